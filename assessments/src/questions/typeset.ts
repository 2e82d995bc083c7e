import { type Compiled, type Step } from './compiled.ts';
import { type Expr, type Operator } from './expression.ts';
import { figureText, toShortFigures } from './format.ts';
import { FUNCTIONS } from './functions.ts';
import { type Line, type Token } from './types.ts';
import { fromSi, type Unit } from './units.ts';

const WHOLE = 9;
const SIGNS: Record<Operator, string> = {
  '+': '+',
  '-': '−',
  '*': '×',
  '/': '÷',
  '^': '^',
  '<': '<',
  '<=': '≤',
  '>': '>',
  '>=': '≥',
  '==': '=',
  '!=': '≠',
};
const STRENGTH: Partial<Record<Operator, number>> = { '+': 2, '-': 2, '*': 3, '/': 3, '^': 5 };
const POWERS: Readonly<Record<number, string>> = { 2: '²', 3: '³' };

export const operator = (text: string): Token => ({ kind: 'operator', text });
export const words = (text: string): Token => ({ kind: 'text', text });
const EQUALS = operator('=');

/** Figure and unit of a value; a negative one stands in brackets inside a sum. */
function quantityTokens(si: number, unit: Unit, figures: number): Token[] {
  const number: Token = { kind: 'number', text: figureText(fromSi(si, unit), unit, figures) };
  return unit.symbol === '' ? [number] : [number, { kind: 'unit', text: unit.symbol }];
}

/** The right-hand side of a formula, the same for every draw; an expression is of one question. */
const symbols = new WeakMap<Expr, Line>();

/** "U_d = I × R" */
export function formulaLine(question: Compiled, step: Step, expr: Expr): Line {
  let tokens = symbols.get(expr);
  if (!tokens) {
    tokens = joinFactors(typeset(expr, (name) => symbolOf(question, name)));
    symbols.set(expr, tokens);
  }
  return [symbolToken(step.symbol), EQUALS, ...tokens];
}

/** "= 14 A × 48.1 mΩ" */
export function figuresLine(
  question: Compiled,
  expr: Expr,
  values: ReadonlyMap<string, number>,
): Line {
  return [EQUALS, ...typeset(expr, (name) => figureOf(question, name, values.get(name) ?? NaN))];
}

/** "= 0.674 V" */
export function resultLine(step: Step, si: number, unit: Unit): Line {
  return [EQUALS, ...quantityTokens(si, unit, step.figures)];
}

export function symbolToken(text: string): Token {
  return { kind: 'symbol', text };
}

function symbolOf(question: Compiled, name: string): Token[] {
  const step = question.steps.find((one) => one.name === name);
  const given = question.givens.find((one) => one.name === name);
  if (step) return [symbolToken(step.symbol)];
  if (given?.symbol) return [symbolToken(given.symbol)];
  // A fixed figure nobody is shown by name stands as its figure.
  const value = given?.source.kind === 'value' ? given.source.figure : NaN;
  const unit: Token[] = given?.unit.symbol ? [{ kind: 'unit', text: given.unit.symbol }] : [];
  return [{ kind: 'number', text: toShortFigures(value, WHOLE) }, ...unit];
}

function figureOf(question: Compiled, name: string, si: number): Token[] {
  const step = question.steps.find((one) => one.name === name);
  const given = question.givens.find((one) => one.name === name);
  const tokens = step
    ? quantityTokens(si, step.unit, step.figures)
    : given
      ? quantityTokens(si, given.unit, WHOLE)
      : [];
  const isNegative = tokens[0]?.text.startsWith('−') ?? false;
  return isNegative ? [operator('('), ...tokens, operator(')')] : tokens;
}

/** A number straight before a symbol needs no sign between: 2 L. */
function joinFactors(tokens: Token[]): Token[] {
  return tokens.filter((token, index) => {
    const before = tokens[index - 1];
    const after = tokens[index + 1];
    return !(token.text === '×' && before?.kind === 'number' && after?.kind === 'symbol');
  });
}

type Leaf = (name: string) => Token[];

function typeset(expr: Expr, leaf: Leaf): Token[] {
  switch (expr.kind) {
    case 'number':
      return [{ kind: 'number', text: toShortFigures(expr.value, WHOLE) }];
    case 'name':
      return leaf(expr.name);
    case 'minus':
      return [operator('−'), ...bracketed(expr.of, 3, leaf)];
    case 'op':
      return typesetOperation(expr, leaf);
    case 'if':
      return [
        ...typeset(expr.then, leaf),
        words('if'),
        ...typeset(expr.when, leaf),
        words('or else'),
        ...typeset(expr.otherwise, leaf),
      ];
    case 'call':
      return typesetCall(expr, leaf);
    case 'look':
      return typesetLookUp(expr, leaf);
  }
}

function typesetOperation(expr: Extract<Expr, { kind: 'op' }>, leaf: Leaf): Token[] {
  const strength = STRENGTH[expr.op] ?? 1;
  const isFirm = expr.op === '-' || expr.op === '/';
  const left = expr.op === '^' ? base(expr.left, leaf) : bracketed(expr.left, strength, leaf);
  const power = expr.op === '^' && expr.right.kind === 'number' && POWERS[expr.right.value];
  if (power) return [...left, operator(power)];
  const right = bracketed(expr.right, isFirm ? strength + 1 : strength, leaf);
  return [...left, operator(SIGNS[expr.op]), ...right];
}

/** What is raised to a power; a figure with its unit is bracketed, or only the unit would be. */
function base(expr: Expr, leaf: Leaf): Token[] {
  const tokens = bracketed(expr, 6, leaf);
  const isQuantity = tokens.at(-1)?.kind === 'unit';
  return isQuantity ? [operator('('), ...tokens, operator(')')] : tokens;
}

function typesetCall(expr: Extract<Expr, { kind: 'call' }>, leaf: Leaf): Token[] {
  const says = FUNCTIONS.get(expr.name)?.says ?? expr.name;
  const args = expr.of.flatMap((arg, index) => [
    ...(index > 0 ? [operator(',')] : []),
    ...typeset(arg, leaf),
  ]);
  const opening = says === '√' ? [operator('√')] : [words(says)];
  const isBare = says !== '√' && expr.of.every((arg) => arg.kind === 'name');
  return isBare ? [...opening, ...args] : [...opening, operator('('), ...args, operator(')')];
}

const ROWS_OFF: Readonly<Record<number, string>> = {
  [-3]: 'three rows above',
  [-2]: 'two rows above',
  [-1]: 'the row above',
  0: 'row',
  1: 'the row below',
  2: 'two rows below',
  3: 'three rows below',
};

/** "row 10 mm², column 105 °C" */
function typesetLookUp(expr: Extract<Expr, { kind: 'look' }>, leaf: Leaf): Token[] {
  const row = words(ROWS_OFF[expr.off] ?? 'row');
  return [row, ...typeset(expr.of, leaf), operator(','), words(`column ${expr.column}`)];
}

function bracketed(expr: Expr, least: number, leaf: Leaf): Token[] {
  const tokens = typeset(expr, leaf);
  return strengthOf(expr) < least ? [operator('('), ...tokens, operator(')')] : tokens;
}

function strengthOf(expr: Expr): number {
  if (expr.kind === 'op') return STRENGTH[expr.op] ?? 1;
  if (expr.kind === 'minus') return 2;
  return expr.kind === 'if' ? 0 : 9;
}
