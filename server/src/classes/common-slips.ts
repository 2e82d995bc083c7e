/** A predicted slip that somebody made in a first attempt. */
export interface SlipMade {
  readonly accountId: string;
  readonly question: string;
  readonly part: string;
  readonly says: string;
}

/** A part that somebody handed in an answer to. */
export interface PartAnswered {
  readonly accountId: string;
  readonly question: string;
  readonly part: string;
}

export interface CommonSlip {
  readonly question: string;
  readonly part: string;
  readonly says: string;
  /** People who made it, of those who answered the part. */
  readonly count: number;
  readonly of: number;
}

/** Under so many answers a list of slips points at persons. */
const LEAST_ANSWERS = 5;
const MOST_SLIPS = 10;

function countPeople<T extends { accountId: string }>(
  made: readonly T[],
  nameOf: (one: T) => string,
): Map<string, { first: T; count: number }> {
  const people = new Map<string, { first: T; accounts: Set<string> }>();
  for (const one of made) {
    const name = nameOf(one);
    const known = people.get(name) ?? { first: one, accounts: new Set() };
    people.set(name, { ...known, accounts: known.accounts.add(one.accountId) });
  }
  return new Map(
    [...people].map(([name, { first, accounts }]) => [name, { first, count: accounts.size }]),
  );
}

/** The commonest slips of a class; none where too few have answered to speak of it. */
export function commonSlips(
  made: readonly SlipMade[],
  answered: readonly PartAnswered[],
): { slips: CommonSlip[]; tooFew: boolean } {
  const partOf = ({ question, part }: PartAnswered) => JSON.stringify([question, part]);
  const answers = countPeople(answered, partOf);
  const slips = [...countPeople(made, (one) => partOf(one) + one.says).values()]
    .map(({ first: { question, part, says, accountId }, count }) => ({
      ...{ question, part, says, count },
      of: answers.get(partOf({ accountId, question, part }))?.count ?? 0,
    }))
    .filter(({ of }) => of >= LEAST_ANSWERS)
    .sort((a, b) => b.count - a.count || a.question.localeCompare(b.question))
    .slice(0, MOST_SLIPS);
  const tooFew = ![...answers.values()].some(({ count }) => count >= LEAST_ANSWERS);
  return { slips, tooFew };
}
