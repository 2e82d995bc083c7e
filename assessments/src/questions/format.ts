import { gaugeName } from '../electrical/gauge.ts';
import { type Unit } from './units.ts';

/** Longest run of noughts after the point before a figure is written with a power of ten. */
const SMALLEST_PLAIN = 1e-5;
const LARGEST_PLAIN = 1e7;

/** A figure to so many significant figures, noughts kept: 14 to three is "14.0". */
export function toFigures(value: number, figures: number): string {
  if (value === 0) return '0';
  const size = Math.abs(value);
  if (size < SMALLEST_PLAIN || size >= LARGEST_PLAIN) return withPower(value, figures);
  const rounded = value.toPrecision(figures);
  // With more digits before the point than figures it comes with a power of ten: 1.23e+4.
  return signed(rounded.includes('e') ? String(Number(rounded)) : rounded);
}

/** A figure as short as it can be said at so many significant figures: "5.5", "4". */
export function toShortFigures(value: number, figures: number): string {
  const long = toFigures(value, figures);
  return long.includes('.') && !long.includes('×') ? long.replace(/\.?0+$/, '') : long;
}

function withPower(value: number, figures: number): string {
  const [mantissa = '', exponent = '0'] = value.toExponential(figures - 1).split('e');
  return `${signed(mantissa)} × 10^${signed(String(Number(exponent)))}`;
}

function signed(text: string): string {
  return text.replace('-', '\u2212');
}

/** A figure beside its unit, as short as it can be said; a gauge goes by its name, 1/0 for 0. */
export function figureText(figure: number, unit: Unit, figures: number): string {
  const isGauge = unit.symbol === 'AWG' && Number.isInteger(figure) && figure >= -3 && figure <= 40;
  return isGauge ? gaugeName(figure) : toShortFigures(figure, figures);
}
