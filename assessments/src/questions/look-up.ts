import { type Expr } from './expression.ts';

type LookUp = Extract<Expr, { kind: 'look' }>;

/** Figures come back from SI with their last binary digits changed. */
const NEAR = 1e-9;

/**
 * What a printed table says for a value.
 *
 * @throws {Error} when no row has the value, or nothing stands there.
 */
export function lookUp({ table, keys, results, off, column }: LookUp, value: number): number {
  const row = keys.findIndex((key) => key !== null && isSame(key, value));
  if (row < 0) {
    throw new Error(`Table ${table} has no row for ${value} (SI); add it or narrow the values.`);
  }
  const result = results[row + off];
  if (result !== undefined && result !== null) return result;
  throw new Error(`Table ${table} has nothing in column "${column}" there; fill it or narrow.`);
}

function isSame(key: number, value: number): boolean {
  return Math.abs(key - value) <= NEAR * Math.max(Math.abs(key), Math.abs(value));
}
