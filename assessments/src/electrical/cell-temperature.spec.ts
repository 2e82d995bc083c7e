import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { cellTemperatureC, panelWatts } from './cell-temperature.ts';

describe('a panel in the sun', () => {
  it.each(readTable('cell-temperature.csv'))(
    'at $air_C °C and $light_W_m2 W/m² has cells at $cell_C °C and gives $watts W',
    (row) => {
      const lightWPerM2 = numberIn(row, 'light_W_m2');
      const cellC = cellTemperatureC({
        airC: numberIn(row, 'air_C'),
        noctC: numberIn(row, 'noct_C'),
        lightWPerM2,
      });
      expect(cellC).toBeCloseTo(numberIn(row, 'cell_C'), 4);
      const watts = panelWatts({
        ratedW: numberIn(row, 'rated_W'),
        percentPerK: numberIn(row, 'percent_per_K'),
        cellC,
        lightWPerM2,
      });
      expect(watts).toBeCloseTo(numberIn(row, 'watts'), 3);
    },
  );

  it('has cells at air temperature in the dark, and at its NOCT under NOCT conditions', () => {
    expect(cellTemperatureC({ airC: 12, noctC: 46, lightWPerM2: 0 })).toBe(12);
    expect(cellTemperatureC({ airC: 20, noctC: 46, lightWPerM2: 800 })).toBe(46);
  });

  it('gives more in more light and less when hotter', () => {
    const light = fc.double({ min: 0, max: 1400, noNaN: true });
    const cell = fc.double({ min: -40, max: 95, noNaN: true });
    fc.assert(
      fc.property(light, cell, (lightWPerM2, cellC) => {
        const panel = { ratedW: 200, percentPerK: -0.4 };
        const watts = panelWatts({ ...panel, cellC, lightWPerM2 });
        expect(watts).toBeGreaterThanOrEqual(0);
        expect(panelWatts({ ...panel, cellC: cellC + 5, lightWPerM2 })).toBeLessThanOrEqual(watts);
        const brighter = { ...panel, cellC, lightWPerM2: lightWPerM2 + 100 };
        expect(panelWatts(brighter)).toBeGreaterThan(watts);
      }),
    );
  });

  it('refuses kilowatts for watts and a NOCT that is no panel’s', () => {
    expect(() => cellTemperatureC({ airC: 25, noctC: 45, lightWPerM2: 10_000 })).toThrow(
      'Irradiance 10000 W/m² is outside 0 to 1500 W/m²; full sun is about 1000 W/m².',
    );
    expect(() => cellTemperatureC({ airC: 25, noctC: 25, lightWPerM2: 800 })).toThrow('NOCT 25 °C');
  });
});
