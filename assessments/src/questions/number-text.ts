/** What a typed figure may mean. */
export type NumberReading =
  | { state: 'number'; value: number; length: number }
  | { state: 'ambiguous'; readings: string[]; length: number }
  | { state: 'none' };

const FIGURE = new RegExp(
  '^(?<sign>[-+]?) ?' +
    "(?<digits>\\d[\\d.,'\u2019]*(?: \\d{3}(?!\\d))*(?:[.,]\\d+)?|[.,]\\d+)" +
    '(?<power>[eE][-+]?\\d{1,3}(?!\\d)| ?[×xX*·⋅] ?10(?: ?\\^ ?[-+]?\\d{1,3}|[⁻⁺]?[⁰¹²³⁴-⁹]{1,3}))?',
);
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/** Reads the figure a text of plain signs begins with; `length` is how much of it it took. */
export function readNumber(text: string): NumberReading {
  const found = FIGURE.exec(text);
  if (!found) return { state: 'none' };
  const { sign, digits, power } = found.groups as Record<string, string | undefined>;
  const plain = plainDigits(digits ?? '');
  if (plain.state === 'none') return plain;
  const mark = sign === '-' ? '-' : '';
  const length = found[0].length;
  if (plain.state === 'ambiguous') {
    const readings = plain.readings.map((one) => mark.replace('-', '\u2212') + one + (power ?? ''));
    return { state: 'ambiguous', readings, length };
  }
  // One conversion of the joined text keeps the last digit that a product would lose.
  const value = Number(`${mark}${plain.text}e${exponentOf(power ?? '')}`);
  const isLost = value === 0 && /[1-9]/.test(plain.text);
  return Number.isFinite(value) && !isLost ? { state: 'number', value, length } : { state: 'none' };
}

type PlainReading =
  | { state: 'number'; text: string }
  | { state: 'ambiguous'; readings: string[] }
  | { state: 'none' };

const NONE: PlainReading = { state: 'none' };

function plainDigits(digits: string): PlainReading {
  const spaced = /[ '\u2019]/.test(digits);
  if (spaced) return groupedBySpaces(digits);
  const marks = [...digits].filter((c) => c === '.' || c === ',');
  const kinds = new Set(marks);
  if (kinds.size === 2) return mixedMarks(digits);
  if (marks.length > 1) return groupedByMarks(digits);
  if (/^[1-9]\d{0,2},\d{3}$/.test(digits)) {
    return { state: 'ambiguous', readings: [digits.replace(',', '.'), digits.replace(',', '')] };
  }
  return numberFrom(digits.replace(',', '.'));
}

/** 1 234 567,8: groups of three set apart; what follows a point or comma is decimal. */
function groupedBySpaces(digits: string): PlainReading {
  const grouped = /^([1-9]\d{0,2}(?:[ '\u2019]\d{3})+)(?:[.,](\d+))?$/.exec(digits);
  if (!grouped) return NONE;
  const whole = (grouped[1] ?? '').replace(/\D/g, '');
  return numberFrom(grouped[2] === undefined ? whole : `${whole}.${grouped[2]}`);
}

/** 1.234.567 can only be groups. */
function groupedByMarks(digits: string): PlainReading {
  return /^[1-9]\d{0,2}(?:([.,])\d{3})(?:\1\d{3})+$/.test(digits)
    ? numberFrom(digits.replace(/[.,]/g, ''))
    : NONE;
}

/** 1.234,5 and 1,234.5 can each be read in one way only: the last mark is the decimal one. */
function mixedMarks(digits: string): PlainReading {
  const mixed = /^([1-9]\d{0,2}([.,])\d{3}(?:\2\d{3})*)([.,])(\d+)$/.exec(digits);
  if (!mixed || mixed[2] === mixed[3]) return NONE;
  return numberFrom(`${(mixed[1] ?? '').replace(/[.,]/g, '')}.${mixed[4] ?? ''}`);
}

function numberFrom(text: string): PlainReading {
  if (!/^(\d+\.?\d*|\.\d+)$/.test(text)) return NONE;
  return { state: 'number', text };
}

function exponentOf(power: string): number {
  if (power === '') return 0;
  const raised = power.replace(/^.*10/, '').replace(/^[eE]/, '').replace(/[ ^]/g, '');
  const flat = [...raised]
    .map((c) => (RAISED.includes(c) ? String(RAISED.indexOf(c)) : c))
    .join('')
    .replace(/⁻/g, '-')
    .replace(/[+⁺]/g, '');
  return Number(flat);
}
