import {
  add,
  divide,
  type MathType,
  multiply,
  pow,
  sqrt,
  unit as mathUnit,
  type Unit as MathUnit,
} from 'mathjs';
import { type Expr, ExpressionRefused, isComparison, type Operator } from './expression.ts';
import { FUNCTIONS } from './functions.ts';
import { type TradeFunction } from './trade-function.ts';
import { type Dimension, NO_DIMENSION, sameDimension } from './units.ts';

/** What an expression gives: a quantity of a dimension, or a yes or no. */
export type Outcome = { kind: 'quantity'; dimension: Dimension } | { kind: 'condition' };

const CONDITION: Outcome = { kind: 'condition' };
const SI_BASES = ['kg', 'm', 's', 'A', 'K'] as const;

/**
 * Checks every branch of an expression with mathjs units, once, when a sheet is published.
 *
 * @throws {ExpressionRefused} when units do not match anywhere in it.
 */
export function outcomeOf(expr: Expr, scope: ReadonlyMap<string, Dimension>): Outcome {
  switch (expr.kind) {
    case 'number':
      return quantity(NO_DIMENSION);
    case 'name':
      return quantity(scope.get(expr.name) ?? NO_DIMENSION);
    case 'minus':
      return quantity(dimensionOf(expr.of, scope));
    case 'op':
      return operation(expr.op, expr, scope);
    case 'if':
      return conditional(expr, scope);
    case 'call':
      return quantity(callResult(expr, scope));
    case 'look':
      return quantity(expr.unit.dimension);
  }
}

/** As outcomeOf, where only a quantity will do. */
export function dimensionOf(expr: Expr, scope: ReadonlyMap<string, Dimension>): Dimension {
  const outcome = outcomeOf(expr, scope);
  if (outcome.kind === 'quantity') return outcome.dimension;
  throw new ExpressionRefused('A comparison stands where a quantity is wanted; use ?: to choose.');
}

function quantity(dimension: Dimension): Outcome {
  return { kind: 'quantity', dimension };
}

function operation(
  op: Operator,
  sides: { left: Expr; right: Expr },
  scope: ReadonlyMap<string, Dimension>,
): Outcome {
  const left = dimensionOf(sides.left, scope);
  const right = dimensionOf(sides.right, scope);
  if (op === '*') return quantity(backFrom(multiply(asMath(left), asMath(right))));
  if (op === '/') return quantity(backFrom(divide(asMath(left), asMath(right))));
  if (op === '^') return quantity(power(left, { expr: sides.right, dimension: right }));
  matching(op, left, right);
  return isComparison(op) ? CONDITION : quantity(left);
}

function matching(op: string, left: Dimension, right: Dimension): void {
  try {
    add(asMath(left), asMath(right));
  } catch {
    throw new ExpressionRefused(
      `Units do not match: ${spell(left)} ${op} ${spell(right)}; both sides must be the same kind of quantity.`,
    );
  }
}

/** A pure number may be raised to any pure number; a quantity only to one that is written out. */
function power(base: Dimension, exponent: { expr: Expr; dimension: Dimension }): Dimension {
  const isPure = (one: Dimension): boolean => sameDimension(one, NO_DIMENSION);
  if (isPure(base) && isPure(exponent.dimension)) return NO_DIMENSION;
  const { expr } = exponent;
  const times = expr.kind === 'minus' ? expr.of : expr;
  if (times.kind !== 'number') {
    throw new ExpressionRefused(
      'An exponent must be a number written out, or base and exponent pure numbers; split the step.',
    );
  }
  const signed = expr.kind === 'minus' ? -times.value : times.value;
  return backFrom(pow(asMath(base), signed));
}

function conditional(
  expr: Extract<Expr, { kind: 'if' }>,
  scope: ReadonlyMap<string, Dimension>,
): Outcome {
  if (outcomeOf(expr.when, scope).kind !== 'condition') {
    throw new ExpressionRefused('What stands before ? must be a comparison.');
  }
  const then = dimensionOf(expr.then, scope);
  matching('or', then, dimensionOf(expr.otherwise, scope));
  return quantity(then);
}

function callResult(
  expr: Extract<Expr, { kind: 'call' }>,
  scope: ReadonlyMap<string, Dimension>,
): Dimension {
  const given = expr.of.map((arg) => dimensionOf(arg, scope));
  const [first = NO_DIMENSION] = given;
  const { shape } = FUNCTIONS.get(expr.name) as TradeFunction;
  if (shape.kind === 'root') return backFrom(sqrt(asMath(first) as MathUnit));
  if (shape.kind === 'same') {
    given.forEach((dimension) => matching(`in ${expr.name}() with`, first, dimension));
    return first;
  }
  shape.takes.forEach((wanted, index) => {
    const have = given[index] ?? NO_DIMENSION;
    if (sameDimension(have, wanted)) return;
    throw new ExpressionRefused(
      `${expr.name}() takes ${spell(wanted)} as argument ${index + 1}, not ${spell(have)}.`,
    );
  });
  return shape.gives;
}

/** One of the dimension, as mathjs has it: sums keep to 1, so that no nought can hide a unit. */
function asMath(dimension: Dimension): MathUnit | number {
  return sameDimension(dimension, NO_DIMENSION) ? 1 : mathUnit(1, spell(dimension));
}

function backFrom(result: MathType): Dimension {
  if (typeof result === 'number') return NO_DIMENSION;
  const { dimensions } = result as unknown as { dimensions: number[] };
  const [kg = 0, m = 0, s = 0, a = 0, k = 0] = dimensions;
  return [kg, m, s, a, k];
}

function spell(dimension: Dimension): string {
  const factors = SI_BASES.flatMap((symbol, index) => {
    const exponent = dimension[index] ?? 0;
    return exponent === 0 ? [] : [exponent === 1 ? symbol : `${symbol}^${exponent}`];
  });
  return factors.length === 0 ? 'a pure number' : factors.join(' ');
}
