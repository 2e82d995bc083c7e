import { type SizePart } from './compiled.ts';
import { toSi } from './units.ts';

/** SI value of one of a part's sizes. */
export function sizeSi(part: SizePart, index: number): number {
  return toSi(part.sizes[index] ?? NaN, part.unit);
}
