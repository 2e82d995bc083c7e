import { type SizePart } from './compiled.ts';
import { toSi } from './units.ts';

/** SI value of one of a part's sizes. */
export function sizeSi(part: SizePart, index: number): number {
  return toSi(part.sizes[index] ?? NaN, part.unit);
}

/** Whether two SI values are one size; gauge 1/0 counts as 0, so the ratio will not do. */
export function isSameSize(one: number, other: number): boolean {
  return Math.abs(one - other) <= 1e-9 * Math.max(Math.abs(one), Math.abs(other));
}
