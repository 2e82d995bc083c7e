import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { type DailyLoad, dailyUse } from './daily-use.ts';
import { type BudgetJob, type BudgetStep, energyBudget } from './energy-budget.ts';
import { PROFILES } from './practice-profile.ts';
import { FUSE_RATINGS_A } from './stock.ts';

const FRIDGE = { is: 'fridge', watts: 57.6, hoursPerDay: 24, duty: 0.35, efficiency: 1 };
const LIGHTS = { is: 'lights', watts: 38.4, hoursPerDay: 5, duty: 1, efficiency: 1 };
const KETTLE = { is: 'inverter load', watts: 250, hoursPerDay: 1.5, duty: 1, efficiency: 0.9 };

const JOB: BudgetJob = {
  nominalV: 12,
  bankV: 12.8,
  loads: [FRIDGE, LIGHTS, KETTLE],
  bank: { daysWithoutCharge: 1, usableShare: 0.8, blockAh: 100 },
  source: { hoursPerDay: 2.5, chargeEfficiency: 0.99, outputsA: [10, 20, 25, 30, 40, 50, 60] },
  route: { lengthM: 4.5, kind: 'critical', jacketC: 105, airC: 50, circuits: 2 },
  fuse: { ratingsA: FUSE_RATINGS_A, breakingA: 2000 },
  fault: { openV: 12.8, batteryOhms: 0.006, jointOhms: 0.001 },
};

function named(steps: readonly BudgetStep[], name: string): BudgetStep {
  const found = steps.find((one) => one.name === name);
  if (!found) throw new Error(`No step ${name}.`);
  return found;
}

describe('daily use', () => {
  it('adds up a fridge by its duty, lights, and an inverter with its loss', () => {
    // Worked outside this project: 4.5 A × 0.35 × 24 h, 3 A × 5 h, 250 W × 1.5 h ÷ 0.9 ÷ 12.8 V.
    const use = dailyUse(JOB.loads, 12.8);
    expect(use.lines.map(({ ampHours }) => ampHours.toFixed(2))).toEqual([
      '37.80',
      '15.00',
      '32.55',
    ]);
    expect(use.ampHours).toBeCloseTo(85.35, 2);
    expect(use.wattHours).toBeCloseTo(use.ampHours * 12.8, 9);
  });

  it('grows with every load, and names the line that makes no sense', () => {
    const load: fc.Arbitrary<DailyLoad> = fc.record({
      is: fc.constant('load'),
      watts: fc.double({ min: 0, max: 2000, noNaN: true }),
      hoursPerDay: fc.double({ min: 0, max: 24, noNaN: true }),
      duty: fc.double({ min: 0, max: 1, noNaN: true }),
      efficiency: fc.double({ min: 0.3, max: 1, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(load, { minLength: 1, maxLength: 6 }), load, (loads, more) => {
        const before = dailyUse(loads, 12.8).ampHours;
        expect(dailyUse([...loads, more], 12.8).ampHours).toBeGreaterThanOrEqual(before);
        expect(dailyUse(loads, 25.6).ampHours).toBeCloseTo(before / 2, 6);
      }),
    );
    expect(() => dailyUse([{ ...FRIDGE, duty: 35 }], 12.8)).toThrow(
      'Duty of “fridge” 35  is outside 0 to 1 ; give it as a share: 35 % is 0.35.',
    );
    expect(() => dailyUse([], 12.8)).toThrow('The load list is empty');
  });
});

describe('a budget from the load list to the fault current', () => {
  const steps = energyBudget(JOB, PROFILES.metric);
  const value = (name: string): number => named(steps, name).value;

  it('works the chain by hand', () => {
    expect(value('daily use')).toBeCloseTo(85.3521, 4);
    expect(value('least bank')).toBeCloseTo(106.69, 2);
    expect(value('blocks in parallel')).toBe(2);
    // 85.3521 ÷ (0.99 × 2.5) = 34.486 A, so 40 A.
    expect(value('charging needed')).toBeCloseTo(34.486, 3);
    expect(value('output')).toBe(40);
    // √(55 ÷ 75) × 0.80.
    expect(value('factor')).toBeCloseTo(0.68508, 5);
    expect(value('drop allowed')).toBeCloseTo(0.36, 9);
    // 40 ÷ 0.8 = 50 A; 80 A × 0.68508 = 54.8 A in 10 mm²; 9 m at 40 A want 1 mΩ/m: 25 mm².
    expect(value('cable by current')).toBe(10);
    expect(value('cable by drop')).toBe(25);
    expect(value('cable')).toBe(25);
    expect(value('cable carries')).toBeCloseTo(160 * 0.68508, 3);
    expect(named(steps, 'fuse')).toMatchObject({ value: 50, verdict: 'fits' });
    // 40 A × 9 m × 0.780 mΩ/m.
    expect(named(steps, 'drop')).toMatchObject({ verdict: 'within the drop allowed' });
    expect(value('drop')).toBeCloseTo(0.2808, 9);
    // 12.8 V over 6 + 1 + 7.02 mΩ, and over 7 mΩ.
    expect(value('fault current at the far end')).toBeCloseTo(12.8 / 0.01402, 6);
    expect(value('fault current at the fuse')).toBeCloseTo(12.8 / 0.007, 6);
    expect(named(steps, 'fault current at the fuse').verdict).toBe('the fuse can break it');
  });

  it('says at each step what it used, earlier steps by their names', () => {
    const names = steps.map(({ name }) => name);
    expect(new Set(names).size).toBe(names.length);
    for (const { name, used } of steps) {
      expect(used.length, name).toBeGreaterThan(0);
      for (const other of used.filter((one) => names.includes(one))) {
        expect(names.indexOf(other), `${name} uses ${other}`).toBeLessThan(names.indexOf(name));
      }
    }
    expect(named(steps, 'factor').used).toContain('square-root formula');
    expect(named(steps, 'cable by current').used).toContain('house rating table');
  });

  it('comes out otherwise under another practice, and says so', () => {
    const awg = energyBudget(
      { ...JOB, route: { ...JOB.route, jacketC: 90, airC: 43 } },
      PROFILES.awg,
    );
    expect(named(awg, 'factor').used).toContain('printed bins');
    // Bin up to 45 °C for 90 °C: 0.87, times 0.80.
    expect(named(awg, 'factor').value).toBeCloseTo(0.87 * 0.8, 9);
    expect(named(awg, 'cable by drop').used).toContain('awg resistance table');
  });

  it('tells a fuse that cannot break the fault at its posts', () => {
    const weak = energyBudget({ ...JOB, fuse: { ...JOB.fuse, breakingA: 1000 } }, PROFILES.metric);
    const { verdict } = named(weak, 'fault current at the fuse');
    expect(verdict).toBe('choose a fuse of higher breaking capacity');
  });

  it('keeps fuse, cable and drop in order whatever the job', () => {
    const job = fc.record({
      lengthM: fc.double({ min: 0.5, max: 8, noNaN: true }),
      airC: fc.integer({ min: 20, max: 60 }),
      circuits: fc.integer({ min: 1, max: 4 }),
      blockAh: fc.integer({ min: 60, max: 200 }),
    });
    fc.assert(
      fc.property(job, fc.constantFrom(PROFILES.metric, PROFILES.awg), (of, profile) => {
        const found = energyBudget(
          {
            ...JOB,
            bank: { ...JOB.bank, blockAh: of.blockAh },
            route: { ...JOB.route, lengthM: of.lengthM, airC: of.airC, circuits: of.circuits },
          },
          profile,
        );
        const at = (name: string): number => named(found, name).value;
        expect(found.every((one) => Number.isFinite(one.value))).toBe(true);
        expect(at('fuse')).toBeGreaterThanOrEqual(at('output') / 0.8 - 1e-9);
        expect(at('fuse')).toBeLessThanOrEqual(at('cable carries') + 1e-9);
        expect(at('drop')).toBeLessThanOrEqual(at('drop allowed') + 1e-9);
        expect(at('blocks in parallel') * of.blockAh).toBeGreaterThanOrEqual(
          at('least bank') - 1e-6,
        );
        expect(at('fault current at the far end')).toBeLessThan(at('fault current at the fuse'));
      }),
    );
  });

  it('refuses a job no step of it can meet, with the step’s own words', () => {
    const far = { ...JOB, route: { ...JOB.route, lengthM: 200 } };
    expect(() => energyBudget(far, PROFILES.metric)).toThrow('shorten the run');
    const deep = { ...JOB, bank: { ...JOB.bank, usableShare: 80 } };
    expect(() => energyBudget(deep, PROFILES.metric)).toThrow('Usable share 80');
  });
});
