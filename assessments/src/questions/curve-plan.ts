import { type CurvePlan, type Given } from './compiled.ts';
import { type Sheet } from './sheet-schema.ts';
import { parseUnit } from './unit-expression.ts';
import { sameDimension } from './units.ts';

type CurveSheet = NonNullable<Sheet['curve']>;

/**
 * The curve of a sheet in the form that is kept, its names checked against the given values.
 *
 * @throws {Error} when a setting names no given value, or one of another kind.
 */
export function planCurve(curve: CurveSheet, givens: readonly Given[]): CurvePlan {
  const { battery, charger, load, hours, intervals } = curve;
  for (const [name, unit] of settingsOf(curve)) requireSetting(name, unit, givens);
  return {
    battery,
    charger: {
      limit: charger.limit,
      absorption: charger.absorption,
      float: charger.float,
      tail: charger.tail,
      longestAbsorption: charger['longest absorption'] ?? null,
    },
    load: load ? { amps: load.amps, from: load.from ?? null } : null,
    hours,
    intervals: Object.entries(intervals).map(([label, entry]) => {
      const marked = typeof entry === 'string' ? { stage: entry } : entry;
      return { label, before: null, after: null, ...marked };
    }),
  };
}

function settingsOf(curve: CurveSheet): [string | undefined, string][] {
  const { battery, charger, load, intervals } = curve;
  const times = Object.values(intervals).flatMap((entry): [string | undefined, string][] =>
    typeof entry === 'string'
      ? []
      : [
          [entry.before, 'h'],
          [entry.after, 'h'],
        ],
  );
  return [
    ...times,
    [battery.capacity, 'Ah'],
    [battery.charge, '%'],
    [charger.limit, 'A'],
    [charger.absorption, 'V'],
    [charger.float, 'V'],
    [charger.tail, 'A'],
    [charger['longest absorption'], 'h'],
    [load?.amps, 'A'],
    [load?.from, 'h'],
  ];
}

function requireSetting(name: string | undefined, unit: string, givens: readonly Given[]): void {
  if (name === undefined) return;
  const given = givens.find((one) => one.name === name);
  if (given && sameDimension(given.unit.dimension, parseUnit(unit).dimension)) return;
  throw new Error(`The curve needs ${name} as a given value in ${unit}; declare it under given.`);
}
