import {
  ambientFactor,
  engineSpaceFactor,
  groupingFactor,
  ratingAmps,
  sizeForCurrent,
} from '../electrical/ampacity.ts';
import { classFiveOhmsPerKm } from '../electrical/conductors.ts';
import { CABLE_AREAS_MM2, FUSE_RATINGS_A, nextSize } from '../electrical/stock.ts';
import { sizeForDrop } from '../electrical/voltage-drop.ts';
import { type Dimension } from './units.ts';
import { parseUnit } from './unit-expression.ts';

/** `root`: half the argument's dimension; `same`: all arguments alike, and the result too. */
type Shape =
  | { kind: 'fixed'; takes: readonly Dimension[]; gives: Dimension }
  | { kind: 'root' }
  | { kind: 'same' };

export interface TradeFunction {
  arity: readonly [least: number, most: number];
  shape: Shape;
  /** SI in, SI out. */
  run: (...si: number[]) => number;
  /** Words printed before its arguments in a worked line. */
  says: string;
}

const of = (unit: string): Dimension => parseUnit(unit).dimension;
const PURE = of('');
const AREA = of('m²');
const AMPS = of('A');
const VOLTS = of('V');
const METRES = of('m');
const KELVIN = of('K');
const OHMS_PER_METRE = of('Ω/m');

const MM2_PER_M2 = 1e6;
const ZERO_C_IN_K = 273.15;
const mm2 = (m2: number): number => Number((m2 * MM2_PER_M2).toPrecision(12));
const m2 = (areaMm2: number): number => areaMm2 / MM2_PER_M2;
const celsius = (kelvin: number): number => Number((kelvin - ZERO_C_IN_K).toFixed(9));

function fixed(
  says: string,
  shape: { takes: readonly Dimension[]; gives: Dimension },
  run: (...si: number[]) => number,
): TradeFunction {
  const count = shape.takes.length;
  return { arity: [count, count], shape: { kind: 'fixed', ...shape }, run, says };
}

const at = (si: number[], index: number): number => si[index] ?? NaN;

/** Functions a sheet may call. Everything here works in SI. */
export const FUNCTIONS: ReadonlyMap<string, TradeFunction> = new Map<string, TradeFunction>([
  ['sqrt', { arity: [1, 1], shape: { kind: 'root' }, run: (x) => Math.sqrt(x ?? NaN), says: '√' }],
  [
    'abs',
    { arity: [1, 1], shape: { kind: 'same' }, run: (x) => Math.abs(x ?? NaN), says: 'size of' },
  ],
  ['min', { arity: [2, 4], shape: { kind: 'same' }, run: Math.min, says: 'the smaller of' }],
  ['max', { arity: [2, 4], shape: { kind: 'same' }, run: Math.max, says: 'the larger of' }],
  ['ln', fixed('ln', { takes: [PURE], gives: PURE }, (x) => Math.log(x ?? NaN))],
  [
    'tableOhms',
    fixed('table resistance of', { takes: [AREA], gives: OHMS_PER_METRE }, (...si) => {
      return classFiveOhmsPerKm(mm2(at(si, 0))) / 1000;
    }),
  ],
  [
    'nextCable',
    fixed('next stock size from', { takes: [AREA], gives: AREA }, (...si) =>
      m2(nextSize(mm2(at(si, 0)), CABLE_AREAS_MM2)),
    ),
  ],
  [
    'nextFuse',
    fixed('next fuse from', { takes: [AMPS], gives: AMPS }, (...si) =>
      nextSize(at(si, 0), FUSE_RATINGS_A),
    ),
  ],
  [
    'cableForDrop',
    fixed(
      'smallest size by the cable table for',
      { takes: [AMPS, METRES, VOLTS], gives: AREA },
      (...si) => m2(sizeForDrop({ amps: at(si, 0), lengthM: at(si, 1), limitV: at(si, 2) })),
    ),
  ],
  [
    'rating',
    fixed('table rating of', { takes: [AREA, KELVIN], gives: AMPS }, (...si) =>
      ratingAmps(mm2(at(si, 0)), celsius(at(si, 1))),
    ),
  ],
  [
    'cableForCurrent',
    fixed(
      'smallest size by the rating table for',
      { takes: [AMPS, KELVIN, PURE], gives: AREA },
      (...si) =>
        m2(sizeForCurrent({ amps: at(si, 0), jacketC: celsius(at(si, 1)), factor: at(si, 2) })),
    ),
  ],
  [
    'ambientFactor',
    fixed('ambient factor for', { takes: [KELVIN, KELVIN], gives: PURE }, (...si) =>
      ambientFactor(celsius(at(si, 0)), celsius(at(si, 1))),
    ),
  ],
  [
    'groupingFactor',
    fixed('grouping factor for', { takes: [PURE], gives: PURE }, (...si) =>
      groupingFactor(at(si, 0)),
    ),
  ],
  [
    'engineFactor',
    fixed('engine-space factor for', { takes: [KELVIN], gives: PURE }, (...si) =>
      engineSpaceFactor(celsius(at(si, 0))),
    ),
  ],
]);
