import { type DrawnPart, type Part } from './compiled.ts';
import { type OptionView, type PartView, type RawAnswer, type Reading } from './types.ts';

const NOT_ON_PAPER: Reading = {
  state: 'not-understood',
  ask: 'That choice is not on this paper; choose again.',
};

/** What of a part a choice is read by. */
type Choosable = Pick<PartView, 'kind' | 'options' | 'rows'>;

/** As readChosen, for the marker: it needs no text of what was chosen. */
export function readChosenId(
  { kind }: Part,
  held: DrawnPart | undefined,
  answer: RawAnswer,
): Reading {
  const untold = (one: { id: string }): OptionView => ({ id: one.id, text: '' });
  return readChosen(
    {
      kind: kind === 'size' ? 'choice' : kind,
      options: held && held.kind !== 'quantity' ? held.options.map(untold) : [],
      rows: held?.kind === 'match' ? held.rows.map(untold) : [],
    },
    answer,
  );
}

/** Reads what was chosen, put in order or matched; never compares it with a key. */
export function readChosen(part: Choosable, answer: RawAnswer): Reading {
  switch (part.kind) {
    case 'choices':
      return readAll(part, chosenIn(answer));
    case 'order':
      return readOrder(part, chosenIn(answer));
    case 'match':
      return readMatch(part, chosenIn(answer));
    default:
      return readOne(part, answer.option);
  }
}

/** Ids of the answer; it may come from a stored or hostile form that holds anything. */
export function chosenIn(answer: RawAnswer): string[] {
  const options: unknown = answer.options;
  return Array.isArray(options) ? options.map(String) : [];
}

function readOne({ options }: Choosable, id: string | null): Reading {
  if (id === null || id === '') return { state: 'blank' };
  const chosen = options.find((option) => option.id === id);
  return chosen ? understood(chosen.text) : NOT_ON_PAPER;
}

function readAll({ options }: Choosable, ids: readonly string[]): Reading {
  if (ids.length === 0) return { state: 'blank' };
  if (textsOf(ids, options).length < ids.length) return NOT_ON_PAPER;
  // Said in the order of the paper, each once, however they were ticked.
  return understood(textsOf([...new Set(ids)], options).join('; '));
}

function readOrder({ options }: Choosable, ids: readonly string[]): Reading {
  if (ids.length === 0) return { state: 'blank' };
  const texts = textsOf(ids, options);
  if (texts.length < ids.length) return NOT_ON_PAPER;
  if (new Set(ids).size === options.length && ids.length === options.length) {
    return understood(texts.map((text, index) => `${index + 1}. ${text}`).join('; '));
  }
  return {
    state: 'not-understood',
    ask: `Put each of the ${options.length} steps in its place, once.`,
  };
}

function readMatch({ rows, options }: Choosable, ids: readonly string[]): Reading {
  if (ids.every((id) => id === '')) return { state: 'blank' };
  const given = ids.filter((id) => id !== '');
  if (ids.length > rows.length || textsOf(given, options).length < given.length) {
    return NOT_ON_PAPER;
  }
  const pairs = rows.flatMap(({ text }, row) => {
    const [other] = textsOf([ids[row] ?? ''], options);
    return other === undefined ? [] : [`${text}: ${other}`];
  });
  return understood(pairs.join('; '));
}

function textsOf(ids: readonly string[], options: readonly OptionView[]): string[] {
  return ids.flatMap((id) => options.find((option) => option.id === id)?.text ?? []);
}

function understood(shown: string): Reading {
  return { state: 'understood', value: null, shown };
}
