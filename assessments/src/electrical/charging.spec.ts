import { describe, expect, it } from 'vitest';
import { numberIn, readTable } from '../../test/reference/read-table.ts';
import { type Battery, type BatteryKind, leadAcid } from './battery.ts';
import { type ChargeLog, type ChargeRun, logCharge } from './charging.ts';

const CHARGER = {
  limitA: 30,
  absorptionV: 14.4,
  floatV: 13.6,
  tailA: 2.2,
  tailHoldH: 5 / 60,
  longestAbsorptionH: Infinity,
};
const AGM: ChargeRun = {
  battery: leadAcid('agm', 110, 1),
  charge: 0.5,
  charger: CHARGER,
  load: { amps: 0, fromH: 0 },
  hours: 8,
  stepS: 60,
};

function ampsAt({ readings }: ChargeLog, hour: number): number {
  const after = readings.findIndex((reading) => reading.hour >= hour);
  const [a, b] = [readings[after - 1], readings[after]];
  if (!a || !b) throw new Error(`No reading at ${hour} h.`);
  return a.amps + ((b.amps - a.amps) * (hour - a.hour)) / (b.hour - a.hour);
}

describe('a staged charge', () => {
  it('holds current in bulk, the upper voltage in absorption, the lower in float', () => {
    const { readings } = logCharge(AGM);
    for (const { stage, volts, amps } of readings) {
      if (stage === 'bulk') {
        expect(amps).toBeCloseTo(30, 6);
        expect(volts).toBeLessThan(14.4 + 1e-6);
      } else {
        expect(volts).toBeCloseTo(stage === 'absorption' ? 14.4 : 13.6, 6);
        expect(amps).toBeLessThan(30);
      }
    }
    expect(new Set(readings.map(({ stage }) => stage))).toEqual(
      new Set(['bulk', 'absorption', 'float']),
    );
  });

  it.each(readTable('charge-model.csv'))(
    'agrees with another program on $kind $capacity_Ah Ah at $limit_A A',
    (row) => {
      const kind = ['agm', 'flooded', 'gel'].find((one) => one === row.kind) as BatteryKind;
      const cell = (column: string): number => numberIn(row, column);
      const log = logCharge({
        battery: leadAcid(kind, cell('capacity_Ah'), 1),
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
      const amps = ampsAt(log, cell('at_h'));
      expect(Math.abs(amps / cell('amps') - 1)).toBeLessThan(0.005);
    },
  );

  it.each<[BatteryKind, number, number]>([
    ['agm', 110, 30],
    ['flooded', 180, 40],
    ['gel', 120, 25],
    ['flooded', 330, 60],
  ])('moves no stage time of %s %d Ah by 0.5 % when the step is halved', (kind, ah, limitA) => {
    const run = {
      ...AGM,
      battery: leadAcid(kind, ah, 1),
      charger: { ...CHARGER, limitA, tailA: 4 },
    };
    const coarse = logCharge({ ...run, hours: 12, stepS: 60 });
    const fine = logCharge({ ...run, hours: 12, stepS: 30 });
    for (const time of ['bulkEndsH', 'floatStartsH'] as const) {
      expect(coarse[time]).not.toBeNull();
      expect(Math.abs((coarse[time] ?? NaN) / (fine[time] ?? NaN) - 1)).toBeLessThan(0.005);
    }
  });

  it('tapers as the closed form says where the resistance is constant', () => {
    // Constant voltage into E = E0 + kQ behind R: I falls as exp(-t/τ), τ = R C / (ΔE η).
    const battery: Battery = {
      emptyV: 11.9,
      fullV: 12.8,
      capacityAh: 100,
      baseOhms: 0.05,
      fillingOhms: 0,
      efficiency: 1,
    };
    const charger = { ...CHARGER, limitA: 500, absorptionV: 12.7, floatV: 12.2, tailA: 1 };
    const { readings } = logCharge({ ...AGM, battery, charger, charge: 0.2, hours: 10 });
    const tauH = (0.05 * 100) / 0.9;
    const first = readings[0]?.amps ?? NaN;
    expect(first).toBeCloseTo((12.7 - 12.08) / 0.05, 9);
    for (const { hour, amps, stage } of readings) {
      if (stage === 'float') continue;
      // Error of the midpoint rule over t: (t/τ)(h/τ)²/6, at most 2.7e-6 here.
      const bound = 1e-9 + ((hour / tauH) * (1 / 60 / tauH) ** 2) / 6;
      expect(Math.abs(amps / (first * Math.exp(-hour / tauH)) - 1)).toBeLessThan(bound * 1.01);
    }
  });

  it('puts in what the closed form of a taper says', () => {
    // t = τ ln(I0/It): 0.55 h from 30 A to 2 A takes 1.489 h (closed form, computed outside).
    const [row] = readTable('trade-facts.csv').filter((one) => one.fact?.includes('taper'));
    const battery: Battery = {
      emptyV: 11.9,
      fullV: 12.8,
      capacityAh: 100,
      baseOhms: (0.55 * 0.9) / 100,
      fillingOhms: 0,
      efficiency: 1,
    };
    const charger = {
      ...CHARGER,
      limitA: 30,
      absorptionV: 12.6,
      floatV: 12,
      tailA: 2,
      tailHoldH: 0,
    };
    const log = logCharge({ ...AGM, battery, charger, charge: 0.5, hours: 6 });
    const taperH = (log.floatStartsH ?? NaN) - (log.bulkEndsH ?? NaN);
    expect(taperH).toBeCloseTo(numberIn(row ?? {}, 'value'), 3);
  });

  it('never leaves absorption while a load keeps the tail up', () => {
    const log = logCharge({ ...AGM, load: { amps: 8, fromH: 0 }, hours: 12 });
    expect(log.bulkEndsH).not.toBeNull();
    expect(log.floatStartsH).toBeNull();
    const last = log.readings.at(-1);
    expect(last?.amps).toBeGreaterThan(8);
    expect(last?.batteryAmps).toBeLessThan(2.2);
  });

  it('stays in float when a load comes on, and carries it', () => {
    const log = logCharge({ ...AGM, load: { amps: 20, fromH: 5 } });
    const after = log.readings.filter(({ hour }) => hour > 5.01);
    expect(after.every(({ stage }) => stage === 'float')).toBe(true);
    expect(after.every(({ volts }) => Math.abs(volts - 13.6) < 1e-6)).toBe(true);
    expect(after[0]?.amps).toBeGreaterThan(20);
  });

  it('goes to float on time-out with current still flowing', () => {
    const log = logCharge({ ...AGM, charger: { ...CHARGER, longestAbsorptionH: 1 } });
    expect((log.floatStartsH ?? NaN) - (log.bulkEndsH ?? NaN)).toBeCloseTo(1, 6);
    const before = log.readings.findLast(({ stage }) => stage === 'absorption');
    expect(before?.amps).toBeGreaterThan(4);
  });

  it.each(readTable('stage-cases.csv'))('shows $volts V and $amps A as $stage', (row) => {
    // Every reading of these runs near the pair must be in the stage the table names.
    const charger = { ...CHARGER, limitA: numberIn(row, 'limit_A'), tailA: 2 };
    const runs = [0, 21.4].map((amps) =>
      logCharge({
        ...AGM,
        battery: leadAcid('agm', 200, 1),
        charger,
        load: { amps, fromH: 12 },
        hours: 24,
        stepS: 20,
      }),
    );
    const near = runs
      .flatMap(({ readings }) => readings)
      .filter(({ volts, amps }) => {
        const isNearV = Math.abs(volts - numberIn(row, 'volts')) < 0.06;
        return isNearV && Math.abs(amps - numberIn(row, 'amps')) < 1;
      });
    expect(new Set(near.map(({ stage }) => stage))).toEqual(new Set([row.stage]));
  });

  it('refuses settings that make no sense, naming value and remedy', () => {
    expect(() => logCharge({ ...AGM, charger: { ...CHARGER, floatV: 14.4 } })).toThrow(
      'Float 14.4 V is not below absorption 14.4 V; lower the float setting.',
    );
    expect(() => logCharge({ ...AGM, load: { amps: 30, fromH: 0 } })).toThrow('lower the load');
    expect(() => logCharge({ ...AGM, charge: 1.2 })).toThrow('Charge at the start 1.2');
    expect(() => leadAcid('agm', 5, 1)).toThrow('Battery capacity 5 Ah is outside 20 to 2000 Ah');
    expect(() => leadAcid('agm', 100, 6)).toThrow('Blocks in series');
  });
});
