import { figureText } from './format.ts';
import { readChosen } from './read-chosen.ts';
import { readQuantity } from './quantity.ts';
import { type PartView, type RawAnswer, type Reading } from './types.ts';
import { parseUnit } from './unit-expression.ts';
import { sameDimension, toSi, type Unit, unitsSpelt } from './units.ts';

/** A figure a person typed, with the unit it stands in. */
export interface TypedQuantity {
  figure: number;
  unit: Unit;
  /** False when the unit measures something else than is asked. */
  isOfKind: boolean;
}
type TypedReading =
  { state: 'typed'; typed: TypedQuantity } | Exclude<Reading, { state: 'understood' }>;

/** Enough to give back what was typed. */
const SHOWN_FIGURES = 10;

/** Reads what was typed or chosen; never compares it with a key. */
export function readAnswer(part: PartView, answer: RawAnswer): Reading {
  if (part.kind !== 'quantity') return readChosen(part, answer);
  const offered = part.units.map(parseUnit);
  const reading = readTypedIn(offered, answer);
  if (reading.state !== 'typed') return reading;
  const { figure, unit, isOfKind } = reading.typed;
  if (!isOfKind) {
    return {
      state: 'not-understood',
      ask: `${unit.symbol} measures something else than this part asks for; give it ${unitList(offered)}.`,
    };
  }
  return { state: 'understood', value: toSi(figure, unit), shown: showTyped(reading.typed) };
}

/** A typed quantity as it is shown back: "48.1 mΩ". */
function showTyped({ figure, unit }: TypedQuantity): string {
  const shown = figureText(figure, unit, SHOWN_FIGURES);
  return unit.symbol === '' ? shown : `${shown} ${unit.symbol}`;
}

/** Figure and unit of a quantity answer; a typed unit goes before a chosen one. */
export function readTypedIn(offered: readonly Unit[], answer: RawAnswer): TypedReading {
  const wanted = offered[0] ?? parseUnit('');
  const read = readQuantity(answer.text, wanted);
  switch (read.state) {
    case 'blank':
      return { state: 'blank' };
    case 'ambiguous':
      return askWhich(read.readings);
    case 'unknown-unit':
      return {
        state: 'not-understood',
        ask: `"${read.spelling}" is not a unit we know; give it ${unitList(offered)}.`,
      };
    case 'not-a-quantity':
      return {
        state: 'not-understood',
        ask: `We could not read "${answer.text.trim().slice(0, 40)}"; type one figure, such as 12.5.`,
      };
    case 'quantity': {
      const unit = read.unit ?? chosenUnit(offered, answer.unit);
      if (!unit) {
        return {
          state: 'not-understood',
          ask: `Which unit is it in? Give ${symbolsOf(offered)}.`,
        };
      }
      const isOfKind = sameDimension(unit.dimension, wanted.dimension);
      return { state: 'typed', typed: { figure: read.figure, unit, isOfKind } };
    }
  }
}

function chosenUnit(offered: readonly Unit[], chosen: string | null): Unit | undefined {
  if (chosen === null || chosen === '') {
    return offered.length <= 1 ? (offered[0] ?? parseUnit('')) : undefined;
  }
  return offered.find((unit) => unit.symbol === chosen) ?? unitsSpelt(chosen)[0];
}

function askWhich(readings: string[]): Reading & { state: 'ambiguous' } {
  const isTime = readings.some((reading) => / (?:h|min) \d/.test(reading));
  const how = isTime ? 'with its units' : 'without a mark between thousands';
  return {
    state: 'ambiguous',
    ask: `Did you mean ${readings.join(' or ')}? Type it ${how}.`,
    readings,
  };
}

function unitList(offered: readonly Unit[]): string {
  return offered.length === 0 ? 'as a pure number, without a unit' : `in ${symbolsOf(offered)}`;
}

function symbolsOf(units: readonly Unit[]): string {
  return units.map(({ symbol }) => symbol).join(' or ');
}
