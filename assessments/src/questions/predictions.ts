import { type ChoicePart, type Compiled } from './compiled.ts';
import { evaluate } from './evaluate.ts';
import { holds, leansOn } from './solve.ts';
import { fromSi, toSi } from './units.ts';

/** Predicted wrong values; a slip whose sum cannot be worked on these figures is silent. */
export function slipValues(
  question: Compiled,
  step: string,
  values: Map<string, number>,
): { slip: number; value: number }[] {
  return question.slips.flatMap((slip, index) =>
    slip.makes
      .filter((made) => made.step === step)
      .flatMap(({ expr }) => {
        try {
          return [{ slip: index, value: evaluate(expr, values, question.profile) }];
        } catch {
          return [];
        }
      }),
  );
}

/** Whether an option is the right one on these values. */
export function isRightOption(
  question: Compiled,
  part: ChoicePart,
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
  const needed = leansOn(question, [target]);
  const values = new Map(Object.entries(by.values));
  const earlier = question.steps.filter(({ name }) => needed.has(name) && name !== target);
  if (earlier.length === 0) return null;
  try {
    for (const { name, unit, how } of earlier) {
      const value =
        how.kind === 'sum'
          ? evaluate(how.expr, values, question.profile)
          : (values.get(name) ?? NaN);
      values.set(name, toSi(Number(fromSi(value, unit).toPrecision(by.figures)), unit));
    }
    const step = question.steps.find(({ name }) => name === target);
    return step?.how.kind === 'sum' ? evaluate(step.how.expr, values, question.profile) : null;
  } catch {
    return null;
  }
}
