import { describe, expect, it } from 'vitest';
import { assemblePaper } from '../src/papers/assemble.ts';
import { type Blueprint } from '../src/papers/types.ts';
import { type Compiled, type Option, type Part, type StepPart } from '../src/questions/compiled.ts';
import { leansOn } from '../src/questions/solve.ts';
import { SUBJECTS } from '../src/subjects.ts';
import { openBank, seedNumber } from './bank-files.ts';

const bank = openBank();
const practice = bank.filter(({ meta }) => meta.pool === 'practice');
const samples = bank.filter(({ meta }) => meta.pool === 'paper');
const slugs = (questions: readonly Compiled[]): string[] => questions.map(({ meta }) => meta.slug);

function countBySubject(questions: readonly Compiled[]): [subject: string, count: number][] {
  return Object.keys(SUBJECTS).map((subject) => [
    subject,
    questions.filter(({ meta }) => meta.subject === subject).length,
  ]);
}

const isOfStep = (part: Part): part is StepPart => part.kind === 'quantity' || part.kind === 'size';

/** Steps that are asked for, each with the asked ones before it that it leans on. */
function longestChain(question: Compiled): number {
  const asked = question.parts.filter(isOfStep).map(({ step }) => step);
  const lengths = new Map<string, number>();
  for (const step of asked) {
    const below = leansOn(question, [step]);
    const before = asked.filter((one) => one !== step && below.has(one));
    lengths.set(step, 1 + Math.max(0, ...before.map((one) => lengths.get(one) ?? 0)));
  }
  return Math.max(0, ...lengths.values());
}

/** Four parts or more, three of them steps that stand on one another. */
const isJob = (question: Compiled): boolean =>
  question.curve === null && question.parts.length >= 4 && longestChain(question) >= 3;

describe('the size of the bank', () => {
  it('is at least 130 practice questions, and at least eight in each of twelve subjects', () => {
    expect(practice.length).toBeGreaterThanOrEqual(130);
    expect(Object.keys(SUBJECTS)).toHaveLength(12);
    expect(countBySubject(practice).filter(([, count]) => count < 8)).toEqual([]);
  });

  it('is at least sixty samples of paper questions, at least five in each subject', () => {
    expect(samples.length).toBeGreaterThanOrEqual(60);
    expect(countBySubject(samples).filter(([, count]) => count < 5)).toEqual([]);
  });

  it('has three levels, each asked in practice and on papers', () => {
    for (const pool of [practice, samples]) {
      const levels = new Set(pool.map(({ meta }) => meta.level));
      expect(levels).toEqual(new Set(['recall', 'apply', 'reason']));
    }
  });

  it('has at least fifteen jobs in practice that run a chain of steps', () => {
    expect(practice.filter(isJob).length).toBeGreaterThanOrEqual(15);
  });

  it('has at least fifteen curves to read in practice', () => {
    const curves = practice.filter(({ curve }) => curve !== null);
    expect(curves.length).toBeGreaterThanOrEqual(15);
  });

  it('has every kind of asking', () => {
    const kinds = new Set(practice.flatMap(({ parts }) => parts.map(({ kind }) => kind)));
    expect(kinds).toEqual(new Set(['quantity', 'size', 'choice', 'choices', 'order', 'match']));
    expect(practice.filter(({ tables }) => tables.length > 0).length).toBeGreaterThanOrEqual(5);
  });
});

/** Wrong options that do not say why. */
function dumbOptions(options: readonly Option[]): Option[] {
  return options.filter(({ right, say }) => right !== true && (say ?? '').trim() === '');
}

function isDumb(part: Part): boolean {
  switch (part.kind) {
    case 'choice':
    case 'choices':
      return dumbOptions(part.options).length > 0;
    case 'order':
      return part.misplaced.length < 2;
    case 'match':
      return part.mixed.length < 2;
    default:
      return false;
  }
}

const isCalculation = (question: Compiled): boolean =>
  question.parts.some(
    (part) =>
      isOfStep(part) &&
      question.steps.some(({ name, how }) => name === part.step && how.kind === 'sum'),
  );

/** Sheets that touch a hazard: an arc, a fire, stored charge, gas, acid. */
const HAZARDOUS: readonly string[] = [
  'cl-heat-in-joint',
  'si-bleed-down',
  'si-spanner',
  'si-hydrogen-volume',
  'si-order-two-sources',
  'si-which-lead-first',
  'si-hydrogen',
  'si-lithium-dead-terminals',
  'si-breach-list',
  'pr-fault-current',
  'pr-interrupt',
  'pr-two-batteries',
  'pr-blown-again',
  'te-joint-drop',
  'te-solder',
  'te-stack',
  'ba-bank',
  'ba-freeze',
  'ba-lithium-cold',
  'cc-wrong-gel',
  'cc-li-cutoff',
  'da-override-time',
  'da-low-input',
  'so-cold-voc',
  'so-unregulated',
  'mf-order-no-charge',
];

describe('every sheet', () => {
  it('that asks for a calculation foresees at least two slips', () => {
    const bare = bank.filter((one) => isCalculation(one) && one.slips.length < 2);
    expect(slugs(bare)).toEqual([]);
  });

  it('says of every wrong choice why it is wrong, and of a wrong order or pair what mends it', () => {
    const dumb = bank.filter(({ parts }) => parts.some(isDumb));
    expect(slugs(dumb)).toEqual([]);
  });

  it('names its sources, or says that it has none', () => {
    const said = /[\p{L}]{3}/u;
    const bare = bank.filter(
      ({ meta }) => meta.sources.length === 0 || !meta.sources.every((one) => said.test(one)),
    );
    expect(slugs(bare)).toEqual([]);
  });

  it('was checked by someone else than its author', () => {
    expect(slugs(bank.filter(({ meta }) => meta.checkedBy === meta.author))).toEqual([]);
  });

  it('carries its subject in its id, which no other has', () => {
    const stray = bank.filter(
      ({ meta }) => !meta.slug.startsWith(`${meta.subject.toLowerCase()}-`),
    );
    expect(slugs(stray)).toEqual([]);
    expect(new Set(slugs(bank)).size).toBe(bank.length);
  });

  it('that touches a hazard carries its caution', () => {
    const known = new Set(slugs(bank));
    expect(HAZARDOUS.filter((slug) => !known.has(slug))).toEqual([]);
    const open = bank.filter(
      ({ meta, cautions }) => HAZARDOUS.includes(meta.slug) && cautions.length === 0,
    );
    expect(slugs(open)).toEqual([]);
  });

  it('about safe isolation carries a caution', () => {
    const open = bank.filter(
      ({ meta, cautions }) => meta.subject === 'SI' && cautions.length === 0,
    );
    expect(slugs(open)).toEqual([]);
  });
});

/** A paper of the whole course: thirty questions, by how often the work asks for each subject. */
const WEIGHTS: Readonly<Record<string, number>> = {
  CL: 2,
  SI: 3,
  CO: 2,
  VD: 2,
  RD: 2,
  PR: 3,
  TE: 3,
  BA: 2,
  CC: 2,
  DA: 3,
  SO: 2,
  MF: 4,
};

describe('papers of the whole course', () => {
  const pool = samples.map(({ meta }) => ({ slug: meta.slug, subject: meta.subject }));
  const questions = Object.entries(WEIGHTS).map(([subject, count]) => ({ subject, count }));
  const blueprint = { slug: 'whole-course', questions } as Blueprint;
  const subjectOf = new Map(pool.map(({ slug, subject }) => [slug, subject]));

  it('can be assembled from the samples, thirty questions of all twelve subjects', () => {
    const paper = assemblePaper(blueprint, pool, seedNumber(1));
    expect(paper).toHaveLength(30);
    for (const { subject, count } of questions) {
      expect(paper.filter((slug) => subjectOf.get(slug) === subject)).toHaveLength(count);
    }
  });

  it('are several: twenty seeds give twenty papers, and no two share nine tenths', () => {
    const papers = Array.from({ length: 20 }, (_, at) =>
      assemblePaper(blueprint, pool, seedNumber(at)),
    );
    const kinds = new Set(papers.map((paper) => [...paper].sort().join()));
    expect(kinds.size).toBe(20);
    const shared = papers.flatMap((paper, at) =>
      papers.slice(at + 1).map((other) => paper.filter((slug) => other.includes(slug)).length),
    );
    expect(Math.max(...shared)).toBeLessThan(27);
  });

  it('between them ask every sample', () => {
    const asked = new Set(
      Array.from({ length: 60 }, (_, at) => assemblePaper(blueprint, pool, seedNumber(at))).flat(),
    );
    expect(pool.filter(({ slug }) => !asked.has(slug))).toEqual([]);
  });
});
