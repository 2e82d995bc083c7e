import { Line, type Token } from '../line.tsx';
import { InlineMarkdown } from './inline-markdown.tsx';
import { type PartView } from './views.ts';

export type Lines = readonly (readonly Token[])[];

/** A part that is worked for the trainee, where its answer would be. */
export function WorkedPart({ part, lines }: { part: PartView; lines: Lines }) {
  return (
    <li className="part worked-part">
      <p className="part-letter">({part.id})</p>
      <div className="part-body">
        <p className="part-prompt">
          <InlineMarkdown>{part.prompt}</InlineMarkdown>
        </p>
        <WorkedLines label="Worked" lines={lines} />
      </div>
      <p className="part-marks">worked</p>
    </li>
  );
}

/** Lines that are worked already, on squared paper as if they had been written there. */
export function WorkedLines({ label, lines }: { label: string; lines: Lines }) {
  return (
    <div className="worked-lines">
      <p className="working-label">{label}</p>
      <div className="squared">
        {lines.map((tokens, index) => (
          <p key={index}>
            <Line tokens={tokens} />
          </p>
        ))}
      </div>
    </div>
  );
}
