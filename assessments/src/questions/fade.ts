import { type Compiled, openDrawn, openQuestion, type Part, type Step } from './compiled.ts';
import { stepLines, takeSteps, workedLines } from './explain.ts';
import { type Page } from './judged.ts';
import {
  type CompiledQuestion,
  type DrawnQuestion,
  type FadedQuestion,
  type Line,
} from './types.ts';

/** How many steps of the worked answer a part is made of. */
interface PartSteps {
  part: Part;
  count: number;
}

/**
 * Steps part by part, in the order of the worked answer. What is chosen, put in order or matched
 * counts as one step, and so does a figure whose steps stand with an earlier part.
 */
function stepsOfParts(question: Compiled): PartSteps[] {
  const shown = new Set<string>();
  return question.parts.map((part) => {
    const steps = takeSteps({ question, shown }, part).length;
    return { part, count: 'step' in part ? Math.max(1, steps) : 1 };
  });
}

/**
 * Levels of fading: how many of the last steps may be left to the trainee, from none (all worked)
 * to all of them.
 *
 * @throws {Error} when the question was compiled by another format version.
 */
export function fadingLevels(stored: CompiledQuestion): number[] {
  const steps = stepsOfParts(openQuestion(stored)).reduce((sum, { count }) => sum + count, 0);
  return Array.from({ length: steps + 1 }, (_, left) => left);
}

/**
 * Works all but the last steps of a draw. Marking knows no levels: an answer to a part that is left
 * is worth the same whatever was shown before it.
 *
 * @param left - how many of the last steps are left; more than there are is all of them.
 * @throws {Error} when the draw does not belong to the question.
 */
export function fadeQuestion(
  stored: CompiledQuestion,
  drawing: DrawnQuestion,
  left: number,
): FadedQuestion {
  const question = openQuestion(stored);
  const page: Page = { question, drawn: openDrawn(question, drawing), shown: new Set() };
  const parts = stepsOfParts(question);
  const all = parts.reduce((sum, { count }) => sum + count, 0);
  const wanted = Number.isNaN(left) ? all : Math.min(all, Math.max(0, Math.trunc(left)));
  const shown: FadedQuestion['shown'] = [];
  const asked: string[] = [];
  let worked = all - wanted;
  for (const { part, count } of parts) {
    const mine = Math.min(count, worked);
    worked -= mine;
    const isWorked = mine === count;
    const lines = isWorked ? allLines(page, part) : firstSteps(page, part, mine);
    if (!isWorked) asked.push(part.id);
    if (lines.length > 0) shown.push({ part: part.id, lines });
  }
  return { left: wanted, shown, asked };
}

/** A part worked whole; one whose steps stand with an earlier part says its own again. */
function allLines(page: Page, part: Part): Line[] {
  const lines = workedLines(page, part);
  if (lines.length > 0 || !('step' in part)) return lines;
  const own = page.question.steps.filter(({ name }) => name === part.step);
  return linesOf(page, own);
}

/** Lines of the first steps on the way to a part's answer. */
function firstSteps(page: Page, part: Part, count: number): Line[] {
  return linesOf(page, takeSteps(page, part).slice(0, count));
}

function linesOf({ question, drawn }: Page, steps: readonly Step[]): Line[] {
  const values = new Map(Object.entries(drawn.values));
  return steps.flatMap((step) => stepLines(question, step, values));
}
