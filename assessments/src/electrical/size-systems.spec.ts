import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gaugeAreaMm2, STOCK_GAUGES } from './gauge.ts';
import { OutOfRange } from './out-of-range.ts';
import { PROFILES } from './practice-profile.ts';
import {
  gaugeOfArea,
  nearestGauge,
  nearestMetric,
  nextGauge,
  nextMetric,
  stockAreasMm2,
} from './size-systems.ts';
import { CABLE_AREAS_MM2, nearestSize, nextSize, prevSize, sizeUnder } from './stock.ts';

const area = fc.double({ min: 1.5, max: 107, noNaN: true });

describe('sizes in two systems', () => {
  it('go up, so that the copper is never less', () => {
    // Areas of ASTM B258: 8 AWG 8.366 mm², 10 AWG 5.261, 6 AWG 13.302.
    expect([8, 10, 6, -3].map(nextMetric)).toEqual([10, 6, 16, 120]);
    expect([6, 10, 16, 95].map(nextGauge)).toEqual([8, 6, 4, -3]);
  });

  it('are nearest by ratio, which may be less copper', () => {
    expect([12, 10, 8, 6].map(nearestMetric)).toEqual([4, 6, 10, 16]);
    expect([6, 10, 16, 35].map(nearestGauge)).toEqual([10, 8, 6, 2]);
    expect(gaugeAreaMm2(nearestGauge(6))).toBeLessThan(6);
    // Of two as near, the larger.
    expect(nearestSize(2, [1, 4])).toBe(4);
  });

  it('find a gauge again from its own copper, and no gauge in other copper', () => {
    for (const gauge of [18, ...STOCK_GAUGES]) {
      expect(gaugeOfArea(gaugeAreaMm2(gauge))).toBe(gauge);
    }
    for (const gauge of STOCK_GAUGES) expect(nextGauge(gaugeAreaMm2(gauge))).toBe(gauge);
    expect(() => gaugeOfArea(6)).toThrow('6 mm² is the copper of no gauge');
  });

  it.each(['metric', 'awg'] as const)('keep next, previous and nearest in order, %s', (name) => {
    const stock = stockAreasMm2(PROFILES[name]);
    fc.assert(
      fc.property(area, (wanted) => {
        const [under, next] = [prevSize(wanted, stock), nextSize(wanted, stock)];
        expect(under).toBeLessThanOrEqual(wanted * (1 + 1e-9));
        expect(next).toBeGreaterThanOrEqual(wanted * (1 - 1e-9));
        expect([under, next]).toContain(nearestSize(wanted, stock));
        if (under !== next) expect(stock.indexOf(next)).toBe(stock.indexOf(under) + 1);
        expect(nextSize(next, stock)).toBe(next);
      }),
    );
  });

  it('step down from a size to the one under it', () => {
    expect(sizeUnder(10, CABLE_AREAS_MM2)).toBe(6);
    expect(sizeUnder(9.58, CABLE_AREAS_MM2)).toBe(6);
    expect(sizeUnder(10 + 1e-12, CABLE_AREAS_MM2)).toBe(6);
    expect(() => sizeUnder(1.5, CABLE_AREAS_MM2)).toThrow('the series starts at 1.5');
  });

  it('refuse copper beyond the stock', () => {
    for (const wrong of [0, -4, NaN, 300, Infinity]) {
      expect(() => nextGauge(wrong)).toThrow(OutOfRange);
      expect(() => nearestGauge(wrong)).toThrow(OutOfRange);
    }
    expect(() => prevSize(1, CABLE_AREAS_MM2)).toThrow('No size is as small as 1');
    expect(() => nearestSize(-1, CABLE_AREAS_MM2)).toThrow('give a number above 0');
  });
});
