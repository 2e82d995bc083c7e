import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../test/ngspice.ts';
import { balanceCurrents } from './current-balance.ts';
import { isRealDifference, meterError, readThrough } from './meter.ts';
import { shuntErrorA, shuntMillivolts, shuntOhms } from './shunt.ts';

const SHUNT_500 = { ratedA: 500, ratedMv: 50 };

describe('a shunt', () => {
  it('trap: may be out by its class of the rated current, not of what flows', () => {
    // IEC 60051 (from memory): class 0.5 on 500 A is 2.5 A, at 40 A as much as at 400 A.
    expect(shuntErrorA(SHUNT_500, 0.5)).toBe(2.5);
    expect(shuntErrorA(SHUNT_500, 0.5) / 40).toBeCloseTo(0.0625, 12);
  });

  it('shows millivolts in proportion to the current, either way', () => {
    expect(shuntMillivolts(SHUNT_500, 40)).toBeCloseTo(4, 12);
    expect(shuntMillivolts(SHUNT_500, -40)).toBeCloseTo(-4, 12);
    const ratedA = fc.integer({ min: 1, max: 2000 });
    const share = fc.double({ min: -1, max: 1, noNaN: true });
    fc.assert(
      fc.property(ratedA, fc.constantFrom(50, 60, 75, 100), share, (rated, ratedMv, part) => {
        const shunt = { ratedA: rated, ratedMv };
        const millivolts = shuntMillivolts(shunt, part * rated);
        expect(millivolts / 1000).toBeCloseTo(part * rated * shuntOhms(shunt), 9);
      }),
    );
  });

  it('refuses more than its rating and labels of no shunt', () => {
    expect(() => shuntMillivolts(SHUNT_500, 501)).toThrow('fit a shunt rated for the current');
    expect(() => shuntOhms({ ratedA: 500, ratedMv: 0.05 })).toThrow('50 and 75 mV are usual');
    expect(() => shuntErrorA(SHUNT_500, 50)).toThrow('Class 50 %');
  });
});

describe('a meter', () => {
  const SPEC = { percent: 0.5, counts: 2, digit: 0.01 };

  it('may be out by a share of its reading and some counts', () => {
    // Worked by hand: 0.5 % of 12.60 V and 2 counts of 0.01 V.
    expect(meterError(12.6, SPEC)).toBeCloseTo(0.083, 12);
    expect(meterError(-12.6, SPEC)).toBeCloseTo(0.083, 12);
    expect(meterError(0, SPEC)).toBeCloseTo(0.02, 12);
  });

  it('proves a difference only beyond both errors', () => {
    expect(isRealDifference(12.6, 12.74, SPEC)).toBe(false);
    expect(isRealDifference(12.6, 12.78, SPEC)).toBe(true);
  });

  it('reads a ghost through damp: 12.6 V behind a megohm', () => {
    // Divider by hand: 12.6 × 10 ÷ 11.
    const ghost = readThrough({ sourceV: 12.6, pathOhms: 1e6, meterOhms: 10e6 });
    expect(ghost).toBeCloseTo(11.4545, 4);
    // A lamp of 2.6 Ω across the same point leaves next to nothing.
    expect(ghost * (2.6 / 1e6)).toBeLessThan(1e-4);
    expect(readThrough({ sourceV: 12.6, pathOhms: 0, meterOhms: 10e6 })).toBe(12.6);
  });

  it('reads less the higher the path or the lower its own resistance', () => {
    const ohms = fc.double({ min: 1, max: 1e9, noNaN: true });
    const input = fc.double({ min: 1e4, max: 1e10, noNaN: true });
    fc.assert(
      fc.property(ohms, input, (pathOhms, meterOhms) => {
        const volts = readThrough({ sourceV: 12.6, pathOhms, meterOhms });
        expect(volts).toBeGreaterThan(0);
        expect(volts).toBeLessThanOrEqual(12.6);
        expect(readThrough({ sourceV: 12.6, pathOhms: pathOhms * 2, meterOhms })).toBeLessThan(
          volts,
        );
        const poorer = readThrough({ sourceV: 12.6, pathOhms, meterOhms: meterOhms / 2 });
        expect(poorer).toBeLessThan(volts);
      }),
    );
  });

  it('refuses specifications of no meter', () => {
    expect(() => meterError(12.6, { ...SPEC, percent: 50 })).toThrow('Share of the reading 50 %');
    expect(() => meterError(12.6, { ...SPEC, digit: 0 })).toThrow('Last digit 0');
    expect(() => readThrough({ sourceV: 12.6, pathOhms: 1e6, meterOhms: 0.1 })).toThrow(
      'Meter’s input resistance 0.1 Ω',
    );
  });
});

describe('charger, monitor and loads', () => {
  it.each([
    [30, 2.4],
    [40, 0],
    [6, 4],
  ])('trap: at %d A, the %d A past the shunt are in no figure of it', (charger, past) => {
    const found = runNgspice('shunt-balance.cir', { charger, past });
    const read = (name: string): number => found.get(name) ?? NaN;
    const readings = { chargerA: charger, monitorA: read('shunt'), clampedA: 10.7, bypassA: past };
    const balance = balanceCurrents(readings);
    expect(balance.loadsA).toBeCloseTo(3.5 + 7.2 + read('third'), 7);
    expect(balance.unseenA).toBeCloseTo(read('third'), 7);
    expect(balance.batteryA).toBeCloseTo(read('battery'), 7);
    expect(balance.allLoadsA - balance.loadsA).toBeCloseTo(past, 12);
    const millivolts = shuntMillivolts({ ratedA: 100, ratedMv: 50 }, read('shunt'));
    expect(millivolts).toBeCloseTo(read('millivolts'), 8);
  });

  it('always adds up: what the charger gives is in the loads and the battery', () => {
    const amps = fc.double({ min: 0, max: 300, noNaN: true });
    fc.assert(
      fc.property(amps, amps, amps, (chargerA, monitorA, bypassA) => {
        const { allLoadsA, batteryA } = balanceCurrents({
          chargerA,
          monitorA,
          clampedA: 0,
          bypassA,
        });
        expect(allLoadsA + batteryA).toBeCloseTo(chargerA, 9);
      }),
    );
  });

  it('refuses a negative load', () => {
    const readings = { chargerA: 30, monitorA: 16, clampedA: -3, bypassA: 0 };
    expect(() => balanceCurrents(readings)).toThrow('Clamped loads -3 A is outside 0 to 2000 A');
  });
});
