import { marksToPass } from './marked-sheet.tsx';
import { type WorksheetView } from './queries.ts';

/** One sentence under the title of a marked worksheet. */
export function sayResult(attempt: WorksheetView): string {
  const { marks, outOf, percent, passed, unit, mine } = attempt;
  const result = `${marks ?? 0} of ${outOf} marks, ${percent ?? 0}\u2009%.`;
  if (passed) {
    return mine ? `${result} The lamp of unit ${unit.number} is lit.` : `${result} Passed.`;
  }
  const short = marksToPass(attempt) - (marks ?? 0);
  const missing = short === 1 ? 'one mark short' : `${short} marks short`;
  return `${result} Not passed, ${missing}.`;
}
