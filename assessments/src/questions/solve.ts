import { type Compiled, type Step } from './compiled.ts';
import { evaluate, type Formula, NotFinite, type Values } from './evaluate.ts';
import { type Expr } from './expression.ts';
import { conditionOf, type StepWorking, workingsOf } from './workings.ts';

/** Steps a set of names leans on, themselves included; the search goes no further than `stop`. */
export function leansOn(
  question: Compiled,
  names: Iterable<string>,
  stop?: ReadonlySet<string>,
): Set<string> {
  const { steps } = workingsOf(question);
  const found = new Set<string>();
  const waiting = [...names];
  for (let name = waiting.pop(); name !== undefined; name = waiting.pop()) {
    const working = steps.get(name);
    if (!working || found.has(name)) continue;
    found.add(name);
    if (!stop?.has(name)) waiting.push(...working.names);
  }
  return found;
}

/**
 * Works the steps that are still missing, in their order; what is known already stays.
 *
 * @throws {NotFinite} when a step comes to no finite number.
 */
export function solve(question: Compiled, known: ReadonlyMap<string, number>): Map<string, number> {
  return solveInto(question, new Map(known));
}

/** As solve, adding to the values themselves. */
export function solveInto(question: Compiled, values: Map<string, number>): Map<string, number> {
  return workMissing(workingsOf(question).steps.values(), values);
}

function workMissing(
  steps: Iterable<StepWorking>,
  values: Map<string, number>,
): Map<string, number> {
  for (const { step, formula } of steps) {
    if (formula === null || values.has(step.name)) continue;
    values.set(step.name, workStep(step, formula, values));
  }
  return values;
}

function workStep(step: Step, formula: Formula, values: Values): number {
  const value = formula(values);
  if (Number.isFinite(value)) return value;
  throw new NotFinite(`Step ${step.name}`);
}

/** Values of which a step is worked when it is asked for, on those that are known by then. */
export class SolvedOnDemand extends Map<string, number> {
  private readonly question: Compiled;

  constructor(question: Compiled, known: Iterable<readonly [string, number]>) {
    super(known);
    this.question = question;
  }

  /** @throws {Error} when the step comes to no finite number, or leads out of a table. */
  override get(name: string): number | undefined {
    const known = super.get(name);
    if (known !== undefined) return known;
    const working = workingsOf(this.question).steps.get(name);
    if (!working?.formula) return undefined;
    const value = workStep(working.step, working.formula, this);
    this.set(name, value);
    return value;
  }
}

/** Whether a condition holds. Steps it leans on are worked first and added to the values. */
export function holds(question: Compiled, condition: Expr, values: Map<string, number>): boolean {
  const { formula, needs } = conditionOf(question, condition);
  return evaluate(formula, workMissing(needs, values), 'A condition') === 1;
}
