import { describe, expect, it } from 'vitest';
import { ambientFactor } from '../src/electrical/ambient.ts';
import { engineSpaceFactor, sizeForCurrent } from '../src/electrical/ampacity.ts';
import {
  classFiveOhmsPerKm,
  COPPER_OHM_MM2_PER_M,
  resistanceAt,
} from '../src/electrical/conductors.ts';
import { groupingFactor } from '../src/electrical/grouping.ts';
import { OutOfRange } from '../src/electrical/out-of-range.ts';
import { ratingAmps } from '../src/electrical/rating-table.ts';
import { CABLE_AREAS_MM2, FUSE_RATINGS_A, nextSize } from '../src/electrical/stock.ts';
import { areaForDrop, dropAlong, sizeForDrop } from '../src/electrical/voltage-drop.ts';
import { numberIn, readTable } from './reference/read-table.ts';

const KM_PER_FT = 0.0003048;

describe('conductors', () => {
  it.each(readTable('iec60228-class-5.csv'))('resists $ohm_per_km Ω/km at $area_mm2 mm²', (row) => {
    const ohmsPerKm = classFiveOhmsPerKm(numberIn(row, 'area_mm2'));
    expect(ohmsPerKm).toBe(numberIn(row, 'ohm_per_km'));
    // Strands, lay and air: 10 to 16 % over solid annealed copper of the same area.
    const ratio = (ohmsPerKm * numberIn(row, 'area_mm2')) / (1000 * COPPER_OHM_MM2_PER_M);
    expect(ratio).toBeCloseTo(numberIn(row, 'ratio'), 3);
    expect(ratio).toBeGreaterThan(1.1);
    expect(ratio).toBeLessThan(1.16);
  });

  it.each(readTable('copper-temperature.csv'))('carries copper to $celsius °C', (row) => {
    const factor = resistanceAt(1, numberIn(row, 'celsius'));
    expect(factor).toBeCloseTo(numberIn(row, 'by_coefficient'), 6);
    expect(Math.abs(factor / numberIn(row, 'by_zero_resistance') - 1)).toBeLessThan(2e-4);
    const cable = resistanceAt(classFiveOhmsPerKm(6), numberIn(row, 'celsius'));
    expect(cable).toBeCloseTo(numberIn(row, 'class5_6mm2_ohm_per_km'), 5);
  });

  it('names the value, the rule and the remedy for a size that is not made', () => {
    expect(() => classFiveOhmsPerKm(2.7)).toThrow(
      'Cable area 2.7 mm² is not a stock size; use one of 0.5, 0.75, 1, 1.5, 2.5, 4,',
    );
    expect(() => resistanceAt(1, 400)).toThrow(OutOfRange);
  });
});

describe('voltage drop', () => {
  it.each(readTable('voltage-drop-cases.csv'))(
    'sizes $amps A over $one_way_m m within $allowed_V V',
    (row) => {
      const [amps, lengthM, limitV] = ['amps', 'one_way_m', 'allowed_V'].map((c) =>
        numberIn(row, c),
      );
      if (amps === undefined || lengthM === undefined || limitV === undefined)
        throw new Error('row');
      const run = { amps, lengthM, limitV };
      const area = areaForDrop({ ...run, ohmMm2PerM: COPPER_OHM_MM2_PER_M });
      expect(area).toBeCloseTo(numberIn(row, 'area_mm2'), 4);
      const byArea = numberIn(row, 'next_size_mm2');
      // The house keeps 1.5 mm² and up; one case of the table goes below it.
      if (byArea >= 1.5) expect(nextSize(area, CABLE_AREAS_MM2)).toBe(byArea);
      const drop = dropAlong({ amps, lengthM, ohmsPerKm: classFiveOhmsPerKm(byArea) });
      expect(drop).toBeCloseTo(numberIn(row, 'drop_of_that_V'), 5);
      const byTable = sizeForDrop(run);
      expect(byTable).toBe(numberIn(row, 'size_by_table_mm2'));
      const its = dropAlong({ amps, lengthM, ohmsPerKm: classFiveOhmsPerKm(byTable) });
      expect(its).toBeCloseTo(numberIn(row, 'its_drop_V'), 5);
      expect(its).toBeLessThanOrEqual(limitV);
    },
  );

  it.each(readTable('faa-voltage-drop.csv'))('agrees with the printed run of $run_ft ft', (row) => {
    const drop = dropAlong({
      amps: numberIn(row, 'amps'),
      lengthM: (numberIn(row, 'run_ft') * KM_PER_FT * 1000) / 2,
      ohmsPerKm: numberIn(row, 'ohm_per_ft') / KM_PER_FT,
    });
    expect(drop).toBeCloseTo(numberIn(row, 'recomputed_V'), 4);
    // The two printed errors are 2 % and 34 % out; every other line is its own product, rounded.
    const isMisprint = ['19.5', '88'].includes(row.run_ft ?? '');
    expect(Math.abs(drop / numberIn(row, 'printed_V') - 1) < 0.005).toBe(!isMisprint);
  });

  it('chooses No. 8 over No. 10 for 20 A over 50 ft with 1 V to lose', () => {
    // FAA AC 43.13-1B example 1, par. 11-66c, with table 11-9 resistances (second-hand copy).
    const drop = (ohmsPer1000Ft: number): number =>
      dropAlong({ amps: 20, lengthM: 25 * 0.3048, ohmsPerKm: ohmsPer1000Ft / 0.3048 });
    expect(drop(1.26)).toBeCloseTo(1.26, 6);
    expect(drop(0.7)).toBeCloseTo(0.7, 6);
  });

  it('refuses runs, currents and limits outside the trade', () => {
    expect(() => dropAlong({ lengthM: -1, ohmsPerKm: 3.3, amps: 5 })).toThrow(
      'One-way length -1 m is outside 0 to 1000 m; give the run in metres, one way.',
    );
    expect(() => sizeForDrop({ lengthM: 5, amps: 20, limitV: 0 })).toThrow('not above 0 V');
    expect(() => sizeForDrop({ lengthM: 200, amps: 200, limitV: 0.36 })).toThrow('No stock cable');
  });
});

describe('rating', () => {
  const gauges = readTable('cfr33-183-425.csv');
  /** Bare copper area of a gauge, mm²: ASTM B258 (formula from memory). */
  const areaOf = (awg: string): number => {
    const number = awg.endsWith('/0') ? 1 - Number(awg[0]) : Number(awg);
    return (Math.PI / 4) * (0.127 * 92 ** ((36 - number) / 39)) ** 2;
  };

  it.each(CABLE_AREAS_MM2)('reads %d mm² from the largest gauge that is not larger', (areaMm2) => {
    const row = gauges.findLast((gauge) => areaOf(gauge.awg ?? '') <= areaMm2 * 1.0001);
    for (const jacketC of [60, 75, 90, 105]) {
      expect(ratingAmps(areaMm2, jacketC)).toBe(numberIn(row ?? {}, `jacket_${jacketC}`));
    }
  });

  it.each(readTable('ambient-bins.csv'))('agrees with the printed bin up to $upper_C °C', (row) => {
    for (const jacketC of [60, 75, 90]) {
      const printed = numberIn(row, `jacket_${jacketC}`);
      if (Number.isNaN(printed)) continue;
      const formula = ambientFactor(jacketC, numberIn(row, 'upper_C'));
      expect(Math.abs(formula - printed)).toBeLessThan(0.005);
    }
  });

  it('is kinder inside a bin than its printed factor', () => {
    // 75 °C wire at 43 °C: the bin says 0.82, the formula 0.8433.
    expect(ambientFactor(75, 43)).toBeCloseTo(0.8433, 4);
  });

  it.each(readTable('grouping-4c1.csv'))('bunches $circuits circuits at $bunched', (row) => {
    expect(groupingFactor(numberIn(row, 'circuits'))).toBe(numberIn(row, 'bunched'));
  });

  it.each(readTable('engine-space.csv'))('takes $factor for a $jacket_C °C jacket', (row) => {
    const jacketC = numberIn(row, 'jacket_C');
    expect(engineSpaceFactor(jacketC)).toBe(numberIn(row, 'factor'));
    expect(Math.abs(ambientFactor(jacketC, 50) - engineSpaceFactor(jacketC))).toBeLessThan(0.007);
  });

  it('chooses the smallest size that still carries the current after its factors', () => {
    expect(sizeForCurrent({ amps: 42, jacketC: 105, factor: 0.6 })).toBe(10);
    expect(sizeForCurrent({ amps: 48, jacketC: 105, factor: 0.6 })).toBe(10);
    expect(sizeForCurrent({ amps: 48.1, jacketC: 105, factor: 0.6 })).toBe(16);
  });

  it('refuses what its tables do not hold', () => {
    expect(() => ratingAmps(8, 105)).toThrow('No rating for 8 mm² with a 105 °C jacket');
    expect(() => groupingFactor(10)).toThrow('Table 4C1 has no row for 10 circuits');
    expect(() => ambientFactor(75, 75)).toThrow('carries nothing');
    expect(() => engineSpaceFactor(80)).toThrow('use one of 60, 75, 90, 105');
    expect(() => sizeForCurrent({ amps: 900, jacketC: 60, factor: 0.5 })).toThrow('split the load');
  });
});

describe('stock', () => {
  it('has the blade and bolt-down fuses in one row', () => {
    const ratings = readTable('fuse-ratings.csv').flatMap(({ ratings: row }) =>
      (row ?? '').split(' ').map(Number),
    );
    expect(FUSE_RATINGS_A).toEqual([...new Set(ratings)].sort((a, b) => a - b));
  });

  it.each(readTable('fuse-choice.csv'))('fuses a continuous $load_A A at $next_A A', (row) => {
    const least = numberIn(row, 'load_A') / 0.8;
    expect(least).toBeCloseTo(numberIn(row, 'over_0_8_A'), 9);
    expect(nextSize(least, FUSE_RATINGS_A)).toBe(numberIn(row, 'next_A'));
  });

  it('goes up to the next size and stays on one that fits', () => {
    expect(nextSize(7.02, CABLE_AREAS_MM2)).toBe(10);
    expect(nextSize(10, CABLE_AREAS_MM2)).toBe(10);
    expect(nextSize(10 + 1e-12, CABLE_AREAS_MM2)).toBe(10);
    expect(nextSize(12.5, FUSE_RATINGS_A)).toBe(15);
  });

  it('has nothing for more than the largest or less than something', () => {
    expect(() => nextSize(121, CABLE_AREAS_MM2)).toThrow('the series ends at 120');
    expect(() => nextSize(0, CABLE_AREAS_MM2)).toThrow(OutOfRange);
    expect(() => nextSize(NaN, CABLE_AREAS_MM2)).toThrow(OutOfRange);
  });
});
