import { type ChoicesPart, type DrawnPart, type MatchPart, type OrderPart } from './compiled.ts';
import { type Finding } from './judge.ts';

type Held<K extends DrawnPart['kind']> = Extract<DrawnPart, { kind: K }>;

/** A share of a part's marks, rounded down. */
function scored(marks: number, { share, detail }: { share: number; detail: string }): Finding {
  const say = (): string => detail;
  if (share === 1) return { verdict: 'right', marks, rule: 'right', say };
  const some = share > 0;
  return {
    verdict: some ? 'partly-right' : 'wrong',
    // 3 × 1/3 is 1, not a binary digit less.
    marks: Math.floor(marks * share + 1e-9),
    rule: some ? 'partly-right' : 'wrong',
    say,
  };
}

/** All that apply: each wrong one chosen takes back a right one. */
export function judgeChoices(
  part: ChoicesPart,
  held: Held<'choices'>,
  chosen: readonly string[],
): Finding {
  const picked = new Set(chosen);
  const right = held.right.filter((id) => picked.has(id)).length;
  const wrong = picked.size - right;
  const share = Math.max(0, right - wrong) / held.right.length;
  const detail = `${right} of ${held.right.length} right ones and ${wrong} wrong were chosen`;
  return scored(part.marks, { share, detail });
}

/** An order: half when one step moved makes it right. */
export function judgeOrder(
  part: OrderPart,
  held: Held<'order'>,
  order: readonly string[],
): Finding {
  const places = order.map((id) => held.right.indexOf(id));
  const moves = places.length - longestRising(places);
  const share = moves === 0 ? 1 : moves === 1 ? 0.5 : 0;
  const detail = `${moves} of ${places.length} steps must move`;
  return scored(part.marks, { share, detail });
}

/** Length of the longest run of places that rises, gaps allowed: what may stay where it is. */
function longestRising(places: readonly number[]): number {
  const lengths: number[] = [];
  places.forEach((place, index) => {
    const before = lengths.filter((_, earlier) => (places[earlier] ?? NaN) < place);
    lengths[index] = 1 + Math.max(0, ...before);
  });
  return Math.max(0, ...lengths);
}

/** Pairs: each right one counts. */
export function judgeMatch(
  part: MatchPart,
  held: Held<'match'>,
  chosen: readonly string[],
): Finding {
  const right = held.right.filter((id, row) => chosen[row] === id).length;
  const share = right / held.right.length;
  return scored(part.marks, { share, detail: `${right} of ${held.right.length} pairs are right` });
}
