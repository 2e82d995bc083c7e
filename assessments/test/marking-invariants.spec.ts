import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  type Compiled,
  type Drawn,
  type Part,
  type QuantityPart,
} from '../src/questions/compiled.ts';
import { drawQuestion } from '../src/questions/draw.ts';
import { markQuestion } from '../src/questions/mark.ts';
import { solve } from '../src/questions/solve.ts';
import { slipRangeOf } from '../src/questions/tolerance.ts';
import { type Answers, type MarkedQuestion, type RawAnswer } from '../src/questions/types.ts';
import { fromSi } from '../src/questions/units.ts';
import { answerRight, BLANK, choose, chooseAll, typeSi } from './answering.ts';
import { openBank, seedNumber } from './bank-files.ts';

/** Enough draws of each question to meet its different sides, and few enough to mark thousands. */
const PAPERS = 6;

interface Paper {
  question: Compiled;
  drawn: Drawn;
}
interface Case<P extends Part = Part> extends Paper {
  part: P;
}

/** The bank, so many times drawn: one list of all its questions for each draw. */
const drawnBanks: Paper[][] = Array.from({ length: PAPERS }, (_, at) =>
  openBank().map((question) => ({
    question,
    drawn: drawQuestion(question, seedNumber(at * 17)) as Drawn,
  })),
);
/** By its place, so that what fails is named and not printed whole. */
const aBank = fc.nat({ max: PAPERS - 1 });
const bankAt = (place: number): Paper[] => drawnBanks[place] ?? [];

const casesOf = (bank: readonly Paper[]): Case[] =>
  bank.flatMap((paper) => paper.question.parts.map((part) => ({ ...paper, part })));
const figuresOf = (bank: readonly Paper[]): Case<QuantityPart>[] =>
  casesOf(bank).filter((one): one is Case<QuantityPart> => one.part.kind === 'quantity');

const mark = ({ question, drawn }: Paper, answers: Answers): MarkedQuestion =>
  markQuestion(question, drawn, answers);
const named = ({ question, part }: Case): string => `${question.meta.slug} (${part.id})`;

function lostOn(marked: MarkedQuestion, part: Part): number {
  const found = marked.parts.find(({ id }) => id === part.id);
  return (found?.outOf ?? NaN) - (found?.marks ?? NaN);
}

/** Given figures and what is read off a curve: all that nobody works out. */
function printed({ question, drawn }: Paper): [string, number][] {
  const worked = new Set(
    question.steps.filter(({ how }) => how.kind !== 'read').map(({ name }) => name),
  );
  return Object.entries(drawn.values).filter(([name]) => !worked.has(name));
}

/**
 * Answers as a careful person gives them whose one figure is wrong and who works on with it; null
 * where it leads outside the tables.
 */
function withOneError(one: Case<QuantityPart>, wrong: number): Answers | null {
  const { question, drawn } = one;
  const answers = answerRight(question, drawn);
  const own = new Map(printed(one));
  try {
    for (const part of question.parts) {
      if (part.kind !== 'quantity' && part.kind !== 'size') continue;
      const carries = part.kind === 'quantity' && part.carry === 'own';
      const worked = carries ? solve(question, own).get(part.step) : drawn.values[part.step];
      const value = part.id === one.part.id ? wrong : (worked ?? NaN);
      own.set(part.step, value);
      if (part.kind === 'quantity') answers[part.id] = typeSi(question, part, value);
    }
  } catch {
    return null;
  }
  return answers;
}

/** Another answer than the right one to a part that is chosen, ordered or matched; null if none. */
function anotherChoice({ drawn, part }: Case): RawAnswer | null {
  const held = drawn.parts[part.id];
  if (!held || held.kind === 'quantity') return null;
  if (held.kind === 'options') {
    const other = held.options.find(({ id }) => id !== held.right);
    return other ? choose(other.id) : null;
  }
  if (held.kind === 'order') return chooseAll([...held.right].reverse());
  const [first, ...rest] = held.right;
  const other = held.options.find(({ id }) => id !== first && !rest.includes(id));
  if (held.kind === 'match') return other ? chooseAll([other.id, ...rest]) : null;
  return other ? chooseAll([...held.right, other.id]) : null;
}

describe('any single error', () => {
  it('in a figure costs the marks of its own part and no more, where later parts carry', () => {
    const factor = fc.double({ min: 1.08, max: 1.9, noNaN: true });
    let [tried, worked] = [0, 0];
    fc.assert(
      fc.property(aBank, factor, (place, by) => {
        const faults = new Set<string>();
        for (const one of figuresOf(bankAt(place))) {
          tried += 1;
          const answers = withOneError(one, (one.drawn.values[one.part.step] ?? 0) * by);
          if (!answers) continue;
          const marked = mark(one, answers);
          if (marked.outOf - marked.marks !== lostOn(marked, one.part)) faults.add(named(one));
          worked += 1;
        }
        expect([...faults]).toEqual([]);
      }),
      { numRuns: 8 },
    );
    // Few wrong values lead outside every table.
    expect(worked / tried).toBeGreaterThan(0.8);
  });

  it('in a choice, an order or pairs costs no marks elsewhere', () => {
    fc.assert(
      fc.property(aBank, (place) => {
        const faults = new Set<string>();
        for (const one of casesOf(bankAt(place))) {
          const other = anotherChoice(one);
          if (!other) continue;
          const right = answerRight(one.question, one.drawn);
          const marked = mark(one, { ...right, [one.part.id]: other });
          const lost = lostOn(marked, one.part);
          if (lost === 0 || marked.outOf - marked.marks !== lost) faults.add(named(one));
        }
        expect([...faults]).toEqual([]);
      }),
      { numRuns: 3 },
    );
  });

  it('never brings a right answer below one carried forward', () => {
    const factor = fc.double({ min: 0.2, max: 3, noNaN: true });
    fc.assert(
      fc.property(aBank, factor, (place, by) => {
        const faults = new Set<string>();
        for (const one of figuresOf(bankAt(place))) {
          const off = (one.drawn.values[one.part.step] ?? 0) * by + 1e-9;
          const right = answerRight(one.question, one.drawn);
          const marked = mark(one, {
            ...right,
            [one.part.id]: typeSi(one.question, one.part, off),
          });
          for (const other of marked.parts.filter(({ id }) => id !== one.part.id)) {
            if (other.marks !== other.outOf) faults.add(`${named(one)} wrong, (${other.id}) right`);
          }
        }
        expect([...faults]).toEqual([]);
      }),
      { numRuns: 8 },
    );
  });
});

const meanOf = (shares: readonly number[]): number =>
  shares.reduce((sum, share) => sum + share, 0) / shares.length;

/** Decades either side of the key that a wrong value may lie in. */
const DECADES = 2;

describe('slips', () => {
  /**
   * A figure read off a drawing is taken as exactly as the drawing can be read, which on a ratio
   * scale is wide where the figure is small.
   */
  const mostCaught = ({ question, part }: Case<QuantityPart>): number =>
    question.curve && part.tolerance.kind === 'plain' ? 0.02 : 0.01;

  it('each catch under one in a hundred wrong values, even by ratio; off a curve under two', () => {
    const wide = new Map<string, { most: number; shares: number[] }>();
    for (const one of drawnBanks.flatMap(figuresOf)) {
      const held = one.drawn.parts[one.part.id];
      if (held?.kind !== 'quantity') continue;
      for (const { slip, value } of held.slips) {
        const share = shareCaught(held.key, slipRangeOf(one.part, value));
        const name = `${named(one)}: ${one.question.slips[slip]?.is}`;
        const shares = [...(wide.get(name)?.shares ?? []), share];
        wide.set(name, { most: mostCaught(one), shares });
      }
    }
    const tooWide = [...wide].filter(([, { most, shares }]) => meanOf(shares) >= most);
    expect(tooWide.map(([name, { shares }]) => `${name} ${meanOf(shares)}`)).toEqual([]);
  });

  it('are recognised in under one in a hundred random wrong values of the whole bank', () => {
    const counts = { tried: 0, slips: 0 };
    fc.assert(
      fc.property(aBank, fc.double({ min: 0, max: 1, noNaN: true }), (place, share) => {
        for (const one of figuresOf(bankAt(place))) {
          const wrong = wrongValue(one.drawn.values[one.part.step] ?? 0, share);
          const marked = mark(one, { [one.part.id]: typeSi(one.question, one.part, wrong) });
          const verdict = marked.parts.find(({ id }) => id === one.part.id)?.verdict;
          if (verdict === 'right') continue;
          counts.tried += 1;
          if (verdict === 'slip') counts.slips += 1;
        }
      }),
      { numRuns: 25 },
    );
    expect(counts.tried).toBeGreaterThan(1000);
    expect(counts.slips / counts.tried).toBeLessThan(0.01);
  });

  /** Share of the wrong values below that lie in a range. */
  function shareCaught(key: number, { low, high }: { low: number; high: number }): number {
    const decade = (value: number): number =>
      Math.min(DECADES, Math.max(-DECADES, Math.log10(Math.max(0, value / key))));
    return Math.abs(decade(high) - decade(low)) / (2 * DECADES);
  }

  /** From a hundredth of the key to a hundred times it, even by ratio. */
  function wrongValue(key: number, share: number): number {
    return key * 10 ** (DECADES * (2 * share - 1));
  }
});

const anyText = fc.oneof(
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.string({ unit: fc.constantFrom(...'0123456789.,-+eE×^ µmkΩVAh²%°C/·'), maxLength: 24 }),
  fc.constantFrom(
    '1'.repeat(100_000),
    '9,'.repeat(50_000),
    ' '.repeat(100_000),
    '1e999',
    '-0',
    'NaN',
  ),
  fc.constantFrom('__proto__', 'constructor', '\u0000', '\ud800', '\u202e12 V', '１２'),
);
const anyAnswer: fc.Arbitrary<RawAnswer> = fc.record(
  {
    text: anyText,
    unit: fc.option(fc.oneof(anyText, fc.constantFrom('V', 'mΩ', 'A', 'h'))),
    option: fc.option(anyText),
    options: fc.array(anyText, { maxLength: 12 }),
    working: anyText,
  },
  { requiredKeys: ['text', 'unit', 'option', 'working'] },
);

/** Something for some parts, and for parts that are not there. */
function anyAnswersTo({ question, drawn }: Paper): fc.Arbitrary<Answers> {
  const ids = [...question.parts.map(({ id }) => id), '__proto__', 'toString', 'z'];
  const shown = Object.values(drawn.parts).flatMap((held) =>
    held.kind === 'quantity' ? [] : held.options.map(({ id }) => id),
  );
  const known = fc.constantFrom('', ...shown);
  const half: fc.Arbitrary<RawAnswer> = fc.record({
    text: fc.constant(''),
    unit: fc.constant(null),
    option: fc.option(known),
    options: fc.array(known, { maxLength: 10 }),
    working: fc.constant(''),
  });
  return fc
    .array(fc.tuple(fc.constantFrom(...ids), fc.oneof(anyAnswer, half)), { maxLength: ids.length })
    .map((entries) => Object.fromEntries(entries));
}

describe('marking', () => {
  const anyPaper = fc.constantFrom(...drawnBanks.flat());

  it('is total: any string, any ids, huge input give marks and never throw', () => {
    const anySitting = anyPaper.chain((paper) =>
      anyAnswersTo(paper).map((answers) => ({ paper, answers })),
    );
    fc.assert(
      fc.property(anySitting, ({ paper, answers }) => {
        const marked = mark(paper, answers);
        expect(marked.parts.map(({ id }) => id)).toEqual(paper.question.parts.map(({ id }) => id));
        for (const { marks, outOf } of marked.parts) {
          expect(Number.isInteger(marks) && marks >= 0 && marks <= outOf).toBe(true);
        }
        expect(marked.marks).toBe(marked.parts.reduce((sum, { marks }) => sum + marks, 0));
      }),
      { numRuns: 1200 },
    );
  });

  it('is idempotent: the same answers get the same marks, also from what was stored', () => {
    fc.assert(
      fc.property(
        anyPaper.chain((paper) => fc.tuple(fc.constant(paper), anyAnswersTo(paper))),
        ([paper, answers]) => {
          const once = JSON.stringify(mark(paper, answers));
          expect(JSON.stringify(mark(paper, answers))).toBe(once);
          const stored = JSON.parse(JSON.stringify(paper)) as Paper;
          expect(JSON.stringify(mark(stored, answers))).toBe(once);
        },
      ),
      { numRuns: 300 },
    );
  });

  it('gives full marks for as many figures as the worked answer is printed with', () => {
    const lost = new Set<string>();
    for (const one of drawnBanks.flatMap(figuresOf)) {
      const held = one.drawn.parts[one.part.id];
      const step = one.question.steps.find(({ name }) => name === one.part.step);
      if (held?.kind !== 'quantity' || !step) continue;
      const unit = one.part.units[0];
      const figure = unit ? fromSi(held.key, unit) : held.key;
      const places = one.part.rounding ? 9 : step.figures;
      const text = String(Number(figure.toPrecision(places)));
      const marked = mark(one, { [one.part.id]: { ...BLANK, text, unit: unit?.symbol ?? null } });
      if (lostOn(marked, one.part) > 0) lost.add(`${named(one)}: ${text} for ${figure}`);
    }
    expect([...lost]).toEqual([]);
  });

  it('leaves a paper with nothing on it without marks', () => {
    for (const paper of bankAt(0)) {
      const marked = mark(paper, {});
      expect([paper.question.meta.slug, marked.marks]).toEqual([paper.question.meta.slug, 0]);
      const blank = Object.fromEntries(paper.question.parts.map(({ id }) => [id, BLANK]));
      expect(mark(paper, blank).parts.every(({ verdict }) => verdict === 'blank')).toBe(true);
    }
  });
});
