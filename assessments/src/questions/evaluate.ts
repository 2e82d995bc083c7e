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

/** Turns a checked expression into a function over plain SI numbers; a condition gives 1 or 0. */
export function compile(expr: Expr): Formula {
  switch (expr.kind) {
    case 'number':
      return () => expr.value;
    case 'name':
      return (values) => values.get(expr.name) ?? NaN;
    case 'minus': {
      const of = compile(expr.of);
      return (values) => -of(values);
    }
    case 'op': {
      const left = compile(expr.left);
      const right = compile(expr.right);
      const operate = OPERATIONS[expr.op];
      return (values) => operate(left(values), right(values));
    }
    case 'if': {
      const [when, then, otherwise] = [expr.when, expr.then, expr.otherwise].map(compile);
      if (!when || !then || !otherwise) throw new Error('A conditional has lost a branch.');
      return (values) => (when(values) === 1 ? then(values) : otherwise(values));
    }
    case 'call':
      return compileCall(expr);
  }
}

function compileCall(expr: Extract<Expr, { kind: 'call' }>): Formula {
  const called = FUNCTIONS.get(expr.name);
  if (!called) throw new Error(`Function ${expr.name} is not known to this version.`);
  const args = expr.of.map(compile);
  return (values) => called.run(...args.map((arg) => arg(values)));
}

const compiled = new WeakMap<Expr, Formula>();

/**
 * Value of an expression; formulas are compiled once for each expression object.
 *
 * @throws {NotFinite} when it comes to no finite number.
 */
export function evaluate(expr: Expr, values: Values): number {
  let formula = compiled.get(expr);
  if (!formula) compiled.set(expr, (formula = compile(expr)));
  const value = formula(values);
  if (Number.isFinite(value)) return value;
  throw new NotFinite('A step');
}
