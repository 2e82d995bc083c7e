import { type Compiled } from './compiled.ts';
import { evaluate, NotFinite } from './evaluate.ts';
import { type Expr, namesIn } from './expression.ts';

/** Steps a set of names leans on, themselves included; the search goes no further than `stop`. */
export function leansOn(
  question: Compiled,
  names: Iterable<string>,
  stop?: ReadonlySet<string>,
): Set<string> {
  const found = new Set<string>();
  const waiting = [...names];
  for (let name = waiting.pop(); name !== undefined; name = waiting.pop()) {
    const step = question.steps.find((one) => one.name === name);
    if (!step || found.has(name)) continue;
    found.add(name);
    if (step.how.kind === 'sum' && !stop?.has(name)) waiting.push(...namesIn(step.how.expr));
  }
  return found;
}

/**
 * Works the steps that are still missing, in their order; what is known already stays.
 *
 * @throws {NotFinite} when a step comes to no finite number.
 */
export function solve(
  question: Compiled,
  known: ReadonlyMap<string, number>,
  wanted?: ReadonlySet<string>,
): Map<string, number> {
  const values = new Map(known);
  for (const step of question.steps) {
    if (values.has(step.name) || step.how.kind === 'read') continue;
    if (wanted && !wanted.has(step.name)) continue;
    try {
      values.set(step.name, evaluate(step.how.expr, values, question.profile));
    } catch (error) {
      throw error instanceof NotFinite ? new NotFinite(`Step ${step.name}`) : error;
    }
  }
  return values;
}

/** Whether a condition holds; the steps it leans on are worked first. */
export function holds(question: Compiled, condition: Expr, known: Map<string, number>): boolean {
  const values = solve(question, known, leansOn(question, namesIn(condition)));
  return evaluate(condition, values, question.profile) === 1;
}
