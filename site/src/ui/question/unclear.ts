import { isProblem } from '../../api/problem.ts';

/** A part whose answer is asked back, with the item it stands in where there are several. */
interface Unclear {
  key?: string;
  part: string;
  ask: string;
}

function isUnclear(item: unknown): item is Unclear {
  return typeof item === 'object' && item !== null && 'part' in item && 'ask' in item;
}

/** What a refusal asks back; null when it is a refusal of another kind. */
export function readUnclear(error: unknown): Unclear[] | null {
  if (!isProblem(error, 'answer-unclear')) return null;
  const { unclear } = error.problem;
  return Array.isArray(unclear) ? unclear.filter(isUnclear) : [];
}
