import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../../test/ngspice.ts';
import { numberIn, readTable } from '../../../test/reference/read-table.ts';
import { type Battery, type BatteryKind, batteryModel } from './battery-model.ts';
import { type ChargeLog, logCharge } from './log-charge.ts';
import { type ChargeReading, readingAt } from './readings.ts';
import { type ChargeRun } from './settings.ts';

/** Rest voltage rising with charge behind one resistance: what the closed forms are about. */
function plainBattery(ohms: number): Battery {
  return {
    restShares: [0, 1],
    restVolts: [11.9, 12.8],
    capacityAh: 100,
    seriesOhms: ohms,
    fillingOhms: 0,
    fullShare: 1.005,
    relaxOhms: 0,
    relaxS: 240,
    efficiency: 1,
  };
}

const CHARGER = {
  limitA: 30,
  absorptionV: 14.4,
  floatV: 13.6,
  tailA: 2.2,
  tailHoldH: 5 / 60,
  longestAbsorptionH: Infinity,
};
const NO_LOAD = { amps: 0, fromH: 0 };

function at(log: ChargeLog, hour: number): ChargeReading {
  const reading = readingAt(log.readings, hour);
  if (!reading) throw new Error(`No reading at ${hour} h.`);
  return reading;
}

describe('closed forms of a taper', () => {
  it('falls as exp(-t/τ) at a held voltage, τ = R C / (ΔE η)', () => {
    const charger = { ...CHARGER, limitA: 500, absorptionV: 12.7, floatV: 12.2, tailA: 1 };
    const run = { battery: plainBattery(0.05), charge: 0.2, charger, load: NO_LOAD };
    const { readings } = logCharge({ ...run, hours: 10, stepS: 60 });
    const tauH = (0.05 * 100) / 0.9;
    const first = readings[0]?.amps ?? NaN;
    expect(first).toBeCloseTo((12.7 - 12.08) / 0.05, 9);
    for (const { hour, amps, stage } of readings) {
      if (stage !== 'absorption') continue;
      // Error of the midpoint rule over t: (t/τ)(h/τ)²/6, at most 2.7e-6 here.
      const bound = 1e-9 + ((hour / tauH) * (1 / 60 / tauH) ** 2) / 6;
      expect(Math.abs(amps / (first * Math.exp(-hour / tauH)) - 1)).toBeLessThan(bound * 1.01);
    }
  });

  it('takes τ ln(I0/It) from one current to another and puts in τ(I0 - It)', () => {
    // 30 A to 2 A at 0.55 h takes 1.489427 h (closed form, computed outside).
    const [row] = readTable('trade-facts.csv').filter((one) => one.fact?.includes('taper'));
    const charger = {
      ...{ ...CHARGER, absorptionV: 12.6, floatV: 12, tailA: 2 },
      tailHoldH: 0,
    };
    const battery = plainBattery((0.55 * 0.9) / 100);
    const run = { battery, charge: 0.5, charger, load: NO_LOAD, hours: 6, stepS: 60 };
    const log = logCharge(run);
    const [from, to] = [log.bulkEndsH ?? NaN, log.floatStartsH ?? NaN];
    expect(to - from).toBeCloseTo(numberIn(row ?? {}, 'value'), 3);
    expect((at(log, to - 1e-6).charge - at(log, from).charge) * 100).toBeCloseTo(0.55 * 28, 1);
  });

  it('relaxes as exp(-t/τ) once the current stops, to the rest voltage', () => {
    const battery = { ...plainBattery(0.01), relaxOhms: 0.02, relaxS: 300 };
    const charger = {
      ...CHARGER,
      limitA: 20,
      tailA: 19,
      afterAbsorption: 'rest' as const,
      longestAbsorptionH: 0.01,
      absorptionV: 13,
    };
    const run = { battery, charge: 0.6, charger, load: NO_LOAD, hours: 4, stepS: 60 };
    const log = logCharge(run);
    const stopsH = log.floatStartsH ?? NaN;
    const rested = log.readings.at(-1)?.volts ?? NaN;
    const above = at(log, stopsH).volts - rested;
    expect(above).toBeGreaterThan(0.3);
    for (const { hour, volts } of log.readings.filter((one) => one.hour > stopsH)) {
      expect(volts - rested).toBeCloseTo(above * Math.exp((stopsH - hour) * 12), 4);
    }
  });
});

describe('another program', () => {
  it.each(readTable('charge-model.csv'))(
    'agrees without the pair’s delay on $kind $capacity_Ah Ah at $limit_A A',
    (row) => {
      const kind = ['agm', 'flooded', 'gel'].find((one) => one === row.kind) as BatteryKind;
      const cell = (column: string): number => numberIn(row, column);
      const model = batteryModel({ kind, capacityAh: cell('capacity_Ah'), blocks: 1 });
      const log = logCharge({
        battery: { ...model, relaxS: 0.01 },
        charge: cell('charge'),
        charger: {
          limitA: cell('limit_A'),
          absorptionV: cell('absorption_V'),
          floatV: cell('float_V'),
          tailA: cell('tail_A'),
          tailHoldH: 5 / 60,
          longestAbsorptionH: row.longest_h === '' ? Infinity : cell('longest_h'),
        },
        load: { amps: cell('load_A'), fromH: 0 },
        hours: 12,
        stepS: 60,
      });
      expect(log.bulkEndsH).toBeCloseTo(cell('bulk_ends_h'), 2);
      if (row.float_starts_h === '') expect(log.floatStartsH).toBeNull();
      else expect(log.floatStartsH).toBeCloseTo(cell('float_starts_h'), 2);
      expect(Math.abs(at(log, cell('at_h')).amps / cell('amps') - 1)).toBeLessThan(0.005);
    },
  );
});

/** What a run and two moments to look at put into the netlist. */
function netlistOf(run: ChargeRun, log: ChargeLog, times: { atH: number; lateH: number }) {
  const { battery, charger, load } = run;
  const { restShares, restVolts, ...cell } = battery;
  const points = restShares.flatMap((share, index) => [share, restVolts[index] ?? NaN]);
  return {
    ...{ seriesOhms: cell.seriesOhms, relaxOhms: cell.relaxOhms, fillingOhms: cell.fillingOhms },
    ...{ fullShare: cell.fullShare, relaxS: cell.relaxS, efficiency: cell.efficiency },
    ...{ capacityAh: cell.capacityAh, charge: run.charge, restPwl: points.join(', ') },
    ...{ limitA: charger.limitA, nearLimitA: charger.limitA * 0.9998, tailA: charger.tailA },
    ...{ holdV: charger.absorptionV, lowerV: charger.floatV, loadA: load.amps },
    leadOhms: Math.max(charger.leadOhms ?? 0, 1e-9),
    stepS: (log.floatStartsH ?? 99) * 3600,
    atS: times.atH * 3600,
    lateS: times.lateH * 3600,
    endS: (times.lateH + 0.1) * 3600,
    mostS: 20,
  };
}

interface SpiceCase {
  what: string;
  kind: BatteryKind;
  capacityAh: number;
  charge: number;
  charger: Partial<ChargeRun['charger']>;
  loadA: number;
  /** In absorption; in float or at rest. */
  atH: number;
  lateH: number;
}

const CASES: SpiceCase[] = [
  {
    what: 'an AGM battery',
    ...{ kind: 'agm', capacityAh: 110, charge: 0.5, charger: {}, loadA: 0, atH: 2, lateH: 3.5 },
  },
  {
    what: 'a lead of 30 mΩ, sensed at the charger',
    ...{ kind: 'agm', capacityAh: 110, charge: 0.5, charger: { leadOhms: 0.03 } },
    ...{ loadA: 0, atH: 2, lateH: 3.8 },
  },
  {
    what: 'a flooded battery with a load on it',
    ...{ kind: 'flooded', capacityAh: 180, charge: 0.45 },
    charger: { limitA: 40, absorptionV: 14.6, floatV: 13.5, tailA: 13 },
    ...{ loadA: 8, atH: 3, lateH: 6 },
  },
  {
    what: 'a gel battery',
    ...{ kind: 'gel', capacityAh: 120, charge: 0.6 },
    charger: { limitA: 25, absorptionV: 14.1, tailA: 4 },
    ...{ loadA: 0, atH: 2, lateH: 4 },
  },
  {
    what: 'a lithium battery',
    ...{ kind: 'lithium', capacityAh: 100, charge: 0.2 },
    charger: { limitA: 40, absorptionV: 14.2, floatV: 13.5, tailA: 4 },
    ...{ loadA: 0, atH: 2.02, lateH: 3 },
  },
];

describe('ngspice transients', () => {
  // Tolerances: 0.1 % of a time, 0.5 % of a current, 5 mV, 0.1 % of the capacity.
  it.each(CASES)('agree on $what', ({ charger, loadA, atH, lateH, ...plate }) => {
    const run: ChargeRun = {
      battery: batteryModel({ ...plate, blocks: 1 }),
      charge: plate.charge,
      charger: { ...CHARGER, ...charger },
      load: { amps: loadA, fromH: 0 },
      hours: lateH + 0.2,
      stepS: 20,
    };
    const log = logCharge(run);
    const spice = runNgspice('staged-charge.cir', netlistOf(run, log, { atH, lateH }));
    const near = (name: string, ours: number | null, share: number): void => {
      const theirs = spice.get(name) ?? NaN;
      expect(Math.abs((ours ?? NaN) - theirs), name).toBeLessThan(share * Math.abs(theirs));
    };
    const { tailHoldH } = run.charger;
    near('bulk_ends', (log.bulkEndsH ?? NaN) * 3600, 0.001);
    near('tail', ((log.floatStartsH ?? NaN) - tailHoldH) * 3600, 0.001);
    const [early, late] = [at(log, atH), at(log, lateH)];
    near('amps_at', early.amps, 0.005);
    near('volts_at', early.volts, 0.005 / 14);
    near('battery_volts_at', early.batteryVolts, 0.005 / 14);
    near('charge_at', early.charge, 0.001);
    near('late_volts', late.batteryVolts, 0.005 / 14);
    if (late.amps > 0) near('late_amps', late.amps, 0.005);
    else expect(Math.abs(spice.get('late_amps') ?? NaN)).toBeLessThan(1e-3);
  });
});
