import { gaugeNumber } from '../electrical/gauge.ts';
import { readAuthorFigure, readAuthorFigures } from './author-figure.ts';
import { type Given, type Source, type Table } from './compiled.ts';
import { type SheetGiven } from './sheet-schema.ts';
import { figureText } from './format.ts';
import { columnAt } from './sheet-tables.ts';
import { STOCK, type StockName } from './stock-series.ts';
import { parseUnit } from './unit-expression.ts';
import { type Unit } from './units.ts';

const DEFAULT_FIGURES = 3;

/**
 * Turns one entry of `given` into a checked parameter.
 *
 * @param tables - of the sheet, for a value drawn from a column.
 * @throws {Error} when it mixes ways of giving a value, or a range is empty.
 */
export function readGiven(name: string, given: SheetGiven, tables: readonly Table[]): Given {
  const [source, unit] = readSource(given, tables);
  if (given.shown && given.symbol === undefined) {
    throw new Error('A value that is shown needs a symbol; add one or set shown: false.');
  }
  return {
    name,
    symbol: given.symbol ?? null,
    label: given.is,
    unit,
    source,
    isShown: given.shown,
    figures: given.figures === undefined ? defaultFigures(given, unit) : given.figures,
  };
}

/** Counts and stock sizes are printed as they are named: 4 mm², 3 circuits. */
function defaultFigures(given: SheetGiven, unit: Unit): number | null {
  const isNamed = given.stock !== undefined || given.column !== undefined;
  return isNamed || unit.symbol === '' || unit.symbol === 'AWG' ? null : DEFAULT_FIGURES;
}

function readSource(given: SheetGiven, tables: readonly Table[]): [Source, Unit] {
  const { stock, column } = given;
  const ways = [given.value, given['one of'], stock, column, stock ? undefined : given.from];
  if (ways.filter((way) => way !== undefined).length !== 1) {
    throw new Error(
      'Give one of: value; from, to and step; one of; stock with from and to; column.',
    );
  }
  if (given.value !== undefined) {
    const { figure, unit } = readAuthorFigure(given.value);
    return [{ kind: 'value', figure }, unit.symbol === '' ? parseUnit(given.unit ?? '') : unit];
  }
  if (stock !== undefined) return readStock(given, stock);
  if (column !== undefined) {
    const { figures, unit } = columnAt(column, tables);
    return [{ kind: 'list', figures }, unit];
  }
  if (given['one of'] !== undefined) {
    const [figures, unit] = readAuthorFigures(given['one of'], given.unit ?? '');
    return [{ kind: 'list', figures }, unit];
  }
  return readRange(given);
}

function readRange(given: SheetGiven): [Source, Unit] {
  const texts = [given.from, given.to, given.step].map((text) => text ?? '');
  const [figures, unit] = readAuthorFigures(texts, given.unit ?? '');
  const [low = NaN, high = NaN, by = NaN] = figures;
  const steps = (high - low) / by;
  if (!(by > 0 && steps >= 1 && Math.abs(steps - Math.round(steps)) < 1e-6)) {
    throw new Error(`Range ${texts.join(', ')} does not come out even; mend the step.`);
  }
  return [{ kind: 'range', from: low, to: high, step: by }, unit];
}

function readStock(given: SheetGiven, series: StockName): [Source, Unit] {
  const { sizes, unit } = STOCK[series];
  const figures = sizesBetween(series, given.from ?? '', given.to ?? '');
  if (figures.length < 2)
    throw new Error(`Stock has ${sizes.join(', ')} ${unit.symbol}; widen it.`);
  return [{ kind: 'list', figures }, unit];
}

/** Stock sizes between two typed ones, both included. */
export function sizesBetween(series: StockName, from: string, to: string): number[] {
  const { sizes, unit } = STOCK[series];
  const [low = -1, high = -1] = [from, to].map((text) => {
    const figure = sizeFigure(text, unit);
    const place = sizes.indexOf(figure);
    if (place >= 0) return place;
    const known = sizes.map((size) => figureText(size, unit, 9)).join(', ');
    throw new Error(`"${text}" is no stock size; use ${known} ${unit.symbol}.`);
  });
  if (low > high) throw new Error(`From ${from} to ${to} runs downwards; give the smaller first.`);
  return sizes.slice(low, high + 1);
}

function sizeFigure(text: string, unit: Unit): number {
  if (unit.symbol === 'AWG') return gaugeNumber(text.replace(/\s*AWG$/, ''));
  const [[figure = NaN]] = readAuthorFigures([text], unit.symbol);
  return figure;
}
