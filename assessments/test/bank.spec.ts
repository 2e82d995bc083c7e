import { describe, expect, it } from 'vitest';
import {
  type Compiled,
  type Drawn,
  type DrawnPart,
  type Given,
  type Part,
} from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { fillIn } from '../src/questions/placeholders.ts';
import { isTooNear } from '../src/questions/tolerance.ts';
import { type Answers } from '../src/questions/types.ts';
import { fromSi } from '../src/questions/units.ts';
import { answerRight, choose, typeSi } from './answering.ts';
import { openBank, seedNumber } from './bank-files.ts';

const DRAWS = 2000;
/** Marking every one of them would only repeat itself; every twenty-fifth is marked. */
const MARK_EVERY = 25;
/** A slip that is silent in most draws teaches nobody. */
const LIVELY = 0.25;

const bank = openBank();

/** Fewer different papers than this, and neighbours would share their answers. */
const LEAST_VARIETY = 12;

/** What is wrong with a draw, in words; nothing when it is sound. */
function faultsOf(question: Compiled, drawn: Drawn): string[] {
  const faults = Object.entries(drawn.values).flatMap(([name, value]) =>
    Number.isFinite(value) ? [] : [`${name} is ${value}`],
  );
  for (const given of question.givens) {
    const figure = fromSi(drawn.values[given.name] ?? NaN, given.unit);
    if (!isDrawable(given, figure)) faults.push(`${given.name} ${figure} is out of its range`);
  }
  for (const part of question.parts) {
    const held = drawn.parts[part.id];
    faults.push(...(held ? keyFaults(part, held) : [`${part.id} was not drawn`]));
  }
  return faults;
}

function isDrawable({ source }: Given, figure: number): boolean {
  const near = (one: number): boolean => Math.abs(one - figure) < 1e-6;
  if (source.kind === 'value') return near(source.figure);
  if (source.kind === 'list') return source.figures.some(near);
  return figure >= source.from - 1e-6 && figure <= source.to + 1e-6;
}

function keyFaults(part: Part, held: DrawnPart): string[] {
  if (held.kind === 'options') {
    const ids = held.options.map(({ id }) => id);
    const isSound = new Set(ids).size === ids.length && ids.includes(held.right);
    const isSlip = held.slips.some(({ id }) => id === held.right);
    return isSound && !isSlip ? [] : [`${part.id} has no single right option`];
  }
  const isEdged = held.low <= held.key && held.key <= held.high;
  const isSlip =
    part.kind === 'quantity' && held.slips.some((one) => isTooNear(part, held.key, one.value));
  return isEdged && !isSlip ? [] : [`${part.id} has a slip that could be its key`];
}

/** The key as a person would say it. */
function keyWords(part: Part, held: DrawnPart | undefined): string {
  if (held?.kind === 'quantity') return held.key.toPrecision(4);
  return String(held?.options.find(({ id }) => id === held.right)?.index);
}

/** Right answers get every mark; each slip alone gets its own words. */
function marksAsWritten(question: Compiled, drawn: Drawn): void {
  const right = answerRight(question, drawn);
  const marked = markQuestion(question, drawn, right);
  expect(marked.marks).toBe(question.meta.marks);
  expect(marked.parts.map((part) => part.verdict)).toEqual(question.parts.map(() => 'right'));
  for (const part of question.parts) {
    const slips = drawn.parts[part.id]?.slips ?? [];
    const says = slips.map(({ slip }) => question.slips[slip]?.say ?? '');
    for (const made of slips) {
      const answer = 'id' in made ? choose(made.id) : typeSi(question, part, made.value);
      const words = wordsOn(question, drawn, { part, answers: { ...right, [part.id]: answer } });
      // Two slips may come to one value; the words of either teach.
      const fitting = says.map((say) => fillIn(say, question.givens, drawn.values));
      expect(
        fitting.some((say) => words.includes(say)),
        `${part.id}: ${words.join()}`,
      ).toBe(true);
    }
  }
}

/** What the marker writes beside a part that was taken for a slip. */
function wordsOn(
  question: Compiled,
  drawn: Drawn,
  { part, answers }: { part: Part; answers: Answers },
): string[] {
  const marked = markQuestion(question, drawn, answers).parts.find(({ id }) => id === part.id);
  expect(marked?.verdict).toBe('slip');
  return (marked?.remarks ?? []).map(({ text }) => text);
}

describe.each(bank.map((question) => [question.meta.slug, question] as const))(
  '%s',
  (_, question) => {
    it(`draws ${DRAWS} times: solvable, in range, one key, no slip that could be the key`, () => {
      const faults: string[] = [];
      const papers = new Set<string>();
      const live = question.slips.map(() => 0);
      for (let n = 0; n < DRAWS; n += 1) {
        const drawn = drawQuestion(question, seedNumber(n)) as Drawn;
        faults.push(...faultsOf(question, drawn).map((fault) => `draw ${n}: ${fault}`));
        papers.add(question.parts.map((part) => keyWords(part, drawn.parts[part.id])).join());
        const made = Object.values(drawn.parts).flatMap(({ slips }) =>
          slips.map(({ slip }) => slip),
        );
        for (const slip of new Set(made)) live[slip] = (live[slip] ?? 0) + 1;
        if (n % MARK_EVERY === 0) marksAsWritten(question, drawn);
      }
      expect(faults).toEqual([]);
      expect(papers.size).toBeGreaterThanOrEqual(LEAST_VARIETY);
      live.forEach((draws, slip) => {
        expect(draws / DRAWS, question.slips[slip]?.is).toBeGreaterThanOrEqual(LIVELY);
      });
    });
  },
);

describe('the bank', () => {
  it('has the practice and sample questions it says it has', () => {
    const counts = new Map<string, number>();
    for (const { meta } of bank) {
      const group = `${meta.pool} ${meta.subject}`;
      counts.set(group, (counts.get(group) ?? 0) + 1);
    }
    expect(Object.fromEntries(counts)).toEqual({
      'practice VD': 3,
      'practice RD': 3,
      'practice CC': 3,
      'practice SI': 1,
      'practice MF': 1,
      'paper VD': 3,
      'paper RD': 3,
      'paper CC': 3,
    });
  });

  it('has every sheet checked by someone else than its author', () => {
    for (const { meta } of bank) expect(meta.checkedBy).not.toBe(meta.author);
  });
});
