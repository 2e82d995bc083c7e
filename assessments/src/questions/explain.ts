import { type Compiled, type Part, type Step } from './compiled.ts';
import { flagDifferences } from './differences.ts';
import { type Expr, namesIn } from './expression.ts';
import { toShortFigures } from './format.ts';
import { type Judged, type Page } from './judged.ts';
import { fillIn } from './placeholders.ts';
import { optionText } from './present.ts';
import { remarksOn } from './remarks.ts';
import { leansOn } from './solve.ts';
import { type TypedQuantity } from './read-answer.ts';
import { type Line, type MarkedPart } from './types.ts';
import { figuresLine, formulaLine, operator, resultLine, symbolToken, words } from './typeset.ts';

/** The marked part as a trainee reads it: own lines, worked lines, remarks. */
export function explainPart(page: Page, judged: Judged): MarkedPart {
  const { part, view, finding } = judged;
  const worked = workedLines(page, part);
  const yours = ownLines(page, judged);
  const isOff = !['right', 'not-understood'].includes(finding.verdict) && yours.length > 0;
  const [own, flagged] = isOff ? flagDifferences(yours, worked) : [yours, worked];
  return {
    id: part.id,
    prompt: view.prompt,
    verdict: finding.verdict,
    marks: finding.marks,
    outOf: part.marks,
    yours: own,
    worked: flagged,
    remarks: remarksOn(page, judged),
  };
}

/** The worked answer of a part, line by line; steps printed for an earlier part are not repeated. */
export function workedLines(page: Page, part: Part): Line[] {
  const { question, drawn } = page;
  const values = new Map(Object.entries(drawn.values));
  const lines = takeSteps(page, part).flatMap((step) => stepLines(question, step, values));
  const held = drawn.parts[part.id];
  if (part.kind === 'choice' && held?.kind === 'options') {
    const right = held.options.find(({ id }) => id === held.right);
    const text = optionText(part, right?.index ?? 0);
    return [...lines, [words(fillIn(text, question.givens, drawn.values))]];
  }
  return part.kind === 'quantity' ? withRounding(page, part, lines) : lines;
}

/** The steps a part leans on that stand on no earlier part; from now on they count as shown. */
export function takeSteps({ question, shown }: Page, part: Part): Step[] {
  const needed = leansOn(question, part.kind === 'choice' ? namesInOptions(part) : [part.step]);
  const steps = question.steps.filter(({ name }) => needed.has(name) && !shown.has(name));
  needed.forEach((name) => shown.add(name));
  return steps;
}

function namesInOptions(part: Extract<Part, { kind: 'choice' }>): string[] {
  return part.options.flatMap(({ right }) =>
    typeof right === 'boolean' ? [] : [...namesIn(right)],
  );
}

function stepLines(question: Compiled, step: Step, values: ReadonlyMap<string, number>): Line[] {
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
  if (part.kind !== 'quantity') return chosenLine(page, judged);
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
  const figure = toShortFigures(typed.figure, 10);
  const result: Line = [operator('='), { kind: 'number', text: figure }];
  if (typed.unit.symbol !== '') result.push({ kind: 'unit', text: typed.unit.symbol });
  const expr = ownFormula(page, judged, step);
  if (!expr) return [[symbolToken(step.symbol), ...result]];
  const values = judged.own?.values ?? new Map(Object.entries(page.drawn.values));
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

function chosenLine({ question, drawn }: Page, { part, answer }: Judged): Line[] {
  const held = drawn.parts[part.id];
  const chosen =
    held?.kind === 'options' ? held.options.find(({ id }) => id === answer.option) : undefined;
  if (!chosen) return [];
  if (part.kind === 'size') {
    const figure = toShortFigures(part.sizes[chosen.index] ?? NaN, 9);
    return [
      [operator('='), { kind: 'number', text: figure }, { kind: 'unit', text: part.unit.symbol }],
    ];
  }
  const text = fillIn(optionText(part, chosen.index), question.givens, drawn.values);
  return [[words(text)]];
}
