import { describe, expect, it } from 'vitest';
import { type Compiled, type Drawn } from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { presentQuestion } from '../src/questions/present.ts';
import { type Answers, type MarkedQuestion, type RawAnswer } from '../src/questions/types.ts';
import { BLANK, choose } from './answering.ts';
import { openSheetNamed, seedNumber } from './bank-files.ts';

const chart = openSheetNamed('vd-chart-table');

/** The draw of the design's worksheet: 14 A, 5.5 m, 4 mm². */
function chartDraw(): Drawn {
  for (let n = 0; n < 5000; n += 1) {
    const drawn = drawQuestion(chart, seedNumber(n)) as Drawn;
    const { load, run, area } = drawn.values;
    if (load === 14 && run === 5.5 && Math.abs((area ?? 0) - 4e-6) < 1e-12) return drawn;
  }
  throw new Error('The draw was not met.');
}

const drawn = chartDraw();
const view = presentQuestion(chart, drawn);

function typed(text: string, unit: string | null = null): RawAnswer {
  return { ...BLANK, text, unit };
}

function size(text: string): RawAnswer {
  const option = view.parts[3]?.options.find((one) => one.text === text);
  return choose(option?.id ?? '');
}

function mark(answers: Answers): MarkedQuestion {
  return markQuestion(chart, drawn, answers);
}

function partA(text: string, unit = 'mΩ'): { verdict: string; marks: number; words: string } {
  const part = mark({ a: typed(text, unit) }).parts[0];
  const words = (part?.remarks ?? []).map((remark) => remark.text).join('; ');
  return { verdict: part?.verdict ?? '', marks: part?.marks ?? NaN, words };
}

describe('the marker’s order', () => {
  it('marks the worked sheet of one slip, carried through', () => {
    const marked = mark({
      a: typed('24.1', 'mΩ'),
      b: typed('0.337', 'V'),
      c: typed('2.6', '%'),
      d: size('4 mm²'),
    });
    expect(marked.parts.map(({ verdict, marks }) => [verdict, marks])).toEqual([
      ['slip', 1],
      ['carried-forward', 2],
      ['carried-forward', 1],
      ['not-carried', 0],
    ]);
    expect(marked.marks).toBe(4);
    expect(marked.outOf).toBe(7);
    expect(marked.summary).toBe(
      'One slip, carried through. You counted the cable out but not back. Your method after that was sound.',
    );
    expect(marked.parts[0]?.remarks).toEqual([
      { sign: 'gained', heading: null, text: 'right rule, right ρ and A' },
      { sign: 'lost', heading: null, text: 'out and back, 2 × 5.5\u00a0m' },
    ]);
    expect(marked.parts[3]?.remarks[0]).toEqual({
      sign: 'lost',
      heading: 'Not carried forward',
      text: 'a cable too small for the job is marked on the true drop',
    });
  });

  it('sets own and worked lines side by side and marks where they part ways', () => {
    const [a, b] = mark({ a: typed('24.1', 'mΩ'), b: typed('0.337', 'V') }).parts;
    const lines = (part: typeof a, column: 'yours' | 'worked'): string[] =>
      (part?.[column] ?? []).map((line) => line.map((token) => token.text).join(' '));
    const differing = (part: typeof a, column: 'yours' | 'worked'): string[] =>
      (part?.[column] ?? []).flat().flatMap((token) => (token.differs ? [token.text] : []));
    expect(lines(a, 'worked')).toEqual([
      'R = ρ × 2 L ÷ A',
      '= 0.0175 Ω·mm²/m × 2 × 5.5 m ÷ 4 mm²',
      '= 48.1 mΩ',
    ]);
    expect(lines(a, 'yours')).toEqual([
      'R = ρ × L ÷ A',
      '= 0.0175 Ω·mm²/m × 5.5 m ÷ 4 mm²',
      '= 24.1 mΩ',
    ]);
    expect(differing(a, 'worked')).toEqual(['2', '2', '×', '48.1']);
    expect(differing(a, 'yours')).toEqual(['24.1']);
    expect(lines(b, 'yours')).toEqual(['U_d = I × R', '= 14 A × 24.1 mΩ', '= 0.337 V']);
    expect(differing(b, 'yours')).toEqual(['24.1', '0.337']);
    expect(differing(b, 'worked')).toEqual(['48.1', '0.674']);
  });

  it('gives full marks inside the tolerance and none outside, edges included', () => {
    expect(partA('48.1')).toMatchObject({ verdict: 'right', marks: 2 });
    expect(partA('48.60625')).toMatchObject({ verdict: 'right' });
    expect(partA('47.64375')).toMatchObject({ verdict: 'right' });
    expect(partA('48.607')).toMatchObject({ verdict: 'wrong', marks: 0 });
    expect(partA('0.0481', 'Ω')).toMatchObject({ verdict: 'right' });
    expect(partA('48,1 mΩ')).toMatchObject({ verdict: 'right' });
  });

  it('says wrong unit and power of ten, and keeps half', () => {
    expect(partA('48.1', 'Ω')).toEqual({
      verdict: 'wrong-unit',
      marks: 1,
      words: 'sum right: 1 of 2 kept; wrong unit: the figure is right in mΩ, you gave Ω',
    });
    expect(partA('48.1 V')).toMatchObject({ verdict: 'wrong-unit', marks: 1 });
    expect(partA('4.81')).toEqual({
      verdict: 'power-of-ten',
      marks: 1,
      words:
        'sum right: 1 of 2 kept; right figures, 10 times too small: check prefix and decimal point',
    });
    expect(partA('481')).toMatchObject({ verdict: 'power-of-ten' });
  });

  it('knows a key that was rounded too early on the way', () => {
    for (let n = 0; n < 300; n += 1) {
      const paper = drawQuestion(chart, seedNumber(n)) as Drawn;
      const { load = 0, pair = 0 } = paper.values;
      const rounded = Number(pair.toPrecision(2)) * load;
      if (Math.abs(rounded / (pair * load) - 1) < 0.015) continue;
      const answer = typed(String(Number(rounded.toPrecision(4))), 'V');
      const marked = markQuestion(chart, paper, { b: answer });
      expect(marked.parts[1]).toMatchObject({ verdict: 'slip', marks: 1 });
      expect(marked.trace[1]?.rule).toBe('rounded-early');
      expect(marked.summary).toContain('You rounded too early.');
      return;
    }
    throw new Error('No draw shows it.');
  });

  it('carries a value on in the unit it was given in', () => {
    const marked = mark({ a: typed('48.1', 'Ω'), b: typed('673.4', 'V') });
    expect(marked.parts.map((part) => part.verdict).slice(0, 2)).toEqual([
      'wrong-unit',
      'carried-forward',
    ]);
  });

  it('leaves blank, asked-back and unreadable answers unmarked', () => {
    expect(partA('')).toMatchObject({ verdict: 'blank', marks: 0 });
    expect(partA('1,234')).toMatchObject({ verdict: 'not-understood', marks: 0 });
    expect(partA('lots')).toMatchObject({ verdict: 'not-understood', marks: 0 });
    expect(mark({}).summary).toBe('Nothing was answered.');
    expect(mark({ d: choose('nothing') }).parts[3]?.verdict).toBe('not-understood');
  });

  it('says of a wrong size whether it is too small or more than was asked', () => {
    const words = (text: string): string =>
      mark({ d: size(text) }).parts[3]?.remarks[0]?.text ?? '';
    expect(words('6 mm²')).toContain('too small for the job');
    expect(words('16 mm²')).toContain('a smaller stock size does as well');
    expect(mark({ d: size('4 mm²') }).parts[3]?.verdict).toBe('slip');
  });

  it('writes every decision down', () => {
    const { trace } = mark({ a: typed('24.1', 'mΩ'), b: typed('0.337', 'V') });
    expect(trace.map(({ part, rule }) => [part, rule])).toEqual([
      ['a', 'slip'],
      ['b', 'carried-forward'],
      ['c', 'blank'],
      ['d', 'blank'],
    ]);
    expect(trace.every(({ detail }) => detail.length > 0)).toBe(true);
  });

  it('carries no value nobody could have meant', () => {
    const marked = mark({ a: typed('-24', 'mΩ'), b: typed('-0.336', 'V') });
    expect(marked.parts[1]?.verdict).toBe('wrong');
    expect(marked.trace.map(({ rule }) => rule)).toContain('carry-stopped');
  });

  it('ignores answers to parts that do not exist and hostile keys', () => {
    const hostile = JSON.parse('{"__proto__": {"text": "1"}, "z": {"text": "1"}}') as Answers;
    expect(mark(hostile).marks).toBe(0);
  });

  it('marks the same from what was stored as from what was drawn', () => {
    const answers = { a: typed('24.1', 'mΩ'), b: typed('0.337', 'V'), d: size('4 mm²') };
    const stored = JSON.parse(JSON.stringify({ chart, drawn })) as {
      chart: Compiled;
      drawn: Drawn;
    };
    expect(markQuestion(stored.chart, stored.drawn, answers)).toEqual(mark(answers));
  });

  it('refuses a draw of another revision', () => {
    expect(() => markQuestion(chart, { ...drawn, revision: 'Z' }, {})).toThrow(
      `does not belong to vd-chart-table revision ${chart.meta.revision}`,
    );
  });
});

describe('a draw', () => {
  it('is the same for the same seed and another for another', () => {
    expect(drawQuestion(chart, seedNumber(4))).toEqual(drawQuestion(chart, seedNumber(4)));
    expect(drawQuestion(chart, seedNumber(4))).not.toEqual(drawQuestion(chart, seedNumber(5)));
  });

  it('heeds every digit of a long seed', () => {
    const seed = 'a'.repeat(64);
    const draws = Array.from({ length: 64 }, (_, at) =>
      JSON.stringify(drawQuestion(chart, `${seed.slice(0, at)}b${seed.slice(at + 1)}`)),
    );
    expect(new Set(draws).size).toBe(64);
  });

  it('refuses a seed that is no keyed hash', () => {
    for (const seed of ['', 'abc', 'z'.repeat(64), '1'.repeat(31)]) {
      expect(() => drawQuestion(chart, seed)).toThrow('is not a keyed hash in hex');
    }
  });

  it('orders options anew, and neither place nor id tells the right one', () => {
    const question = openSheetNamed('cc-never-ends');
    const places = new Map<number, number>();
    const ranks = new Map<number, number>();
    const ids = new Set<string>();
    for (let n = 0; n < 400; n += 1) {
      const held = (drawQuestion(question, seedNumber(n)) as Drawn).parts.f;
      if (held?.kind !== 'options') throw new Error('not a choice');
      const place = held.options.findIndex(({ id }) => id === held.right);
      const rank = held.options.filter(({ id }) => id < held.right).length;
      places.set(place, (places.get(place) ?? 0) + 1);
      ranks.set(rank, (ranks.get(rank) ?? 0) + 1);
      held.options.forEach(({ id }) => ids.add(id));
    }
    expect(ids.size).toBe(1600);
    for (const counts of [places, ranks]) {
      expect(counts.size).toBe(4);
      // 100 expected in each of four; five standard deviations either side.
      for (const count of counts.values()) expect(Math.abs(count - 100)).toBeLessThan(44);
    }
  });

  it('spreads its values evenly over their range', () => {
    const counts = new Map<number, number>();
    for (let n = 0; n < 900; n += 1) {
      const load = (drawQuestion(chart, seedNumber(n)) as Drawn).values.load ?? NaN;
      counts.set(load, (counts.get(load) ?? 0) + 1);
    }
    expect(counts.size).toBe(9);
    for (const count of counts.values()) expect(Math.abs(count - 100)).toBeLessThan(50);
  });
});
