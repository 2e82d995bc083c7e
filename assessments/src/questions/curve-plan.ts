import { type Given } from './compiled.ts';
import { type CurveSheet } from './curve-schema.ts';
import { curveSettings } from './curve-settings.ts';
import { type CurvePlan, type CurveRead } from './curve-types.ts';
import { parseUnit } from './unit-expression.ts';
import { sameDimension } from './units.ts';

/** Unit of what is read off. */
const READ_IN: Readonly<Record<CurveRead['kind'], string>> = {
  'bulk ends': 'h',
  'float starts': 'h',
  'absorption lasts': 'h',
  'quiet ends': 'h',
  'protection opens': 'h',
  'vehicle taken': 'h',
  'vehicle let go': 'h',
  'amp-hours in bulk': 'Ah',
  'highest volts': 'V',
  'volts at': 'V',
  'battery volts at': 'V',
  'input volts at': 'V',
  'amps before float': 'A',
  'amps at': 'A',
  'battery amps at': 'A',
};

/**
 * The curve of a sheet in the form that is kept, its names checked against the given values.
 *
 * @throws {Error} when a setting names no given value, or one of another kind.
 */
export function planCurve(curve: CurveSheet, givens: readonly Given[]): CurvePlan {
  for (const [name, unit] of curveSettings(curve)) requireSetting(name, unit, givens);
  for (const read of Object.values(curve.reads)) requireUnit(read);
  requireWhole(curve);
  const { battery, charger, load, input, hours, show, intervals } = curve;
  const { protection } = battery;
  return {
    battery: {
      ...battery,
      protection: protection && {
        opensAt: protection['opens at'],
        closesAt: protection['closes at'],
      },
    },
    charger: planCharger(charger),
    vehicle: input?.vehicle,
    solar: input?.solar,
    load: load ? { ...load, from: load.from ?? null } : null,
    hours,
    show,
    intervals: Object.entries(intervals).map(([label, entry]) => {
      const marked = typeof entry === 'string' ? { stage: entry } : entry;
      return { label, before: null, after: null, ...marked };
    }),
  };
}

function planCharger(charger: CurveSheet['charger']): CurvePlan['charger'] {
  return {
    limit: charger.limit,
    absorption: charger.absorption,
    float: charger.float ?? null,
    tail: charger.tail,
    tailAt: charger['tail at'],
    longestAbsorption: charger['longest absorption'] ?? null,
    leastAbsorption: charger['least absorption'],
    afterAbsorption: charger['after absorption'],
    restart: charger.restart,
    compensation: charger.compensation,
    quietUntil: charger.quiet?.until,
    derate: charger.derate,
    lead: charger.lead,
    sense: charger.sense,
    pauses: charger.pauses,
  };
}

/** Settings that need one another. */
function requireWhole({ charger, input, show }: CurveSheet): void {
  const after = charger['after absorption'] ?? 'float';
  if (after === 'float' && charger.float === undefined) {
    throw new Error('The charger goes to float and has none; name float or after absorption.');
  }
  if (charger.sense !== undefined && charger.lead === undefined) {
    throw new Error('sense matters only behind a lead; name lead as well or leave sense out.');
  }
  if (show.includes('input volts') && !input?.vehicle) {
    throw new Error('Input volts are those of the vehicle input; describe it under input.');
  }
}

function requireUnit({ of: kind, unit }: CurveSheet['reads'][string]): void {
  const wanted = READ_IN[kind];
  if (sameDimension(parseUnit(unit).dimension, parseUnit(wanted).dimension)) return;
  throw new Error(`A reading of "${kind}" is in ${wanted}, not in ${unit}; change its unit.`);
}

function requireSetting(name: string | undefined, unit: string, givens: readonly Given[]): void {
  if (name === undefined) return;
  const given = givens.find((one) => one.name === name);
  if (given && sameDimension(given.unit.dimension, parseUnit(unit).dimension)) return;
  const wanted = unit === '' ? 'a pure number' : unit;
  throw new Error(`The curve needs ${name} as a given value in ${wanted}; declare it under given.`);
}
