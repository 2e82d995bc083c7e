import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { batteryModel } from './battery-model.ts';
import { type ChargeLog, logCharge } from './log-charge.ts';
import { type ChargeRun } from './settings.ts';

const between = (min: number, max: number): fc.Arbitrary<number> =>
  fc.double({ min, max, noNaN: true });

/** Settings a charger may meet in the bank, the odd ones included. */
const runs: fc.Arbitrary<ChargeRun> = fc
  .record({
    kind: fc.constantFrom('agm' as const, 'flooded' as const, 'gel' as const, 'lithium' as const),
    capacityAh: between(60, 400),
    celsius: between(0, 40),
    charge: between(0.1, 0.9),
    limitA: between(8, 60),
    absorptionV: between(14, 14.8),
    tailA: between(1.5, 6),
    loadA: between(0, 5),
    leadOhms: between(0, 0.03),
    sense: fc.constantFrom('charger' as const, 'battery' as const),
    quietUntilH: between(0, 1),
  })
  .map(({ kind, capacityAh, celsius, charge, loadA, ...charger }) => ({
    battery: batteryModel({ kind, capacityAh, celsius, blocks: 1 }),
    charge,
    charger: { ...charger, floatV: 13.4, tailHoldH: 5 / 60, longestAbsorptionH: 8 },
    load: { amps: loadA, fromH: 0.5 },
    hours: 12,
    stepS: 60,
  }));

/** Everything that may befall a charge, in one run. */
const oddRuns: fc.Arbitrary<ChargeRun> = fc
  .record({
    run: runs,
    engageV: between(12.5, 14),
    gapV: between(0.05, 1.5),
    cableOhms: between(0, 0.06),
    hasOverride: fc.boolean(),
    startCharge: between(0.1, 1),
    sunA: between(0, 30),
    opensV: between(13.8, 14.8),
    closesUnderV: between(0.01, 1),
    lookS: between(1, 20),
    derateA: between(1, 30),
    restartV: between(12, 13.5),
    afterAbsorption: fc.constantFrom('float' as const, 'rest' as const, 'hold' as const),
  })
  .map((odd) => ({
    ...odd.run,
    battery: {
      ...odd.run.battery,
      protection: { opensV: odd.opensV, closesV: odd.opensV - odd.closesUnderV },
    },
    charger: {
      ...odd.run.charger,
      ...{ afterAbsorption: odd.afterAbsorption, restartV: odd.restartV },
      pauses: { everyH: 0.05, forH: odd.lookS / 3600 },
      derate: { fromH: 0.3, toA: odd.derateA, overH: 0.4 },
    },
    vehicle: {
      ...{ fromH: 0.4, untilH: 2, volts: 14.2, delayH: 30 / 3600, efficiency: 0.9 },
      ...{ engageV: odd.engageV, releaseV: odd.engageV - odd.gapV },
      ...{ hasOverride: odd.hasOverride, cableOhms: odd.cableOhms, charge: odd.startCharge },
      battery: batteryModel({ kind: 'flooded' as const, capacityAh: 60, blocks: 1 }),
    },
    solar: { amps: odd.sunA, shade: { fromH: 0.2, untilH: 0.6, amps: 0 } },
    load: { amps: 1, fromH: 0.5 },
    hours: 4,
  }));

const FIGURES = ['hour', 'volts', 'batteryVolts', 'amps', 'batteryAmps', 'charge'] as const;

function moved(one: ChargeLog, other: ChargeLog, time: 'bulkEndsH' | 'floatStartsH'): number {
  const [a, b] = [one[time], other[time]];
  return a === null || b === null ? 0 : Math.abs(a - b);
}

describe('whatever the settings', () => {
  it('no stage time moves by half a minute or 0.5 % when the step is halved', () => {
    fc.assert(
      fc.property(runs, (run) => {
        const [coarse, fine] = [logCharge(run), logCharge({ ...run, stepS: 30 })];
        for (const time of ['bulkEndsH', 'floatStartsH'] as const) {
          const bound = Math.max(0.5 / 60, 0.005 * (fine[time] ?? 0));
          expect(moved(coarse, fine, time)).toBeLessThan(bound);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('every figure is finite, time runs forwards and no ampere is lost', () => {
    fc.assert(
      fc.property(fc.oneof(runs, oddRuns), (run) => {
        const { readings } = logCharge(run);
        const isWrong = readings.findIndex((reading, index) => {
          const { amps, batteryAmps, hour } = reading;
          const loadA = amps - batteryAmps;
          const isFinite = FIGURES.every((figure) => Number.isFinite(reading[figure]));
          const isForwards = hour >= (readings[index - 1]?.hour ?? 0);
          const isWithin = amps >= 0 && amps <= run.charger.limitA + 1e-9;
          const isWhole = Math.abs(loadA) < 1e-9 || Math.abs(loadA - run.load.amps) < 1e-9;
          return !(isFinite && isForwards && isWithin && isWhole);
        });
        expect(isWrong).toBe(-1);
      }),
      { numRuns: 60 },
    );
  });

  it('a higher limit ends bulk no later, a fuller battery sooner', () => {
    fc.assert(
      fc.property(runs, between(1.05, 1.5), (run, more) => {
        const end = (other: ChargeRun): number => logCharge(other).bulkEndsH ?? Infinity;
        const charger = { ...run.charger, limitA: run.charger.limitA * more };
        expect(end({ ...run, charger })).toBeLessThanOrEqual(end(run) + 1e-3);
        expect(end({ ...run, charge: run.charge + 0.05 })).toBeLessThanOrEqual(end(run) + 1e-3);
      }),
      { numRuns: 40 },
    );
  });

  it('the same settings give the same log', () => {
    fc.assert(
      fc.property(runs, (run) => {
        expect(logCharge(run)).toEqual(logCharge(run));
      }),
      { numRuns: 10 },
    );
  });
});
