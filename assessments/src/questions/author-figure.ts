import { readNumber } from './number-text.ts';
import { plainSigns } from './plain-signs.ts';
import { parseUnit } from './unit-expression.ts';
import { sameDimension, type Unit } from './units.ts';

export interface AuthorFigure {
  figure: number;
  unit: Unit;
}

/**
 * Reads a figure with its unit as an author writes it in a sheet: "12.8 V", "0.0175 Ω·mm²/m", "3".
 *
 * @throws {Error} when it is no figure, or the unit is unknown.
 */
export function readAuthorFigure(text: string): AuthorFigure {
  const plain = plainSigns(text);
  const number = readNumber(plain);
  if (number.state !== 'number') {
    throw new Error(`"${text}" is not a figure with its unit; write it like 12.8 V.`);
  }
  return { figure: number.value, unit: parseUnit(plain.slice(number.length)) };
}

/** Figures that must share one unit, taken from the first that names one, or from `fallback`. */
export function readAuthorFigures(texts: string[], fallback: string): [number[], Unit] {
  const read = texts.map(readAuthorFigure);
  const named = read.find((one) => one.unit.symbol !== '')?.unit ?? parseUnit(fallback);
  for (const [index, { unit }] of read.entries()) {
    if (unit.symbol === '' || unit.symbol === named.symbol) continue;
    const kind = sameDimension(unit.dimension, named.dimension) ? 'another unit' : 'another kind';
    throw new Error(`"${texts[index]}" is in ${kind} than ${named.symbol}; use ${named.symbol}.`);
  }
  return [read.map((one) => one.figure), named];
}
