import { openQuestion, type Drawn, type DrawnPart, type Part } from './compiled.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type RawAnswer,
} from './types.ts';
import { fromSi } from './units.ts';

const blank: RawAnswer = { text: '', unit: null, option: null, working: '' };

function typed(part: Part, si: number): RawAnswer {
  const unit = part.kind === 'quantity' ? part.units[0] : undefined;
  const figure = unit ? fromSi(si, unit) : si;
  return { ...blank, text: String(Number(figure.toPrecision(8))), unit: unit?.symbol ?? null };
}

function answerOf(part: Part, held: DrawnPart, isSlipped: boolean): RawAnswer {
  if (held.kind === 'quantity') {
    const slipped = isSlipped ? held.slips[0]?.value : undefined;
    return typed(part, slipped ?? held.key);
  }
  const other = held.slips[0]?.id ?? held.options.find(({ id }) => id !== held.right)?.id;
  return { ...blank, option: isSlipped ? (other ?? held.right) : held.right };
}

/**
 * Answers that the key accepts, save in the parts named, which get the first predicted slip.
 * It knows the key: for demonstrations and tests, never for anything that is sent before marking.
 *
 * @throws {Error} when the question was compiled by another format version.
 */
export function keyAnswers(
  question: CompiledQuestion,
  drawn: DrawnQuestion,
  slippedParts: readonly string[] = [],
): Answers {
  const { parts } = drawn as unknown as Drawn;
  return Object.fromEntries(
    openQuestion(question).parts.flatMap((part) => {
      const held = parts[part.id];
      return held ? [[part.id, answerOf(part, held, slippedParts.includes(part.id))]] : [];
    }),
  );
}
