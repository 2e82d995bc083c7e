import { describe, expect, it } from 'vitest';
import { readTable, numberIn } from '../../../test/reference/read-table.ts';
import { type BatteryKind, batteryModel } from './battery-model.ts';
import { type ChargeLog, logCharge } from './log-charge.ts';
import { type ChargeReading, readingAt, spellsOf } from './readings.ts';
import { type ChargeRun, type VehicleInput } from './settings.ts';

const CHARGER = {
  limitA: 30,
  absorptionV: 14.4,
  floatV: 13.6,
  tailA: 2.2,
  tailHoldH: 5 / 60,
  longestAbsorptionH: Infinity,
};
const AGM: ChargeRun = {
  battery: batteryModel({ kind: 'agm', capacityAh: 110, blocks: 1 }),
  charge: 0.5,
  charger: CHARGER,
  load: { amps: 0, fromH: 0 },
  hours: 8,
  stepS: 60,
};

const VEHICLE_PARKED: VehicleInput = {
  fromH: 30,
  untilH: 31,
  volts: 14.2,
  engageV: 13.2,
  releaseV: 12.6,
  delayH: 30 / 3600,
  hasOverride: false,
  cableOhms: 0.015,
  efficiency: 0.9,
  battery: batteryModel({ kind: 'flooded', capacityAh: 60, blocks: 1 }),
  charge: 0.9,
};

const withCharger = (more: Partial<ChargeRun['charger']>): ChargeRun => ({
  ...AGM,
  charger: { ...CHARGER, ...more },
});

function at(log: ChargeLog, hour: number): ChargeReading {
  const reading = readingAt(log.readings, hour);
  if (!reading) throw new Error(`No reading at ${hour} h.`);
  return reading;
}

/** All readings of five runs that pass by every pair of the table. */
function staged(): ChargeReading[] {
  const run = (more: Partial<ChargeRun['charger']>, other: Partial<ChargeRun> = {}): ChargeRun => ({
    ...AGM,
    ...other,
    battery: batteryModel({ kind: 'agm', capacityAh: 200, blocks: 1 }),
    charger: { ...CHARGER, limitA: 40, tailA: 2, ...more },
    hours: 14,
    stepS: 5,
  });
  stagedReadings ??= [
    run({}),
    run({}, { load: { amps: 21.4, fromH: 12 } }),
    run({ quietUntilH: 6 }),
    run({ derate: { fromH: 0.1, toA: 25, overH: 0.5 } }),
    run({}, { charge: 0.89, vehicle: VEHICLE_PARKED }),
  ].flatMap((one) => logCharge(one).readings);
  return stagedReadings;
}
let stagedReadings: ChargeReading[] | undefined;

const hoursOf = (hour: number | null): number => hour ?? NaN;

describe('the stages', () => {
  it('hold current in bulk, the upper voltage in absorption, the lower in float', () => {
    const { readings } = logCharge(AGM);
    for (const { stage, volts, amps } of readings) {
      if (stage === 'bulk') {
        expect(amps).toBeCloseTo(30, 6);
        expect(volts).toBeLessThan(14.4 + 1e-6);
      } else if (stage === 'rest') {
        expect(amps).toBe(0);
        expect(volts).toBeGreaterThan(13.6 - 1e-6);
      } else {
        expect(volts).toBeCloseTo(stage === 'absorption' ? 14.4 : 13.6, 6);
        expect(amps).toBeLessThan(30);
      }
    }
    const stages = spellsOf(readings).map(({ stage }) => stage);
    expect(stages).toEqual(['bulk', 'absorption', 'rest', 'float']);
  });

  // Trap: current alone names no stage (pairs are common practice, no source).
  it.each(readTable('stage-cases.csv'))('show $volts V and $amps A as $stage', (row) => {
    const near = staged().filter(({ volts, amps }) => {
      const isNearV = Math.abs(volts - numberIn(row, 'volts')) < 0.06;
      return isNearV && Math.abs(amps - numberIn(row, 'amps')) < 0.5;
    });
    const shown = new Set(near.map(({ stage }) => stage));
    expect([...shown]).toEqual([row.stage]);
  });

  it('never leave absorption while a load keeps the tail up (trap: the tail counts the load)', () => {
    const log = logCharge({ ...AGM, load: { amps: 8, fromH: 0 }, hours: 12 });
    expect(log.bulkEndsH).not.toBeNull();
    expect(log.floatStartsH).toBeNull();
    const last = log.readings.at(-1);
    expect(last?.amps).toBeGreaterThan(8);
    expect(last?.batteryAmps).toBeLessThan(2.2);
    const atShunt = { ...AGM, charger: { ...CHARGER, tailAt: 'battery' as const } };
    expect(logCharge({ ...atShunt, load: { amps: 8, fromH: 0 } }).floatStartsH).not.toBeNull();
  });

  it('stay in float when a load comes on, and carry it (trap: float at a high current)', () => {
    const log = logCharge({ ...AGM, load: { amps: 20, fromH: 5, untilH: 7 } });
    const during = log.readings.filter(({ hour }) => hour > 5.01 && hour < 6.99);
    expect(during.every(({ stage }) => stage === 'float')).toBe(true);
    expect(during.every(({ volts }) => Math.abs(volts - 13.6) < 1e-6)).toBe(true);
    expect(at(log, 6).amps).toBeGreaterThan(20);
    expect(at(log, 7.5).amps).toBeLessThan(1);
  });

  it('go to float on time-out with current still flowing, and not before the least time', () => {
    const short = logCharge(withCharger({ longestAbsorptionH: 1 }));
    expect(hoursOf(short.floatStartsH) - hoursOf(short.bulkEndsH)).toBeCloseTo(1, 6);
    expect(at(short, hoursOf(short.floatStartsH) - 1e-6).amps).toBeGreaterThan(4);
    const long = logCharge(withCharger({ leastAbsorptionH: 3 }));
    expect(hoursOf(long.floatStartsH) - hoursOf(long.bulkEndsH)).toBeCloseTo(3, 6);
  });

  it('rest after absorption, or hold on, where the charger is set so', () => {
    const rested = logCharge(withCharger({ afterAbsorption: 'rest', floatV: NaN, restartV: 12.9 }));
    expect(at(rested, 7).amps).toBe(0);
    const held = logCharge(withCharger({ afterAbsorption: 'hold', floatV: NaN }));
    expect(held.floatStartsH).toBeNull();
    expect(at(held, 7).volts).toBeCloseTo(14.4, 6);
  });

  it('go back to bulk when the battery falls under the restart voltage for a minute', () => {
    const load = { amps: 45, fromH: 4, untilH: 5 };
    const log = logCharge({ ...withCharger({ restartV: 12.9 }), load });
    expect(spellsOf(log.readings).map(({ stage }) => stage)).toEqual([
      ...['bulk', 'absorption', 'rest', 'float', 'bulk', 'absorption', 'rest', 'float'],
    ]);
  });
});

describe('what goes in and out', () => {
  it('adds up: charger less loads is the battery’s, and its efficiency what stays', () => {
    const log = logCharge({ ...AGM, load: { amps: 3, fromH: 1, untilH: 3 }, hours: 3.5 });
    const { chargerAh, batteryAh, chargerWh, bulkAh } = log.totals;
    expect(chargerAh - batteryAh).toBeCloseTo(6, 9);
    const gained = (log.readings.at(-1)?.charge ?? NaN) - 0.5;
    expect((batteryAh * 0.9) / 110 / gained).toBeCloseTo(1, 3);
    expect(bulkAh).toBeCloseTo(30 * hoursOf(log.bulkEndsH), 6);
    expect(chargerWh / chargerAh).toBeGreaterThan(13);
    expect(chargerWh / chargerAh).toBeLessThan(14.4);
  });
});

describe('what changes a charge', () => {
  it('quiet running gives exactly half until its time-out', () => {
    const log = logCharge(withCharger({ quietUntilH: 1 }));
    expect([at(log, 0.99).amps, at(log, 1.01).amps]).toEqual([15, 30]);
    expect(hoursOf(log.bulkEndsH)).toBeCloseTo(hoursOf(logCharge(AGM).bulkEndsH) + 0.5, 2);
    expect(log.quietEndsH).toBe(1);
  });

  it('heat lets the limit slide: below limit and voltage no stage can be told (trap)', () => {
    const log = logCharge(withCharger({ limitA: 40, derate: { fromH: 0.4, toA: 24, overH: 0.5 } }));
    expect(at(log, 0.65).amps).toBeCloseTo(32, 6);
    expect(at(log, 1.2)).toMatchObject({ amps: 24, stage: 'held back' });
    expect(at(log, 1.2).volts).toBeLessThan(14.3);
  });

  it('an off-load look of 5 s in each 180 s lowers 40 A to a mean of 38.89 A (trap)', () => {
    const run = withCharger({ limitA: 40, pauses: { everyH: 0.05, forH: 5 / 3600 } });
    const big = batteryModel({ kind: 'flooded', capacityAh: 400, blocks: 1 });
    const log = logCharge({ ...run, battery: big, hours: 1.05 });
    const looks = log.readings.filter(({ isPaused, hour }, index) => {
      return isPaused && hour < 1.04 && log.readings[index - 1]?.isPaused === false;
    });
    expect(looks).toHaveLength(20);
    expect(log.totals.chargerAh).toBeCloseTo(40 * (1.05 - (20 * 5) / 3600), 6);
    // From the first look on: 20 whole turns of 180 s.
    expect(log.totals.chargerAh - 40 * 0.05).toBeCloseTo(38.88889, 5);
    expect(spellsOf(log.readings)).toHaveLength(1);
  });

  it('a lead sensed at the charger ends bulk early and lasts longer; at the battery it does not', () => {
    const plain = logCharge(AGM);
    const early = logCharge(withCharger({ leadOhms: 0.03 }));
    expect(early.bulkEndsH).toBeLessThan(hoursOf(plain.bulkEndsH) - 0.5);
    expect(early.floatStartsH).toBeGreaterThan(hoursOf(plain.floatStartsH) + 0.3);
    const reading = at(early, 1);
    expect(reading.volts - reading.batteryVolts).toBeCloseTo(reading.amps * 0.03, 9);
    const sensed = logCharge(withCharger({ leadOhms: 0.03, sense: 'battery' }));
    expect(sensed.bulkEndsH).toBeCloseTo(hoursOf(plain.bulkEndsH), 6);
    expect(at(sensed, 2).batteryVolts).toBeCloseTo(14.4, 6);
  });

  it('a lithium battery needs little absorption, then rests above float at no current', () => {
    const battery = batteryModel({ kind: 'lithium', capacityAh: 100, blocks: 1 });
    const charger = { ...CHARGER, limitA: 40, absorptionV: 14.2, floatV: 13.5, tailA: 4 };
    const log = logCharge({ ...AGM, battery, charge: 0.2, charger, hours: 5 });
    expect(hoursOf(log.floatStartsH) - hoursOf(log.bulkEndsH)).toBeLessThan(0.4);
    expect(at(log, 4)).toMatchObject({ amps: 0, stage: 'rest' });
    expect(Math.abs(at(log, 4).volts - 13.5)).toBeLessThan(0.15);
  });

  it('a lithium battery under 0 °C takes no charge while its loads run on (trap)', () => {
    const battery = batteryModel({ kind: 'lithium', capacityAh: 100, blocks: 1, celsius: -4 });
    const log = logCharge({ ...AGM, battery, load: { amps: 6, fromH: 1 }, hours: 3 });
    expect(log.readings.every(({ batteryAmps }) => Math.abs(batteryAmps) < 1e-9)).toBe(true);
    expect(at(log, 2).amps).toBeCloseTo(6, 9);
  });

  it('protection drops the current in one step and the posts jump to what the charger holds', () => {
    const plain = batteryModel({ kind: 'lithium', capacityAh: 100, blocks: 1 });
    const battery = { ...plain, protection: { opensV: 14.6, closesV: -Infinity } };
    const charger = { ...CHARGER, limitA: 40, absorptionV: 14.8, floatV: 13.5, tailA: 4 };
    const load = { amps: 5, fromH: 0 };
    const log = logCharge({ ...AGM, battery, charge: 0.2, charger, load, hours: 4 });
    const opensH = hoursOf(log.protectionOpensH);
    const around = log.readings.filter(({ hour }) => hour === opensH);
    expect(around[0]?.batteryAmps).toBeCloseTo(35, 6);
    expect(around[0]?.volts).toBeCloseTo(14.6, 4);
    expect(around.at(-1)).toMatchObject({ batteryAmps: 0, amps: 5, volts: 14.8 });
    const again = { ...plain, protection: { opensV: 14.6, closesV: 13.8 } };
    const slow = { ...charger, leastAbsorptionH: 0.5 };
    const cycling = logCharge({ ...AGM, battery: again, charge: 0.2, charger: slow, hours: 4 });
    const opened = at(cycling, hoursOf(cycling.protectionOpensH) + 0.01);
    expect(opened.batteryAmps).toBe(0);
    expect(at(cycling, 3.9).charge).toBeGreaterThan(opened.charge);
  });

  it('cold without compensation ends bulk early; compensated it takes more volts', () => {
    const battery = batteryModel({ kind: 'agm', capacityAh: 110, blocks: 1, celsius: 0 });
    const cold = logCharge({ ...AGM, battery });
    expect(cold.bulkEndsH).toBeLessThan(hoursOf(logCharge(AGM).bulkEndsH));
    // -4 mV × 6 × -25 K.
    const mended = logCharge({ ...withCharger({ compensationV: 0.6 }), battery });
    expect(mended.bulkEndsH).toBeGreaterThan(hoursOf(cold.bulkEndsH));
    expect(Math.max(...mended.readings.map(({ volts }) => volts))).toBeCloseTo(15, 6);
  });

  it('an aged battery reaches its voltage early on few ampere-hours', () => {
    const aged = { capacity: 0.45, resistance: 2.2 };
    const battery = batteryModel({ kind: 'agm', capacityAh: 110, blocks: 1, aged });
    const log = logCharge({ ...AGM, battery });
    expect(log.totals.bulkAh).toBeLessThan(logCharge(AGM).totals.bulkAh / 3);
  });
});

describe('bad input', () => {
  it.each<[string, Partial<ChargeRun>]>([
    [
      'Float 14.4 V is not below absorption 14.4 V; lower the float setting.',
      { charger: { ...CHARGER, floatV: 14.4 } },
    ],
    ['Charge at the start 1.2', { charge: 1.2 }],
    [
      'Least absorption 2 h is over the longest, 1 h',
      withCharger({ leastAbsorptionH: 2, longestAbsorptionH: 1 }),
    ],
    ['The battery is empty at 0.9 h; lower the load', { load: { amps: 90, fromH: 0 } }],
    ['Off-load look of 200 s', withCharger({ pauses: { everyH: 0.05, forH: 1 / 18 } })],
    [
      'Protection that closes at 14.6 V is not below the 14.6 V at which it opens',
      { battery: { ...AGM.battery, protection: { opensV: 14.6, closesV: 14.6 } } },
    ],
    [
      'Release 13.3 V is not below engagement 13.2 V',
      { vehicle: { ...VEHICLE_PARKED, releaseV: 13.3 } },
    ],
  ])('is refused: %s', (message, wrong) => {
    expect(() => logCharge({ ...AGM, ...wrong })).toThrow(message);
  });

  it.each<[string, () => unknown]>([
    ['Battery capacity 5 Ah is outside 20 to 2000 Ah', () => batteryOf({ capacityAh: 5 })],
    ['Blocks in series', () => batteryOf({ blocks: 6 })],
    ['Battery temperature 80 °C', () => batteryOf({ celsius: 80 })],
    ['Capacity left 1.2 of new', () => batteryOf({ aged: { capacity: 1.2, resistance: 1 } })],
  ])('of a battery is refused: %s', (message, make) => {
    expect(make).toThrow(message);
  });
});

function batteryOf(more: Partial<Parameters<typeof batteryModel>[0]>) {
  return batteryModel({ kind: 'agm' satisfies BatteryKind, capacityAh: 100, blocks: 1, ...more });
}
