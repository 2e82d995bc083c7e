import { type ChoicesPart, type MatchPart, type OrderPart } from './compiled.ts';
import { type Judged, type Page } from './judged.ts';
import { chosenIn } from './read-chosen.ts';
import { type Remark } from './types.ts';

const gained = (text: string): Remark => ({ sign: 'gained', heading: null, text });
const lost = (heading: string | null, text: string): Remark => ({ sign: 'lost', heading, text });

/** What the marker writes beside a part that takes all that apply. */
export function remarksOnChoices({ drawn }: Page, part: ChoicesPart, { answer }: Judged): Remark[] {
  const held = drawn.parts[part.id];
  if (held?.kind !== 'choices') return [];
  const picked = new Set(chosenIn(answer));
  const kept = held.right.filter((id) => picked.has(id)).length;
  const rows = held.options.map(({ id, index }) => ({
    option: part.options[index],
    isRight: held.right.includes(id),
    isPicked: picked.has(id),
  }));
  const wrong = rows
    .filter(({ isRight, isPicked }) => isPicked && !isRight)
    .map(({ option }) => lost(option?.text ?? '', option?.say ?? 'not this one'));
  const missing = rows
    .filter(({ isRight, isPicked }) => isRight && !isPicked)
    .map(({ option }) => lost('Left out', sayMissing(option?.text ?? '', option?.say ?? null)));
  return [...soMany(kept, held.right.length, 'right ones chosen'), ...wrong, ...missing];
}

/** An option that may be right or wrong has words for when it is wrong only. */
function sayMissing(text: string, say: string | null): string {
  return say === null ? text : `${text}: ${say}`;
}

function soMany(count: number, of: number, what: string): Remark[] {
  return count > 0 ? [gained(`${count} of ${of} ${what}`)] : [];
}

/** Words for every pair that stands the wrong way round; in their default, the first such pair. */
export function remarksOnOrder({ drawn }: Page, part: OrderPart, { answer }: Judged): Remark[] {
  const held = drawn.parts[part.id];
  if (held?.kind !== 'order') return [];
  const places = chosenIn(answer).map((id) => held.right.indexOf(id));
  const stands = (item: number): number => places.indexOf(item);
  const known = part.misplaced.filter(({ first, then }) => stands(first) < stands(then));
  if (known.length > 0) {
    return known.map(({ first, then, say }) =>
      lost('Wrong way round', `${part.items[first] ?? ''}, then ${part.items[then] ?? ''}: ${say}`),
    );
  }
  const next = places.findIndex((place, index) => place > (places[index + 1] ?? Infinity));
  const [late = 0, early = 0] = [places[next], places[next + 1]];
  return [
    lost('Wrong way round', `${part.items[early] ?? ''} comes before ${part.items[late] ?? ''}`),
  ];
}

/** Each pair that is wrong, with its words where there are some. */
export function remarksOnMatch({ drawn }: Page, part: MatchPart, { answer }: Judged): Remark[] {
  const held = drawn.parts[part.id];
  if (held?.kind !== 'match') return [];
  const ids = chosenIn(answer);
  const kept = held.right.filter((id, row) => ids[row] === id).length;
  const wrong = held.rows.flatMap(({ index }, row) => {
    const option = held.options.find(({ id }) => id === ids[row])?.index;
    const isRight = option === part.rows[index]?.right;
    return isRight ? [] : [lost(part.rows[index]?.text ?? '', mixedWords(part, index, option))];
  });
  return [...soMany(kept, held.right.length, 'pairs right'), ...wrong];
}

function mixedWords(part: MatchPart, row: number, option: number | undefined): string {
  const fits = part.options[part.rows[row]?.right ?? -1] ?? '';
  if (option === undefined) return `not matched; it is ${fits}`;
  const mixed = part.mixed.find((one) => one.row === row && one.option === option);
  return mixed?.say ?? `${fits}, not ${part.options[option] ?? ''}`;
}
