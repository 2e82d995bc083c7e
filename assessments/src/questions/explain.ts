import { type Compiled, type Part, type Step } from './compiled.ts';
import { flagDifferences } from './differences.ts';
import { type Expr, namesIn } from './expression.ts';
import { figureText } from './format.ts';
import { type Judged, type Page } from './judged.ts';
import { chosenLines, rightLines } from './listed-lines.ts';
import { fillIn } from './placeholders.ts';
import { remarksOn } from './remarks.ts';
import { leansOn } from './solve.ts';
import { type TypedQuantity } from './read-answer.ts';
import { type Line, type MarkedPart } from './types.ts';
import { figuresLine, formulaLine, operator, resultLine, symbolToken, words } from './typeset.ts';
import { wrongStepOf } from './wrong-step.ts';

/** The marked part as a trainee reads it: own lines, worked lines, remarks. */
export function explainPart(page: Page, judged: Judged): MarkedPart {
  const { part, finding } = judged;
  const worked = workedLines(page, part);
  const yours = ownLines(page, judged);
  const isLost = finding.marks < part.marks;
  const isOff = !['right', 'not-understood'].includes(finding.verdict) && yours.length > 0;
  const [own, flagged] = isOff ? flagDifferences(yours, worked) : [yours, worked];
  return {
    id: part.id,
    prompt: fillIn(part.prompt, page.question.givens, page.drawn.values),
    verdict: finding.verdict,
    marks: finding.marks,
    outOf: part.marks,
    yours: own,
    worked: flagged,
    remarks: remarksOn(page, judged),
    wrongStep: isLost ? wrongStepOf(page, judged) : null,
    read: isLost ? (part.read ?? page.question.read) : null,
  };
}

/** The worked answer of a part, line by line; steps printed for an earlier part are not repeated. */
export function workedLines(page: Page, part: Part): Line[] {
  const { question, drawn } = page;
  const values = new Map(Object.entries(drawn.values));
  const lines = takeSteps(page, part).flatMap((step) => stepLines(question, step, values));
  if (part.kind === 'quantity') return withRounding(page, part, lines);
  return part.kind === 'size' ? lines : [...lines, ...rightLines(page, part)];
}

/** The steps a part leans on that stand on no earlier part; from now on they count as shown. */
export function takeSteps({ question, shown }: Omit<Page, 'drawn'>, part: Part): Step[] {
  const needed = leansOn(question, namesUsed(part));
  const steps = question.steps.filter(({ name }) => needed.has(name) && !shown.has(name));
  needed.forEach((name) => shown.add(name));
  return steps;
}

/** Names a part is judged by. */
function namesUsed(part: Part): string[] {
  if ('step' in part) return [part.step];
  if (part.kind === 'order' || part.kind === 'match') return [];
  return part.options.flatMap(({ right }) =>
    typeof right === 'boolean' ? [] : [...namesIn(right)],
  );
}

/** One step as it is printed: where it comes from, and what it comes to. */
export function stepLines(
  question: Compiled,
  step: Step,
  values: ReadonlyMap<string, number>,
): Line[] {
  const value = values.get(step.name) ?? NaN;
  const result = resultLine(step, value, step.unit);
  if (step.how.kind === 'read') {
    return [[words(step.how.because)], [symbolToken(step.symbol), ...result]];
  }
  const { expr } = step.how;
  return [formulaLine(question, step, expr), figuresLine(question, expr, values), result];
}

/** Where the part says how to round, the rounded key is the last line. */
function withRounding(
  { question, drawn }: Page,
  part: Extract<Part, { kind: 'quantity' }>,
  lines: Line[],
): Line[] {
  const held = drawn.parts[part.id];
  const step = question.steps.find((one) => one.name === part.step);
  if (!part.rounding || held?.kind !== 'quantity' || !step) return lines;
  const rounded = resultLine({ ...step, figures: 9 }, held.key, part.units[0] ?? step.unit);
  return [...lines, [words(part.rounding.text), ...rounded]];
}

function ownLines(page: Page, judged: Judged): Line[] {
  const { part, answer, typed, finding } = judged;
  if (finding.verdict === 'blank') return [];
  if (part.kind !== 'quantity') return chosenLines(page, judged);
  if (!typed) return [[words(answer.text.trim().slice(0, 60))]];
  const step = page.question.steps.find((one) => one.name === part.step);
  return step ? typedLines(page, judged, { step, typed }) : [];
}

/** Own formula and figures where they are known, and always what was typed. */
function typedLines(
  page: Page,
  judged: Judged,
  { step, typed }: { step: Step; typed: TypedQuantity },
): Line[] {
  const figure = figureText(typed.figure, typed.unit, 10);
  const result: Line = [operator('='), { kind: 'number', text: figure }];
  if (typed.unit.symbol !== '') result.push({ kind: 'unit', text: typed.unit.symbol });
  const expr = ownFormula(page, judged, step);
  if (!expr) return [[symbolToken(step.symbol), ...result]];
  const values = judged.sums?.account?.values ?? new Map(Object.entries(page.drawn.values));
  const formula = formulaLine(page.question, step, expr);
  return [formula, figuresLine(page.question, expr, values), result];
}

/** The formula a trainee must have used: the slip's own where one was recognised. */
function ownFormula(page: Page, { finding, part }: Judged, step: Step): Expr | null {
  // A figure read off a curve has no formula; with rounded steps in between, it is not known.
  const isUnknown = finding.verdict === 'wrong' || finding.rule === 'rounded-early';
  if (isUnknown || step.how.kind !== 'sum') return null;
  if (finding.slip === undefined || part.kind !== 'quantity') return step.how.expr;
  const slip = page.question.slips[finding.slip];
  return slip?.makes.find((made) => made.step === part.step)?.expr ?? null;
}
