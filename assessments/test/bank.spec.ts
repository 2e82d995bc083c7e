import { describe, expect, it } from 'vitest';
import { auditQuestion } from '../src/audit/audit-question.ts';
import { breachesOf } from '../src/audit/bounds.ts';
import {
  type Compiled,
  type Drawn,
  type DrawnPart,
  type Given,
  type Part,
} from '../src/questions/compiled.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { fillIn } from '../src/questions/placeholders.ts';
import { isTooNear } from '../src/questions/tolerance.ts';
import { type Answers } from '../src/questions/types.ts';
import { fromSi } from '../src/questions/units.ts';
import { answerRight, choose, typeSi } from './answering.ts';
import { openBank } from './bank-files.ts';

/** `npm run bank:audit` draws ten thousand. */
const DRAWS = 300;
/** Marking every one of them would only repeat itself; every twenty-fifth is marked. */
const MARK_EVERY = 25;
/** Speed is measured by the audit from the command line; a busy machine is no fault of a sheet. */
const NO_CLOCK = (): number => 0;

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
  if (held.kind === 'quantity') {
    const isEdged = held.low <= held.key && held.key <= held.high;
    const isSlip =
      part.kind === 'quantity' && held.slips.some((one) => isTooNear(part, held.key, one.value));
    return isEdged && !isSlip ? [] : [`${part.id} has a slip that could be its key`];
  }
  return isChoosable(held) ? [] : [`${part.id} has no key among its options`];
}

function isChoosable(held: Exclude<DrawnPart, { kind: 'quantity' }>): boolean {
  const ids = held.options.map(({ id }) => id);
  const right = held.kind === 'options' ? [held.right] : held.right;
  const isSlip = held.kind === 'options' && held.slips.some(({ id }) => id === held.right);
  const areThere = right.length > 0 && right.every((id) => ids.includes(id));
  return areThere && new Set(ids).size === ids.length && !isSlip;
}

/** Right answers get every mark; each slip alone gets its own words. */
function marksAsWritten(question: Compiled, drawn: Drawn): void {
  const right = answerRight(question, drawn);
  const marked = markQuestion(question, drawn, right);
  expect(marked.marks).toBe(question.meta.marks);
  expect(JSON.stringify(marked)).not.toContain('NaN');
  expect(marked.parts.map((part) => part.verdict)).toEqual(question.parts.map(() => 'right'));
  for (const part of question.parts) {
    const held = drawn.parts[part.id];
    const slips = held && 'slips' in held ? held.slips : [];
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
  expect(JSON.stringify(marked)).not.toContain('NaN');
  return (marked?.remarks ?? []).map(({ text }) => text);
}

describe.each(openBank().map((question) => [question.meta.slug, question] as const))(
  '%s',
  (_, question) => {
    it(`draws ${DRAWS} times within the bounds of the audit and is marked as written`, () => {
      const faults: string[] = [];
      const audit = auditQuestion(question, {
        draws: DRAWS,
        clock: NO_CLOCK,
        onDrawn: (given, number) => {
          const drawn = given as Drawn;
          faults.push(...faultsOf(question, drawn).map((fault) => `draw ${number}: ${fault}`));
          if (number % MARK_EVERY === 0) marksAsWritten(question, drawn);
        },
      });
      expect(faults).toEqual([]);
      expect(breachesOf(audit)).toEqual([]);
    });
  },
);
