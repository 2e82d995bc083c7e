import {
  type ConditionalNode,
  type ConstantNode,
  type FunctionNode,
  type MathNode,
  type OperatorNode,
  parse,
  type ParenthesisNode,
  type SymbolNode,
} from 'mathjs';
import { FUNCTIONS } from './functions.ts';
import { type Unit } from './units.ts';

export type Operator = '+' | '-' | '*' | '/' | '^' | Comparison;
export type Comparison = '<' | '<=' | '>' | '>=' | '==' | '!=';

/** A checked expression: plain data, kept with the question. */
export type Expr =
  | { kind: 'number'; value: number }
  | { kind: 'name'; name: string }
  | { kind: 'minus'; of: Expr }
  | { kind: 'op'; op: Operator; left: Expr; right: Expr }
  | { kind: 'if'; when: Expr; then: Expr; otherwise: Expr }
  | { kind: 'call'; name: string; of: Expr[] }
  /** A printed table: what stands beside the key that `of` comes to, so many rows `off`; SI. */
  | {
      kind: 'look';
      table: string;
      caption: string;
      column: string;
      keys: (number | null)[];
      results: (number | null)[];
      unit: Unit;
      of: Expr;
      off: number;
    };

/** An expression that may not be published; the message names what, the rule and the remedy. */
export class ExpressionRefused extends Error {
  constructor(message: string) {
    super(message);
    this.name = 'ExpressionRefused';
  }
}

const MOST_CHARACTERS = 300;
const MOST_NODES = 100;
const MOST_DEPTH = 20;
const COMPARISONS: readonly string[] = ['<', '<=', '>', '>=', '==', '!='];
const OPERATORS: readonly string[] = ['+', '-', '*', '/', '^', ...COMPARISONS];

/**
 * Reads an expression and bounds it on its syntax tree: number constants, declared names,
 * + − × ÷ ^, comparison, conditional and the trade functions; nothing else.
 *
 * @throws {ExpressionRefused} when it is too long, too deep or holds anything else.
 */
export function readExpression(text: string, names: ReadonlySet<string>): Expr {
  if (text.length > MOST_CHARACTERS) {
    throw new ExpressionRefused(
      `Expression of ${text.length} characters is over ${MOST_CHARACTERS}; split it into steps.`,
    );
  }
  // Refused before parsing: the parser would build them, and none is ever allowed.
  const stray = /[^A-Za-z0-9_.,+\-*/^()<>=!?: ]|\b0[bxo]/i.exec(text);
  if (stray || text.trim() === '') {
    const what = stray ? `"${stray[0]}"` : 'nothing';
    throw new ExpressionRefused(
      `Expression holds ${what}; use numbers, declared names, + - * / ^, comparisons, ?: and the trade functions.`,
    );
  }
  return new Reader(names).read(parseText(text), 1);
}

function parseText(text: string): MathNode {
  try {
    return parse(text);
  } catch (error) {
    const why = error instanceof Error ? error.message : 'syntax';
    throw new ExpressionRefused(`Expression "${text}" cannot be read (${why}); mend its syntax.`);
  }
}

class Reader {
  private nodes = 0;
  private readonly names: ReadonlySet<string>;

  constructor(names: ReadonlySet<string>) {
    this.names = names;
  }

  read(node: MathNode, depth: number): Expr {
    this.nodes += 1;
    if (this.nodes > MOST_NODES || depth > MOST_DEPTH) {
      throw new ExpressionRefused(
        `Expression has more than ${MOST_NODES} terms or ${MOST_DEPTH} levels; split it into steps.`,
      );
    }
    switch (node.type) {
      case 'ParenthesisNode':
        return this.read((node as ParenthesisNode).content, depth + 1);
      case 'ConstantNode':
        return this.readNumber(node as ConstantNode);
      case 'SymbolNode':
        return this.readName((node as SymbolNode).name);
      case 'OperatorNode':
        return this.readOperator(node as unknown as OperatorNode<never, never, MathNode[]>, depth);
      case 'ConditionalNode':
        return this.readConditional(node as ConditionalNode, depth);
      case 'FunctionNode':
        return this.readCall(node as FunctionNode, depth);
      default:
        throw new ExpressionRefused(
          `Expression holds a ${node.type}; only sums, comparisons, ?: and trade functions may stand here.`,
        );
    }
  }

  private readNumber(node: ConstantNode): Expr {
    const value: unknown = node.value;
    if (typeof value !== 'number' || !Number.isFinite(value)) {
      throw new ExpressionRefused(`Constant ${String(value)} is not a finite number; write one.`);
    }
    return { kind: 'number', value };
  }

  private readName(name: string): Expr {
    if (!this.names.has(name)) {
      throw new ExpressionRefused(
        `Name "${name}" is not declared before this line; use one of ${[...this.names].join(', ')}.`,
      );
    }
    return { kind: 'name', name };
  }

  private readOperator(node: OperatorNode<never, never, MathNode[]>, depth: number): Expr {
    const [left, right] = node.args;
    const op: string = node.op;
    if (left && !right && op === '-') return { kind: 'minus', of: this.read(left, depth + 1) };
    // A hidden × would let "5 mm" or "2 A" pass for a figure with its unit.
    if (!left || !right || node.args.length !== 2 || node.implicit || !OPERATORS.includes(op)) {
      throw new ExpressionRefused(
        `Operator "${op}"${node.implicit ? ' left out' : ''} is not allowed; use + - * / ^ or a comparison.`,
      );
    }
    return {
      kind: 'op',
      op: op as Operator,
      left: this.read(left, depth + 1),
      right: this.read(right, depth + 1),
    };
  }

  private readConditional(node: ConditionalNode, depth: number): Expr {
    return {
      kind: 'if',
      when: this.read(node.condition, depth + 1),
      then: this.read(node.trueExpr, depth + 1),
      otherwise: this.read(node.falseExpr, depth + 1),
    };
  }

  private readCall(node: FunctionNode, depth: number): Expr {
    const called: MathNode = node.fn;
    const name = called.type === 'SymbolNode' ? (called as SymbolNode).name : '';
    const known = FUNCTIONS.get(name);
    if (!known) {
      throw new ExpressionRefused(
        `Function "${name || called.toString()}" is not one of ${[...FUNCTIONS.keys()].join(', ')}.`,
      );
    }
    const [least, most] = known.arity;
    if (node.args.length < least || node.args.length > most) {
      throw new ExpressionRefused(
        `${name}() takes ${least === most ? least : `${least} to ${most}`} arguments, not ${node.args.length}.`,
      );
    }
    return { kind: 'call', name, of: node.args.map((arg) => this.read(arg, depth + 1)) };
  }
}

export function isComparison(op: Operator): op is Comparison {
  return COMPARISONS.includes(op);
}

/** Names an expression leans on. */
export function namesIn(expr: Expr): Set<string> {
  const found = new Set<string>();
  const walk = (node: Expr): void => {
    if (node.kind === 'name') found.add(node.name);
    else children(node).forEach(walk);
  };
  walk(expr);
  return found;
}

function children(expr: Expr): Expr[] {
  switch (expr.kind) {
    case 'minus':
    case 'look':
      return [expr.of];
    case 'op':
      return [expr.left, expr.right];
    case 'if':
      return [expr.when, expr.then, expr.otherwise];
    case 'call':
      return expr.of;
    default:
      return [];
  }
}
