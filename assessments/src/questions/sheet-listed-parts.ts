import {
  type BarePart,
  type ChoicesPart,
  type MatchPart,
  type Option,
  type OrderPart,
} from './compiled.ts';
import { type Expr } from './expression.ts';
import { inField } from './sheet-desk.ts';
import { type SheetAsk } from './sheet-schema.ts';

type SheetOptions = Extract<SheetAsk, { choose: unknown }>['choose'];

export interface OptionScope {
  /** Reads a condition; throws when it is none. */
  condition(text: string): Expr;
}

/** Options to choose from, each that can be wrong with its reason. */
export function readOptions(
  way: 'choose' | 'choose all',
  options: SheetOptions,
  scope: OptionScope,
): Option[] {
  return options.map((option, index) =>
    inField([way, index], () => {
      requireUnlike(
        option.is,
        options.slice(0, index).map(({ is }) => is),
      );
      const right = typeof option.right === 'string' ? scope.condition(option.right) : option.right;
      if (right !== true && option.say === undefined) {
        throw new Error(`Option "${option.is}" can be wrong and has no say: write why it is.`);
      }
      return { text: option.is, right, say: option.say ?? null };
    }),
  );
}

/**
 * A part that takes all options that apply.
 *
 * @throws {Error} when all or none are right whatever is drawn.
 */
export function readChoices(options: SheetOptions, scope: OptionScope): BarePart<ChoicesPart> {
  const read = readOptions('choose all', options, scope);
  const isAll = (right: boolean): boolean => read.every((option) => option.right === right);
  if (isAll(false)) throw new Error('No option is right; set right: true on those that apply.');
  if (isAll(true)) throw new Error('Every option is right; add one that does not apply.');
  return { kind: 'choices', options: read };
}

/**
 * A part that asks for an order.
 *
 * @throws {Error} when words are written for a pair that stands the right way round, or for none.
 */
export function readOrder(ask: Extract<SheetAsk, { order: unknown }>): BarePart<OrderPart> {
  const names = Object.keys(ask.order);
  const texts = Object.values(ask.order);
  names.forEach((name, index) =>
    inField(['order', name], () => requireUnlike(texts[index] ?? '', texts.slice(0, index))),
  );
  const placeOf = (name: string): number => placeIn(names, name, 'step of the order');
  const misplaced = ask.misplaced.map(({ first, then, say }, index) =>
    inField(['misplaced', index], () => {
      const pair = { first: placeOf(first), then: placeOf(then), say };
      if (pair.first > pair.then) return pair;
      throw new Error(
        `${first} before ${then} is the right order; write words for the wrong one, ${then} before ${first}.`,
      );
    }),
  );
  return { kind: 'order', items: texts, misplaced };
}

/**
 * A part that asks for pairs.
 *
 * @throws {Error} when words are written for a pair that is right, or is none.
 */
export function readMatch(ask: Extract<SheetAsk, { match: unknown }>): BarePart<MatchPart> {
  const names = Object.keys(ask.match);
  const options = [...new Set([...Object.values(ask.match), ...ask.also])];
  if (options.length < 2) throw new Error('Every item has the same text; one way fits all.');
  ask.also.forEach((text, index) =>
    inField(['also', index], () => {
      if (!Object.values(ask.match).includes(text)) return;
      throw new Error(`"${text}" under also fits a pair; leave it out there.`);
    }),
  );
  const rows = names.map((text) => ({ text, right: options.indexOf(ask.match[text] ?? '') }));
  const mixed = ask.mixed.map(({ is, with: other, say }, index) =>
    inField(['mixed', index], () => {
      const row = placeIn(names, is, 'item to match');
      const option = placeIn(options, other, 'text to match with');
      if (rows[row]?.right !== option) return { row, option, say };
      throw new Error(`"${is}" with "${other}" is a right pair; write words for a wrong one.`);
    }),
  );
  return { kind: 'match', rows, options, mixed };
}

function placeIn(names: readonly string[], name: string, what: string): number {
  const place = names.indexOf(name);
  if (place >= 0) return place;
  throw new Error(`"${name}" is no ${what}; use one of ${names.join(', ')}.`);
}

function requireUnlike(text: string, before: readonly string[]): void {
  if (before.includes(text)) throw new Error(`"${text}" stands there twice; tell them apart.`);
}
