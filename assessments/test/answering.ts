import { type Compiled, type Drawn, type DrawnPart, type Part } from '../src/questions/compiled.ts';
import { type Answers, type RawAnswer } from '../src/questions/types.ts';
import { fromSi } from '../src/questions/units.ts';

export const BLANK: RawAnswer = { text: '', unit: null, option: null, working: '' };

/** An answer of so much SI, typed to six figures in the part's first unit. */
export function typeSi(question: Compiled, part: Part, si: number): RawAnswer {
  if (part.kind !== 'quantity') throw new Error(`Part ${part.id} takes no figure.`);
  const unit = part.units[0];
  const figure = unit ? fromSi(si, unit) : si;
  return { ...BLANK, text: String(Number(figure.toPrecision(8))), unit: unit?.symbol ?? null };
}

export function choose(id: string): RawAnswer {
  return { ...BLANK, option: id };
}

/** Ids chosen, in their order, or matched row by row. */
export function chooseAll(options: readonly string[]): RawAnswer {
  return { ...BLANK, options: [...options] };
}

/** The right answer to every part. */
export function answerRight(question: Compiled, drawn: Drawn): Answers {
  return Object.fromEntries(
    question.parts.map((part) => {
      const held = drawn.parts[part.id];
      if (!held) throw new Error(`Part ${part.id} was not drawn.`);
      return [part.id, rightAnswer(question, part, held)];
    }),
  );
}

function rightAnswer(question: Compiled, part: Part, held: DrawnPart): RawAnswer {
  if (held.kind === 'quantity') return typeSi(question, part, held.key);
  return held.kind === 'options' ? choose(held.right) : chooseAll(held.right);
}
