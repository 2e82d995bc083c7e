import { type PracticeProfile } from '../electrical/practice-profile.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension } from './units.ts';

/** `root`: half the argument's dimension; `same`: all arguments alike, and the result too. */
type Shape =
  | { kind: 'fixed'; takes: readonly Dimension[]; gives: Dimension }
  | { kind: 'root' }
  | { kind: 'same' };

/** Arguments and result in SI; the practice is the one the question is asked under. */
type Run = (si: readonly number[], profile: PracticeProfile) => number;

/** A function a sheet may call. */
export interface TradeFunction {
  arity: readonly [least: number, most: number];
  shape: Shape;
  run: Run;
  /** Words printed before its arguments in a worked line. */
  says: string;
}

/** Functions by the names sheets call them by, ready for a Map. */
export type FunctionEntries = readonly (readonly [name: string, called: TradeFunction])[];

const of = (unit: string): Dimension => parseUnit(unit).dimension;
export const PURE = of('');
export const AREA = of('m²');
export const AMPS = of('A');
export const VOLTS = of('V');
export const METRES = of('m');
export const KELVIN = of('K');
export const OHMS_PER_METRE = of('Ω/m');

const MM2_PER_M2 = 1e6;
const ZERO_C_IN_K = 273.15;
/** mm² of an SI area, rid of the last binary digits so that a stock size is found again. */
export const toMm2 = (areaM2: number): number => Number((areaM2 * MM2_PER_M2).toPrecision(12));
export const fromMm2 = (areaMm2: number): number => areaMm2 / MM2_PER_M2;
export const toCelsius = (kelvin: number): number => Number((kelvin - ZERO_C_IN_K).toFixed(9));

/** A function of so many arguments, each of its own dimension. */
export function fixed(
  says: string,
  shape: { takes: readonly Dimension[]; gives: Dimension },
  run: Run,
): TradeFunction {
  const count = shape.takes.length;
  return { arity: [count, count], shape: { kind: 'fixed', ...shape }, run, says };
}

/** An argument by its place; NaN when a sheet gave none. */
export const at = (si: readonly number[], index: number): number => si[index] ?? NaN;
