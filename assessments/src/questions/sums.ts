import { type z } from 'zod';
import { gaugeName, gaugeNumber } from '../electrical/gauge.ts';
import { readAuthorFigure } from './author-figure.ts';
import { dimensionOf } from './dimensions.ts';
import { compile, evaluate } from './evaluate.ts';
import { namesIn, readExpression } from './expression.ts';
import { figureText, toFigures } from './format.ts';
import { refusalOf } from './names.ts';
import { readNumber } from './number-text.ts';
import { plainSigns } from './plain-signs.ts';
import { type Sums, sumsSchema } from './sums-schema.ts';
import { parseUnit } from './unit-expression.ts';
import { type Dimension, fromSi, sameDimension, toSi, type Unit } from './units.ts';

/** A figure of a lesson's sums as it is printed. */
export interface PrintedSum {
  /** Figure and unit, which stay on one line. */
  text: string;
  /** The figure alone. */
  bare: string;
}

export interface WorkedSums {
  /** By name. */
  printed: ReadonlyMap<string, PrintedSum>;
  /** What is wrong, each at a field of the sums. */
  issues: { field: PropertyKey[]; message: string }[];
}

/** Sums being worked: what is declared and worked so far. */
interface Slate {
  sums: Sums;
  dimensions: Map<string, Dimension>;
  values: Map<string, number>;
  printed: Map<string, PrintedSum>;
}

const NO_BREAK = '\u00a0';
/** Digits a figure is printed with at most where it is printed as short as it is. */
const SHORTEST = 9;
const RAISED = '⁰¹²³⁴⁵⁶⁷⁸⁹';

/**
 * Works the sums of a lesson with the parser, units and functions of question sheets, and prints
 * every figure. Nothing is thrown: what is wrong is told at its field.
 */
export function workSums(source: unknown): WorkedSums {
  const checked = sumsSchema.safeParse(source);
  if (!checked.success) return { printed: new Map(), issues: issuesOf(checked.error) };
  const slate: Slate = {
    sums: checked.data,
    ...{ dimensions: new Map(), values: new Map(), printed: new Map() },
  };
  const { given, steps } = slate.sums;
  const issues = [
    ...Object.keys(given).flatMap((name) =>
      issueIn(['given', name], () => {
        takeGiven(slate, name);
      }),
    ),
    ...Object.keys(steps).flatMap((name) =>
      issueIn(['steps', name], () => {
        takeStep(slate, name);
      }),
    ),
  ];
  return { printed: slate.printed, issues };
}

const issuesOf = (error: z.ZodError): WorkedSums['issues'] =>
  error.issues.flatMap((issue) => {
    const { code, path: field, message } = issue;
    if (code === 'unrecognized_keys') {
      return issue.keys.map((key) => ({ field: [...field, key], message: 'there is no such key' }));
    }
    return [
      { field, message: code === 'invalid_key' ? (issue.issues[0]?.message ?? '') : message },
    ];
  });

function issueIn(field: PropertyKey[], work: () => void): WorkedSums['issues'] {
  try {
    work();
    return [];
  } catch (error) {
    return [{ field, message: error instanceof Error ? error.message : String(error) }];
  }
}

function declare({ dimensions }: Slate, name: string, dimension: Dimension): void {
  const refusal =
    refusalOf(name) ?? (dimensions.has(name) ? `Name "${name}" is declared twice.` : null);
  if (refusal) throw new Error(refusal);
  dimensions.set(name, dimension);
}

function takeGiven(slate: Slate, name: string): void {
  const { figure, bare, unit } = readGiven(slate.sums.given[name] ?? '');
  declare(slate, name, unit.dimension);
  slate.values.set(name, toSi(figure, unit));
  slate.printed.set(name, printed(bare, unit));
}

/** A gauge goes by its name, 1/0 AWG; any other figure keeps the digits it was written with. */
function readGiven(written: string): { figure: number; bare: string; unit: Unit } {
  const [, gauge] = /^([1-4]\/0|\d{1,2}) ?AWG$/.exec(plainSigns(written)) ?? [];
  if (gauge !== undefined) {
    const figure = gaugeNumber(gauge);
    return { figure, bare: gaugeName(figure), unit: parseUnit('AWG') };
  }
  const { figure, unit } = readAuthorFigure(written);
  const plain = plainSigns(written);
  const number = readNumber(plain);
  const length = number.state === 'number' ? number.length : plain.length;
  return { figure, bare: plain.slice(0, length).trim().replace(/^-/, '\u2212'), unit };
}

function takeStep(slate: Slate, name: string): void {
  const step = slate.sums.steps[name];
  if (!step) return;
  const { dimensions, values, sums } = slate;
  const unit = parseUnit(step.unit);
  const known = new Map(dimensions);
  // Declared even when its sum is wrong, so that one mistake is not told at every later line.
  declare(slate, name, unit.dimension);
  const expr = readExpression(step.is, new Set(known.keys()));
  if (!sameDimension(dimensionOf(expr, known), unit.dimension)) {
    const wanted = unit.symbol || 'a pure number';
    throw new Error(`The sum does not come out in ${wanted}; check it or its unit.`);
  }
  if ([...namesIn(expr)].some((one) => !values.has(one))) return;
  const value = evaluate(compile(expr, sums.profile), values, `Sum ${name}`);
  values.set(name, value);
  slate.printed.set(name, printed(figureIn(fromSi(value, unit), unit, step.figures), unit));
}

function figureIn(figure: number, unit: Unit, figures: number | null): string {
  const text =
    figures === null || unit.symbol === 'AWG'
      ? figureText(figure, unit, figures ?? SHORTEST)
      : toFigures(figure, figures);
  return text.replace(/\^(\u2212?)(\d+)$/, (_, minus: string, power: string) => {
    return (minus && '⁻') + [...power].map((digit) => RAISED[Number(digit)] ?? '').join('');
  });
}

const printed = (bare: string, unit: Unit): PrintedSum => ({
  bare,
  text: unit.symbol === '' ? bare : `${bare}${NO_BREAK}${unit.symbol}`,
});
