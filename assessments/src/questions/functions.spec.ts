import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { OutOfRange } from '../electrical/out-of-range.ts';
import { type PracticeName, PROFILES } from '../electrical/practice-profile.ts';
import { CONDUCTOR_FUNCTIONS } from './functions-conductors.ts';
import { PROTECTION_FUNCTIONS } from './functions-protection.ts';
import { RATING_FUNCTIONS } from './functions-rating.ts';
import { FUNCTIONS } from './functions.ts';

const CELSIUS = 273.15;
const MM2 = 1e-6;

/** What a sheet's function gives for SI arguments under a practice. */
function call(name: string, si: number[], practice: PracticeName = 'metric'): number {
  const called = FUNCTIONS.get(name);
  if (!called) throw new Error(`No function ${name}.`);
  expect(si.length).toBeGreaterThanOrEqual(called.arity[0]);
  expect(si.length).toBeLessThanOrEqual(called.arity[1]);
  return called.run(si, PROFILES[practice]);
}

describe('functions of a sheet', () => {
  it.each([
    // IEC 60228 (from memory), Ω/km of 6 mm² as Ω/m.
    ['tableOhms', [6 * MM2], 0.0033],
    ['classTwoOhms', [6 * MM2], 0.00308],
    ['tinnedOhms', [6 * MM2], 0.00339],
    ['heatFactor', [60 + CELSIUS], 1.1572],
    // ASTM B258 by GNU units: 10 AWG and 4/0.
    ['gaugeArea', [10], 5.26115496 * MM2],
    ['gaugeArea', [-3], 107.219303 * MM2],
    ['gaugeDiameter', [10], 0.00258818673],
    ['nextGauge', [6 * MM2], 8],
    // NEC chapter 9 table 8 (second-hand copy): 1.24 Ω per 1000 ft.
    ['gaugeOhms', [10], 1.24 / 304.8],
    ['nextCable', [9.579 * MM2], 10 * MM2],
    ['prevCable', [10 * MM2], 6 * MM2],
    ['cableForDrop', [20, 5, 0.36], 16 * MM2],
    ['rating', [10 * MM2, 105 + CELSIUS], 80],
    ['prevJacket', [105 + CELSIUS], 90 + CELSIUS],
    ['cableForCurrent', [42, 105 + CELSIUS, 0.6], 10 * MM2],
    ['ambientFactor', [75 + CELSIUS, 43 + CELSIUS], Math.sqrt(32 / 45)],
    ['ambientBin', [75 + CELSIUS, 43 + CELSIUS], 0.82],
    ['groupingFactor', [4], 0.65],
    ['conductorsFactor', [8], 0.7],
    ['engineFactor', [105 + CELSIUS], 0.85],
    ['nextFuse', [37.5], 40],
    ['prevFuse', [38], 35],
    ['nextBlade', [8], 10],
    ['nextBolt', [8], 30],
    ['nextOf', [1.3, 4, 1, 2.5], 2.5],
    ['prevOf', [3, 4, 1, 2.5], 2.5],
    ['exp', [1], Math.E],
    ['ln', [Math.E], 1],
  ] as [string, number[], number][])('%s of %j is %d in metric practice', (name, si, expected) => {
    expect(call(name, si) / expected).toBeCloseTo(1, 8);
  });

  it.each([
    // 33 CFR 183.425 table 5 (second-hand copy): 10 AWG at 105 °C, and 80 °C has its own column.
    ['rating', [5.26115496 * MM2, 105 + CELSIUS], 60],
    ['rating', [6 * MM2, 105 + CELSIUS], 60],
    ['prevJacket', [90 + CELSIUS], 80 + CELSIUS],
    ['engineFactor', [80 + CELSIUS], 0.78],
    ['ambientFactor', [75 + CELSIUS, 43 + CELSIUS], 0.82],
    ['ambientFactor', [105 + CELSIUS, 50 + CELSIUS], Math.sqrt(55 / 75)],
    // 8 AWG is the next from 6 mm², 10 AWG the one under it.
    ['nextCable', [6 * MM2], 8.36556406008 * MM2],
    ['prevCable', [8.36556406008 * MM2], 5.26115496 * MM2],
    ['cableForCurrent', [42, 105 + CELSIUS, 0.6], 8.36556406008 * MM2],
    // 2 × 5 m × 20 A: 6 AWG at 75 °C loses 0.322 V, 8 AWG 0.511 V.
    ['cableForDrop', [20, 5, 0.36], 13.3017679 * MM2],
  ] as [string, number[], number][])('%s of %j is %d in AWG practice', (name, si, expected) => {
    expect(call(name, si, 'awg') / expected).toBeCloseTo(1, 7);
  });

  it('count 1/0 as nought', () => {
    expect(call('nextGauge', [53.475 * MM2])).toBe(0);
    expect(call('gaugeArea', [0]) / MM2).toBeCloseTo(53.4751207, 5);
  });

  it('find a size again from what another of them gave', () => {
    for (const practice of ['metric', 'awg'] as const) {
      const area = call('nextCable', [7.3 * MM2], practice);
      expect(call('nextCable', [area], practice)).toBe(area);
      expect(call('prevCable', [area], practice)).toBeLessThan(area);
      expect(call('rating', [area, call('prevJacket', [90 + CELSIUS], practice)], practice)).toBe(
        practice === 'metric' ? 65 : 70,
      );
    }
  });

  it('refuse what no table holds, by name', () => {
    expect(() => call('rating', [8 * MM2, 105 + CELSIUS])).toThrow('No rating for 8 mm²');
    expect(() => call('gaugeArea', [2.5])).toThrow('write 1/0 as 0');
    expect(() => call('prevCable', [1.5 * MM2])).toThrow('the series starts at 1.5');
    expect(() => call('nextOf', [9, 1, 2])).toThrow('the series ends at 2');
  });

  it.each(
    [...CONDUCTOR_FUNCTIONS, ...RATING_FUNCTIONS, ...PROTECTION_FUNCTIONS].map(([name]) => name),
  )('%s gives a finite figure or says what is out of range', (name) => {
    const [least = 1] = FUNCTIONS.get(name)?.arity ?? [];
    const figure = fc.oneof(
      fc.double({ min: -50, max: 1000 }),
      fc.double({ min: 0, max: 2e-4 }),
      fc.constantFrom(...[-3, 0, 1, 10, 105].map((celsius) => celsius + CELSIUS)),
      fc.constantFrom(1.5, 10, 120, 8.36556406008).map((areaMm2) => areaMm2 * MM2),
      fc.integer({ min: -4, max: 42 }),
      fc.constantFrom(NaN, Infinity, -Infinity),
    );
    fc.assert(
      fc.property(
        fc.array(figure, { minLength: least, maxLength: least }),
        fc.constantFrom<PracticeName>('metric', 'awg'),
        (si, practice) => {
          try {
            expect(Number.isFinite(call(name, si, practice))).toBe(true);
          } catch (error) {
            expect(error).toBeInstanceOf(OutOfRange);
          }
        },
      ),
      { numRuns: 300 },
    );
  });
});
