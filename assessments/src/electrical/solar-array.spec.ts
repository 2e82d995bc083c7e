import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { GENERIC_36_CELLS, shareOf } from './single-diode.ts';
import { OutOfRange } from './out-of-range.ts';
import {
  inParallel,
  inputMarginV,
  inSeries,
  mostInSeries,
  panelCircuitAmps,
} from './solar-array.ts';
import { directFrom, trackedFrom, withoutTracking, withTracking } from './solar-controller.ts';

const TRACKER = { efficiency: 0.95, limitA: Infinity, headroomV: 0 };
const LABEL = { volts: 18, amps: 5.5 };

describe('panels together', () => {
  it.each(readTable('panel-arrays.csv'))(
    'of $first_A A and $second_A A in $arrangement give $volts V and $amps A',
    (row) => {
      const first = { volts: numberIn(row, 'first_V'), amps: numberIn(row, 'first_A') };
      const second = { volts: numberIn(row, 'second_V'), amps: numberIn(row, 'second_A') };
      const pair = row.arrangement === 'parallel' ? inParallel([first, second]) : null;
      const string = inSeries([first, second]);
      const found = pair ?? (row.arrangement === '2s2p' ? inParallel([string, string]) : string);
      expect(found).toEqual({ volts: numberIn(row, 'volts'), amps: numberIn(row, 'amps') });
      expect(found.volts * found.amps).toBe(numberIn(row, 'watts'));
    },
  );

  it('refuses strings of different voltage on one input, and an empty roof', () => {
    expect(() => inParallel([LABEL, { volts: 36, amps: 5.5 }])).toThrow(
      'Strings of 18 V and 36 V in parallel do not share a working voltage within 5 %',
    );
    expect(() => inSeries([])).toThrow('No panel is given');
  });

  it('take conductors and fuse at 1.25 × 1.25 of the short-circuit current', () => {
    // NEC 690.8 (from memory).
    expect(panelCircuitAmps({ shortA: 1, strings: 1 })).toBe(1.25 * 1.25);
    expect(panelCircuitAmps({ shortA: 6, strings: 1 })).toBe(9.375);
    expect(panelCircuitAmps({ shortA: 6, strings: 3 })).toBe(28.125);
    expect(() => panelCircuitAmps({ shortA: 6, strings: 0 })).toThrow('count the strings');
  });
});

describe('controllers', () => {
  it('trap: without tracking give battery volts times panel amps, 70.4 W of 99', () => {
    // Worked outside this project: 12.8 V × 5.5 A; tracking at 95 % 94.05 W, 7.34766 A.
    expect(withoutTracking(LABEL, 12.8).watts).toBeCloseTo(70.4, 9);
    const tracked = withTracking(LABEL, 12.8, TRACKER);
    expect(tracked.watts).toBeCloseTo(94.05, 9);
    expect(tracked.amps).toBeCloseTo(7.34766, 5);
  });

  it('put out no more than their limit', () => {
    const { amps } = withTracking(LABEL, 12.8, { ...TRACKER, limitA: 5 });
    expect(amps).toBe(5);
  });

  it('agree from label and from curve, but for the knee', () => {
    const string = { groups: [GENERIC_36_CELLS], hasBypass: false };
    const tracked = trackedFrom(string, 12.8, TRACKER);
    expect(tracked.watts).toBeCloseTo(99.856355952 * 0.95, 6);
    // At 12.8 V the module is still near its short-circuit current (from the curve, ngspice 39.3).
    expect(directFrom(string, 12).amps).toBeCloseTo(5.933265038, 9);
    expect(directFrom(string, 25).amps).toBe(0);
  });

  it('give nothing from half a 12 V panel', () => {
    const string = {
      groups: [shareOf(GENERIC_36_CELLS, { cells: 0.5, light: 1 })],
      hasBypass: true,
    };
    expect(trackedFrom(string, 12.8, TRACKER)).toEqual({ amps: 0, watts: 0 });
    expect(directFrom(string, 12.8).amps).toBe(0);
  });

  it('refuse what cannot work, saying what to do', () => {
    expect(() => withoutTracking(LABEL, 25.6)).toThrow('panels in series');
    expect(() => withTracking(LABEL, 17.5, { ...TRACKER, headroomV: 1 })).toThrow(
      'does not stand 1 V over a battery at 17.5 V',
    );
    expect(() => withTracking(LABEL, 12.8, { ...TRACKER, efficiency: 95 })).toThrow(
      'give it as a share',
    );
    expect(() => withTracking(LABEL, 12.8, { ...TRACKER, limitA: 0 })).toThrow('not above 0 A');
  });
});

describe('solar sums over their whole range', () => {
  const within = (least: number, most: number): fc.Arbitrary<number> =>
    fc.double({ min: least, max: most, noNaN: true });
  const panel = fc.record({ volts: within(0.1, 1500), amps: within(0, 50) });

  it('scale: like panels in series multiply volts, in parallel amps, and watts either way', () => {
    fc.assert(
      fc.property(panel, fc.integer({ min: 1, max: 20 }), (one, count) => {
        const panels = Array.from({ length: count }, () => one);
        const [string, bank] = [inSeries(panels), inParallel(panels)];
        expect(string.volts).toBeCloseTo(count * one.volts, 6);
        expect(bank.amps).toBeCloseTo(count * one.amps, 6);
        expect(string.volts * string.amps).toBeCloseTo(bank.volts * bank.amps, 3);
      }),
    );
  });

  it('never put one panel too many in a string, nor one too few', () => {
    // Labels and limits are printed to a tenth of a volt.
    const tenths = (least: number, most: number): fc.Arbitrary<number> =>
      fc.integer({ min: least, max: most }).map((count) => count / 10);
    fc.assert(
      fc.property(tenths(100, 800), tenths(300, 6000), (coldOpenV, limitV) => {
        const most = mostInSeries({ coldOpenV, limitV });
        const margin = (inSeries: number): number => inputMarginV({ coldOpenV, inSeries, limitV });
        if (most > 0) expect(margin(most)).toBeGreaterThanOrEqual(-1e-6);
        expect(margin(most + 1)).toBeLessThan(0);
      }),
    );
  });

  it('come to a finite figure or say why there is none', () => {
    fc.assert(
      fc.property(panel, within(6, 66), within(0.5, 1), within(0, 10), (one, ...rest) => {
        const [batteryV, efficiency, headroomV] = rest;
        const tracker = { efficiency, limitA: 40, headroomV };
        for (const sum of [
          () => withoutTracking(one, batteryV),
          () => withTracking(one, batteryV, tracker),
        ]) {
          try {
            const { amps, watts } = sum();
            expect(Number.isFinite(amps) && amps >= 0 && Number.isFinite(watts)).toBe(true);
          } catch (error) {
            expect(error).toBeInstanceOf(OutOfRange);
          }
        }
      }),
    );
  });

  it('a tracker without loss never gives less than the same panel straight on', () => {
    const string = { groups: [GENERIC_36_CELLS], hasBypass: false };
    fc.assert(
      fc.property(within(6, 17), (batteryV) => {
        const tracked = trackedFrom(string, batteryV, { ...TRACKER, efficiency: 1 });
        expect(tracked.watts).toBeGreaterThanOrEqual(directFrom(string, batteryV).watts - 1e-9);
      }),
      { numRuns: 15 },
    );
  });
});
