import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { bankOf, capacityForUse, shareInParallel, usableAh } from './battery-bank.ts';
import {
  type ChargeChemistry,
  chargeVoltageRange,
  compensatedV,
  mayCharge,
} from './charge-voltage.ts';
import { chargeOfGravity, freezingPointC, gravityShift } from './hydrometer.ts';
import { ahAtRate, capacityAtOneAmp, hoursAtRate, hoursByShortForm } from './peukert.ts';

const between = (min: number, max: number): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true });
const toCelsius = (fahrenheit: number): number => (fahrenheit - 32) / 1.8;

describe('a bank', () => {
  it('adds volts in series and ampere-hours in parallel', () => {
    expect(bankOf({ blockV: 12, blockAh: 110, inSeries: 2, inParallel: 2 })).toEqual({
      volts: 24,
      capacityAh: 220,
      wattHours: 5280,
    });
  });

  it('gives a use for some days out of the depth allowed', () => {
    expect(capacityForUse({ dailyAh: 62, days: 1.5, depth: 0.5 })).toBeCloseTo(186, 9);
    expect(usableAh(186, 0.5)).toBeCloseTo(62 * 1.5, 9);
  });

  it('loads the nearer of two parallel batteries more', () => {
    const { nearA, farA } = shareInParallel({ batteryOhms: 0.005, linkOhms: 0.0005, amps: 120 });
    expect(nearA).toBeCloseTo(65.4545, 3);
    expect(nearA * 0.005).toBeCloseTo(farA * 0.006, 12);
  });

  it('refuses what is no bank', () => {
    const block = { blockV: 12, blockAh: 110 };
    expect(() => bankOf({ ...block, inSeries: 0, inParallel: 1 })).toThrow('Batteries in series 0');
    expect(() => bankOf({ ...block, inSeries: 1, inParallel: 1.5 })).toThrow('whole number');
    expect(() => usableAh(100, 1.2)).toThrow('Depth allowed 1.2');
  });
});

describe('Peukert’s law', () => {
  it.each(readTable('peukert.csv'))(
    'gives $rated_form_h h and $short_form_h h of $capacity_Ah Ah at $amps A',
    (row) => {
      const cell = (column: string): number => numberIn(row, column);
      const rated = {
        capacityAh: cell('capacity_Ah'),
        ratedHours: cell('rated_h'),
        exponent: cell('exponent'),
      };
      const amps = cell('amps');
      expect(hoursAtRate(rated, amps)).toBeCloseTo(cell('rated_form_h'), 5);
      expect(ahAtRate(rated, amps)).toBeCloseTo(cell('delivered_Ah'), 4);
      const short = hoursByShortForm(rated.capacityAh, rated.exponent, amps);
      expect(short).toBeCloseTo(cell('short_form_h'), 5);
      const atOneAmp = capacityAtOneAmp(rated);
      expect(hoursByShortForm(atOneAmp, rated.exponent, amps)).toBeCloseTo(
        hoursAtRate(rated, amps),
        9,
      );
    },
  );

  it('is 3.789 h by one form and 2.746 h by the other for one plate (trap: two capacities)', () => {
    const plate = { capacityAh: 100, ratedHours: 20, exponent: 1.2 };
    expect(hoursAtRate(plate, 20)).toBeCloseTo(3.789291, 5);
    expect(hoursByShortForm(100, 1.2, 20)).toBeCloseTo(2.746401, 5);
  });

  it('gives the rated time at the rated current, and never more ampere-hours at more amps', () => {
    const rated = fc.record({
      capacityAh: between(20, 1000),
      ratedHours: fc.constantFrom(5, 10, 20),
      exponent: between(1, 1.4),
    });
    fc.assert(
      fc.property(rated, between(1, 100), between(1, 3), (battery, amps, more) => {
        const { capacityAh, ratedHours } = battery;
        expect(hoursAtRate(battery, capacityAh / ratedHours)).toBeCloseTo(ratedHours, 9);
        const drop = ahAtRate(battery, amps * more) / ahAtRate(battery, amps);
        expect(drop).toBeLessThanOrEqual(1 + 1e-9);
      }),
    );
  });

  it('refuses a current of nought', () => {
    const rated = { capacityAh: 100, ratedHours: 20, exponent: 1.2 };
    expect(() => hoursAtRate(rated, 0)).toThrow('Current 0 A is outside 0.01 to 1000 A');
  });
});

describe('the hydrometer', () => {
  it('takes 0.009 off a reading at 50 °F: cold acid reads high (trap: the sign)', () => {
    expect(gravityShift(toCelsius(50))).toBeCloseTo(-0.009, 9);
    expect(gravityShift(toCelsius(77))).toBeCloseTo(0, 12);
    expect(1.226 + gravityShift(toCelsius(50))).toBeCloseTo(1.217, 9);
  });

  it.each(readTable('gravity-charge.csv'))('reads $gravity as $words', (row) => {
    expect(chargeOfGravity(numberIn(row, 'gravity'))).toBeCloseTo(numberIn(row, 'charge'), 9);
  });

  it.each(readTable('freezing.csv'))('freezes $gravity at $fahrenheit °F', (row) => {
    const celsius = freezingPointC(numberIn(row, 'gravity'));
    expect(celsius * 1.8 + 32).toBeCloseTo(numberIn(row, 'fahrenheit'), 9);
    expect(celsius).toBeCloseTo(numberIn(row, 'celsius'), 1);
  });

  it('is fuller and harder to freeze the heavier the acid', () => {
    const gravity = between(1.1301, 1.2799);
    fc.assert(
      fc.property(gravity, gravity, (one, other) => {
        const [light, heavy] = [Math.min(one, other), Math.max(one, other)];
        expect(chargeOfGravity(light)).toBeLessThanOrEqual(chargeOfGravity(heavy));
        expect(freezingPointC(light)).toBeGreaterThanOrEqual(freezingPointC(heavy));
      }),
    );
  });

  it('refuses a reading off the table', () => {
    expect(() => chargeOfGravity(1.05)).toThrow('Specific gravity 1.05');
    expect(() => freezingPointC(1.09)).toThrow('the printed table ends there');
    expect(() => gravityShift(80)).toThrow('Electrolyte temperature 80 °C');
  });
});

describe('charging voltages', () => {
  // Trap: set points are ranges, and the maker's figure goes first.
  it.each(readTable('charge-voltages.csv'))('of $chemistry in $stage are a range', (row) => {
    const stage = row.stage === 'float' ? 'float' : 'absorption';
    const range = chargeVoltageRange(row.chemistry as ChargeChemistry, stage);
    const cells = row.chemistry === 'lithium' ? 4 : 6;
    expect(range.least / cells).toBeCloseTo(numberIn(row, 'cell_least_V'), 9);
    expect(range.most / cells).toBeCloseTo(numberIn(row, 'cell_most_V'), 9);
    // The 12 V column is printed to a tenth.
    expect(Math.abs(range.least - numberIn(row, 'least_12V'))).toBeLessThan(0.0501);
    expect(Math.abs(range.most - numberIn(row, 'most_12V'))).toBeLessThan(0.0501);
    expect(range.least).toBeLessThan(range.most);
  });

  it('a gel battery at 14.8 V is over its range, a flooded one is not (trap)', () => {
    expect(chargeVoltageRange('gel', 'absorption').most).toBeLessThan(14.8);
    expect(chargeVoltageRange('flooded', 'absorption').most).toBeGreaterThan(14.8);
  });

  it.each(readTable('float-article.csv'))('an article’s $chemistry float is $volts V', (row) => {
    expect(numberIn(row, 'cell_V') * 6).toBeCloseTo(numberIn(row, 'volts'), 2);
    const range = chargeVoltageRange(row.chemistry as ChargeChemistry, 'float');
    // It prints one figure for gel that lies below the handbooks' range: ranges, not set points.
    if (row.chemistry !== 'gel') {
      expect(numberIn(row, 'volts')).toBeGreaterThanOrEqual(range.least);
      expect(numberIn(row, 'volts')).toBeLessThanOrEqual(range.most);
    }
  });

  it.each(readTable('temperature-compensation.csv'))(
    '$volts_at_25C V becomes $volts V at $celsius °C',
    (row) => {
      const volts = compensatedV({
        volts: numberIn(row, 'volts_at_25C'),
        cells: numberIn(row, 'cells'),
        mvPerKelvinCell: numberIn(row, 'mv_per_K_cell'),
        celsius: numberIn(row, 'celsius'),
      });
      expect(volts).toBeCloseTo(numberIn(row, 'volts'), 6);
    },
  );

  it('with -5 and with -3.9 mV differ: the figure given is used (trap)', () => {
    const setting = { volts: 13.4, cells: 6, celsius: 30 };
    expect(compensatedV({ ...setting, mvPerKelvinCell: -5 })).toBeCloseTo(13.25, 9);
    expect(compensatedV({ ...setting, mvPerKelvinCell: -3.9 })).toBeCloseTo(13.283, 9);
  });

  it('refuse a compensation that takes volts off in the cold', () => {
    const setting = { volts: 14.4, cells: 6, celsius: 10 };
    expect(() => compensatedV({ ...setting, mvPerKelvinCell: 4 })).toThrow('a cold battery needs');
  });

  it('forbid charging lithium under 0 °C, and lead-acid not (trap)', () => {
    expect([mayCharge('lithium', -4), mayCharge('lithium', 0)]).toEqual([false, true]);
    expect(mayCharge('agm', -4)).toBe(true);
  });
});
