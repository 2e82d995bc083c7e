import { execFileSync } from 'node:child_process';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { COPPER_OHM_MM2_PER_M, ohmsPerKmOfArea } from './conductors.ts';
import {
  circularMilsToMm2,
  gaugeAreaMm2,
  gaugeCircularMils,
  gaugeDiameterMm,
  gaugeName,
  gaugeNumber,
  mm2ToCircularMils,
  STOCK_GAUGES,
} from './gauge.ts';

/** GNU units, the general-purpose converter, whose data file has its own wire gauge. */
function askUnits(have: string, want: string): number {
  return Number(execFileSync('units', ['-t', '-o', '%.15g', have, want], { encoding: 'utf8' }));
}

describe('wire gauge', () => {
  it.each([40, 36, 30, 24, 20, 18, ...STOCK_GAUGES])('has GNU units’ copper at number %d', (n) => {
    expect(gaugeDiameterMm(n) / askUnits(`awg(${n})`, 'mm')).toBeCloseTo(1, 12);
    expect(gaugeCircularMils(n) / askUnits(`awg(${n})^2 pi/4`, 'circularmil')).toBeCloseTo(1, 12);
    expect(gaugeAreaMm2(n) / askUnits(`awg(${n})^2 pi/4`, 'mm^2')).toBeCloseTo(1, 12);
  });

  it.each(readTable('awg-geometry.csv'))('has the tabled copper at $awg', (row) => {
    const number = gaugeNumber(row.awg ?? '');
    expect(number).toBe(numberIn(row, 'number'));
    const ohmsPerKm = ohmsPerKmOfArea(gaugeAreaMm2(number), COPPER_OHM_MM2_PER_M);
    const found = {
      diameter_mm: gaugeDiameterMm(number),
      diameter_in: gaugeDiameterMm(number) / 25.4,
      area_mm2: gaugeAreaMm2(number),
      circular_mil: gaugeCircularMils(number),
      ohm_per_km: ohmsPerKm,
      ohm_per_1000ft: ohmsPerKm * 0.3048,
    };
    for (const [column, value] of Object.entries(found)) {
      // The table has nine figures.
      expect(Math.abs(value / numberIn(row, column) - 1), column).toBeLessThan(1e-8);
    }
  });

  it.each(readTable('awg-textbook.csv'))('agrees with the textbook at $awg, rounded', (row) => {
    const number = gaugeNumber(row.awg ?? '');
    const off = (printed: number, exact: number): number => 100 * (printed / exact - 1);
    const inches = gaugeDiameterMm(number) / 25.4;
    const diameter = off(numberIn(row, 'diameter_in'), inches);
    const area = off(numberIn(row, 'circular_mil'), gaugeCircularMils(number));
    // Signs as in the table: exact over printed.
    expect(-diameter).toBeCloseTo(numberIn(row, 'off_diameter_percent'), 3);
    expect(-area).toBeCloseTo(numberIn(row, 'off_area_percent'), 3);
    expect(Math.abs(area)).toBeLessThan(0.046);
  });

  it('writes 1/0 as number 0 and 4/0 as −3, never as a division', () => {
    expect(['1/0', '2/0', '3/0', '4/0', '10'].map(gaugeNumber)).toEqual([0, -1, -2, -3, 10]);
    expect([0, -1, -2, -3, 10].map(gaugeName)).toEqual(['1/0', '2/0', '3/0', '4/0', '10']);
    expect(gaugeCircularMils(-3)).toBeCloseTo(211_600, 6);
    expect(gaugeCircularMils(0)).toBeCloseTo(105_534.5, 1);
    // Taken for a division, 4/0 would be infinite and 2/0 would not be 133 077.
    expect(() => gaugeDiameterMm(4 / 0)).toThrow('write 1/0 as 0, 2/0 as −1');
    expect(() => gaugeNumber('0/1')).toThrow('is no gauge');
    expect(() => gaugeNumber('41')).toThrow('is no gauge');
    expect(() => gaugeNumber('-1')).toThrow('is no gauge');
  });

  it('grows as its number falls, tenfold in area over ten, twice over three', () => {
    fc.assert(
      fc.property(fc.integer({ min: -3, max: 29 }), (n) => {
        expect(gaugeAreaMm2(n)).toBeGreaterThan(gaugeAreaMm2(n + 1));
        expect(gaugeAreaMm2(n) / gaugeAreaMm2(n + 10)).toBeCloseTo(92 ** (20 / 39), 9);
        expect(gaugeNumber(gaugeName(n))).toBe(n);
      }),
    );
  });

  it('goes from circular mils to mm² and back', () => {
    expect(circularMilsToMm2(1)).toBeCloseTo(5.0670748e-4, 11);
    expect(circularMilsToMm2(1) / askUnits('circularmil', 'mm^2')).toBeCloseTo(1, 12);
    fc.assert(
      fc.property(fc.double({ min: 1, max: 1e6, noNaN: true }), (mils) => {
        expect(mm2ToCircularMils(circularMilsToMm2(mils)) / mils).toBeCloseTo(1, 12);
      }),
    );
  });
});
