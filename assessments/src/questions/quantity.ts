import { gaugeAreaMm2, gaugeNumber } from '../electrical/gauge.ts';
import { readNumber } from './number-text.ts';
import { plainSigns } from './plain-signs.ts';
import { readTime } from './typed-time.ts';
import { unitsTyped } from './typed-units.ts';
import { sameDimension, type Unit, unitsSpelt } from './units.ts';

/** What a person typed, before it is looked at as an answer. */
export type QuantityReading =
  | { state: 'blank' }
  | { state: 'quantity'; figure: number; unit: Unit | null }
  | { state: 'ambiguous'; readings: string[] }
  | { state: 'unknown-unit'; spelling: string }
  | { state: 'not-a-quantity' };

const LONGEST = 60;
/** What most people type; it needs no further look. */
const PLAIN_FIGURE = /^-?\d+(?:\.\d+)?$/;
/** "I = 14 A", "U_d = 0.67 V", "≈ 5": what a figure is called, or that it is rounded. */
const CALLED = /^(?:\p{L}[\p{L}\p{N}_]{0,9} ?)?[=≈~] ?/u;
const MINUS_IN_WORDS = /^minus (?=[\d.,])/i;
const NOUGHTS = '0{2,4}|[1-4] ?/ ?0';
const MARKED_GAUGE = new RegExp(
  `^(?:(?:#|awg|no\\.?) ?(\\d{1,2}|${NOUGHTS})|(\\d{1,2}|${NOUGHTS}) ?(?:awg|ga|gauge)\\.?)$`,
  'i',
);
/** What no unit begins with: a unit is spelt in letters, or is one of a few signs. */
const NO_UNIT = /^[^\p{L}\p{So}°˚%‰€$£]/u;
const BARE_GAUGE = new RegExp(`^(${NOUGHTS})$`);

/**
 * Reads a typed quantity: figure, and unit where one is typed. `wanted` only settles what can
 * be read in two ways, such as F for farad or Fahrenheit; the figure is never compared.
 */
export function readQuantity(typed: string, wanted: Unit | null): QuantityReading {
  const text = plainSigns(typed);
  if (text === '') return { state: 'blank' };
  if (text.length > LONGEST) return { state: 'not-a-quantity' };
  if (PLAIN_FIGURE.test(text) && wanted?.symbol !== 'AWG') {
    return { state: 'quantity', figure: Number(text), unit: null };
  }
  const bare = text.replace(CALLED, '').replace(MINUS_IN_WORDS, '-');
  const time = readTime(bare, wanted);
  if (time) return time.state === 'time' ? { ...time, state: 'quantity' } : time;
  return readGauge(bare, wanted) ?? readFigure(bare, wanted);
}

function readFigure(text: string, wanted: Unit | null): QuantityReading {
  const number = readNumber(text);
  if (number.state === 'none') return { state: 'not-a-quantity' };
  const spelling = text.slice(number.length).trim();
  if (NO_UNIT.test(spelling)) return { state: 'not-a-quantity' };
  if (number.state === 'ambiguous') {
    return { state: 'ambiguous', readings: number.readings.map((r) => `${r} ${spelling}`.trim()) };
  }
  if (spelling === '') return { state: 'quantity', figure: number.value, unit: null };
  const unit = chooseUnit(unitsTyped(spelling), wanted);
  if (unit) return { state: 'quantity', figure: number.value, unit };
  return /\d/.test(spelling) ? { state: 'not-a-quantity' } : { state: 'unknown-unit', spelling };
}

function chooseUnit(units: readonly Unit[], wanted: Unit | null): Unit | undefined {
  const fitting = wanted && units.find((unit) => sameDimension(unit.dimension, wanted.dimension));
  return fitting ?? units[0];
}

/** A gauge where a gauge is wanted, its copper area where an area is or nothing is known. */
function readGauge(text: string, wanted: Unit | null): QuantityReading | null {
  const isWanted = wanted?.symbol === 'AWG';
  const [mm2] = unitsSpelt('mm²');
  if (!mm2 || !(isWanted || sameDimension((wanted ?? mm2).dimension, mm2.dimension))) return null;
  const gauge = gaugeTyped(text, isWanted);
  if (gauge === null) return null;
  return isWanted
    ? { state: 'quantity', figure: gauge, unit: wanted }
    : { state: 'quantity', figure: gaugeAreaMm2(gauge), unit: mm2 };
}

function gaugeTyped(text: string, isWanted: boolean): number | null {
  const found = MARKED_GAUGE.exec(text) ?? (isWanted ? BARE_GAUGE.exec(text) : null);
  const written = found?.[1] ?? found?.[2];
  if (written === undefined) return null;
  const name = /^0+$/.test(written) ? `${written.length}/0` : written.replace(/ /g, '');
  try {
    return gaugeNumber(name);
  } catch {
    return null;
  }
}
