import { describe, expect, it } from 'vitest';
import { runNgspice } from '../../../test/ngspice.ts';
import { batteryModel } from './battery-model.ts';
import { logCharge } from './log-charge.ts';
import { type ChargeReading, readingAt } from './readings.ts';
import { type ChargeRun, type VehicleInput } from './settings.ts';

const VEHICLE: VehicleInput = {
  fromH: 1,
  untilH: 3,
  volts: 14.2,
  engageV: 13.2,
  releaseV: 12.9,
  delayH: 30 / 3600,
  hasOverride: false,
  cableOhms: 0.015,
  efficiency: 0.9,
  battery: batteryModel({ kind: 'flooded', capacityAh: 60, blocks: 1 }),
  charge: 0.9,
};
const RUN: ChargeRun = {
  battery: batteryModel({ kind: 'agm', capacityAh: 200, blocks: 1 }),
  charge: 0.5,
  charger: {
    limitA: 30,
    absorptionV: 14.4,
    floatV: 13.6,
    tailA: 2,
    tailHoldH: 5 / 60,
    longestAbsorptionH: Infinity,
  },
  load: { amps: 0, fromH: 0 },
  vehicle: VEHICLE,
  solar: { amps: 8 },
  hours: 5,
  stepS: 60,
};

function at(run: ChargeRun, hour: number): ChargeReading {
  const reading = readingAt(logCharge(run).readings, hour);
  if (!reading) throw new Error(`No reading at ${hour} h.`);
  return reading;
}

describe('two inputs', () => {
  it('take the vehicle first, after the delay, and the panel again after the delay', () => {
    const log = logCharge(RUN);
    expect(log.vehicleTakenH).toBeCloseTo(1 + 30 / 3600, 9);
    expect(log.vehicleLetGoH).toBeCloseTo(3 + 30 / 3600, 9);
    const sources = [0.5, 1.004, 1.1, 3.004, 3.1].map((hour) => at(RUN, hour).source);
    expect(sources).toEqual(['solar', 'solar', 'vehicle', 'vehicle', 'solar']);
    expect([at(RUN, 0.5).amps, at(RUN, 2).amps, at(RUN, 3.1).amps]).toEqual([8, 30, 8]);
  });

  it('leave the charger off without sun or engine', () => {
    const { battery, charge, charger, load } = RUN;
    const parked = { battery, charge, charger, load, vehicle: VEHICLE, hours: 5, stepS: 60 };
    expect(at(parked, 0.5)).toMatchObject({ source: 'none', stage: 'off', amps: 0 });
  });

  it('give less in the shade, at which no stage can be told', () => {
    const shade = { fromH: 0.2, untilH: 0.6, amps: 3 };
    const run = { ...RUN, solar: { amps: 8, shade } };
    expect(at(run, 0.4)).toMatchObject({ amps: 3, stage: 'held back' });
    expect(at(run, 0.7).amps).toBe(8);
  });

  it('do not take a variable-voltage alternator under the engagement level (trap: no run signal)', () => {
    const smart = { ...VEHICLE, volts: 12.3 };
    expect(logCharge({ ...RUN, vehicle: smart }).vehicleTakenH).toBeNull();
    const override = { ...smart, hasOverride: true };
    expect(logCharge({ ...RUN, vehicle: override }).vehicleTakenH).not.toBeNull();
  });

  it('show the cable’s drop at the input only while current flows', () => {
    const reading = logCharge(RUN).readings.find(({ hour }) => hour > 2);
    if (!reading) throw new Error('The log ends before 2 h.');
    const watts = (reading.volts * reading.amps) / 0.9;
    const inputA = (14.2 - reading.inputVolts) / 0.015;
    expect(reading.inputVolts * inputA).toBeCloseTo(watts, 6);
    const looking = { ...RUN.charger, pauses: { everyH: 0.05, forH: 5 / 3600 } };
    expect(at({ ...RUN, charger: looking }, 2 + 2 / 3600).inputVolts).toBeCloseTo(14.2, 9);
  });

  it('let go where the cable drops the volts under the release level', () => {
    const thin = { ...VEHICLE, cableOhms: 0.05, untilH: 5 };
    const log = logCharge({ ...RUN, vehicle: thin });
    expect(log.vehicleLetGoH).toBeLessThan(1.1);
  });
});

describe('the override left on, engine off', () => {
  const withoutSun: ChargeRun = {
    battery: RUN.battery,
    charger: RUN.charger,
    load: RUN.load,
    charge: 0.3,
    vehicle: { ...VEHICLE, hasOverride: true, fromH: 0, untilH: 0, delayH: 0 },
    hours: 1.2,
    stepS: 20,
  };
  it('empties the start battery as ngspice says', () => {
    const { battery, charger, charge } = withoutSun;
    const spice = runNgspice('override-drain.cir', {
      ...{ limitA: charger.limitA, charge, emptyV: 11.9, fullV: 12.8 },
      ...{ seriesOhms: battery.seriesOhms, relaxOhms: battery.relaxOhms },
      ...{ fillingOhms: battery.fillingOhms, fullShare: battery.fullShare },
      ...{ relaxS: battery.relaxS, efficiency: battery.efficiency },
      capacityAh: battery.capacityAh,
      startOhms: VEHICLE.battery.seriesOhms + VEHICLE.battery.relaxOhms,
      ...{ cableOhms: VEHICLE.cableOhms, chargerShare: VEHICLE.efficiency },
      ...{ startAh: VEHICLE.battery.capacityAh, startCharge: VEHICLE.charge },
    });
    for (const [when, hour] of [
      ['early', 1 / 6],
      ['late', 1],
    ] as const) {
      const { startVolts, inputVolts, startCharge } = at(withoutSun, hour);
      expect(Math.abs(startVolts - (spice.get(`post_${when}`) ?? NaN))).toBeLessThan(0.005);
      expect(Math.abs(inputVolts - (spice.get(`in_${when}`) ?? NaN))).toBeLessThan(0.005);
      expect(Math.abs(startCharge - (spice.get(`share_${when}`) ?? NaN))).toBeLessThan(0.001);
    }
  });

  it('lets go only when the start battery is flat, and draws more as the volts fall', () => {
    const log = logCharge({ ...withoutSun, hours: 4 });
    const letGoH = log.vehicleLetGoH ?? NaN;
    expect(letGoH).toBeGreaterThan(1);
    const before = readingAt(log.readings, letGoH - 1e-3);
    expect(before?.startCharge).toBeLessThan(0.01);
    const slope = (fromH: number): number =>
      (at(withoutSun, fromH).startCharge - at(withoutSun, fromH + 0.2).startCharge) / 0.2;
    expect(slope(0.9)).toBeGreaterThan(slope(0.1));
  });
});
