import { readdirSync } from 'node:fs';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { type Compiled } from '../src/questions/compiled.ts';
import { solve } from '../src/questions/solve.ts';
import { fromSi, toSi } from '../src/questions/units.ts';
import { openBank, openSheetNamed } from './bank-files.ts';
import { numberIn, readTable } from './reference/read-table.ts';
import { type Case } from './worked-cases/case.ts';

const FOLDER = fileURLToPath(new URL('./worked-cases/', import.meta.url));

/** Every list of cases that a file of the folder exports. */
async function readCases(): Promise<Case[]> {
  const files = readdirSync(FOLDER).filter((file) => file.endsWith('.ts') && file !== 'case.ts');
  const modules = await Promise.all(
    files.map((file) => import(`./worked-cases/${file}`) as Promise<Record<string, Case[]>>),
  );
  return modules.flatMap((one) => Object.values(one).flat());
}

const CASES = await readCases();

/** Every step of a case, in the step's own unit. */
function workCase({ slug, given }: Case): Map<string, number> {
  const question = openSheetNamed(slug);
  const known = new Map<string, number>();
  for (const { name, unit, source } of question.givens) {
    const figure = given[name] ?? (source.kind === 'value' ? source.figure : NaN);
    expect(figure, `${slug} needs ${name}`).not.toBeNaN();
    known.set(name, toSi(figure, unit));
  }
  for (const { name, unit, how } of question.steps) {
    const figure = given[name];
    if (how.kind === 'read' && figure !== undefined) known.set(name, toSi(figure, unit));
  }
  for (const name of Object.keys(given)) expect(known.has(name), `${slug} has ${name}`).toBe(true);
  const values = solve(question, known);
  return new Map(
    question.steps.map(({ name, unit }) => [name, fromSi(values.get(name) ?? NaN, unit)]),
  );
}

describe('questions against results from outside', () => {
  it.each(CASES)('$slug: $source', (one) => {
    const values = workCase(one);
    for (const [name, expected] of Object.entries(one.results)) {
      const found = values.get(name) ?? NaN;
      const off = Math.abs(found - expected);
      expect(off, `${name}: ${found}`).toBeLessThanOrEqual(5e-6 * Math.abs(expected) + 1e-12);
    }
  });

  it.each(readTable('trade-facts.csv').filter(({ slug }) => slug !== ''))('$fact', (row) => {
    const one = CASES.find(({ slug }) => slug === row.slug);
    if (!one) throw new Error(`No case ${row.slug}.`);
    const found = workCase(one).get(row.step ?? '') ?? NaN;
    expect(Math.abs(found / numberIn(row, 'value') - 1)).toBeLessThan(1e-4);
  });
});

/** Whether anything in a question is worked out, other than read off its curve. */
function isCalculation({ steps, parts }: Compiled): boolean {
  return parts.some(
    (part) =>
      'step' in part && steps.some(({ name, how }) => name === part.step && how.kind !== 'read'),
  );
}

describe('the cases', () => {
  it('say where each result comes from, once a question', () => {
    const slugs = CASES.map(({ slug }) => slug);
    expect(slugs.filter((slug, index) => slugs.indexOf(slug) !== index)).toEqual([]);
    for (const { slug, source } of CASES) expect(source.length, slug).toBeGreaterThan(20);
  });

  it('leave no calculation out', () => {
    const cases = new Set(CASES.map(({ slug }) => slug));
    const without = openBank()
      .filter((question) => isCalculation(question) && !cases.has(question.meta.slug))
      .map(({ meta }) => meta.slug);
    expect(without).toEqual([]);
  });
});
