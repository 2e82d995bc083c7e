import { type Compiled, type DrawnPart, type QuantityPart } from './compiled.ts';
import { toShortFigures } from './format.ts';
import { type OwnSums } from './own-values.ts';
import { type TypedQuantity } from './read-answer.ts';
import { slipValues, workRounded } from './predictions.ts';
import { isTooNear, isWithin, keyOf, rangeOf, slipRangeOf } from './tolerance.ts';
import { type Verdict } from './types.ts';
import { toSi, type Unit } from './units.ts';
import { workingsOf } from './workings.ts';

/** What the marker decided about one part, and by which rule. */
export interface Finding {
  verdict: Verdict;
  marks: number;
  rule: string;
  /** Says why, for the trace; put into words only when it is asked for. */
  say: () => string;
  /** Which slip was recognised. */
  slip?: number;
  /** The unit the figure fits, where the unit was wrong. */
  fits?: Unit;
  /** Power of ten the figure is out by. */
  power?: number;
}

/** One quantity answer and everything it is judged by. */
export interface QuantityCase {
  question: Compiled;
  part: QuantityPart;
  drawn: Extract<DrawnPart, { kind: 'quantity' }>;
  typed: TypedQuantity;
  /** Everything recomputed on the trainee's own earlier values. */
  sums: OwnSums;
  /** All values as drawn, SI. */
  values: Readonly<Record<string, number>>;
}

type Rule = (it: QuantityCase) => Finding | null;

/** The marker's order. The first rule that applies decides. */
const RULES: readonly Rule[] = [right, carried, slipped, roundedEarly, wrongUnit, powerOfTen];

export function judgeQuantity(it: QuantityCase): Finding {
  for (const rule of RULES) {
    const finding = rule(it);
    if (finding) return finding;
  }
  return { verdict: 'wrong', marks: 0, rule: 'wrong', say: () => `${figures(it)} fits no rule` };
}

/** Half a part's marks, rounded down, for the right figures in a wrong unit or power of ten. */
function half(part: QuantityPart): number {
  return Math.floor(part.marks / 2);
}

function valueOf({ typed }: QuantityCase): number {
  return typed.isOfKind ? toSi(typed.figure, typed.unit) : NaN;
}

function figures(it: QuantityCase): string {
  return `${toShortFigures(it.typed.figure, 8)} ${it.typed.unit.symbol}`.trim();
}

function right(it: QuantityCase): Finding | null {
  if (!isWithin(valueOf(it), it.drawn)) return null;
  return {
    verdict: 'right',
    marks: it.part.marks,
    rule: 'right',
    say: () => `${figures(it)} is within ${span(it.drawn)} (SI)`,
  };
}

/** The key recomputed on the trainee's own earlier values, or null where there are none. */
function ownKeyOf(it: QuantityCase): number | null {
  const value = it.sums.account?.values.get(it.part.step);
  const step = workingsOf(it.question).steps.get(it.part.step)?.step;
  return value === undefined || !step ? null : keyOf(it.part, step.unit, value);
}

function carried(it: QuantityCase): Finding | null {
  const ownKey = ownKeyOf(it);
  if (ownKey === null || !isWithin(valueOf(it), rangeOf(it.part, ownKey))) return null;
  const say = (): string =>
    `${figures(it)} is within ${span(rangeOf(it.part, ownKey))} (SI), on own earlier values`;
  if (it.part.carry === 'never') {
    return { verdict: 'not-carried', marks: 0, rule: 'not-carried', say };
  }
  return it.sums.account?.isOff
    ? { verdict: 'carried-forward', marks: it.part.marks, rule: 'carried-forward', say }
    : { verdict: 'right', marks: it.part.marks, rule: 'right-on-own-rounding', say };
}

/** A slip predicted on the true values, or on the trainee's own where they carry. */
function slipped(it: QuantityCase): Finding | null {
  const value = valueOf(it);
  const own = it.part.carry === 'own' ? it.sums.account : null;
  const onOwn = own ? slipValues(it.question, it.part.step, own.values) : [];
  const ownKey = ownKeyOf(it);
  const live = onOwn.filter((one) => ownKey !== null && !isTooNear(it.part, ownKey, one.value));
  const found = [...it.drawn.slips, ...live].find((one) =>
    isWithin(value, slipRangeOf(it.part, one.value)),
  );
  const made = found && it.question.slips[found.slip]?.makes.find((m) => m.step === it.part.step);
  if (!found || !made) return null;
  return {
    verdict: 'slip',
    marks: made.keep,
    rule: 'slip',
    slip: found.slip,
    say: () =>
      `${figures(it)} is what slip ${found.slip + 1} gives (${toShortFigures(found.value, 6)} SI)`,
  };
}

/** Figures left after rounding too early. */
const TOO_FEW = 2;

/** The key as it comes out when every step before it was rounded to two figures. */
function roundedEarly(it: QuantityCase): Finding | null {
  const { question, part } = it;
  const value = workRounded(question, part.step, { values: it.values, figures: TOO_FEW });
  if (value === null || !isWithin(valueOf(it), slipRangeOf(part, value))) return null;
  return {
    verdict: 'slip',
    marks: half(part),
    rule: 'rounded-early',
    say: () => `${figures(it)} is what steps rounded to ${TOO_FEW} figures give`,
  };
}

function keysOf(it: QuantityCase): number[] {
  const ownKey = it.part.carry === 'own' ? ownKeyOf(it) : null;
  return ownKey === null ? [it.drawn.key] : [it.drawn.key, ownKey];
}

function wrongUnit(it: QuantityCase): Finding | null {
  const accepted = it.part.units.filter((unit) => unit.symbol !== it.typed.unit.symbol);
  for (const key of keysOf(it)) {
    const fits = accepted.find((unit) =>
      isWithin(toSi(it.typed.figure, unit), rangeOf(it.part, key)),
    );
    if (!fits) continue;
    return {
      verdict: 'wrong-unit',
      marks: half(it.part),
      rule: 'wrong-unit',
      fits,
      say: () => `${figures(it)} would be right in ${fits.symbol}`,
    };
  }
  return null;
}

const MOST_POWER = 6;

function powerOfTen(it: QuantityCase): Finding | null {
  const value = valueOf(it);
  // 1 AWG is not ten times too small for 10 AWG.
  const isCounted = it.part.units[0]?.symbol === 'AWG';
  if (!Number.isFinite(value) || it.typed.unit.offset !== 0 || isCounted) return null;
  for (const key of keysOf(it)) {
    for (let power = -MOST_POWER; power <= MOST_POWER; power += 1) {
      if (power === 0 || !isWithin(value / 10 ** power, rangeOf(it.part, key))) continue;
      return {
        verdict: 'power-of-ten',
        marks: half(it.part),
        rule: 'power-of-ten',
        power,
        say: () => `${figures(it)} is out by 10^${power}`,
      };
    }
  }
  return null;
}

function span({ low, high }: { low: number; high: number }): string {
  return `${toShortFigures(low, 6)} to ${toShortFigures(high, 6)}`;
}
