import { type ChoicePart, type Compiled } from './compiled.ts';
import { evaluate } from './evaluate.ts';
import { holds } from './solve.ts';

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
          return [{ slip: index, value: evaluate(expr, values) }];
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
