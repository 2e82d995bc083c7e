/** Exponents of kg, m, s, A and K. */
export type Dimension = readonly [kg: number, m: number, s: number, a: number, k: number];

export interface Unit {
  /** As printed, such as "mm²". */
  symbol: string;
  dimension: Dimension;
  /** SI value of one of it. */
  factor: number;
  /** SI value of its zero; not nought for °C and °F alone. */
  offset: number;
}

interface BaseUnit extends Unit {
  /** Other spellings of the symbol; they take prefixes where `prefixes` are given. */
  spellings: readonly string[];
  /** Words, prefixed by whole words: milliohm. */
  words: readonly string[];
  prefixes: string;
}

export const NO_DIMENSION: Dimension = [0, 0, 0, 0, 0];
const VOLT: Dimension = [1, 2, -3, -1, 0];
const OHM: Dimension = [1, 2, -3, -2, 0];
const WATT: Dimension = [1, 2, -3, 0, 0];
const AMPERE: Dimension = [0, 0, 0, 1, 0];
const AREA: Dimension = [0, 2, 0, 0, 0];
const LENGTH: Dimension = [0, 1, 0, 0, 0];
const VOLUME: Dimension = [0, 3, 0, 0, 0];
const TIME: Dimension = [0, 0, 1, 0, 0];
const CHARGE: Dimension = [0, 0, 1, 1, 0];
const ENERGY: Dimension = [1, 2, -2, 0, 0];
const FORCE: Dimension = [1, 1, -2, 0, 0];
const MASS: Dimension = [1, 0, 0, 0, 0];
const KELVIN: Dimension = [0, 0, 0, 0, 1];
const FARAD: Dimension = [-1, -2, 4, 2, 0];

const PREFIX_FACTORS: Readonly<Record<string, number>> = {
  p: 1e-12,
  n: 1e-9,
  µ: 1e-6,
  m: 1e-3,
  k: 1e3,
  M: 1e6,
  G: 1e9,
};
const PREFIX_SPELLINGS: Readonly<Record<string, string>> = { u: 'µ', μ: 'µ', K: 'k' };
const PREFIX_WORDS: Readonly<Record<string, string>> = {
  pico: 'p',
  nano: 'n',
  micro: 'µ',
  milli: 'm',
  kilo: 'k',
  mega: 'M',
  giga: 'G',
};

const base = (
  symbol: string,
  dimension: Dimension,
  more: Partial<Omit<BaseUnit, 'symbol' | 'dimension'>> = {},
): BaseUnit => ({
  symbol,
  dimension,
  factor: 1,
  offset: 0,
  spellings: [],
  words: [],
  prefixes: '',
  ...more,
});

const CIRCULAR_MIL_M2 = (Math.PI / 4) * 0.0000254 ** 2;

/** Order matters where a spelling is shared: the first that fits the wanted dimension is taken. */
export const BASE_UNITS: readonly BaseUnit[] = [
  base('V', VOLT, { spellings: ['v'], words: ['volt', 'volts'], prefixes: 'µmk' }),
  base('A', AMPERE, {
    spellings: ['a'],
    words: ['amp', 'amps', 'ampere', 'amperes'],
    prefixes: 'nµmk',
  }),
  base('Ω', OHM, {
    spellings: ['\u2126', 'ohm', 'ohms', 'Ohm', 'Ohms', 'OHM'],
    words: ['ohm', 'ohms'],
    prefixes: 'µmkM',
  }),
  base('W', WATT, { spellings: ['w'], words: ['watt', 'watts'], prefixes: 'mkM' }),
  base('Wh', ENERGY, {
    factor: 3600,
    spellings: ['wh', 'WH', 'W·h', 'W h', 'W*h'],
    words: ['watt-hour', 'watt-hours', 'watthour', 'watthours', 'watt hour', 'watt hours'],
    prefixes: 'k',
  }),
  base('Ah', CHARGE, {
    factor: 3600,
    spellings: ['ah', 'AH', 'aH', 'A·h', 'A h', 'A*h'],
    words: ['amp-hour', 'amp-hours', 'amphour', 'amphours', 'amp hour', 'amp hours'],
    prefixes: 'm',
  }),
  base('F', FARAD, { spellings: ['f'], words: ['farad', 'farads'], prefixes: 'pnµm' }),
  base('mm²', AREA, {
    factor: 1e-6,
    spellings: ['mm2', 'mm^2', 'sq mm', 'sqmm', 'sq.mm', 'mm sq', 'MM2', 'qmm'],
    words: ['square millimetre', 'square millimetres'],
  }),
  base('m²', AREA, { spellings: ['m2', 'm^2', 'sq m'] }),
  base('kcmil', AREA, { factor: 1000 * CIRCULAR_MIL_M2, spellings: ['MCM'] }),
  base('cmil', AREA, {
    factor: CIRCULAR_MIL_M2,
    spellings: ['CM', 'cmils'],
    words: ['circular mil', 'circular mils'],
  }),
  base('L', VOLUME, {
    factor: 1e-3,
    spellings: ['l'],
    words: ['litre', 'litres', 'liter', 'liters'],
  }),
  base('mm', LENGTH, {
    factor: 1e-3,
    spellings: ['MM'],
    words: ['millimetre', 'millimetres', 'millimeter', 'millimeters'],
  }),
  base('cm', LENGTH, { factor: 1e-2, words: ['centimetre', 'centimetres'] }),
  base('km', LENGTH, { factor: 1e3, words: ['kilometre', 'kilometres'] }),
  base('m', LENGTH, { words: ['metre', 'metres', 'meter', 'meters'] }),
  base('ft', LENGTH, { factor: 0.3048, words: ['foot', 'feet'] }),
  base('in', LENGTH, { factor: 0.0254, words: ['inch', 'inches'] }),
  base('h', TIME, {
    factor: 3600,
    spellings: ['H', 'hr', 'hrs', 'Hr', 'Hrs'],
    words: ['hour', 'hours'],
  }),
  base('min', TIME, {
    factor: 60,
    spellings: ['mins', 'Min', 'MIN'],
    words: ['minute', 'minutes'],
  }),
  base('d', TIME, { factor: 86400, words: ['day', 'days'] }),
  base('s', TIME, {
    spellings: ['S', 'sec', 'secs', 'Sec'],
    words: ['second', 'seconds'],
    prefixes: 'µm',
  }),
  base('°C', KELVIN, {
    offset: 273.15,
    spellings: ['℃', 'degC', 'deg C', 'oC', '° C', 'C', 'ºC'],
    words: ['degrees C', 'celsius', 'degrees celsius'],
  }),
  base('°F', KELVIN, {
    factor: 5 / 9,
    offset: 459.67 * (5 / 9),
    spellings: ['℉', 'degF', 'deg F', 'oF', '° F', 'ºF'],
    words: ['degrees F', 'fahrenheit', 'degrees fahrenheit'],
  }),
  base('K', KELVIN, { spellings: ['k'], words: ['kelvin'] }),
  base('N', FORCE, { words: ['newton', 'newtons'], prefixes: 'k' }),
  base('N·m', ENERGY, {
    spellings: ['Nm', 'N m', 'N*m'],
    words: ['newton metre', 'newton metres', 'newton meter', 'newton meters'],
  }),
  base('kg', MASS, { spellings: ['KG', 'Kg'], words: ['kilogram', 'kilograms', 'kilo', 'kilos'] }),
  base('g', MASS, { factor: 1e-3, words: ['gram', 'grams'] }),
  /** A gauge number: 10 is 10 AWG, 0 is 1/0, −1 is 2/0, −3 is 4/0. */
  base('AWG', NO_DIMENSION, { spellings: ['awg', 'Awg'] }),
  base('%', NO_DIMENSION, {
    factor: 0.01,
    spellings: ['pc', 'pct'],
    words: ['percent', 'per cent'],
  }),
];

const BY_SPELLING = spellEverything();

function spellEverything(): Map<string, Unit[]> {
  const table = new Map<string, Unit[]>();
  const add = (spelling: string, unit: Unit): void => {
    const known = table.get(spelling) ?? [];
    if (!known.some((other) => other.symbol === unit.symbol)) table.set(spelling, [...known, unit]);
  };
  for (const unit of BASE_UNITS) {
    for (const spelling of [unit.symbol, ...unit.spellings, ...unit.words]) add(spelling, unit);
  }
  for (const unit of BASE_UNITS) addPrefixed(unit, add);
  return table;
}

function addPrefixed(unit: BaseUnit, add: (spelling: string, unit: Unit) => void): void {
  const written = Object.entries(PREFIX_SPELLINGS);
  for (const prefix of unit.prefixes) {
    const factor = unit.factor * (PREFIX_FACTORS[prefix] ?? 1);
    const whole: Unit = { ...unit, symbol: prefix + unit.symbol, factor };
    const marks = [prefix, ...written.filter(([, is]) => is === prefix).map(([mark]) => mark)];
    for (const mark of marks) {
      for (const spelling of [unit.symbol, ...unit.spellings]) add(mark + spelling, whole);
    }
    for (const [word, is] of Object.entries(PREFIX_WORDS)) {
      if (is === prefix) unit.words.forEach((name) => add(word + name, whole));
    }
  }
}

/** Units a spelling may stand for, likeliest first; empty when none. */
export function unitsSpelt(spelling: string): readonly Unit[] {
  const known = BY_SPELLING.get(spelling);
  if (known) return known;
  const tidy = spelling.trim().replace(/[\s\u00a0\u2009\u202f]+/g, ' ');
  return BY_SPELLING.get(tidy) ?? BY_SPELLING.get(tidy.toLowerCase()) ?? [];
}

export function sameDimension(a: Dimension, b: Dimension): boolean {
  return a[0] === b[0] && a[1] === b[1] && a[2] === b[2] && a[3] === b[3] && a[4] === b[4];
}

/** Value in SI of a figure in the unit. */
export function toSi(figure: number, unit: Unit): number {
  return figure * unit.factor + unit.offset;
}

/** Figure in the unit of an SI value. */
export function fromSi(value: number, unit: Unit): number {
  return (value - unit.offset) / unit.factor;
}
