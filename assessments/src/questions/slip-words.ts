import { openQuestion } from './compiled.ts';
import { type CompiledQuestion, type TraceEntry } from './types.ts';

const RECOGNISED = /\bslip (\d+)\b/;

/**
 * The slip a decision of the marker names, in words that hold whatever the figures were,
 * such as "You counted the cable out but not back."; null when it names none.
 */
export function slipWords(question: CompiledQuestion, entry: TraceEntry): string | null {
  if (entry.rule !== 'slip') return null;
  const number = Number(RECOGNISED.exec(entry.detail)?.[1] ?? NaN);
  return openQuestion(question).slips[number - 1]?.is ?? null;
}
