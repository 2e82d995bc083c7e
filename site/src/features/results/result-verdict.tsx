import { Button } from '@radix-ui/themes';
import { Link } from 'react-router-dom';
import { sayDate, sayDateInFull } from '../../ui/dates.ts';
import { MarkScale } from './mark-scale.tsx';
import { practiceOf } from './practice-list.tsx';
import { type ResultView } from './queries.ts';
import { sayMarks } from './say-marks.ts';

/** The word, the mark, the scale and the one next step; beside them the paper's way with its lamp. */
export function ResultVerdict({ result }: { result: ResultView }) {
  return (
    <section className={result.passed ? 'verdict result passed' : 'verdict result'}>
      <div className="verdict-word">
        <p className="kicker">
          {result.paper.title}, {result.name}
        </p>
        <h1>{result.passed ? 'Passed' : 'Not passed'}</h1>
        <p className="until">{sayMarks(result)}</p>
        <MarkScale {...result} />
        <NextStep result={result} />
      </div>
      <div className="verdict-mark lamp-box">
        <LampDrawing result={result} />
        <p>
          <LampSaid result={result} />
        </p>
      </div>
    </section>
  );
}

function NextStep({ result }: { result: ResultView }) {
  const [worst] = practiceOf(result);
  if (result.certificate?.ready) {
    return (
      <div className="actions">
        <Button size="3" asChild>
          <Link to={`/certificates/${result.certificate.id}`}>Open the certificate</Link>
        </Button>
      </div>
    );
  }
  if (result.passed || !worst) return null;
  const { worksheet, sheet } = worst.practise;
  return (
    <div className="actions">
      <Button size="3" asChild>
        <Link to={worksheet ? `/worksheets/${worksheet}` : `/sheets/${sheet}`}>
          Practise {worksheet ?? sheet}
        </Link>
      </Button>
      <Link to={`/sheets/${sheet}`}>Read sheet {sheet}</Link>
    </div>
  );
}

function LampSaid({ result }: { result: ResultView }) {
  if (result.passed) return 'The lamp of the paper is lit, and the course is complete on your map.';
  return (
    <>
      {result.maySitAgainAt && (
        <>
          Next sitting from <b>{sayDateInFull(result.maySitAgainAt)}</b>.{' '}
        </>
      )}
      Your sheets and worksheets stay open.
    </>
  );
}

/** The way of the paper: live down to its lamp. The sentence beneath says the same. */
function LampDrawing({ result }: { result: ResultView }) {
  const { passed, maySitAgainAt, paper } = result;
  return (
    <svg className="drawing" viewBox="0 0 260 170" aria-hidden="true">
      <path className="busbar-line" d="M20 20H240" />
      <path className="live" d="M86 20V92" />
      <circle className="terminal-ring" cx="86" cy="56" r="7.5" />
      <g className={passed ? 'lamp lit' : 'lamp'} transform="translate(86 114)">
        <circle r="22" />
        <path d="M-15.5 -15.5 15.5 15.5M15.5 -15.5 -15.5 15.5" />
      </g>
      <text className="bold" x="120" y={passed ? 119 : 110}>
        Paper {paper.number}
      </text>
      {!passed && maySitAgainAt && (
        <text className="second" x="120" y="130">
          {sayDate(maySitAgainAt)}
        </text>
      )}
    </svg>
  );
}
