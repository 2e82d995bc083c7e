import { type ChoicePart, type ChoicesPart, type Compiled } from './compiled.ts';
import { evaluate, type Values } from './evaluate.ts';
import { holds } from './solve.ts';
import { fromSi, toSi } from './units.ts';
import { type StepWorking, workingsOf } from './workings.ts';

/** Predicted wrong values; a slip whose sum cannot be worked on these figures is silent. */
export function slipValues(
  question: Compiled,
  step: string,
  values: Values,
): { slip: number; value: number }[] {
  const found: { slip: number; value: number }[] = [];
  for (const { slip, formula } of workingsOf(question).slips.get(step) ?? []) {
    try {
      const value = formula(values);
      if (Number.isFinite(value)) found.push({ slip, value });
    } catch {
      // Out of some table: nobody can have gone wrong this way here.
    }
  }
  return found;
}

/** Whether an option is the right one on these values. */
export function isRightOption(
  question: Compiled,
  part: ChoicePart | ChoicesPart,
  at: { index: number; values: Map<string, number> },
): boolean {
  const right = part.options[at.index]?.right ?? false;
  return typeof right === 'boolean' ? right : holds(question, right, at.values);
}

/**
 * A step worked from earlier steps that were each rounded to so many figures, in their own unit.
 * Null when it leans on no other step, or comes to nothing.
 */
export function workRounded(
  question: Compiled,
  target: string,
  by: { values: Readonly<Record<string, number>>; figures: number },
): number | null {
  const { steps } = workingsOf(question);
  const worked = steps.get(target);
  const earlier = [...steps.values()].filter(
    ({ step: { name } }) => name !== target && worked?.leansOn.has(name),
  );
  if (!worked?.formula || earlier.length === 0) return null;
  const values = new Map(Object.entries(by.values));
  try {
    for (const working of earlier) roundInto(values, working, by.figures);
    return evaluate(worked.formula, values, target);
  } catch {
    return null;
  }
}

function roundInto(
  values: Map<string, number>,
  { step: { name, unit }, formula }: StepWorking,
  figures: number,
): void {
  const value = formula ? evaluate(formula, values, name) : (values.get(name) ?? NaN);
  values.set(name, toSi(Number(fromSi(value, unit).toPrecision(figures)), unit));
}
