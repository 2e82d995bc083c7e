import { readAuthorFigure, readAuthorFigures } from './author-figure.ts';
import { type Given, type Source } from './compiled.ts';
import { type SheetGiven } from './sheet-schema.ts';
import { STOCK } from './stock-series.ts';
import { parseUnit } from './unit-expression.ts';
import { type Unit } from './units.ts';

const DEFAULT_FIGURES = 3;

/**
 * Turns one entry of `given` into a checked parameter.
 *
 * @throws {Error} when it mixes ways of giving a value, or a range is empty.
 */
export function readGiven(name: string, given: SheetGiven): Given {
  const [source, unit] = readSource(given);
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
  return given.stock !== undefined || unit.symbol === '' ? null : DEFAULT_FIGURES;
}

function readSource(given: SheetGiven): [Source, Unit] {
  const ways = [given.value, given['one of'], given.stock, given.stock ? undefined : given.from];
  if (ways.filter((way) => way !== undefined).length !== 1) {
    throw new Error('Give one of: value; from, to and step; one of; stock with from and to.');
  }
  if (given.value !== undefined) {
    const { figure, unit } = readAuthorFigure(given.value);
    return [{ kind: 'value', figure }, unit.symbol === '' ? parseUnit(given.unit ?? '') : unit];
  }
  if (given.stock !== undefined) return readStock(given, given.stock);
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

function readStock(given: SheetGiven, series: 'cable' | 'fuse'): [Source, Unit] {
  const { sizes, unit } = STOCK[series];
  const figures = sizesBetween(series, given.from ?? '', given.to ?? '');
  if (figures.length < 2)
    throw new Error(`Stock has ${sizes.join(', ')} ${unit.symbol}; widen it.`);
  return [{ kind: 'list', figures }, unit];
}

/** Stock sizes between two typed ones, both included. */
export function sizesBetween(series: 'cable' | 'fuse', from: string, to: string): number[] {
  const { sizes, unit } = STOCK[series];
  const [[low = 0, high = 0]] = readAuthorFigures([from, to], unit.symbol);
  for (const end of [low, high]) {
    if (!sizes.includes(end)) {
      throw new Error(`${end} ${unit.symbol} is no stock size; use ${sizes.join(', ')}.`);
    }
  }
  return sizes.filter((size) => size >= low && size <= high);
}
