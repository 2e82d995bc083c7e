import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { coldFactor, openVoltsAt } from './cold-voltage.ts';
import { inputMarginV, mostInSeries } from './solar-array.ts';

describe('the cold factor', () => {
  it.each(readTable('cold-factors.csv'))('is $factor from $highest_C to $lowest_C °C', (row) => {
    for (const column of ['highest_C', 'lowest_C']) {
      expect(coldFactor(numberIn(row, column))).toBe(numberIn(row, 'factor'));
    }
  });

  it('takes the colder band between two of the table’s whole degrees', () => {
    expect(coldFactor(-5.5)).toBe(1.14);
  });

  it('never falls as it gets colder', () => {
    const celsius = fc.double({ min: -40, max: 24, noNaN: true });
    fc.assert(
      fc.property(celsius, celsius, (a, b) => {
        expect(coldFactor(Math.min(a, b))).toBeGreaterThanOrEqual(coldFactor(Math.max(a, b)));
      }),
    );
  });

  it.each([25, -41, NaN])('refuses %d °C, naming the table’s ends', (celsius) => {
    expect(() => coldFactor(celsius)).toThrow('is outside -40 to 24 °C; the table runs from 24 °C');
  });
});

describe('a string in the cold', () => {
  it.each(readTable('cold-strings.csv'))(
    'of $in_series times $open_V V at $cell_C °C stands at $by_coefficient_V V',
    (row) => {
      const ratedOpenV = numberIn(row, 'open_V');
      const cellC = numberIn(row, 'cell_C');
      const count = numberIn(row, 'in_series');
      const limitV = numberIn(row, 'limit_V');
      const coldOpenV = openVoltsAt({
        ratedOpenV,
        percentPerK: numberIn(row, 'percent_per_K'),
        cellC,
      });
      expect(coldOpenV * count).toBeCloseTo(numberIn(row, 'by_coefficient_V'), 4);
      const isOver = inputMarginV({ coldOpenV, inSeries: count, limitV }) < 0;
      expect(isOver).toBe(row.verdict === 'exceeds');
      expect(mostInSeries({ coldOpenV, limitV }) >= count).toBe(row.verdict === 'ok');
      if (row.by_table_V !== '') {
        expect(ratedOpenV * count * coldFactor(cellC)).toBeCloseTo(numberIn(row, 'by_table_V'), 4);
      }
    },
  );

  it('trap: passes by the coefficient and fails by the table against one limit', () => {
    const coldOpenV = openVoltsAt({ ratedOpenV: 22, percentPerK: -0.3, cellC: -10 });
    expect(inputMarginV({ coldOpenV, inSeries: 2, limitV: 50 })).toBeCloseTo(1.38, 9);
    const byTable = 22 * coldFactor(-10);
    expect(inputMarginV({ coldOpenV: byTable, inSeries: 2, limitV: 50 })).toBeCloseTo(-0.16, 9);
  });

  it('trap: one household panel of 60 cells is over 40 V on a frosty morning', () => {
    // 60 × 0.65 V; worked outside this project: 43.095 V.
    const coldOpenV = openVoltsAt({ ratedOpenV: 60 * 0.65, percentPerK: -0.3, cellC: -10 });
    expect(coldOpenV).toBeCloseTo(43.095, 9);
    expect(mostInSeries({ coldOpenV, limitV: 30 })).toBe(0);
  });

  it('rises as the cells cool, and is the label’s voltage at 25 °C', () => {
    const cellC = fc.double({ min: -40, max: 100, noNaN: true });
    const percentPerK = fc.double({ min: -1, max: -0.05, noNaN: true });
    fc.assert(
      fc.property(cellC, cellC, percentPerK, (a, b, percent) => {
        const volts = (celsius: number): number =>
          openVoltsAt({ ratedOpenV: 22, percentPerK: percent, cellC: celsius });
        expect(volts(Math.min(a, b))).toBeGreaterThanOrEqual(volts(Math.max(a, b)));
        expect(volts(25)).toBe(22);
      }),
    );
  });

  it('refuses a coefficient with its sign lost', () => {
    expect(() => openVoltsAt({ ratedOpenV: 22, percentPerK: 0.3, cellC: -10 })).toThrow(
      'Voltage coefficient 0.3 %/K is outside -1 to 0 %/K',
    );
  });
});
