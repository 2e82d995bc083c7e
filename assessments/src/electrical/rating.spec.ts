import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { derate, sizeForCurrent } from './ampacity.ts';
import { chooseCable, stoutEnough } from './cable-choice.ts';
import { gaugeAreaMm2, gaugeNumber, STOCK_GAUGES } from './gauge.ts';
import { OutOfRange } from './out-of-range.ts';
import { PROFILES } from './practice-profile.ts';
import { gaugeRatingAmps, jacketBefore, jacketsC, ratingAmps, ratingIn } from './rating-table.ts';
import { stockAreasMm2 } from './size-systems.ts';
import { CABLE_AREAS_MM2, FUSE_RATINGS_A } from './stock.ts';
import { mostSmallCraftA } from './device-choice.ts';
import { dropAlong, stockOhmsPerKm } from './voltage-drop.ts';

const JACKETS_C = [60, 75, 80, 90, 105, 125, 200];
const TABLE_FIVE = readTable('cfr33-183-425.csv');

describe('the rating table', () => {
  it.each(TABLE_FIVE)('is carried over at $awg', (row) => {
    const gauge = gaugeNumber(row.awg ?? '');
    for (const jacketC of JACKETS_C) {
      const printed = numberIn(row, `jacket_${jacketC}`);
      expect(gaugeRatingAmps(gauge, jacketC)).toBe(printed);
      const areaMm2 = gaugeAreaMm2(gauge);
      expect(ratingIn(PROFILES.awg, { areaMm2, jacketC })).toBe(printed);
    }
  });

  it.each(CABLE_AREAS_MM2)('gives %d mm² the row of the largest gauge not larger', (areaMm2) => {
    const row = TABLE_FIVE.findLast(({ awg }) => gaugeAreaMm2(gaugeNumber(awg ?? '')) <= areaMm2);
    for (const jacketC of [60, 75, 90, 105]) {
      const printed = numberIn(row ?? {}, `jacket_${jacketC}`);
      expect(ratingAmps(areaMm2, jacketC)).toBe(printed);
      expect(ratingIn(PROFILES.metric, { areaMm2, jacketC })).toBe(printed);
    }
  });

  it('rises with copper and with the jacket, in both practices', () => {
    for (const profile of Object.values(PROFILES)) {
      const areas = stockAreasMm2(profile);
      for (const jacketC of jacketsC(profile)) {
        const column = areas.map((areaMm2) => ratingIn(profile, { areaMm2, jacketC }));
        expect(column).toEqual([...column].sort((a, b) => a - b));
      }
      for (const areaMm2 of areas) {
        const row = jacketsC(profile).map((jacketC) => ratingIn(profile, { areaMm2, jacketC }));
        expect(row).toEqual([...row].sort((a, b) => a - b));
      }
    }
  });

  it('knows the column one to the left', () => {
    expect(jacketBefore(PROFILES.metric, 90)).toBe(75);
    expect(jacketBefore(PROFILES.awg, 90)).toBe(80);
    expect(() => jacketBefore(PROFILES.metric, 60)).toThrow('No column stands before 60 °C');
    expect(() => jacketBefore(PROFILES.metric, 80)).toThrow('the table has 60, 75, 90, 105 °C');
  });

  it('answers another question than a table of bundles in hot thin air', () => {
    // FAA AC 43.13-1B table 11-9 (second-hand copy): 33 and more wires, 70 °C air, 60 000 ft.
    for (const wire of readTable('faa-11-9.csv')) {
      const gauge = gaugeNumber(wire.awg ?? '');
      const bundled = numberIn(wire, 'conductor_105');
      if (gauge > 18) continue;
      expect(bundled).toBeLessThan(0.65 * gaugeRatingAmps(gauge, 105));
    }
    const eight = readTable('faa-11-9.csv').find(({ awg }) => awg === '8') ?? {};
    expect([gaugeRatingAmps(8, 105), numberIn(eight, 'conductor_105')]).toEqual([80, 38]);
  });

  it('refuses what it does not hold', () => {
    expect(() => ratingAmps(8, 105)).toThrow('No rating for 8 mm² with a 105 °C jacket');
    expect(() => gaugeRatingAmps(5, 105)).toThrow('the table has 18, 16, 14');
    const areaMm2 = gaugeAreaMm2(10);
    expect(() => ratingIn(PROFILES.awg, { areaMm2, jacketC: 70 })).toThrow('200 °C');
    for (const wrong of [0, 0.5, 150, NaN]) {
      expect(() => ratingIn(PROFILES.awg, { areaMm2: wrong, jacketC: 105 })).toThrow(OutOfRange);
    }
  });
});

describe('aircraft wire for a second opinion', () => {
  it.each(readTable('faa-11-9.csv'))('resists as its copper and tin at $awg', (row) => {
    // Ω·cmil/ft of tinned strands: 8 to 30 % over annealed copper’s 10.371, both ways rounded.
    const constant = (numberIn(row, 'ohm_per_1000ft') * numberIn(row, 'circular_mil')) / 1000;
    expect(constant / 10.371215).toBeGreaterThan(1.08);
    expect(constant / 10.371215).toBeLessThan(1.31);
    const columns = ['conductor_105', 'conductor_150', 'conductor_200'];
    const amps = columns.map((column) => numberIn(row, column));
    expect(amps).toEqual([...amps].sort((a, b) => a - b));
  });

  it.each(readTable('faa-11-3.csv'))('has a protector the small craft rule allows, $awg', (row) => {
    const [breaker, fuse] = [numberIn(row, 'breaker_A'), numberIn(row, 'fuse_A')];
    if (!Number.isNaN(breaker)) expect(breaker).toBeGreaterThanOrEqual(fuse);
    expect(FUSE_RATINGS_A).toContain(fuse);
    const gauge = row.awg === '0' ? 0 : Number(row.awg);
    if (gauge > 18) return;
    const tableA = gaugeRatingAmps(gauge, 105);
    expect(fuse).toBeLessThanOrEqual(mostSmallCraftA({ tableA, volts: 28 }, FUSE_RATINGS_A) ?? 0);
  });
});

describe('a chain of conditions', () => {
  it('follows the printed example: 47 A, altitude .91, eight wires .6', () => {
    // FAA AC 43.13-1B example 2 (second-hand copy), which rounds the end to 26 A.
    const chain = derate(47, [
      { is: '20 000 ft', factor: 0.91 },
      { is: 'eight wires', factor: 0.6 },
    ]);
    expect(chain.map(({ amps }) => Number(amps.toFixed(3)))).toEqual([42.77, 25.662]);
    expect(chain.map(({ is }) => is)).toEqual(['20 000 ft', 'eight wires']);
  });

  it('ends alike in any order, and a harsher condition leaves less', () => {
    const factor = fc.double({ min: 0.3, max: 1.2, noNaN: true });
    fc.assert(
      fc.property(fc.array(factor, { minLength: 1, maxLength: 5 }), (factors) => {
        const chain = factors.map((one) => ({ is: 'condition', factor: one }));
        const end = derate(100, chain).at(-1)?.amps ?? NaN;
        expect(derate(100, [...chain].reverse()).at(-1)?.amps).toBeCloseTo(end, 9);
        expect(derate(100, [...chain, { is: 'more', factor: 0.5 }]).at(-1)?.amps).toBeLessThan(end);
      }),
    );
    expect(() => derate(60, [{ is: 'air', factor: 0 }])).toThrow('multiply the ambient');
  });
});

describe('sizing', () => {
  it('takes the smallest size that still carries the current after its factors', () => {
    expect(sizeForCurrent({ amps: 42, jacketC: 105, factor: 0.6 })).toBe(10);
    expect(sizeForCurrent({ amps: 48, jacketC: 105, factor: 0.6 })).toBe(10);
    expect(sizeForCurrent({ amps: 48.1, jacketC: 105, factor: 0.6 })).toBe(16);
    const gauged = sizeForCurrent({ amps: 42, jacketC: 105, factor: 0.6 }, PROFILES.awg);
    expect(gauged).toBe(gaugeAreaMm2(8));
  });

  it.each(['metric', 'awg'] as const)('is never a size too small or too large, %s', (name) => {
    const profile = PROFILES[name];
    const stock = stockAreasMm2(profile);
    const job = fc.record({
      amps: fc.double({ min: 1, max: 200, noNaN: true }),
      jacketC: fc.constantFrom(...jacketsC(profile)),
      factor: fc.double({ min: 0.7, max: 1.2, noNaN: true }),
    });
    fc.assert(
      fc.property(job, (one) => {
        const areaMm2 = sizeForCurrent(one, profile);
        const carries = (area: number): number =>
          ratingIn(profile, { areaMm2: area, jacketC: one.jacketC }) * one.factor;
        expect(carries(areaMm2)).toBeGreaterThanOrEqual(one.amps * (1 - 1e-9));
        const smaller = stock[stock.indexOf(areaMm2) - 1];
        if (smaller !== undefined) expect(carries(smaller)).toBeLessThan(one.amps);
      }),
    );
  });

  it('goes by current, then by drop, and takes the larger', () => {
    const short = { amps: 100, jacketC: 105, factor: 1, lengthM: 0.5, limitV: 1.2 };
    expect(chooseCable(short, PROFILES.metric)).toMatchObject({
      byCurrentMm2: 16,
      takesMm2: 16,
      decidedBy: 'current',
    });
    const long = { amps: 20, jacketC: 105, factor: 1, lengthM: 5, limitV: 0.36 };
    expect(chooseCable(long, PROFILES.metric)).toEqual({
      byCurrentMm2: 1.5,
      byDropMm2: 16,
      takesMm2: 16,
      decidedBy: 'drop',
    });
    const gauged = chooseCable(long, PROFILES.awg);
    expect(STOCK_GAUGES.map(gaugeAreaMm2)).toContain(gauged.takesMm2);
    expect(gauged.decidedBy).toBe('drop');
  });

  it.each(['metric', 'awg'] as const)(
    'passes both rules, and a size less fails one, %s',
    (name) => {
      const profile = PROFILES[name];
      const stock = stockAreasMm2(profile);
      const job = fc.record({
        amps: fc.double({ min: 1, max: 150, noNaN: true }),
        jacketC: fc.constantFrom(75, 90, 105),
        factor: fc.double({ min: 0.6, max: 1, noNaN: true }),
        lengthM: fc.double({ min: 0.2, max: 4, noNaN: true }),
        limitV: fc.double({ min: 0.9, max: 3, noNaN: true }),
      });
      fc.assert(
        fc.property(job, (one) => {
          const choice = chooseCable(one, profile);
          const does = (areaMm2: number): boolean => {
            const carried = ratingIn(profile, { areaMm2, jacketC: one.jacketC }) * one.factor;
            const dropV = dropAlong({ ...one, ohmsPerKm: stockOhmsPerKm(areaMm2, profile) });
            return carried >= one.amps - 1e-6 && dropV <= one.limitV + 1e-9;
          };
          expect(does(choice.takesMm2)).toBe(true);
          const smaller = stock[stock.indexOf(choice.takesMm2) - 1];
          if (smaller !== undefined) expect(does(smaller)).toBe(false);
          const equal = choice.byCurrentMm2 === choice.byDropMm2;
          expect(choice.decidedBy === 'both').toBe(equal);
        }),
      );
    },
  );

  it('leaves out wire too thin to last: 1 mm² or 16 AWG alone, less inside a sheath', () => {
    const thin = (areaMm2: number, name: 'metric' | 'awg'): boolean[] =>
      [false, true].map((sheathed) => stoutEnough({ areaMm2, sheathed }, PROFILES[name]));
    expect([0.5, 0.75, 1].map((area) => thin(area, 'metric'))).toEqual([
      [false, false],
      [false, true],
      [true, true],
    ]);
    expect([20, 18, 16].map((gauge) => thin(gaugeAreaMm2(gauge), 'awg'))).toEqual([
      [false, false],
      [false, true],
      [true, true],
    ]);
  });

  it('says when no cable will do', () => {
    const job = { amps: 900, jacketC: 60, factor: 0.5, lengthM: 3, limitV: 1 };
    expect(() => sizeForCurrent(job)).toThrow('split the load');
    expect(() => chooseCable(job, PROFILES.awg)).toThrow(OutOfRange);
  });
});
