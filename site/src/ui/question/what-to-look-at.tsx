import { Link } from 'react-router-dom';
import { QuantitySymbol } from '../quantity.tsx';
import { type MarkedPartView } from './views.ts';

type Reading = NonNullable<MarkedPartView['read']>;

interface WhatToLookAtProps {
  part: MarkedPartView;
  /** A part above sends to the same place: it is not said again. */
  isSaidAbove: boolean;
}

/** After a wrong answer: the step that went wrong, and the paragraph to read. */
export function WhatToLookAt({ part, isSaidAbove }: WhatToLookAtProps) {
  const toRead = isSaidAbove ? null : part.read;
  // Where nothing was written no step went wrong.
  const wrongStep = part.verdict === 'blank' ? null : part.wrongStep;
  if (!wrongStep && !toRead) return null;
  return (
    <div className="look-at">
      {wrongStep && (
        <p>
          The step that went wrong: <StepName {...wrongStep} />
        </p>
      )}
      {toRead && (
        <p>
          Read: <Place read={toRead} />
        </p>
      )}
    </div>
  );
}

/** "R, resistance of the pair" */
function StepName({ symbol, says }: NonNullable<MarkedPartView['wrongStep']>) {
  if (!symbol) return says;
  return (
    <>
      <QuantitySymbol text={symbol} />
      {says && `, ${says}`}
    </>
  );
}

/** "sheet 3.4, paragraph 7, Out and back" */
function Place({ read: { sheet, title, heading, paragraph, issued } }: { read: Reading }) {
  if (!issued) return `sheet ${sheet}, which is not issued yet`;
  if (!paragraph) return <Link to={`/sheets/${sheet}`}>{`sheet ${sheet}, ${title ?? ''}`}</Link>;
  return (
    <Link to={`/sheets/${sheet}#p${paragraph}`}>
      {`sheet ${sheet}, paragraph ${paragraph}, ${heading ?? ''}`}
    </Link>
  );
}

/** Whether one of these sends to the same place as the part does. */
export function isSentThere(parts: readonly MarkedPartView[], { read }: MarkedPartView): boolean {
  return parts.some(
    (above) => above.read?.sheet === read?.sheet && above.read?.paragraph === read?.paragraph,
  );
}
