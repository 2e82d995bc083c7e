import { type Compiled, type Given, type Step } from './compiled.ts';
import { compile, type Formula } from './evaluate.ts';
import { type Expr, namesIn } from './expression.ts';
import { toSi } from './units.ts';

/** A step and what is found out about it once. */
export interface StepWorking {
  readonly step: Step;
  /** Null where the value is read off a curve. */
  readonly formula: Formula | null;
  /** What its formula names. */
  readonly names: ReadonlySet<string>;
  /** Steps it leans on, itself included. */
  readonly leansOn: ReadonlySet<string>;
}

/** A condition and the steps it leans on, in their order. */
export interface ConditionWorking {
  readonly formula: Formula;
  readonly needs: readonly StepWorking[];
}

/** A question made ready to be worked, over and over, on plain SI numbers. */
export interface Workings {
  readonly steps: ReadonlyMap<string, StepWorking>;
  /** In the order they are kept in: given values, what is read off a curve, steps. */
  readonly names: readonly string[];
  /** Those of them that are drawn or read, not worked. */
  readonly unworked: readonly string[];
  /** Conditions, those first that need no curve to be run. */
  readonly plain: readonly Expr[];
  readonly onCurve: readonly Expr[];
  /** By step, what each slip makes of it. */
  readonly slips: ReadonlyMap<string, readonly { slip: number; formula: Formula }[]>;
  /** SI values a given may take, by place, filled as they are drawn. */
  readonly choices: ReadonlyMap<string, number[]>;
}

const ready = new WeakMap<Compiled, Workings>();
const conditions = new WeakMap<Expr, ConditionWorking>();

/** Compiles a question's expressions, once for each question that is kept in memory. */
export function workingsOf(question: Compiled): Workings {
  let workings = ready.get(question);
  if (!workings) ready.set(question, (workings = makeReady(question)));
  return workings;
}

/** The same for a condition of the question. */
export function conditionOf(question: Compiled, condition: Expr): ConditionWorking {
  let working = conditions.get(condition);
  if (!working) {
    const { steps } = workingsOf(question);
    const needed = belowAll(namesIn(condition), steps);
    const needs = [...steps.values()].filter(({ step }) => needed.has(step.name));
    working = { formula: compile(condition, question.profile), needs };
    conditions.set(condition, working);
  }
  return working;
}

function belowAll(
  names: ReadonlySet<string>,
  steps: ReadonlyMap<string, StepWorking>,
): Set<string> {
  return new Set([...names].flatMap((name) => [...(steps.get(name)?.leansOn ?? [])]));
}

function makeReady(question: Compiled): Workings {
  const steps = new Map<string, StepWorking>();
  for (const step of question.steps) steps.set(step.name, workingOf(step, { question, steps }));
  const isRead = ({ how }: Step): boolean => how.kind === 'read';
  const reads = question.steps.filter(isRead).map(({ name }) => name);
  const unworked = [...question.givens.map(({ name }) => name), ...reads];
  const isOnCurve = (condition: Expr): boolean => {
    const below = belowAll(namesIn(condition), steps);
    return reads.some((name) => below.has(name));
  };
  return {
    steps,
    unworked,
    names: [...unworked, ...question.steps.filter((step) => !isRead(step)).map(({ name }) => name)],
    plain: question.require.filter((condition) => !isOnCurve(condition)),
    onCurve: question.require.filter(isOnCurve),
    slips: slipsOf(question),
    choices: new Map(question.givens.map(({ name }) => [name, []])),
  };
}

/** A step leans on earlier ones only, so theirs are known by then. */
function workingOf(
  step: Step,
  at: { question: Compiled; steps: ReadonlyMap<string, StepWorking> },
): StepWorking {
  if (step.how.kind === 'read') {
    return { step, formula: null, names: new Set(), leansOn: new Set([step.name]) };
  }
  const { expr } = step.how;
  const names = namesIn(expr);
  return {
    step,
    formula: compile(expr, at.question.profile),
    names,
    leansOn: belowAll(names, at.steps).add(step.name),
  };
}

function slipsOf({ slips, profile }: Compiled): Workings['slips'] {
  const found = new Map<string, { slip: number; formula: Formula }[]>();
  slips.forEach(({ makes }, slip) => {
    for (const { step, expr } of makes) {
      const others = found.get(step) ?? [];
      found.set(step, [...others, { slip, formula: compile(expr, profile) }]);
    }
  });
  return found;
}

/** SI value of a given at one of its places, as `placesOf` counts them. */
export function valueAt(question: Compiled, given: Given, place: number): number {
  const known = workingsOf(question).choices.get(given.name);
  const value = known?.[place] ?? toSi(figureAt(given, place), given.unit);
  if (known) known[place] = value;
  return value;
}

function figureAt({ source }: Given, place: number): number {
  if (source.kind === 'value') return source.figure;
  if (source.kind === 'list') return source.figures[place] ?? NaN;
  // 8 + 0.1 × 13 is 9.3, not 9.300000000000001.
  return Number((source.from + source.step * place).toPrecision(12));
}

/** How many values a given may take. */
export function placesOf({ source }: Given): number {
  if (source.kind === 'value') return 1;
  if (source.kind === 'list') return source.figures.length;
  return Math.round((source.to - source.from) / source.step) + 1;
}
