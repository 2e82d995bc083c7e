import { Link } from 'react-router-dom';
import { QuantitySymbol } from '../quantity.tsx';
import { type MarkedPartView } from './views.ts';

/** After a wrong answer: the step that went wrong, and the paragraph to read. */
export function WhatToLookAt({ part: { wrongStep, read } }: { part: MarkedPartView }) {
  if (!wrongStep && !read) return null;
  return (
    <div className="look-at">
      {wrongStep && (
        <p>
          The step that went wrong: <StepName {...wrongStep} />
        </p>
      )}
      {read && (
        <p>
          Read:{' '}
          <Link to={`/sheets/${read.sheet}${read.paragraph ? `#p${read.paragraph}` : ''}`}>
            {sayPlace(read)}
          </Link>
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
function sayPlace({ sheet, paragraph, heading }: NonNullable<MarkedPartView['read']>): string {
  const within = [...(paragraph ? [`paragraph ${paragraph}`] : []), ...(heading ? [heading] : [])];
  return [`sheet ${sheet}`, ...within].join(', ');
}
