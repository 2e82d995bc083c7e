import { type Compiled, type Step, type StepPart } from './compiled.ts';
import { type Judged, type Page } from './judged.ts';
import { leansOn } from './solve.ts';
import { type MarkedPart } from './types.ts';
import { fromSi } from './units.ts';

/** A figure jotted down may be rounded, and stand in a neighbouring prefix. */
const NEAR = 0.015;
const PREFIXES = [1, 1e3, 1e-3];

/**
 * The step that went wrong. An earlier part's where the error began there; the first on the way whose
 * value is missing from the trainee's working, where others stand in it; else the one asked for.
 */
export function wrongStepOf(page: Page, judged: Judged): MarkedPart['wrongStep'] {
  const { steps, parts } = page.question;
  const began = judged.finding.verdict === 'not-carried' ? judged.sums?.account?.parts[0] : null;
  const from = parts.find(({ id }) => id === began) ?? judged.part;
  if (!('step' in from)) return null;
  const missed = judged.finding.verdict === 'wrong' ? missedIn(page, judged, from) : null;
  const step = missed ?? steps.find(({ name }) => name === from.step);
  return step ? { symbol: step.symbol, says: step.says ?? '' } : null;
}

function missedIn({ question, drawn }: Page, judged: Judged, part: StepPart): Step | null {
  const values = judged.sums?.account?.values ?? new Map(Object.entries(drawn.values));
  return missedStep(stepsTo(question, part), values, judged.answer.working);
}

/** Steps of a part's own: those on the way that no other part asks for, and the one it asks for. */
function stepsTo(question: Compiled, part: StepPart): Step[] {
  const others = question.parts.flatMap((one) => ('step' in one && one !== part ? one.step : []));
  const asked = new Set(others.filter((name) => name !== part.step));
  const needed = leansOn(question, [part.step], asked);
  return question.steps.filter(({ name }) => needed.has(name) && !asked.has(name));
}

function missedStep(
  steps: readonly Step[],
  values: ReadonlyMap<string, number>,
  working: string,
): Step | null {
  const jotted = (working.match(/\d+(?:[.,]\d+)?/g) ?? []).map((text) =>
    Number(text.replace(',', '.')),
  );
  const isJotted = ({ name, unit }: Step): boolean => {
    const figure = Math.abs(fromSi(values.get(name) ?? NaN, unit));
    return jotted.some((one) =>
      PREFIXES.some((prefix) => Math.abs(one * prefix - figure) <= NEAR * figure),
    );
  };
  const onTheWay = steps.slice(0, -1);
  return onTheWay.some(isJotted) ? (onTheWay.find((step) => !isJotted(step)) ?? null) : null;
}
