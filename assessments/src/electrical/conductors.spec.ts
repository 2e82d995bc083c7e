import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { heatRatio, loadedConductorC, warmRun } from './conductor-heat.ts';
import {
  ALUMINIUM_OHM_MM2_PER_M,
  classFiveOhmsPerKm,
  COPPER_OHM_MM2_PER_M,
  ohmsPerKmOfArea,
  resistanceAt,
} from './conductors.ts';
import { gaugeAreaMm2, gaugeCircularMils, gaugeNumber } from './gauge.ts';
import { gaugeOhmsPer1000Ft, gaugeOhmsPerKm, printedCircularMils } from './gauge-resistance.ts';
import { IEC_AREAS_MM2, iecOhmsPerKm } from './iec-resistance.ts';
import { OutOfRange } from './out-of-range.ts';

const KM_PER_1000_FT = 0.3048;

describe('metric conductors', () => {
  it.each(readTable('iec60228.csv'))('resist as tabled at $area_mm2 mm²', (row) => {
    const area = numberIn(row, 'area_mm2');
    for (const strands of ['class 2', 'class 5'] as const) {
      const column = strands.replace(' ', '_');
      for (const surface of ['plain', 'tinned'] as const) {
        expect(iecOhmsPerKm(area, { strands, surface })).toBe(
          numberIn(row, `${column}_${surface}`),
        );
      }
      const plain = iecOhmsPerKm(area, { strands, surface: 'plain' });
      const ratio = plain / ohmsPerKmOfArea(area, COPPER_OHM_MM2_PER_M);
      expect(ratio).toBeCloseTo(numberIn(row, `${column}_ratio`), 3);
      // Strands, lay and air over solid copper: 4 to 9 %, fine strands 10 to 16 %.
      const [least, most] = strands === 'class 5' ? [1.1, 1.16] : [1.04, 1.09];
      if (strands === 'class 2' && area === 50) continue;
      expect(ratio).toBeGreaterThan(least);
      expect(ratio).toBeLessThan(most);
    }
    expect(classFiveOhmsPerKm(area)).toBe(numberIn(row, 'class_5_plain'));
  });

  it('keep the odd 50 mm² of class 2, which resists a hair more than class 5 and is right', () => {
    const ratio = (strands: 'class 2' | 'class 5'): number =>
      iecOhmsPerKm(50, { strands, surface: 'plain' }) / ohmsPerKmOfArea(50, COPPER_OHM_MM2_PER_M);
    expect(ratio('class 2')).toBeCloseTo(1.1223, 3);
    expect(ratio('class 2')).toBeGreaterThan(ratio('class 5'));
    const others = IEC_AREAS_MM2.filter((area) => area !== 50);
    for (const area of others) {
      const [two, five] = (['class 2', 'class 5'] as const).map((strands) =>
        iecOhmsPerKm(area, { strands, surface: 'plain' }),
      );
      expect(two).toBeLessThan(five ?? NaN);
    }
  });

  it('resist more where tinned, and less the thicker they are', () => {
    for (const strands of ['class 2', 'class 5'] as const) {
      const plain = IEC_AREAS_MM2.map((a) => iecOhmsPerKm(a, { strands, surface: 'plain' }));
      const tinned = IEC_AREAS_MM2.map((a) => iecOhmsPerKm(a, { strands, surface: 'tinned' }));
      plain.forEach((ohms, index) => expect(tinned[index]).toBeGreaterThan(ohms));
      for (const column of [plain, tinned]) {
        expect(column).toEqual([...column].sort((a, b) => b - a));
      }
    }
  });

  it('name the value, the rule and the remedy for a size that is not made', () => {
    expect(() => classFiveOhmsPerKm(2.7)).toThrow(
      'Cable area 2.7 mm² is not a stock size; use one of 0.5, 0.75, 1, 1.5, 2.5, 4,',
    );
    expect(() => ohmsPerKmOfArea(0, COPPER_OHM_MM2_PER_M)).toThrow('cross-section of the metal');
  });
});

describe('gauges in the printed table', () => {
  it.each(readTable('nec-table-8.csv'))('resist as tabled at $awg', (row) => {
    const gauge = gaugeNumber(row.awg ?? '');
    expect(printedCircularMils(gauge)).toBe(numberIn(row, 'circular_mil'));
    expect(gaugeOhmsPer1000Ft(gauge)).toBe(numberIn(row, 'stranded'));
    expect(gaugeOhmsPer1000Ft(gauge, 'aluminium')).toBe(numberIn(row, 'aluminium'));
    const solid = numberIn(row, 'solid');
    if (Number.isNaN(solid)) {
      expect(() => gaugeOhmsPer1000Ft(gauge, 'solid copper')).toThrow('no solid copper of gauge');
    } else {
      expect(gaugeOhmsPer1000Ft(gauge, 'solid copper')).toBe(solid);
    }
    expect(gaugeOhmsPerKm(gauge) * KM_PER_1000_FT).toBeCloseTo(numberIn(row, 'stranded'), 9);
  });

  it.each(readTable('nec-table-8.csv'))('follow from resistivity and heat at $awg', (row) => {
    const gauge = gaugeNumber(row.awg ?? '');
    // The table's own, rounded circular mils.
    const areaMm2 =
      (numberIn(row, 'circular_mil') / gaugeCircularMils(gauge)) * gaugeAreaMm2(gauge);
    const hot = (rho: number, metal: 'copper' | 'aluminium'): number =>
      resistanceAt(ohmsPerKmOfArea(areaMm2, rho), 75, metal) * KM_PER_1000_FT;
    const copper = hot(COPPER_OHM_MM2_PER_M, 'copper');
    expect(copper).toBeCloseTo(numberIn(row, 'solid_computed'), 4);
    const solid = numberIn(row, 'solid');
    if (!Number.isNaN(solid)) expect(Math.abs(solid / copper - 1)).toBeLessThan(0.005);
    const strands = numberIn(row, 'stranded') / copper;
    expect(strands).toBeGreaterThan(1.015);
    expect(strands).toBeLessThan(1.03);
    const aluminium = numberIn(row, 'aluminium') / hot(ALUMINIUM_OHM_MM2_PER_M, 'aluminium');
    expect(aluminium).toBeGreaterThan(0.99);
    expect(aluminium).toBeLessThan(1.035);
  });

  it('refuse a gauge that is not printed', () => {
    expect(() => gaugeOhmsPer1000Ft(5)).toThrow('use one of 18, 16, 14, 12, 10, 8, 6, 4, 3, 2, 1');
    expect(() => printedCircularMils(7)).toThrow(OutOfRange);
  });
});

describe('heat', () => {
  it.each(readTable('conductor-temperature.csv'))('changes resistance at $celsius °C', (row) => {
    const celsius = numberIn(row, 'celsius');
    for (const metal of ['copper', 'aluminium'] as const) {
      const factor = resistanceAt(1, celsius, metal);
      expect(factor).toBeCloseTo(numberIn(row, `${metal}_by_coefficient`), 6);
      const ratio = heatRatio({ fromC: 20, toC: celsius }, metal);
      expect(ratio).toBeCloseTo(numberIn(row, `${metal}_by_zero`), 6);
      expect(Math.abs(factor / ratio - 1)).toBeLessThan(metal === 'copper' ? 2e-4 : 0.011);
    }
    const cable = resistanceAt(classFiveOhmsPerKm(6), celsius);
    expect(cable).toBeCloseTo(numberIn(row, 'class5_6mm2_ohm_per_km'), 5);
  });

  it('follows the printed example of a loaded wire and its run', () => {
    // FAA AC 43.13-1B par. 11-66: printed 182 °C and 9.5 ft (from memory).
    const hot = loadedConductorC({ airC: 50, ratedC: 200, amps: 20, ratedAmps: 26 });
    expect(hot).toBeCloseTo(181.56, 2);
    expect(warmRun(15.5, hot, 'copper')).toBeCloseTo(9.481, 3);
  });

  it('raises resistance and shortens a run, and undoes itself on the way back', () => {
    const celsius = fc.double({ min: -40, max: 200, noNaN: true });
    fc.assert(
      fc.property(celsius, celsius, fc.constantFrom('copper', 'aluminium'), (from, to, metal) => {
        const there = heatRatio({ fromC: from, toC: to }, metal);
        expect(there * heatRatio({ fromC: to, toC: from }, metal)).toBeCloseTo(1, 12);
        if (to > from + 0.01) {
          expect(there).toBeGreaterThan(1);
          expect(resistanceAt(1, to, metal)).toBeGreaterThan(resistanceAt(1, from, metal));
          expect(warmRun(10, to, metal)).toBeLessThan(warmRun(10, from, metal));
        }
      }),
    );
  });

  it('refuses what is beyond the straight line or the cable', () => {
    expect(() => resistanceAt(1, 400)).toThrow(
      'Conductor temperature 400 °C is outside -40 to 200 °C',
    );
    expect(() => heatRatio({ fromC: 20, toC: -234.5 }, 'copper')).toThrow(OutOfRange);
    const cable = { airC: 30, ratedC: 105, amps: 30, ratedAmps: 26 };
    expect(() => loadedConductorC(cable)).toThrow('choose a cable that carries it');
    expect(() => loadedConductorC({ ...cable, ratedAmps: 0 })).toThrow(OutOfRange);
  });
});
