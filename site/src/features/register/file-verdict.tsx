import { type ReactNode } from 'react';
import { EmptyStrandMark } from '../../ui/strand-mark.tsx';
import { sayFinding } from './file-words.ts';
import { type FileReport } from './look-at-file.ts';
import { sizeOfWord } from './verdict-words.ts';

interface FileVerdictProps {
  report: FileReport;
  fileName: string;
  /** What else can be done with it. */
  actions: ReactNode;
}

/** A file that is not, byte for byte, one that was issued: what is wrong with it. */
export function FileVerdict({ report, fileName, actions }: FileVerdictProps) {
  const { word, says } = sayFinding(report.finding);
  return (
    <section className={`verdict faulty-file ${sizeOfWord(word)}`}>
      <div className="verdict-word">
        <p className="kicker">
          File <span className="file-name">{fileName}</span>
          {report.number && (
            <>
              , which claims to be <span className="mono">{report.number}</span>
            </>
          )}
        </p>
        <h1>{word}</h1>
        <p className="todo">{says}</p>
        {report.detail && <p className="when">Found: {report.detail}</p>}
        <p className="todo">
          The certificate itself may still be good: check its number and the family name below.
        </p>
        {actions}
      </div>
      <div className="verdict-mark">
        <EmptyStrandMark />
      </div>
    </section>
  );
}
