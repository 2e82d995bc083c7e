import { describe, expect, it } from 'vitest';
import { solve } from '../src/questions/solve.ts';
import { fromSi, toSi } from '../src/questions/units.ts';
import { openSheetNamed } from './bank-files.ts';
import { numberIn, readTable } from './reference/read-table.ts';

/**
 * Whole questions worked on one set of figures, against results from outside the library.
 * Given values in their own units; results in the unit of their step.
 */
interface Case {
  slug: string;
  source: string;
  given: Record<string, number>;
  results: Record<string, number>;
}

const CASES: Case[] = [
  {
    slug: 'vd-chart-table',
    source: 'worked by hand: 0.0175 × 11 ÷ 4 = 48.1 mΩ, × 14 A = 0.674 V, 5.3 %, 7.0 mm², so 10',
    given: { load: 14, run: 5.5, area: 4 },
    results: { pair: 48.125, fall: 0.67375, share: 5.263672, need: 7.01823, size: 10 },
  },
  {
    slug: 'vd-table-decides',
    source: 'test/reference/voltage-drop-cases.csv, first case: area says 10 mm², the table 16',
    given: { load: 20, run: 5 },
    results: { limit: 0.36, need: 9.57778, first: 10, firstFall: 0.382, size: 16, fall: 0.242 },
  },
  {
    slug: 'vd-measured-joint',
    // A 0.150 Ω joint in 5 m of 6 mm²: 9.175627 A, 1.527742 V along the return.
    source: 'circuit simulator ngspice 39.3, operating point, run outside this project',
    given: { load: 9.17562724, reading: 1.527741935, area: 6, run: 5 },
    results: { joint: 1.376344086, jointOhms: 150, heat: 12.62882029 },
  },
  {
    slug: 'mf-reconcile',
    // 30 A charger, 16.0457 A through the shunt, 2.4 A past it.
    source: 'circuit simulator ngspice 39.3, operating point, run outside this project',
    given: { charger: 30, monitor: 16.04570288, clamped: 10.7, bypass: 2.4 },
    results: { loads: 13.95429712, unseen: 3.25429712, battery: 13.64570288 },
  },
  {
    slug: 'si-bleed-down',
    source: 'closed form by hand: 22 s × ln 12.8 = 56.09 s',
    given: { capacitor: 10, bleed: 2.2, start: 12.8 },
    results: { constant: 22, wait: 56.0879 },
  },
  {
    slug: 'rd-chain',
    source: 'tables of 33 CFR 183.425 and BS 7671 4C1 by hand: 80 × 0.8563 × 0.70',
    given: { area: 10, ambient: 50, circuits: 3, load: 45 },
    results: { rated: 80, heat: 0.856349, bunch: 0.7, carries: 47.95554, spare: 2.95554 },
  },
  {
    slug: 'rd-engine-space',
    source: '33 CFR 183.425 table 5 and note 1 by hand: 80 × 0.85',
    given: { area: 10, jacket: 105 },
    results: { rated: 80, factor: 0.85, carries: 68 },
  },
  {
    slug: 'rd-roof-void',
    source: 'formula by hand: √(40/60) = 0.8165, × 55 A',
    given: { jacket: 90, ambient: 50, rated: 55 },
    results: { factor: 0.8164966, carries: 44.90731 },
  },
  {
    slug: 'vd-deck-lamps',
    source: 'by hand: 2 × 2 m × 7.98 mΩ/m = 31.92 mΩ, and 3 + 2 + 1 times 2 A of it',
    given: { lamp: 2, section: 2, area: 2.5 },
    results: { pair: 31.92, first: 0.19152, last: 0.06384, total: 0.38304 },
  },
  {
    slug: 'vd-charger-feed',
    source: 'quadratic solved by hand for 626.087 W behind 12.1 mΩ at 13.9 V',
    given: { output: 576, source: 13.9, area: 16, run: 5 },
    results: { input: 626.087, pair: 12.1, current: 46.9619, fall: 0.568239 },
  },
  {
    slug: 'vd-winch-pump',
    source:
      'house table and class 5 table by hand: 28 ÷ 0.68 = 41.2 A, so 4 mm²; 0.36 V, so 16 mm²',
    given: { load: 28, run: 3.5, allowed: 3, factor: 0.68 },
    results: { forCurrent: 4, limit: 0.36, forDrop: 16, size: 16 },
  },
];

/** Every step of a case, in the step's own unit. */
function workCase({ slug, given }: Case): Map<string, number> {
  const question = openSheetNamed(slug);
  const known = new Map<string, number>();
  for (const { name, unit, source } of question.givens) {
    const figure = given[name] ?? (source.kind === 'value' ? source.figure : NaN);
    expect(figure, `${slug} needs ${name}`).not.toBeNaN();
    known.set(name, toSi(figure, unit));
  }
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
      expect(Math.abs(found / expected - 1), `${name}: ${found}`).toBeLessThan(5e-6);
    }
  });

  it.each(readTable('trade-facts.csv').filter(({ slug }) => slug !== ''))('$fact', (row) => {
    const one = CASES.find(({ slug }) => slug === row.slug);
    if (!one) throw new Error(`No case ${row.slug}.`);
    const found = workCase(one).get(row.step ?? '') ?? NaN;
    expect(Math.abs(found / numberIn(row, 'value') - 1)).toBeLessThan(1e-4);
  });
});
