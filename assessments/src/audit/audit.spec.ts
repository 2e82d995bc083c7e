import { describe, expect, it } from 'vitest';
import { smallSheet } from '../../test/small-sheet.ts';
import { type Compiled } from '../questions/compiled.ts';
import { auditQuestion } from './audit-question.ts';
import { breachesOf } from './bounds.ts';

const SOUND = `given:
  load: { is: Load, symbol: I, from: 8 A, to: 20 A, step: 1 A }
  path: { is: Resistance, symbol: R, value: 50 mΩ }
  bound: { is: Bound, value: 17 A, shown: false }
steps:
  fall: { symbol: U_d, unit: V, is: load * path }
ask:
  a: { find: fall, units: [V], within: 1 %, marks: 2 }
slips:
  - { is: You halved it., say: do not halve, makes: { fall: load * path / 2 } }
  - { is: You doubled it., say: do not double, makes: { fall: load * path * 2 } }`;

const ONE_PART = '## a\n\nFind it.';

function sheet(...changes: readonly (readonly [from: string, to: string])[]): Compiled {
  const front = changes.reduce((text, [from, to]) => text.replace(from, to), SOUND);
  return smallSheet(front, ONE_PART).question;
}

const stopped = { draws: 300, clock: (): number => 0 };

describe('the audit of a question', () => {
  it('finds nothing wrong with a sound one, and says what it saw', () => {
    const found = auditQuestion(sheet(), stopped);
    expect(breachesOf(found)).toEqual([]);
    expect(found).toMatchObject({
      slug: 'vd-small-one',
      draws: 300,
      failures: { count: 0 },
      rejectedShare: 0,
      papers: 13,
      hasDrawnFigures: true,
      readsCurve: false,
    });
    const [part] = found.parts;
    expect(part?.range?.least).toBeCloseTo(0.4, 12);
    expect(part?.range?.most).toBeCloseTo(1, 12);
    // Half the key is 50 tolerances of 1 % away.
    expect(part?.nearestSlip).toBeCloseTo(50, 9);
    expect(found.slips.map(({ liveShare }) => liveShare)).toEqual([1, 1]);
  });

  it.each<[what: string, changes: [string, string][], said: [figure: string, value: RegExp]]>([
    [
      'rejects most of its draws',
      [['ask:', 'require: [load > bound]\nask:']],
      ['rejected draws', /^\d\d\.\d %$/],
    ],
    [
      'has a slip that is nearly always silent',
      [['load * path / 2', 'load * path * 1.015']],
      ['draws in which “You halved it.” can be told', /^0\.0 %$/],
    ],
    ['has too few papers', [['to: 20 A', 'to: 12 A']], ['different papers', /^5$/]],
    [
      'asks for what it prints',
      [
        ['path: {', 'same: { is: Drop, symbol: U, value: 0.5 V }\n  path: {'],
        ['from: 8 A, to: 20 A, step: 1 A', 'from: 9.92 A, to: 10.08 A, step: 0.01 A'],
      ],
      ['answers to (a) that are a given', /^100\.0 %$/],
    ],
  ])('refuses one that %s', (_, changes, [figure, value]) => {
    const breaches = breachesOf(auditQuestion(sheet(...changes), stopped));
    const found = breaches.find((breach) => breach.figure === figure);
    expect(found, JSON.stringify(breaches)).toBeDefined();
    expect(found?.value).toMatch(value);
  });

  it('refuses one that cannot be drawn, with the reason of the first', () => {
    const question = sheet();
    const givens = question.givens.map((given) =>
      given.name === 'load'
        ? { ...given, source: { kind: 'list' as const, figures: [NaN] } }
        : given,
    );
    const [breach] = breachesOf(auditQuestion({ ...question, givens }, stopped));
    expect(breach?.figure).toBe('draws that fail');
    expect(breach?.value).toMatch(/^300 of 300 .*comes to no finite number/);
  });

  it('refuses one that takes too long, by the clock it is given', () => {
    let now = 0;
    const slow = auditQuestion(sheet(), { draws: 300, clock: () => (now += 900) });
    expect(breachesOf(slow).map((breach) => breach.figure)).toEqual(['time for a draw']);
  });

  it('takes papers for one whose options only stand elsewhere', () => {
    const listed = smallSheet(
      `given: {}
ask:
  a:
    choose all:
      - { is: One, right: true }
      - { is: Two, right: true }
      - { is: Three, say: not this }
    marks: 2
  b:
    match: { left: first, right: second, both: first }
    mixed:
      - { is: left, with: second, say: the other one }
      - { is: right, with: first, say: the other one }
    marks: 3
  c:
    order: { one: First, two: Then, three: Last }
    misplaced:
      - { first: two, then: one, say: one before two }
      - { first: three, then: two, say: two before three }
    marks: 2`,
      '## a\n\nChoose.\n\n## b\n\nMatch.\n\n## c\n\nOrder.',
    );
    const found = auditQuestion(listed.question, stopped);
    expect(found).toMatchObject({ papers: 1, hasDrawnFigures: false });
    expect(breachesOf(found)).toEqual([]);
  });

  it('sees slip and key that could be taken for each other', () => {
    const found = auditQuestion(sheet(), stopped);
    const [part] = found.parts;
    if (!part) throw new Error('no part');
    const near = { ...found, parts: [{ ...part, nearestSlip: 1.4 }] };
    expect(breachesOf(near)[0]).toMatchObject({
      slug: 'vd-small-one',
      figure: 'nearest slip in (a)',
      value: '1.40 tolerances',
      bound: 'at least 2',
    });
  });
});
