import { expect, it } from 'vitest';
import { makeClass, makeMember } from '../../testing/classes.ts';
import { isReadyToSit, membersUnder, sayClass, sayStrip } from './class-words.ts';
import { layStrip, wideStrip } from './strip-layout.ts';

const now = new Date('2026-12-01T12:00:00Z');
const stuckOn = (at: string) => makeMember({ at, daysThere: 9 });

it('says in a sentence who is stuck, and where most are', () => {
  const say = (members: ReturnType<typeof makeMember>[]) => sayClass(makeClass({ members }));
  expect(say([makeMember(), makeMember()])).toBe(
    'Two on the course. Nobody has been on one sheet for a week.',
  );
  expect(say([makeMember(), stuckOn('3.4 The long run')])).toBe(
    'Two on the course. One has been on one sheet for a week or more, on 3.4.',
  );
  expect(say([stuckOn('3.4 a'), stuckOn('3.4 a'), stuckOn('4.1 b')])).toBe(
    'Three on the course. Three have been on one sheet for a week or more, two of them on 3.4.',
  );
});

it('counts nobody as stuck who has read everything', () => {
  expect(membersUnder('stuck', [stuckOn('all read')], now)).toEqual([]);
});

it('knows who has not been here for seven days', () => {
  const seen = (lastSeenOn: string | null) => makeMember({ lastSeenOn });
  const members = [seen('2026-11-24'), seen('2026-11-25'), seen(null)];
  expect(membersUnder('away', members, now).map(({ lastSeenOn }) => lastSeenOn)).toEqual([
    '2026-11-24',
    null,
  ]);
});

it('calls ready to sit whoever has every lamp lit and has not sat', () => {
  const lamp = (number: number, state: 'lit' | 'not-sat' | 'none') => ({
    number,
    sheetsDone: 1,
    sheetsBegun: 0,
    lamp: state,
    percent: null,
  });
  const lit = [lamp(1, 'lit'), lamp(2, 'none'), lamp(3, 'lit')];
  expect(isReadyToSit(makeMember({ units: lit }))).toBe(true);
  expect(isReadyToSit(makeMember({ units: lit, paper: 'passed' }))).toBe(false);
  expect(isReadyToSit(makeMember({ units: [lamp(1, 'lit'), lamp(3, 'not-sat')] }))).toBe(false);
});

it('draws the strip live as far as somebody has come, and says the same', () => {
  const view = makeClass();
  const member = makeMember();
  const [first, second, third] = layStrip(view.units, member, wideStrip).units;
  expect(first).toMatchObject({ liveTo: first?.to, lamp: { state: 'lit' } });
  expect(second).toMatchObject({ dots: [], lamp: null, liveTo: null });
  expect(third).toMatchObject({ liveTo: third?.from, dots: [{ state: 'begun' }] });
  expect(sayStrip(view, member)).toBe('1 of 2 sheets done, W1 passed');
});
