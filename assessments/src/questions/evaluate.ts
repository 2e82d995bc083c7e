import { type PracticeName, PROFILES } from '../electrical/practice-profile.ts';
import { type Expr, type Operator } from './expression.ts';
import { FUNCTIONS } from './functions.ts';
import { lookUp } from './look-up.ts';

/** Values by declared name, plain SI numbers. */
export type Values = ReadonlyMap<string, number>;
export type Formula = (values: Values) => number;

/** A sum that came to no finite number. */
export class NotFinite extends Error {
  constructor(what: string) {
    super(`${what} comes to no finite number; narrow the given values or add a condition.`);
    this.name = 'NotFinite';
  }
}

/** One function each: a shared one would have to look the operator up at every turn. */
const OPERATIONS: Record<Operator, (left: Formula, right: Formula) => Formula> = {
  '+': (left, right) => (values) => left(values) + right(values),
  '-': (left, right) => (values) => left(values) - right(values),
  '*': (left, right) => (values) => left(values) * right(values),
  '/': (left, right) => (values) => left(values) / right(values),
  '^': (left, right) => (values) => left(values) ** right(values),
  '<': (left, right) => (values) => Number(left(values) < right(values)),
  '<=': (left, right) => (values) => Number(left(values) <= right(values)),
  '>': (left, right) => (values) => Number(left(values) > right(values)),
  '>=': (left, right) => (values) => Number(left(values) >= right(values)),
  '==': (left, right) => (values) => Number(left(values) === right(values)),
  '!=': (left, right) => (values) => Number(left(values) !== right(values)),
};

/**
 * Turns a checked expression into a function over plain SI numbers; a condition gives 1 or 0.
 * The practice decides where tables and rules of the trade differ.
 */
export function compile(expr: Expr, practice: PracticeName): Formula {
  switch (expr.kind) {
    case 'number':
      return () => expr.value;
    case 'name':
      return (values) => values.get(expr.name) ?? NaN;
    case 'minus': {
      const of = compile(expr.of, practice);
      return (values) => -of(values);
    }
    case 'op':
      return OPERATIONS[expr.op](compile(expr.left, practice), compile(expr.right, practice));
    case 'if':
      return compileConditional(expr, practice);
    case 'call':
      return compileCall(expr, practice);
    case 'look': {
      const of = compile(expr.of, practice);
      return (values) => lookUp(expr, of(values));
    }
  }
}

function compileConditional(expr: Extract<Expr, { kind: 'if' }>, practice: PracticeName): Formula {
  const when = compile(expr.when, practice);
  const then = compile(expr.then, practice);
  const otherwise = compile(expr.otherwise, practice);
  return (values) => (when(values) === 1 ? then(values) : otherwise(values));
}

function compileCall(expr: Extract<Expr, { kind: 'call' }>, practice: PracticeName): Formula {
  const called = FUNCTIONS.get(expr.name);
  if (!called) throw new Error(`Function ${expr.name} is not known to this version.`);
  const profile = PROFILES[practice];
  const args = expr.of.map((arg) => compile(arg, practice));
  const [first] = args;
  // Most take one value; a list made by hand is quicker than a mapped one.
  if (first && args.length === 1) return (values) => called.run([first(values)], profile);
  return (values) => {
    const worked: number[] = [];
    for (const arg of args) worked.push(arg(values));
    return called.run(worked, profile);
  };
}

/**
 * Value of a formula.
 *
 * @throws {NotFinite} when it comes to no finite number; `what` names it.
 */
export function evaluate(formula: Formula, values: Values, what: string): number {
  const value = formula(values);
  if (Number.isFinite(value)) return value;
  throw new NotFinite(what);
}
