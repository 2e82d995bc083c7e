import { type PracticeName, PROFILES } from '../electrical/practice-profile.ts';
import { type Expr, type Operator } from './expression.ts';
import { FUNCTIONS } from './functions.ts';

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

const OPERATIONS: Record<Operator, (left: number, right: number) => number> = {
  '+': (left, right) => left + right,
  '-': (left, right) => left - right,
  '*': (left, right) => left * right,
  '/': (left, right) => left / right,
  '^': (left, right) => left ** right,
  '<': (left, right) => Number(left < right),
  '<=': (left, right) => Number(left <= right),
  '>': (left, right) => Number(left > right),
  '>=': (left, right) => Number(left >= right),
  '==': (left, right) => Number(left === right),
  '!=': (left, right) => Number(left !== right),
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
    case 'op': {
      const left = compile(expr.left, practice);
      const right = compile(expr.right, practice);
      const operate = OPERATIONS[expr.op];
      return (values) => operate(left(values), right(values));
    }
    case 'if': {
      const [when, then, otherwise] = [expr.when, expr.then, expr.otherwise].map((branch) =>
        compile(branch, practice),
      );
      if (!when || !then || !otherwise) throw new Error('A conditional has lost a branch.');
      return (values) => (when(values) === 1 ? then(values) : otherwise(values));
    }
    case 'call':
      return compileCall(expr, practice);
  }
}

function compileCall(expr: Extract<Expr, { kind: 'call' }>, practice: PracticeName): Formula {
  const called = FUNCTIONS.get(expr.name);
  if (!called) throw new Error(`Function ${expr.name} is not known to this version.`);
  const profile = PROFILES[practice];
  const args = expr.of.map((arg) => compile(arg, practice));
  return (values) =>
    called.run(
      args.map((arg) => arg(values)),
      profile,
    );
}

const compiled: Record<PracticeName, WeakMap<Expr, Formula>> = {
  metric: new WeakMap(),
  awg: new WeakMap(),
};

/**
 * Value of an expression; formulas are compiled once for each expression object and practice.
 *
 * @throws {NotFinite} when it comes to no finite number.
 */
export function evaluate(expr: Expr, values: Values, practice: PracticeName): number {
  let formula = compiled[practice].get(expr);
  if (!formula) compiled[practice].set(expr, (formula = compile(expr, practice)));
  const value = formula(values);
  if (Number.isFinite(value)) return value;
  throw new NotFinite('A step');
}
