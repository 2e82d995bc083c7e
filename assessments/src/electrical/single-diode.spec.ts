import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { bestPoint } from './panel-string.ts';
import {
  ampsAt,
  cellAmps,
  type CellGroup,
  diodeSlopeV,
  GENERIC_36_CELLS,
  openVolts,
  shareOf,
} from './single-diode.ts';

function valuesOf(table: string): (quantity: string) => number {
  const rows = readTable(table);
  return (quantity) => numberIn(rows.find((row) => row.quantity === quantity) ?? {}, 'value');
}

const fit = valuesOf('pv-cell-57mm-fit.csv');
const CELL_57_MM: CellGroup = {
  lightA: fit('Iph_A'),
  saturationA: fit('I0_A'),
  slopeV: diodeSlopeV({ ideality: fit('n'), cells: 1, cellC: fit('T_C') }),
  seriesOhms: fit('Rs_ohm'),
  shuntOhms: fit('Rsh_ohm'),
};
const points = readTable('pv-cell-57mm.csv').map((row) => ({
  volts: numberIn(row, 'volts'),
  amps: numberIn(row, 'amps'),
  fitted: numberIn(row, 'fitted_amps'),
}));

function rootMeanSquare(errors: number[]): number {
  return Math.sqrt(errors.reduce((sum, error) => sum + error ** 2, 0) / errors.length);
}

describe('the single-diode model of the published 57 mm cell', () => {
  it('has the published error, 9.8602e-4 A, with the measured current put into the formula', () => {
    const errors = points.map(
      ({ volts, amps }) => cellAmps(CELL_57_MM, volts + amps * CELL_57_MM.seriesOhms) - amps,
    );
    expect(points).toHaveLength(26);
    expect(rootMeanSquare(errors)).toBeCloseTo(9.8602e-4, 8);
    expect(rootMeanSquare(errors)).toBeCloseTo(fit('RMSE_implicit_A'), 12);
  });

  it('has the smaller error of the solved current', () => {
    const errors = points.map(({ volts, amps }) => ampsAt(CELL_57_MM, volts) - amps);
    expect(rootMeanSquare(errors)).toBeCloseTo(fit('RMSE_explicit_A'), 11);
  });

  it.each(points)('carries $fitted A at $volts V', ({ volts, fitted }) => {
    expect(ampsAt(CELL_57_MM, volts)).toBeCloseTo(fitted, 8);
  });
});

describe('the generic module of 36 cells', () => {
  const known = valuesOf('panel-36-cells.csv');

  it('is built from the figures of the outside programs', () => {
    expect(GENERIC_36_CELLS).toEqual({
      lightA: known('IL_A'),
      saturationA: known('I0_A'),
      slopeV: known('a_V'),
      seriesOhms: known('Rs_ohm'),
      shuntOhms: known('Rsh_ohm'),
    });
  });

  it.each([10, 17, 18, 20, 21])('carries what they say at %d V', (volts) => {
    expect(ampsAt(GENERIC_36_CELLS, volts)).toBeCloseTo(known(`I(${volts}V)`), 11);
  });

  it('has their short-circuit current, open-circuit voltage, best point and fill factor', () => {
    const shortA = ampsAt(GENERIC_36_CELLS, 0);
    const openV = openVolts(GENERIC_36_CELLS);
    const best = bestPoint({ groups: [GENERIC_36_CELLS], hasBypass: false });
    expect(shortA).toBeCloseTo(known('Isc_A'), 11);
    expect(openV).toBeCloseTo(known('Voc_V'), 11);
    expect(best.volts).toBeCloseTo(known('Vmp_V'), 6);
    expect(best.amps).toBeCloseTo(known('Imp_A'), 6);
    expect(best.volts * best.amps).toBeCloseTo(known('Pmp_W'), 11);
    expect((best.volts * best.amps) / (shortA * openV)).toBeCloseTo(known('FF'), 11);
  });

  it('trap: a panel sold for 12 V stands over 20 V with nothing connected', () => {
    expect(openVolts(GENERIC_36_CELLS)).toBeGreaterThan(20);
  });
});

describe('the single-diode model', () => {
  const anyGroup: fc.Arbitrary<CellGroup> = fc
    .record({ cells: fc.integer({ min: 1, max: 96 }), cellC: fc.integer({ min: -40, max: 100 }) })
    .chain(({ cells, cellC }) =>
      fc.record({
        lightA: fc.double({ min: 0, max: 15, noNaN: true }),
        saturationA: fc.double({ min: 1e-12, max: 1e-6, noNaN: true }),
        slopeV: fc
          .double({ min: 1, max: 2, noNaN: true })
          .map((ideality) => diodeSlopeV({ ideality, cells, cellC })),
        seriesOhms: fc.double({ min: 0, max: 0.01 * cells, noNaN: true }),
        shuntOhms: fc.double({ min: 5 * cells, max: 1000 * cells, noNaN: true }),
      }),
    );
  const share = fc.double({ min: 0, max: 1, noNaN: true });

  it('gives a current that satisfies its own equation and falls as the voltage rises', () => {
    fc.assert(
      fc.property(anyGroup, share, share, (group, a, b) => {
        const openV = openVolts(group);
        const [low, high] = [Math.min(a, b) * openV, Math.max(a, b) * openV];
        const amps = ampsAt(group, low);
        expect(cellAmps(group, low + amps * group.seriesOhms)).toBeCloseTo(amps, 6);
        expect(amps).toBeLessThanOrEqual(group.lightA + 1e-9);
        expect(amps).toBeGreaterThanOrEqual(ampsAt(group, high) - 1e-9);
      }),
      { numRuns: 200 },
    );
  });

  it('carries nothing at its open-circuit voltage, which grows with the light', () => {
    fc.assert(
      fc.property(anyGroup, share, (group, light) => {
        const openV = openVolts(group);
        expect(ampsAt(group, openV)).toBeCloseTo(0, 6);
        expect(openVolts(shareOf(group, { cells: 1, light }))).toBeLessThanOrEqual(openV + 1e-9);
      }),
      { numRuns: 200 },
    );
  });

  it('scales: half the cells stand at half the volts at the same current', () => {
    fc.assert(
      fc.property(anyGroup, share, (group, at) => {
        const volts = at * openVolts(group);
        const half = shareOf(group, { cells: 0.5, light: 1 });
        expect(ampsAt(half, volts / 2)).toBeCloseTo(ampsAt(group, volts), 6);
      }),
      { numRuns: 200 },
    );
  });

  it('refuses what is not physical', () => {
    expect(() => ampsAt({ ...GENERIC_36_CELLS, shuntOhms: 0 }, 10)).toThrow('are not physical');
    expect(() => ampsAt({ ...GENERIC_36_CELLS, lightA: NaN }, 10)).toThrow('are not physical');
    expect(() => ampsAt(GENERIC_36_CELLS, 60)).toThrow('Voltage across the panel 60 V');
    expect(() => diodeSlopeV({ ideality: 0.2, cells: 36, cellC: 25 })).toThrow('Ideality 0.2');
  });
});
