import { type Dimension, NO_DIMENSION, type Unit, unitsSpelt } from './units.ts';

/** A spelling that is no unit of the table. */
class UnknownUnit extends Error {
  constructor(spelling: string) {
    super(`"${spelling}" is not a unit of the table; write it as in mΩ, mm², Ah, °C, Ω·mm²/m.`);
    this.name = 'UnknownUnit';
  }
}

const NONE: Unit = { symbol: '', dimension: NO_DIMENSION, factor: 1, offset: 0 };
const SUPERSCRIPTS: Readonly<Record<string, string>> = { '²': '2', '³': '3' };

/**
 * Reads a unit as an author writes it, products and quotients included: "Ω·mm²/m".
 * Nothing, or "-", is a pure number.
 *
 * @throws {UnknownUnit} when a factor is not in the table.
 */
export function parseUnit(spelling: string): Unit {
  const text = spelling.trim();
  if (text === '' || text === '-') return NONE;
  const whole = unitsSpelt(text)[0];
  if (whole) return whole;
  const parts = text.split(/([·*/])/).map((part) => part.trim());
  let unit = factorOf(parts[0] ?? '');
  for (let at = 1; at < parts.length; at += 2) {
    const sign = parts[at] === '/' ? -1 : 1;
    unit = combine(unit, factorOf(parts[at + 1] ?? ''), sign);
  }
  return { ...unit, symbol: parts.map((part) => (part === '*' ? '·' : part)).join('') };
}

function factorOf(spelling: string): Unit {
  if (spelling === '1') return NONE;
  const known = unitsSpelt(spelling)[0];
  if (known) return { ...known, offset: 0 };
  const power = /^(.+?)(?:\^(\d)|([²³]))$/.exec(spelling);
  const root = power ? unitsSpelt(power[1] ?? '')[0] : undefined;
  if (!power || !root) throw new UnknownUnit(spelling);
  const exponent = Number(power[2] ?? SUPERSCRIPTS[power[3] ?? '']);
  let raised = NONE;
  for (let n = 0; n < exponent; n += 1) raised = combine(raised, root, 1);
  return raised;
}

function combine(left: Unit, right: Unit, sign: 1 | -1): Unit {
  const dimension = left.dimension.map(
    (exponent, index) => exponent + sign * (right.dimension[index] ?? 0),
  );
  return {
    symbol: '',
    dimension: dimension as unknown as Dimension,
    factor: left.factor * right.factor ** sign,
    offset: 0,
  };
}
