import { type DrawnPart, type Part } from './compiled.ts';
import { figureText } from './format.ts';
import { type Judged, type Page } from './judged.ts';
import { fillIn } from './placeholders.ts';
import { optionText } from './present.ts';
import { chosenIn } from './read-chosen.ts';
import { type Line } from './types.ts';
import { operator, words } from './typeset.ts';

/** What is right of a part that is chosen, put in order or matched, as lines of text. */
export function rightLines(page: Page, part: Part): Line[] {
  const held = page.drawn.parts[part.id];
  if (!held || held.kind === 'quantity') return [];
  if (held.kind === 'options') return listedLines(page, part, { held, ids: [held.right] });
  // Said as the paper lists them; `right` is in no order.
  const isRight = ({ id }: { id: string }): boolean => held.right.includes(id);
  const ids =
    held.kind === 'choices' ? held.options.filter(isRight).map(({ id }) => id) : held.right;
  return listedLines(page, part, { held, ids });
}

/** What was chosen, in the same form. */
export function chosenLines(page: Page, { part, answer }: Judged): Line[] {
  const held = page.drawn.parts[part.id];
  if (!held || held.kind === 'quantity') return [];
  const ids = held.kind === 'options' ? [answer.option ?? ''] : chosenIn(answer);
  if (part.kind !== 'size') return listedLines(page, part, { held, ids });
  const chosen = held.options.find(({ id }) => id === answer.option);
  if (!chosen) return [];
  const figure = figureText(part.sizes[chosen.index] ?? NaN, part.unit, 9);
  return [
    [operator('='), { kind: 'number', text: figure }, { kind: 'unit', text: part.unit.symbol }],
  ];
}

type Listed = Exclude<DrawnPart, { kind: 'quantity' }>;

function listedLines(
  { question, drawn }: Page,
  part: Part,
  { held, ids }: { held: Listed; ids: readonly string[] },
): Line[] {
  const fill = (text: string): string => fillIn(text, question.givens, drawn.values);
  const textOf = (id: string | undefined): string | null => {
    const option = held.options.find((one) => one.id === id);
    return option ? fill(optionText(part, option.index)) : null;
  };
  if (held.kind === 'match' && part.kind === 'match') {
    return held.rows.map(({ index }, row) => {
      const left = fill(part.rows[index]?.text ?? '');
      return [words(left), operator(':'), words(textOf(ids[row]) ?? '–')];
    });
  }
  const texts = ids.flatMap((id) => textOf(id) ?? []);
  return held.kind === 'order'
    ? texts.map((text, index) => [words(`${index + 1}.`), words(text)])
    : texts.map((text) => [words(text)]);
}
