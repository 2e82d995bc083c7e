import { type Compiled, type Drawn, type DrawnPart, openQuestion, type Part } from './compiled.ts';
import { ownFor, type OwnValues } from './own-values.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type RawAnswer,
} from './types.ts';
import { fromSi } from './units.ts';

const blank: RawAnswer = { text: '', unit: null, option: null, working: '' };
const FIGURES = 5;

function typed(part: Part, si: number): RawAnswer {
  const unit = part.kind === 'quantity' ? part.units[0] : undefined;
  const figure = unit ? fromSi(si, unit) : si;
  return {
    ...blank,
    text: String(Number(figure.toPrecision(FIGURES))),
    unit: unit?.symbol ?? null,
  };
}

function choice(held: Extract<DrawnPart, { kind: 'options' }>, isSlipped: boolean): RawAnswer {
  const other = held.slips[0]?.id ?? held.options.find(({ id }) => id !== held.right)?.id;
  return { ...blank, option: isSlipped ? (other ?? held.right) : held.right };
}

/** The right choice, order or pairs; slipped: one choice short or too many, one step moved, one pair wrong. */
function listed(
  held: Exclude<DrawnPart, { kind: 'quantity' | 'options' }>,
  isSlipped: boolean,
): RawAnswer {
  const { right } = held;
  if (!isSlipped) return { ...blank, options: right };
  const [first = '', ...rest] = right;
  const other = held.options.find(({ id }) => id !== first)?.id ?? first;
  if (held.kind === 'match') return { ...blank, options: [other, ...rest] };
  if (held.kind === 'order') return { ...blank, options: [...rest, first] };
  const extra = held.options.find(({ id }) => !right.includes(id))?.id;
  return { ...blank, options: extra === undefined ? rest : [...right, extra] };
}

interface Table {
  question: Compiled;
  drawn: Drawn;
  /** What was answered so far; later parts are worked on it, as a trainee would. */
  own: OwnValues;
}

function quantity(
  part: Extract<Part, { kind: 'quantity' }>,
  held: Extract<DrawnPart, { kind: 'quantity' }>,
  { table, isSlipped }: { table: Table; isSlipped: boolean },
): RawAnswer {
  const { question, drawn, own } = table;
  const worked = ownFor(question, drawn, { step: part.step, own })?.values.get(part.step);
  const slipped = isSlipped ? held.slips[0]?.value : undefined;
  const value = slipped ?? worked ?? held.key;
  const isOff = value < held.low || value > held.high;
  own.push({ step: part.step, value, part: part.id, isOff });
  return typed(part, value);
}

/**
 * Answers that the key accepts, save in the parts named: those get the first predicted slip, and
 * what follows is worked on with it.
 * It knows the key: for demonstrations and tests, never for anything that is sent before marking.
 *
 * @throws {Error} when the question was compiled by another format version.
 */
export function keyAnswers(
  stored: CompiledQuestion,
  drawnQuestion: DrawnQuestion,
  slippedParts: readonly string[] = [],
): Answers {
  const question = openQuestion(stored);
  const drawn = drawnQuestion as unknown as Drawn;
  const table: Table = { question, drawn, own: [] };
  const answers: Answers = {};
  for (const part of question.parts) {
    const held = drawn.parts[part.id];
    const isSlipped = slippedParts.includes(part.id);
    if (!held) continue;
    if (held.kind === 'options') answers[part.id] = choice(held, isSlipped);
    else if (held.kind !== 'quantity') answers[part.id] = listed(held, isSlipped);
    else if (part.kind === 'quantity') {
      answers[part.id] = quantity(part, held, { table, isSlipped });
    }
  }
  return answers;
}
