import { execFileSync } from 'node:child_process';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { COPPER_OHM_MM2_PER_M } from './conductors.ts';
import {
  areaByResistivity,
  circularMilsForDrop,
  copperHasItAtC,
  dropByGaugeTable,
  dropByResistivity,
  dropByTable,
  ofMilFoot,
  RESISTIVITIES,
} from './drop-routes.ts';
import { circularMilsToMm2, gaugeName, STOCK_GAUGES } from './gauge.ts';
import { printedCircularMils } from './gauge-resistance.ts';
import { IEC_AREAS_MM2 } from './iec-resistance.ts';
import { OutOfRange } from './out-of-range.ts';
import { PROFILES } from './practice-profile.ts';
import { CABLE_AREAS_MM2, nextSize } from './stock.ts';
import { areaForDrop, chassisReturnDrop, dropAlong, sizeForDrop } from './voltage-drop.ts';

const M_PER_FT = 0.3048;

/** Thinnest gauge whose printed circular mils are not under the wanted. */
const gaugeByPrint = (mils: number): string =>
  gaugeName(STOCK_GAUGES.find((gauge) => printedCircularMils(gauge) >= mils) ?? NaN);

describe('one run on four routes', () => {
  const cases = readTable('voltage-drop-cases.csv').map((row) => ({
    row,
    amps: numberIn(row, 'amps'),
    lengthM: numberIn(row, 'one_way_m'),
    limitV: numberIn(row, 'allowed_V'),
  }));

  it.each(cases)('$amps A over $lengthM m within $limitV V', ({ row, ...run }) => {
    const byArea = areaByResistivity(run, RESISTIVITIES.annealedCopper);
    expect(byArea.areaMm2).toBeCloseTo(numberIn(row, 'area_mm2'), 4);
    const nextMm2 = nextSize(byArea.areaMm2, [0.75, 1, ...CABLE_AREAS_MM2]);
    expect(nextMm2).toBe(numberIn(row, 'next_size_mm2'));
    const itsDrop = dropByTable({ ...run, areaMm2: nextMm2 }).dropV;
    expect(itsDrop).toBeCloseTo(numberIn(row, 'drop_of_that_V'), 5);

    const byTable = sizeForDrop(run);
    expect(byTable).toBe(numberIn(row, 'size_by_table_mm2'));
    const passes = dropByTable({ ...run, areaMm2: byTable }).dropV;
    expect(passes).toBeCloseTo(numberIn(row, 'its_drop_V'), 5);
    expect(passes).toBeLessThanOrEqual(run.limitV);

    const byMetricRule = areaByResistivity(run, RESISTIVITIES.metricSmallCraft);
    expect(byMetricRule.areaMm2).toBeCloseTo(numberIn(row, 'area_at_0_0164_mm2'), 4);
    const loopFt = (2 * run.lengthM) / M_PER_FT;
    const { circularMils } = circularMilsForDrop({ ...run, loopFt });
    expect(circularMils).toBeCloseTo(numberIn(row, 'circular_mil'), 1);
    expect(gaugeByPrint(circularMils)).toBe(row.next_awg);
  });

  it('lets the area pass and the cable fail: 10 mm² by the sum, 16 by its table', () => {
    const run = { amps: 20, lengthM: 5, limitV: 0.36 };
    const { areaMm2 } = areaByResistivity(run, RESISTIVITIES.annealedCopper);
    expect(areaMm2).toBeCloseTo(9.579, 3);
    const bySum = nextSize(areaMm2, CABLE_AREAS_MM2);
    expect(bySum).toBe(10);
    expect(dropByTable({ ...run, areaMm2: bySum }).dropV).toBeCloseTo(0.382, 6);
    expect(sizeForDrop(run)).toBe(16);
    // The same way round in five more of the fifteen cases, and no case the other way.
    const grown = cases.filter(({ row }) => row.next_size_mm2 !== row.size_by_table_mm2);
    expect(grown.map(({ row }) => cases.findIndex((one) => one.row === row) + 1)).toEqual([
      1, 4, 6, 7, 9, 14,
    ]);
  });
});

describe('constants', () => {
  /** GNU units, the general-purpose converter. */
  const askUnits = (have: string, want: string): number =>
    Number(execFileSync('units', ['-t', '-o', '%.15g', have, want], { encoding: 'utf8' }));

  it('go between ohm circular mils per foot and ohm square millimetres per metre', () => {
    expect(ofMilFoot(1) / askUnits('ohm circularmil/ft', 'ohm mm^2/m')).toBeCloseTo(1, 12);
    expect(ofMilFoot(10.371215)).toBeCloseTo(COPPER_OHM_MM2_PER_M, 8);
    // The textbook prints 1.66243e-9 Ω·m of one.
    expect(ofMilFoot(1) / 1.66243e-3).toBeCloseTo(1, 4);
  });

  it('of pure and of annealed copper lie 2.7 % apart: a sum must state its own', () => {
    const { pureCopper, annealedCopper } = RESISTIVITIES;
    // The textbook's 10.09 Ω·cmil/ft is its 1.678 µΩ·cm, rounded.
    expect(Math.abs(pureCopper.ohmMm2PerM / 0.01678 - 1)).toBeLessThan(5e-4);
    expect(annealedCopper.ohmMm2PerM / 0.01678 - 1).toBeCloseTo(0.0275, 4);
  });

  it('K = 10.75 is annealed copper at 29.3 °C', () => {
    expect(RESISTIVITIES.milFootSmallCraft.ohmMm2PerM).toBeCloseTo(0.017871081, 9);
    expect(copperHasItAtC(RESISTIVITIES.milFootSmallCraft.ohmMm2PerM)).toBeCloseTo(29.3, 1);
  });

  it('0.0164 lies 5 % under annealed copper and 9 % under K = 10.75', () => {
    const { metricSmallCraft, milFootSmallCraft, annealedCopper } = RESISTIVITIES;
    expect(metricSmallCraft.ohmMm2PerM / annealedCopper.ohmMm2PerM).toBeCloseTo(0.9512, 4);
    expect(milFootSmallCraft.ohmMm2PerM / metricSmallCraft.ohmMm2PerM).toBeCloseTo(1.0897, 4);
    const run = { amps: 20, lengthM: 5, limitV: 0.36 };
    expect(areaByResistivity(run, metricSmallCraft).areaMm2).toBeCloseTo(9.1111, 4);
    expect(areaByResistivity(run, milFootSmallCraft).areaMm2).toBeCloseTo(9.9284, 4);
  });

  it('are named with every result', () => {
    const run = { amps: 20, lengthM: 5, limitV: 0.36, areaMm2: 10 };
    for (const metal of Object.values(RESISTIVITIES)) {
      expect(dropByResistivity(run, metal).by).toBe(metal.is);
      expect(areaByResistivity(run, metal).by).toBe(metal.is);
    }
    expect(dropByTable(run).by).toBe('IEC 60228 class 5, plain, 1.91 Ω/km at 20 °C');
    const warm = dropByTable({ ...run, conductorC: 60 }, { strands: 'class 2', surface: 'tinned' });
    expect(warm.by).toBe('IEC 60228 class 2, tinned, 2.129 Ω/km at 60 °C');
    expect(warm.dropV).toBeCloseTo(20 * 10 * 0.00184 * 1.1572, 9);
    expect(circularMilsForDrop({ ...run, loopFt: 21 }).by).toBe('K = 10.75 Ω·cmil/ft');
    const gauged = dropByGaugeTable({ gauge: 10, lengthM: 5, amps: 20 });
    expect(gauged.by).toBe('NEC table 8, 10 AWG stranded copper, 4.068 Ω/km at 75 °C');
  });
});

describe('worked examples of others', () => {
  it('size 12 V, 10 A over 21 ft at 12 AWG for 3 % and 16 AWG for 10 %', () => {
    // ABYC E-11 formula (from memory); gauges by the printed circular mils.
    const run = { loopFt: 21, amps: 10 };
    const three = circularMilsForDrop({ ...run, limitV: 0.36 }).circularMils;
    const ten = circularMilsForDrop({ ...run, limitV: 1.2 }).circularMils;
    expect(three).toBeCloseTo(6270.83, 2);
    expect(ten).toBeCloseTo(1881.25, 2);
    expect([three, ten].map(gaugeByPrint)).toEqual(['12', '16']);
  });

  it('give 0.385 V where a private page prints 0.38 V by 0.0164', () => {
    // 1.6 A over 22 m out and back of 1.5 mm² (second-hand copy).
    const run = { amps: 1.6, lengthM: 11, areaMm2: 1.5 };
    const { dropV } = dropByResistivity(run, RESISTIVITIES.metricSmallCraft);
    expect(dropV).toBeCloseTo(0.384853, 6);
  });

  it('follow a textbook that states 10.09: 116 035 cmil, so 2/0', () => {
    // Lessons in Electric Circuits, vol. I ch. 12 (read): 230 V, 25 A, 2300 ft each way, 10 V.
    const run = { amps: 25, lengthM: 2300 * M_PER_FT, limitV: 10 };
    const { areaMm2 } = areaByResistivity(run, RESISTIVITIES.pureCopper);
    const mils = areaMm2 / circularMilsToMm2(1);
    expect(mils).toBeCloseTo(116_035, 0);
    expect(gaugeByPrint(mils)).toBe('2/0');
    expect(printedCircularMils(0)).toBeLessThan(mils);
    const own = areaByResistivity(run, RESISTIVITIES.milFootSmallCraft).areaMm2;
    expect(own / circularMilsToMm2(1)).toBeCloseTo(123_625, 0);
    // The same page: 14 AWG, 4107 cmil, gives 5.651 Ω each way.
    const fourteen = { areaMm2: circularMilsToMm2(4107), lengthM: run.lengthM, amps: 1 };
    const pair = dropByResistivity(fourteen, RESISTIVITIES.pureCopper).dropV;
    expect(pair / 2).toBeCloseTo(5.651, 3);
    expect(230 / pair).toBeCloseTo(20.352, 2);
  });

  it.each(readTable('faa-voltage-drop.csv'))('agree with the printed run of $run_ft ft', (row) => {
    const drop = dropAlong({
      amps: numberIn(row, 'amps'),
      lengthM: (numberIn(row, 'run_ft') * M_PER_FT) / 2,
      ohmsPerKm: (1000 * numberIn(row, 'ohm_per_ft')) / M_PER_FT,
    });
    expect(drop).toBeCloseTo(numberIn(row, 'recomputed_V'), 4);
    const wire = readTable('faa-11-9.csv').find(({ awg }) => awg === row.awg);
    const tabled = numberIn(wire ?? {}, 'ohm_per_1000ft') / 1000;
    expect(tabled).toBeCloseTo(numberIn(row, 'ohm_per_ft'), 8);
  });

  it('print two runs of the eight wrong, by 1.2 % and by 34 %', () => {
    const off = readTable('faa-voltage-drop.csv').map((row) => ({
      run: row.run_ft,
      by: Math.abs(numberIn(row, 'recomputed_V') / numberIn(row, 'printed_V') - 1),
    }));
    const misprints = off.filter(({ by }) => by > 0.005);
    expect(misprints.map(({ run }) => run)).toEqual(['88', '19.5']);
    expect(misprints.map(({ by }) => by.toFixed(3))).toEqual(['0.012', '0.343']);
  });

  it('choose No. 8 over No. 10 for 20 A over 50 ft with 1 V to lose', () => {
    // FAA AC 43.13-1B example 1, par. 11-66c, with table 11-9 resistances (second-hand copy).
    const drop = (awg: string): number => {
      const row = readTable('faa-11-9.csv').find((one) => one.awg === awg) ?? {};
      const ohmsPerKm = numberIn(row, 'ohm_per_1000ft') / M_PER_FT;
      return dropAlong({ amps: 20, lengthM: 25 * M_PER_FT, ohmsPerKm });
    };
    expect(drop('10')).toBeCloseTo(1.26, 6);
    expect(drop('8')).toBeCloseTo(0.7, 6);
  });
});

describe('drop', () => {
  const run = fc.record({
    amps: fc.double({ min: 0.1, max: 300, noNaN: true }),
    lengthM: fc.double({ min: 0.1, max: 100, noNaN: true }),
    areaMm2: fc.constantFrom(...IEC_AREAS_MM2),
  });

  it('doubles with length or current, and lands on its own limit', () => {
    fc.assert(
      fc.property(run, (one) => {
        const { dropV } = dropByTable(one);
        expect(Number.isFinite(dropV)).toBe(true);
        expect(dropByTable({ ...one, amps: 2 * one.amps }).dropV / dropV).toBeCloseTo(2, 9);
        expect(dropByTable({ ...one, lengthM: 2 * one.lengthM }).dropV / dropV).toBeCloseTo(2, 9);
        const metal = RESISTIVITIES.annealedCopper;
        const plain = dropByResistivity(one, metal).dropV;
        expect(plain).toBeLessThan(dropV);
        const back = areaByResistivity({ ...one, limitV: plain }, metal).areaMm2;
        expect(back / one.areaMm2).toBeCloseTo(1, 9);
      }),
    );
  });

  it.each(['metric', 'awg'] as const)('never passes the limit it was sized for, %s', (name) => {
    fc.assert(
      fc.property(run, fc.double({ min: 0.05, max: 5, noNaN: true }), (one, limitV) => {
        const size = (limit: number): number => {
          try {
            return sizeForDrop({ ...one, limitV: limit }, PROFILES[name]);
          } catch (error) {
            expect(error).toBeInstanceOf(OutOfRange);
            return Infinity;
          }
        };
        const [tight, loose] = [size(limitV), size(2 * limitV)];
        expect(loose).toBeLessThanOrEqual(tight);
        if (name === 'metric' && tight < Infinity) {
          expect(dropByTable({ ...one, areaMm2: tight }).dropV).toBeLessThanOrEqual(limitV + 1e-9);
        }
      }),
    );
  });

  it('with a chassis return is one conductor and the chassis', () => {
    const feed = { lengthM: 5, ohmsPerKm: 3.3, amps: 10 };
    expect(chassisReturnDrop({ ...feed, chassisOhms: 0.004 })).toBeCloseTo(0.205, 9);
    expect(chassisReturnDrop({ ...feed, chassisOhms: 0.0165 })).toBeCloseTo(dropAlong(feed), 9);
    expect(() => chassisReturnDrop({ ...feed, chassisOhms: -1 })).toThrow('bond to bond');
  });

  it('refuses runs, currents and limits outside the trade', () => {
    expect(() => dropAlong({ lengthM: -1, ohmsPerKm: 3.3, amps: 5 })).toThrow(
      'One-way length -1 m is outside 0 to 1000 m; give the run in metres, one way.',
    );
    expect(() => sizeForDrop({ lengthM: 5, amps: 20, limitV: 0 })).toThrow('not above 0 V');
    expect(() => areaForDrop({ lengthM: 5, amps: 20, limitV: NaN, ohmMm2PerM: 1 })).toThrow(
      'not above 0 V',
    );
    expect(() => sizeForDrop({ lengthM: 200, amps: 200, limitV: 0.36 })).toThrow('No stock cable');
    const flat = { lengthM: 5, amps: 20, areaMm2: 0 };
    expect(() => dropByResistivity(flat, RESISTIVITIES.annealedCopper)).toThrow(OutOfRange);
  });
});
