import { openDrawn, openQuestion } from './compiled.ts';
import { takeSteps } from './explain.ts';
import { type CompiledQuestion, type DrawnQuestion, type Line } from './types.ts';
import { formulaLine } from './typeset.ts';

/**
 * The formula the worked answer of a part begins with, in symbols: where to start, not what comes
 * out. Parts are worked in order, so a formula of an earlier part is not given again.
 *
 * @returns null for a part that is not there, or that needs no sum of its own.
 */
export function hintFor(
  stored: CompiledQuestion,
  drawing: DrawnQuestion,
  partId: string,
): Line | null {
  const question = openQuestion(stored);
  const page = { question, drawn: openDrawn(question, drawing), shown: new Set<string>() };
  for (const part of question.parts) {
    const steps = takeSteps(page, part);
    if (part.id !== partId) continue;
    for (const step of steps) {
      if (step.how.kind === 'sum') return formulaLine(question, step, step.how.expr);
    }
  }
  return null;
}
