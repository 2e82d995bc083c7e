import { gaugeAreaMm2, gaugeNumber } from '../electrical/gauge.ts';
import { readNumber } from './number-text.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension, NO_DIMENSION, sameDimension, type Unit, unitsSpelt } from './units.ts';

/** What a person typed, before it is looked at as an answer. */
export type QuantityReading =
  | { state: 'blank' }
  | { state: 'quantity'; figure: number; unit: Unit | null }
  | { state: 'ambiguous'; readings: string[] }
  | { state: 'unknown-unit'; spelling: string }
  | { state: 'not-a-quantity' };

const LONGEST = 60;
const HOURS_AND_MINUTES =
  /^(\d{1,3})\s*(?:h|hr|hrs|hour|hours|:)\s*(\d{1,2})\s*(?:m|min|mins|minutes)?$/i;
const GAUGE = /^(?:#\s*(\d{1,2})|awg\s*(\d{1,2}|[1-4]\/0)|(\d{1,2}|[1-4]\/0)\s*(?:awg|ga|gauge))$/i;
const BARE_NOUGHTS = /^([1-4]\/0)$/;

/**
 * Reads a typed quantity: figure, and unit where one is typed. `wanted` only settles spellings
 * that stand for two units; the figure is never compared with anything.
 */
export function readQuantity(typed: string, wanted: Dimension | null): QuantityReading {
  const text = typed.trim();
  if (text === '') return { state: 'blank' };
  if (text.length > LONGEST) return { state: 'not-a-quantity' };
  const special = readHoursAndMinutes(text) ?? readGauge(text, wanted);
  if (special) return special;
  const bare = text.replace(/^(?:≈|~|=)\s*/, '');
  const number = readNumber(bare);
  if (number.state === 'none') return { state: 'not-a-quantity' };
  const spelling = bare.slice(number.length).trim();
  if (/^[\d.,/×^+*-]/.test(spelling)) return { state: 'not-a-quantity' };
  if (number.state === 'ambiguous') {
    return { state: 'ambiguous', readings: number.readings.map((r) => `${r} ${spelling}`.trim()) };
  }
  return withUnit(number.value, spelling, wanted);
}

function withUnit(figure: number, spelling: string, wanted: Dimension | null): QuantityReading {
  if (spelling === '') return { state: 'quantity', figure, unit: null };
  const unit = chooseUnit(unitsSpelt(spelling), wanted) ?? compoundUnit(spelling);
  return unit ? { state: 'quantity', figure, unit } : { state: 'unknown-unit', spelling };
}

function chooseUnit(units: readonly Unit[], wanted: Dimension | null): Unit | undefined {
  const fitting = wanted && units.find((unit) => sameDimension(unit.dimension, wanted));
  return fitting ?? units[0];
}

function readHoursAndMinutes(text: string): QuantityReading | null {
  const found = HOURS_AND_MINUTES.exec(text);
  const minutes = Number(found?.[2]);
  const hour = unitsSpelt('h')[0];
  if (!found || !hour || !(minutes < 60)) return null;
  return { state: 'quantity', figure: Number(found[1]) + minutes / 60, unit: hour };
}

/** A gauge where a gauge is wanted, its copper area where anything else is. */
function readGauge(text: string, wanted: Dimension | null): QuantityReading | null {
  const isWanted = wanted !== null && sameDimension(wanted, NO_DIMENSION);
  const found = GAUGE.exec(text) ?? (isWanted ? BARE_NOUGHTS.exec(text) : null);
  const written = found?.slice(1).find((group) => group !== undefined);
  const unit = unitsSpelt(isWanted ? 'AWG' : 'mm²')[0];
  if (written === undefined || !unit) return null;
  try {
    const gauge = gaugeNumber(written);
    return { state: 'quantity', figure: isWanted ? gauge : gaugeAreaMm2(gauge), unit };
  } catch {
    return null;
  }
}

/** A unit that is not in the table and is made of some that are, such as "mΩ/m". */
function compoundUnit(spelling: string): Unit | undefined {
  try {
    return parseUnit(spelling);
  } catch {
    return undefined;
  }
}
