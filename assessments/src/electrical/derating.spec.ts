import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { ambientBin, ambientFactor, ambientFactorIn } from './ambient.ts';
import { engineSpaceFactor } from './ampacity.ts';
import { conductorsFactor, groupingFactor, smallCraftBundleFactor } from './grouping.ts';
import { PROFILES } from './practice-profile.ts';

describe('ambient factor', () => {
  const bins = readTable('ambient-bins.csv');

  it.each(bins)('is the printed one up to $upper_C °C', (row) => {
    const upperC = numberIn(row, 'upper_C');
    for (const jacketC of [60, 75, 90]) {
      const printed = numberIn(row, `jacket_${jacketC}`);
      if (Number.isNaN(printed)) {
        expect(() => ambientBin(jacketC, upperC)).toThrow('choose another route');
        continue;
      }
      expect(ambientBin(jacketC, upperC)).toBe(printed);
      expect(ambientBin(jacketC, upperC - 4)).toBe(printed);
      const formula = ambientFactor(jacketC, upperC);
      expect(formula).toBeCloseTo(numberIn(row, `formula_${jacketC}`), 4);
      expect(Math.abs(formula - printed)).toBeLessThan(0.005);
    }
  });

  it('is .82 by the bin and .8433 by the formula for a 75 °C wire at 43 °C', () => {
    expect(ambientBin(75, 43)).toBe(0.82);
    expect(ambientFactor(75, 43)).toBeCloseTo(0.8433, 4);
    const at = { jacketC: 75, ambientC: 43 };
    expect(ambientFactorIn(PROFILES.awg, at)).toBe(0.82);
    expect(ambientFactorIn(PROFILES.metric, at)).toBeCloseTo(0.8433, 4);
  });

  it('falls back on the formula where the bins have no such jacket', () => {
    const at = { jacketC: 105, ambientC: 50 };
    expect(ambientFactorIn(PROFILES.awg, at)).toBe(ambientFactor(105, 50));
    expect(() => ambientBin(105, 50)).toThrow('the table has 60, 75, 90 °C: use the formula');
  });

  it('reproduces the international table to 0.005', () => {
    // IEC 60364-5-52 table B.52.14 (from memory): 70 °C and 90 °C, from 35 to 60 °C.
    const printed: [number, number[]][] = [
      [70, [0.94, 0.87, 0.79, 0.71, 0.61, 0.5]],
      [90, [0.96, 0.91, 0.87, 0.82, 0.76, 0.71]],
    ];
    for (const [jacketC, factors] of printed) {
      factors.forEach((factor, index) => {
        expect(Math.abs(ambientFactor(jacketC, 35 + 5 * index) - factor)).toBeLessThan(0.0056);
      });
    }
  });

  it('falls as the air warms, is 1 at 30 °C, and the bin is never kinder inside its 5 K', () => {
    const jacket = fc.constantFrom(60, 75, 90);
    const air = fc.double({ min: 0, max: 54.9, noNaN: true });
    fc.assert(
      fc.property(jacket, air, air, (jacketC, one, other) => {
        const [cool, warm] = [Math.min(one, other), Math.max(one, other)];
        expect(ambientFactor(jacketC, warm)).toBeLessThanOrEqual(ambientFactor(jacketC, cool));
        expect(ambientBin(jacketC, warm)).toBeLessThanOrEqual(ambientBin(jacketC, cool));
        // Printed figures are rounded to the hundredth.
        expect(ambientBin(jacketC, warm)).toBeLessThan(ambientFactor(jacketC, warm) + 0.005);
        expect(ambientFactor(jacketC, 30)).toBe(1);
      }),
    );
  });

  it('refuses air in which a cable carries nothing', () => {
    expect(() => ambientFactor(75, 75)).toThrow('carries nothing');
    expect(() => ambientFactor(40, 30)).toThrow('read it off the cable');
    expect(() => ambientBin(90, 86)).toThrow('the table ends there');
  });
});

describe('grouping', () => {
  it.each(readTable('grouping-4c1.csv'))('of $circuits circuits is as tabled', (row) => {
    const circuits = numberIn(row, 'circuits');
    const lies = ['bunched', 'layer on wall', 'layer on tray', 'layer on ladder'] as const;
    for (const lie of lies) expect(groupingFactor(circuits, lie)).toBe(numberIn(row, lie));
    expect(groupingFactor(circuits)).toBe(numberIn(row, 'bunched'));
  });

  it.each(readTable('more-than-three.csv'))(
    'of $least to $most conductors is $percent %',
    (row) => {
      const factor = numberIn(row, 'percent') / 100;
      const [least, most] = [numberIn(row, 'least'), row.most === '' ? 500 : numberIn(row, 'most')];
      expect([least, most].map(conductorsFactor)).toEqual([factor, factor]);
    },
  );

  it.each(readTable('bundle-note-2.csv'))('of $least conductors binds only from 50 V', (row) => {
    const [least, most] = [numberIn(row, 'least'), row.most === '' ? 90 : numberIn(row, 'most')];
    for (const conductors of [least, most]) {
      expect(smallCraftBundleFactor(conductors, 50)).toBe(numberIn(row, 'factor'));
      for (const volts of [12, 24, 48, 49.9]) {
        expect(smallCraftBundleFactor(conductors, volts)).toBe(1);
      }
    }
  });

  it('leaves three conductors alone and refuses part of one', () => {
    expect([1, 2, 3].map(conductorsFactor)).toEqual([1, 1, 1]);
    expect([1, 2].map((n) => smallCraftBundleFactor(n, 60))).toEqual([1, 1]);
    for (const wrong of [0, -1, 2.5, NaN]) {
      expect(() => conductorsFactor(wrong)).toThrow('count those that carry the load');
    }
    expect(() => groupingFactor(10)).toThrow('Table 4C1 has no row for 10 circuits');
  });
});

describe('engine space', () => {
  it.each(readTable('engine-space.csv'))('leaves $factor of a $jacket_C °C jacket', (row) => {
    const jacketC = numberIn(row, 'jacket_C');
    const factor = numberIn(row, 'factor');
    expect(engineSpaceFactor(jacketC, PROFILES.awg)).toBe(factor);
    expect(ambientFactor(jacketC, 50)).toBeCloseTo(numberIn(row, 'formula'), 4);
    // The rule and the square root agree but for 200 °C, which the rule leaves whole.
    if (jacketC === 200) expect(factor).toBe(1);
    else expect(Math.abs(ambientFactor(jacketC, 50) - factor)).toBeLessThan(0.007);
  });

  it('has the house table’s jackets in metric practice', () => {
    expect([60, 75, 90, 105].map((c) => engineSpaceFactor(c))).toEqual([0.58, 0.75, 0.82, 0.85]);
    expect(() => engineSpaceFactor(80)).toThrow('use one of 60, 75, 90, 105');
  });
});
