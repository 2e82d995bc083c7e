import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { openBank, seedNumber } from '../../test/bank-files.ts';
import { SheetInvalid } from '../sheets/errors.ts';
import { assemblePaper } from './assemble.ts';
import { parseBlueprint } from './blueprint.ts';
import { PoolTooSmall } from './pool-too-small.ts';

const SOURCE = readFileSync(new URL('../../papers/final-paper.md', import.meta.url), 'utf8');
const blueprint = parseBlueprint(SOURCE, 'papers/final-paper.md');
const pool = openBank()
  .filter(({ meta }) => meta.pool === 'paper')
  .map(({ meta }) => ({ slug: meta.slug, subject: meta.subject }));

describe('the final paper', () => {
  it('says what it asks, how it is sat and what it leads to', () => {
    expect(blueprint).toMatchObject({
      slug: 'final-paper',
      number: 'F1',
      course: 'hq-dc2',
      minutes: 60,
      passPercent: 70,
      waitDays: 14,
      sat: 'unsupervised, on the candidate’s own device',
      questions: [
        { subject: 'VD', count: 2 },
        { subject: 'RD', count: 2 },
        { subject: 'CC', count: 2 },
      ],
      scheme: {
        slug: 'auxiliary-dc-installer',
        revision: 'A',
        validYears: 3,
        zone: 'Europe/London',
      },
    });
    expect(blueprint.agreement).toContain('The work is my own.');
    expect(blueprint.appeal).toContain('ten working days');
    expect(blueprint.scheme.limits[0]).toContain('No practical work was assessed');
  });

  it('is assembled from the sample questions, each once, in the order of its subjects', () => {
    const slugs = assemblePaper(blueprint, pool, seedNumber(1));
    const subjects = slugs.map((slug) => pool.find((one) => one.slug === slug)?.subject);
    expect(subjects).toEqual(['VD', 'VD', 'RD', 'RD', 'CC', 'CC']);
    expect(new Set(slugs).size).toBe(6);
  });

  it('is the same for the same seed in whatever order the pool comes, and differs by seed', () => {
    const again = assemblePaper(blueprint, pool.toReversed(), seedNumber(1));
    expect(again).toEqual(assemblePaper(blueprint, pool, seedNumber(1)));
    const papers = Array.from({ length: 60 }, (_, n) =>
      assemblePaper(blueprint, pool, seedNumber(n)).join(),
    );
    expect(new Set(papers).size).toBeGreaterThan(30);
    const asked = blueprint.questions.map(({ subject }) => subject);
    for (const { slug } of pool.filter(({ subject }) => asked.includes(subject))) {
      expect(
        papers.some((one) => one.split(',').includes(slug)),
        slug,
      ).toBe(true);
    }
  });

  it('names every subject the pool is short of', () => {
    const few = pool.filter(({ subject }) => subject !== 'RD').slice(1);
    try {
      assemblePaper(blueprint, few, seedNumber(1));
      throw new Error('was assembled');
    } catch (error) {
      expect(error).toBeInstanceOf(PoolTooSmall);
      expect((error as PoolTooSmall).shortages).toContainEqual({
        subject: 'RD',
        wanted: 2,
        available: 0,
      });
    }
  });

  it.each([
    ['zone: Europe/London', 'zone: Europe/Londom', 'a time zone is named like'],
    ['pass mark: 70', 'pass mark: 170', 'pass mark'],
    ['subject: RD', 'subject: VD', 'a subject is named once'],
    ['subject: RD', 'subject: ZZ', 'subject'],
    ['minutes: 60', 'minute: 60', 'minutes'],
  ])('refuses %j as %j', (from, to, message) => {
    expect(() => parseBlueprint(SOURCE.replace(from, to), 'papers/x.md')).toThrow(message);
    expect(() => parseBlueprint(SOURCE.replace(from, to), 'papers/x.md')).toThrow(SheetInvalid);
  });

  it('refuses to go without an agreement', () => {
    const bare = SOURCE.slice(0, SOURCE.indexOf('\n---\n', 4) + 5);
    expect(() => parseBlueprint(bare, 'papers/x.md')).toThrow('The agreement is missing');
  });
});
