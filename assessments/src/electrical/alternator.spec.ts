import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../test/ngspice.ts';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { alternatorFlow } from './alternator-circuit.ts';
import {
  alternatorAmps,
  chargersOnAlternator,
  feedConstantPower,
  hoursToTake,
  inputAmps,
  inputWatts,
  isEngaged,
  leftForCharging,
} from './alternator.ts';
import { fullOutputAt } from './charging/timetable.ts';
import { ahToReturn, bulkHours, looksPerHour, meanWithLooks, quietHours } from './charge-time.ts';

const HOT_IDLE = { ratedA: 120, hotFactor: 0.7, speedFactor: 0.6 };
const OUTPUT = { amps: 40, volts: 14.4, efficiency: 0.92 };
const OVERRIDE = { openV: 12.6, ohms: 0.01, watts: 600 };
const NIGHT = { usedAh: 30, efficiency: 0.95, chargerA: 40, loadA: 0 };
const CHARGER = {
  ...{ limitA: 40, absorptionV: 14.4, floatV: 13.6, tailA: 2 },
  ...{ tailHoldH: 0.1, longestAbsorptionH: 8 },
};
const to24V = { amps: 20, volts: 28.8, efficiency: 0.9 };

/** What the library says to each row of a table. */
function checkRows(table: string, column: string, says: Record<string, () => number>): void {
  it.each(readTable(table))(`$${column}: $value`, (row) => {
    const say = says[row[column] ?? ''];
    if (!say) throw new Error(`Nothing answers the row "${row[column]}".`);
    const value = numberIn(row, 'value');
    const places = (row.value ?? '').split('.')[1]?.length ?? 0;
    expect(Math.abs(say() - value)).toBeLessThanOrEqual(0.51 * 10 ** -places);
  });
}

describe('alternators and the input of chargers', () => {
  checkRows('alternator-cases.csv', 'case', {
    '120 A hot 0.70 at idle 0.60 less 25 A for the vehicle': () => leftForCharging(HOT_IDLE, 25),
    'the same on the road': () => leftForCharging({ ...HOT_IDLE, speedFactor: 1 }, 25),
    'input of 40 A at 14.4 V at 0.92 from 13.2 V': () => inputAmps(OUTPUT, 13.2),
    'the same from 12.5 V': () => inputAmps(OUTPUT, 12.5),
    'the same at half output from 13.2 V': () => inputAmps({ ...OUTPUT, amps: 20 }, 13.2),
    'one half of a 120 A alternator': () =>
      chargersOnAlternator({ ...HOT_IDLE, hotFactor: 1 }, { inputsA: [], share: 0.5 }).allowedA,
    'input of 20 A at 28.8 V at 0.90 from 13.5 V': () => inputAmps(to24V, 13.5),
    'drop of 21.110593 A in 15.28 mΩ': () => {
      const { chargerA, postV, chargerV } = alternatorFlow(HOUSE);
      expect(chargerA).toBeCloseTo(21.110593, 6);
      return postV - chargerV;
    },
    '12.3 V at the input under an engagement level of 13.2 V': () =>
      Number(isEngaged({ volts: 12.3, engageV: 13.2, hasRunSignal: false, hasOverride: false })),
    'hours of 600 W from 12.6 V behind 10 mΩ to take half of 60 Ah': () =>
      hoursToTake(60, 0.5, feedConstantPower(OVERRIDE).amps),
  });

  it('engage under the level on a run signal or with the override (trap)', () => {
    const smart = { volts: 12.3, engageV: 13.2 };
    expect(isEngaged({ ...smart, hasRunSignal: true, hasOverride: false })).toBe(true);
    expect(isEngaged({ ...smart, hasRunSignal: false, hasOverride: true })).toBe(true);
  });

  it('draw more amps the lower the volts: constant power (trap)', () => {
    fc.assert(
      fc.property(fc.double({ min: 10, max: 15, noNaN: true }), (volts) => {
        expect(inputAmps(OUTPUT, volts) * volts).toBeCloseTo(inputWatts(OUTPUT), 9);
        expect(inputAmps(OUTPUT, volts)).toBeGreaterThan(inputAmps(OUTPUT, volts + 0.5));
      }),
    );
  });

  it('the override left on takes half of 60 Ah in 0.605 h at 49.57 A (trap: engine off)', () => {
    const { amps } = feedConstantPower(OVERRIDE);
    expect(amps).toBeCloseTo(49.569126, 5);
    expect(hoursToTake(60, 0.5, amps)).toBeCloseTo(0.605215, 5);
    // At 14.4 V, with the engine on, it would have been 41.67 A.
    expect(amps).toBeGreaterThan(600 / 14.4);
  });

  it('two chargers go beyond half of a hot alternator that one keeps within', () => {
    const one = chargersOnAlternator(HOT_IDLE, { inputsA: [38], share: 0.5 });
    const two = chargersOnAlternator(HOT_IDLE, { inputsA: [38, 22], share: 0.5 });
    expect(one).toEqual({ drawnA: 38, allowedA: 42, isWithin: true });
    expect(two).toEqual({ drawnA: 60, allowedA: 42, isWithin: false });
    expect(leftForCharging(HOT_IDLE, 25) - two.drawnA).toBeLessThan(0);
  });

  it('refuse what no plate or source has', () => {
    expect(() => alternatorAmps({ ...HOT_IDLE, hotFactor: 70 })).toThrow('0.7 for 70 %');
    expect(() => feedConstantPower({ openV: 12, ohms: 1, watts: 100 })).toThrow(
      '100 W is over the 36 W that 12 V behind 1 Ω can give',
    );
    expect(() => hoursToTake(60, 0, 10)).toThrow('Share taken 0');
  });
});

/** The charger of the netlist puts 20 A at 12.7344 V out at 0.90. */
const HOUSE = {
  alternator: { setV: 14.4, ohms: 0.00517, limitA: Infinity },
  startBattery: { restV: 12.6, ohms: 0.012 },
  loadsA: 15,
  charger: { watts: (20 * 12.7344) / 0.9, ohms: 0.01528 },
};

describe('the alternator circuit against ngspice', () => {
  const at = (results: ReadonlyMap<string, number>, name: string): number =>
    results.get(name) ?? NaN;

  it('agrees with a limit: overload, engine off, and within it', () => {
    const spice = runNgspice('alternator-limit.cir');
    const limited = { setV: 14.2, ohms: 0.005, limitA: 70 };
    const cases = [
      { name: 'a', limitA: 70, ohms: 0.01, loadsA: 55, watts: 600 },
      { name: 'b', limitA: 0, ohms: 0.01, loadsA: 0, watts: 600 },
      { name: 'c', limitA: 70, ohms: 0.2, loadsA: 25, watts: 300 },
    ];
    for (const { name, limitA, ohms, loadsA, watts } of cases) {
      const flow = alternatorFlow({
        alternator: { ...limited, limitA },
        startBattery: { restV: 12.6, ohms },
        loadsA,
        charger: { watts, ohms: 0 },
      });
      expect(flow.postV).toBeCloseTo(at(spice, `v(sp${name})`), 6);
      expect(flow.batteryA).toBeCloseTo(at(spice, `batt${name}`), 5);
      expect(flow.chargerA).toBeCloseTo(at(spice, `dcdc${name}`), 5);
      if (name !== 'b') expect(flow.alternatorA).toBeCloseTo(at(spice, `alt${name}`), 5);
    }
  });

  it('agrees without a limit, the charger at the end of a cable', () => {
    const spice = runNgspice('alternator-charger-house.cir');
    const flow = alternatorFlow(HOUSE);
    expect(flow.postV).toBeCloseTo(at(spice, 'v(sp)'), 6);
    expect(flow.chargerV).toBeCloseTo(at(spice, 'v(din)'), 6);
    expect(flow.chargerA).toBeCloseTo(at(spice, 'i_dcdc_in'), 5);
    expect(flow.batteryA).toBeCloseTo(at(spice, 'i_start_charge'), 4);
    expect(flow.alternatorA).toBeCloseTo(at(spice, 'i_alternator'), 4);
  });

  it('makes the start battery give what a limited alternator cannot', () => {
    const watts = fc.double({ min: 0, max: 900, noNaN: true });
    const limits = fc.double({ min: 0, max: 150, noNaN: true });
    fc.assert(
      fc.property(watts, limits, (power, limitA) => {
        const flow = alternatorFlow({
          alternator: { setV: 14.2, ohms: 0.005, limitA },
          startBattery: { restV: 12.6, ohms: 0.01 },
          loadsA: 40,
          charger: { watts: power, ohms: 0.01 },
        });
        expect(flow.alternatorA).toBeLessThanOrEqual(limitA + 1e-6);
        expect(flow.alternatorA).toBeGreaterThanOrEqual(-1e-6);
        expect(flow.chargerV * flow.chargerA).toBeCloseTo(power, 6);
        expect(flow.postV).toBeLessThanOrEqual(14.2);
      }),
    );
  });

  it('refuses a power that the circuit cannot give', () => {
    const engineOff = { ...HOUSE, alternator: { setV: 14.4, ohms: 0.005, limitA: 0 } };
    expect(() => alternatorFlow({ ...engineOff, charger: { watts: 5000, ohms: 0 } })).toThrow(
      '5000 W is more than this circuit can give',
    );
  });
});

describe('the time of a charge', () => {
  checkRows('charging-facts.csv', 'fact', {
    'quiet running of a 40 A charger': () => fullOutputAt({ ...CHARGER, quietUntilH: 1 }, 0.5),
    'hours for 30 Ah at 0.95 at 40 A': () => bulkHours(NIGHT),
    'hours for 30 Ah at 0.95 at 20 A': () => quietHours(NIGHT, 24),
    'the same with a 5 A load at 40 A': () => bulkHours({ ...NIGHT, loadA: 5 }),
    'the same with a 5 A load at 20 A': () => quietHours({ ...NIGHT, loadA: 5 }, 24),
    'looks in an hour at one in 180 s': () => looksPerHour(180),
    'mean of 40 A with 5 s of each 180 s off': () => meanWithLooks(40, { everyS: 180, forS: 5 }),
    'amps of 600 W from 12.60 V behind 10 mΩ': () => feedConstantPower(OVERRIDE).amps,
    'hours for 60 Ah at 0.95 with a 5 A load and 40 A quiet for 3 h': () =>
      quietHours({ ...NIGHT, usedAh: 60, loadA: 5 }, 3),
    '600 W from 14 V': () => inputAmps({ amps: 40, volts: 15, efficiency: 1 }, 14),
    '600 W from 12.1 V': () => inputAmps({ amps: 40, volts: 15, efficiency: 1 }, 12.1),
  });

  it('in quiet running is double without a load, and more than double with one (trap)', () => {
    expect(quietHours(NIGHT, 24) / bulkHours(NIGHT)).toBeCloseTo(2, 9);
    const loaded = { ...NIGHT, loadA: 5 };
    expect(quietHours(loaded, 24) / bulkHours(loaded)).toBeCloseTo(2.333333, 5);
  });

  it('grows with the use and the load, and asks for more than was taken', () => {
    expect(ahToReturn(45, 0.85)).toBeCloseTo(52.941176, 5);
    expect(bulkHours({ usedAh: 45, efficiency: 0.85, chargerA: 30, loadA: 5 })).toBeCloseTo(
      2.117647,
      5,
    );
    expect(() => bulkHours({ ...NIGHT, loadA: 40 })).toThrow('lower the load');
    expect(() => quietHours({ ...NIGHT, loadA: 20 }, 3)).toThrow('cannot charge');
    expect(() => meanWithLooks(40, { everyS: 180, forS: 180 })).toThrow('Off-load look 180 s');
  });
});
