import { type ChoicesPart, type DrawnPart, type MatchPart, type OrderPart } from './compiled.ts';
import { type Draws, opaqueIds } from './random.ts';

/** Ids for so many things, each with its place, in a drawn order. */
function shuffledIds(count: number, draws: Draws): { id: string; index: number }[] {
  return draws.shuffled(opaqueIds(count, draws).map((id, index) => ({ id, index })));
}

/**
 * Options of a part that takes all that apply.
 *
 * @param isRight - whether the option at a place applies on the values drawn.
 * @throws {Error} when none does.
 */
export function drawChoices(
  part: ChoicesPart,
  draws: Draws,
  isRight: (index: number) => boolean,
): DrawnPart {
  const options = shuffledIds(part.options.length, draws);
  const right = options.filter(({ index }) => isRight(index)).map(({ id }) => id);
  if (right.length === 0) throw new Error(`part ${part.id} has no right option; one must hold.`);
  return { kind: 'choices', options, right };
}

/** The steps of an order, shuffled. */
export function drawOrder(part: OrderPart, draws: Draws): DrawnPart {
  const options = shuffledIds(part.items.length, draws);
  const right = options.toSorted((a, b) => a.index - b.index).map(({ id }) => id);
  return { kind: 'order', options, right };
}

/** Both sides of a match, each shuffled. */
export function drawMatch(part: MatchPart, draws: Draws): DrawnPart {
  const rows = shuffledIds(part.rows.length, draws);
  const options = shuffledIds(part.options.length, draws);
  const right = rows.map(({ index }) => {
    const option = options.find((one) => one.index === part.rows[index]?.right);
    return option?.id ?? '';
  });
  return { kind: 'match', rows, options, right };
}
