import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type Drawn } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { keyAnswers } from '../src/questions/key-answers.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { presentQuestion } from '../src/questions/present.ts';
import { readAnswer } from '../src/questions/read-answer.ts';
import { type Line, type MarkedPart } from '../src/questions/types.ts';
import { workQuestion } from '../src/questions/work.ts';
import { BLANK, chooseAll } from './answering.ts';
import { seedNumber } from './bank-files.ts';
import { smallSheet } from './small-sheet.ts';

const { question } = smallSheet(
  `read: What a fuse is for
given:
  load: { is: Load, symbol: I, from: 5 A, to: 25 A, step: 5 A }
steps:
  twice: { symbol: I_2, unit: A, is: 2 * load, says: twice the load }
ask:
  a:
    choose all:
      - { is: The fuse at the battery, right: true, say: 'a fault passes it first' }
      - { is: The lamp’s switch, say: 'a switch breaks the load of {load} only' }
      - { is: The cable’s own fuse, right: true }
      - { is: The master switch, say: it is opened by hand }
      - { is: A fuse of 40 A, right: 2 * load > load + load, say: it fits this load }
      - { is: The breaker at the charger, right: true }
    marks: 5
    read: Where fuses stand
  b:
    order: { isolate: Isolate, prove: Prove dead, cut: Cut, crimp: Crimp, test: Test }
    misplaced:
      - { first: cut, then: prove, say: prove it dead before you cut }
      - { first: cut, then: isolate, say: isolate before anything }
    marks: 3
  c:
    match: { bilge pump: 3 %, navigation lights: 3 %, cabin light: 10 %, fridge: 10 % }
    also: [5 %]
    mixed:
      - { is: navigation lights, with: 10 %, say: a dim light is a safety fault }
      - { is: cabin light, with: 3 %, say: comfort may lose more }
    marks: 2
  d: { find: twice, units: [A], within: 1 %, marks: 1 }
slips:
  - { is: You halved it., say: double it, makes: { twice: load / 2 } }`,
  '## a\n\nWhich clear a fault?\n\n## b\n\nOrder them.\n\n## c\n\nMatch.\n\n## d\n\nDouble it.',
);
const drawn = drawQuestion(question, seedNumber(4)) as Drawn;
const view = presentQuestion(question, drawn);
const text = (line: Line): string => line.map((token) => token.text).join(' ');

function mark(id: string, options: string[]): MarkedPart {
  const part = markQuestion(question, drawn, { [id]: chooseAll(options) }).parts.find(
    (one) => one.id === id,
  );
  if (!part) throw new Error(`No part ${id}.`);
  return part;
}

function viewOf(id: string): (typeof view.parts)[number] {
  const part = view.parts.find((one) => one.id === id);
  if (!part) throw new Error(`No part ${id}.`);
  return part;
}

/** Ids of the options that begin with these words, in this order. */
const ids = (part: string, ...starts: string[]): string[] =>
  starts.map(
    (start) =>
      viewOf(part).options.find((option) => start !== '' && option.text.startsWith(start))?.id ??
      '',
  );

describe('all that apply', () => {
  it.each([
    [['The fuse', 'The cable', 'The breaker'], 'right', 5],
    [['The fuse', 'The cable'], 'partly-right', 3],
    [['The fuse'], 'partly-right', 1],
    [['The fuse', 'The cable', 'The breaker', 'The master'], 'partly-right', 3],
    [['The fuse', 'The lamp'], 'wrong', 0],
    [['The lamp', 'The master'], 'wrong', 0],
    [['The fuse', 'The cable', 'The breaker', 'The lamp', 'The master', 'A fuse'], 'wrong', 0],
  ] as const)('gives %j %s, %d of 5', (starts, verdict, marks) => {
    expect(mark('a', ids('a', ...starts))).toMatchObject({ verdict, marks });
  });

  it('says why each wrong one is, and what was left out', () => {
    const { remarks, read, yours, worked } = mark('a', ids('a', 'The cable', 'The lamp'));
    const says = remarks.map(({ sign, heading, text: words }) => [sign, heading, words]);
    expect(says).toContainEqual(['gained', null, '1 of 3 right ones chosen']);
    const load = String(drawn.values.load);
    expect(says).toContainEqual([
      'lost',
      'The lamp’s switch',
      `a switch breaks the load of ${load}\u00a0A only`,
    ]);
    const leftOut = 'The fuse at the battery: a fault passes it first';
    expect(says).toContainEqual(['lost', 'Left out', leftOut]);
    expect(says).toContainEqual(['lost', 'Left out', 'The breaker at the charger']);
    expect(read).toBe('Where fuses stand');
    expect(yours).toHaveLength(2);
    expect(worked.map(text).toSorted()).toEqual([
      'The breaker at the charger',
      'The cable’s own fuse',
      'The fuse at the battery',
    ]);
  });

  it('takes a choice ticked twice for once, in any order', () => {
    const [fuse = '', cable = '', breaker = ''] = ids('a', 'The fuse', 'The cable', 'The breaker');
    expect(mark('a', [breaker, fuse, fuse, cable]).marks).toBe(5);
  });
});

describe('an order', () => {
  const right = ids('b', 'Isolate', 'Prove', 'Cut', 'Crimp', 'Test');

  it.each([
    [[0, 1, 2, 3, 4], 'right', 3],
    [[1, 2, 3, 4, 0], 'partly-right', 1],
    [[0, 1, 3, 2, 4], 'partly-right', 1],
    [[1, 0, 3, 2, 4], 'wrong', 0],
    [[4, 3, 2, 1, 0], 'wrong', 0],
  ] as const)('put %j gives %s, %d of 3', (places, verdict, marks) => {
    const order = places.map((place) => right[place] ?? '');
    expect(mark('b', order)).toMatchObject({ verdict, marks });
  });

  it('has words for the pairs that stand the wrong way round, and numbered lines', () => {
    const [isolate = '', prove = '', cut = '', crimp = '', test = ''] = right;
    const part = mark('b', [isolate, cut, prove, crimp, test]);
    expect(part.remarks).toEqual([
      {
        sign: 'lost',
        heading: 'Wrong way round',
        text: 'Cut, then Prove dead: prove it dead before you cut',
      },
    ]);
    expect(part.worked.map(text)).toEqual([
      '1. Isolate',
      '2. Prove dead',
      '3. Cut',
      '4. Crimp',
      '5. Test',
    ]);
    expect(text(part.yours[1] ?? [])).toBe('2. Cut');
    const other = mark('b', [isolate, prove, cut, test, crimp]);
    expect(other.remarks.map((remark) => remark.text)).toEqual(['Crimp comes before Test']);
  });

  it('is asked for again when a step is missing or stands twice', () => {
    for (const order of [right.slice(1), [...right.slice(1), right[1] ?? '']]) {
      expect(mark('b', order)).toMatchObject({ verdict: 'not-understood', marks: 0 });
    }
  });
});

describe('pairs', () => {
  /** The texts given to bilge pump, navigation lights, cabin light and fridge. */
  function pairs(...texts: string[]): string[] {
    const names = ['bilge pump', 'navigation lights', 'cabin light', 'fridge'];
    return viewOf('c').rows.flatMap(({ text: row }) => ids('c', texts[names.indexOf(row)] ?? ''));
  }

  it.each([
    [['3 %', '3 %', '10 %', '10 %'], 'right', 2],
    [['3 %', '3 %', '10 %', '5 %'], 'partly-right', 1],
    [['3 %', '3 %', '10 %', ''], 'partly-right', 1],
    [['3 %', '10 %', '3 %', '5 %'], 'partly-right', 0],
    [['10 %', '10 %', '3 %', '3 %'], 'wrong', 0],
  ] as const)('%j are %s, %d of 2', (texts, verdict, marks) => {
    expect(mark('c', pairs(...texts))).toMatchObject({ verdict, marks });
  });

  it('have words for what was mixed up, and the text that fits where there are none', () => {
    const { remarks, worked, yours } = mark('c', pairs('', '10 %', '10 %', '5 %'));
    const says = new Map(remarks.map((remark) => [remark.heading, remark.text]));
    expect(says.get('navigation lights')).toBe('a dim light is a safety fault');
    expect(says.get('fridge')).toBe('10 %, not 5 %');
    expect(says.get('bilge pump')).toBe('not matched; it is 3 %');
    expect(worked.map(text)).toContain('bilge pump : 3 %');
    expect(yours.map(text)).toContain('bilge pump : –');
  });
});

describe('the new kinds', () => {
  it('read back in words what was answered, and blank where nothing was', () => {
    const [fuse = ''] = ids('a', 'The fuse');
    const read = (id: string, options?: string[]): unknown =>
      readAnswer(viewOf(id), options ? chooseAll(options) : BLANK);
    expect(read('a', [fuse])).toMatchObject({ shown: 'The fuse at the battery' });
    expect(read('b', ids('b', 'Test', 'Isolate', 'Prove', 'Cut', 'Crimp'))).toMatchObject({
      state: 'understood',
      shown: '1. Test; 2. Isolate; 3. Prove dead; 4. Cut; 5. Crimp',
    });
    for (const id of ['a', 'b', 'c']) {
      expect(read(id)).toEqual({ state: 'blank' });
      expect(read(id, [])).toEqual({ state: 'blank' });
      expect(read(id, ['nothing'])).toMatchObject({ state: 'not-understood' });
    }
    expect(read('c', ['', '', '', ''])).toEqual({ state: 'blank' });
  });

  it('say which step went wrong, and what to read', () => {
    const off = markQuestion(question, drawn, { d: { ...BLANK, text: '7', unit: 'A' } }).parts[3];
    expect(off).toMatchObject({
      wrongStep: { symbol: 'I_2', says: 'twice the load' },
      read: 'What a fuse is for',
    });
    const right = markQuestion(question, drawn, keyAnswers(question, drawn)).parts;
    expect(right.map(({ wrongStep, read }) => wrongStep ?? read)).toEqual([null, null, null, null]);
    expect(mark('a', ids('a', 'The lamp')).wrongStep).toBeNull();
  });

  it('mark the key in full, and a slip in any part at less', () => {
    const { outOf } = markQuestion(question, drawn, {});
    expect(markQuestion(question, drawn, keyAnswers(question, drawn)).marks).toBe(outOf);
    for (const id of ['a', 'b', 'c', 'd']) {
      const slipped = keyAnswers(question, drawn, [id]);
      expect(markQuestion(question, drawn, slipped).marks, id).toBeLessThan(outOf);
    }
  });

  it('say at the top how much is partly right', () => {
    const answers = keyAnswers(question, drawn, ['a', 'c', 'd']);
    expect(markQuestion(question, drawn, answers).summary).toBe(
      'One slip, two parts partly right. You halved it.',
    );
    const { summary } = markQuestion(question, drawn, { ...answers, d: { ...BLANK, text: '7' } });
    expect(summary).toBe('One part wrong, two partly right.');
  });

  it('work out in the worked answer as they are marked', () => {
    const worked = workQuestion(question, drawn).parts.map(({ lines }) => lines.map(text));
    const marked = markQuestion(question, drawn, {}).parts.map(({ worked: w }) => w.map(text));
    expect(worked).toEqual(marked);
  });

  it('draw both sides anew, and neither place nor id tells what is right', () => {
    const orders = new Set<string>();
    const marks = new Set<string>();
    for (let n = 0; n < 120; n += 1) {
      const { b, c } = (drawQuestion(question, seedNumber(n)) as Drawn).parts;
      if (b?.kind !== 'order' || c?.kind !== 'match') throw new Error('drawn as another kind');
      orders.add(b.options.map(({ index }) => index).join(''));
      [...b.options, ...c.options, ...c.rows].forEach(({ id }) => marks.add(id));
    }
    // 120 orders of five, drawn 120 times: about 76 are met.
    expect(orders.size).toBeGreaterThan(60);
    expect(marks.size).toBe(120 * (5 + 3 + 4));
  });

  it('are marked whatever is answered, and alike every time', () => {
    const known = view.parts
      .flatMap(({ options, rows }) => [...options, ...rows])
      .map(({ id }) => id);
    const anyId = fc.oneof(fc.constantFrom(...known), fc.constant(''), fc.string());
    const anyAnswer = fc.record({
      text: fc.string(),
      unit: fc.option(fc.string()),
      option: fc.option(anyId),
      options: fc.option(fc.array(anyId, { maxLength: 9 }), { nil: undefined }),
      working: fc.string(),
    });
    const anyAnswers = fc.dictionary(fc.constantFrom('a', 'b', 'c', 'd', 'z'), anyAnswer);
    fc.assert(
      fc.property(anyAnswers, (answers) => {
        const marked = markQuestion(question, drawn, answers);
        expect(markQuestion(question, drawn, answers as never)).toEqual(marked);
        for (const { marks, outOf } of marked.parts) {
          expect(marks >= 0 && marks <= outOf && Number.isInteger(marks)).toBe(true);
        }
      }),
      { numRuns: 500 },
    );
  });
});
