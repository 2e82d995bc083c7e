import { ambientFactorIn } from './ambient.ts';
import { sizeForCurrent } from './ampacity.ts';
import { type DailyLoad, dailyUse } from './daily-use.ts';
import { chooseDevice } from './device-choice.ts';
import { type CircuitKind, dropLimitV } from './drop-limits.ts';
import { canBreak, prospectiveAmps } from './fault-current.ts';
import { groupingFactor } from './grouping.ts';
import { within } from './out-of-range.ts';
import { type PracticeProfile } from './practice-profile.ts';
import { ratingIn } from './rating-table.ts';
import { nextSize } from './stock.ts';
import { dropAlong, sizeForDrop, stockOhmsPerKm } from './voltage-drop.ts';

/** A job from its load list to the fuse at the battery. */
export interface BudgetJob {
  nominalV: number;
  /** Voltage the loads are counted at. */
  bankV: number;
  loads: readonly DailyLoad[];
  bank: { daysWithoutCharge: number; usableShare: number; blockAh: number };
  /** Charger or controller: hours it gets in a day, and the outputs to be had, A. */
  source: { hoursPerDay: number; chargeEfficiency: number; outputsA: readonly number[] };
  /** From the charge source to the bank. */
  route: { lengthM: number; kind: CircuitKind; jacketC: number; airC: number; circuits: number };
  fuse: { ratingsA: readonly number[]; breakingA: number };
  fault: { openV: number; batteryOhms: number; jointOhms: number };
}

/** One step of the chain; `used` names earlier steps, given figures and tables. */
export interface BudgetStep {
  name: string;
  value: number;
  unit: string;
  used: string[];
  /** What the step decided, where it decided anything. */
  verdict: string | null;
}

/**
 * The whole sizing of a charge circuit as one chain: daily use, bank, charge source, factor,
 * cable, fuse, drop and fault current. Each step says what it used.
 *
 * Source: the functions it is made of; their order is common practice, no source. Local codes go
 * first.
 *
 * @throws {OutOfRange} where a step has no answer, as the function it is made of says it.
 */
export function energyBudget(job: BudgetJob, profile: PracticeProfile): BudgetStep[] {
  const supply = sizeSupply(job);
  const circuit = sizeCircuit(job, supply.outputA, profile);
  return [...supply.steps, ...circuit];
}

function sizeSupply({ loads, bankV, bank, source }: BudgetJob): {
  outputA: number;
  steps: BudgetStep[];
} {
  const use = dailyUse(loads, bankV);
  requireSupply(bank, source);
  const bankAh = (use.ampHours * bank.daysWithoutCharge) / bank.usableShare;
  const blocks = Math.ceil(bankAh / bank.blockAh - 1e-9);
  const needA = use.ampHours / (source.chargeEfficiency * source.hoursPerDay);
  const outputA = nextSize(needA, source.outputsA);
  return {
    outputA,
    steps: [
      step('daily use', [use.ampHours, 'Ah'], ['load list', 'bank voltage']),
      step('least bank', [bankAh, 'Ah'], ['daily use', 'days without charge', 'usable share']),
      step('blocks in parallel', [blocks, ''], ['least bank', 'capacity of a block']),
      step('charging needed', [needA, 'A'], ['daily use', 'hours of charge', 'charge efficiency']),
      step('output', [outputA, 'A'], ['charging needed', 'outputs to be had']),
    ],
  };
}

function sizeCircuit(job: BudgetJob, loadA: number, profile: PracticeProfile): BudgetStep[] {
  const { route, nominalV, fuse } = job;
  const inAir = ambientFactorIn(profile, { jacketC: route.jacketC, ambientC: route.airC });
  const factor = inAir * groupingFactor(route.circuits);
  const limitV = dropLimitV(profile, { kind: route.kind, nominalV });
  // The cable must carry its fuse, not only its load.
  const fuseA = nextSize(loadA / CONTINUOUS_SHARE, fuse.ratingsA);
  const byCurrent = sizeForCurrent({ amps: fuseA, jacketC: route.jacketC, factor }, profile);
  const byDrop = sizeForDrop({ lengthM: route.lengthM, amps: loadA, limitV }, profile);
  const areaMm2 = Math.max(byCurrent, byDrop);
  const cableA = ratingIn(profile, { areaMm2, jacketC: route.jacketC }) * factor;
  const device = chooseDevice({ loadA, continuous: true, cableA, series: fuse.ratingsA });
  return [
    step('factor', [factor, ''], [...factorSources(profile), 'circuits bunched, table 4C1']),
    step('drop allowed', [limitV, 'V'], [`${profile.name} profile`, 'nominal voltage']),
    step('cable by current', [byCurrent, 'mm²'], ['output over 0.8', 'factor', ratings(profile)]),
    step('cable by drop', [byDrop, 'mm²'], ['output', 'length', 'drop allowed', sizes(profile)]),
    step('cable', [areaMm2, 'mm²', 'the larger'], ['cable by current', 'cable by drop']),
    step('cable carries', [cableA, 'A'], ['cable', 'factor', ratings(profile)]),
    step('fuse', device.fits ? [device.ratingA, 'A', 'fits'] : [device.needA, 'A', device.remedy], [
      'output over 0.8',
      'cable carries',
      'ratings to be had',
    ]),
    ...checkCircuit(job, { loadA, areaMm2, limitV }, profile),
  ];
}

/** Loads that run for hours take at most this share of their fuse; a charger does. */
const CONTINUOUS_SHARE = 0.8;

function checkCircuit(
  { route, fault, fuse }: BudgetJob,
  circuit: { loadA: number; areaMm2: number; limitV: number },
  profile: PracticeProfile,
): BudgetStep[] {
  const ohmsPerKm = stockOhmsPerKm(circuit.areaMm2, profile);
  const dropV = dropAlong({ lengthM: route.lengthM, ohmsPerKm, amps: circuit.loadA });
  const cableOhms = (2 * route.lengthM * ohmsPerKm) / 1000;
  const farA = prospectiveAmps({ ...fault, cableOhms });
  const nearA = prospectiveAmps({ ...fault, cableOhms: 0 });
  const { breaks } = canBreak({ breakingA: fuse.breakingA, prospectiveA: nearA });
  return [
    step(
      'drop',
      [
        dropV,
        'V',
        dropV <= circuit.limitV + 1e-9 ? 'within the drop allowed' : 'over the drop allowed',
      ],
      ['output', 'cable', 'length', sizes(profile)],
    ),
    step('fault current at the far end', [farA, 'A'], ['battery', 'joints', 'cable']),
    step(
      'fault current at the fuse',
      [nearA, 'A', breaks ? 'the fuse can break it' : 'choose a fuse of higher breaking capacity'],
      ['battery', 'joints', 'breaking capacity'],
    ),
  ];
}

function factorSources({ correction }: PracticeProfile): string[] {
  return ['jacket', 'air', correction === 'bins' ? 'printed bins' : 'square-root formula'];
}

function ratings({ ratingTable }: PracticeProfile): string {
  return `${ratingTable} rating table`;
}

function sizes(profile: PracticeProfile): string {
  return `${profile.sizes} resistance table`;
}

function step(
  name: string,
  [value, unit, verdict]: [value: number, unit: string, verdict?: string],
  used: string[],
): BudgetStep {
  return { name, value, unit, used, verdict: verdict ?? null };
}

function requireSupply(bank: BudgetJob['bank'], source: BudgetJob['source']): void {
  const share = { unit: '', least: 0.05, most: 1, remedy: 'give it as a share' };
  within(bank.usableShare, { ...share, what: 'Usable share' });
  within(source.chargeEfficiency, { ...share, what: 'Charge efficiency' });
  within(bank.daysWithoutCharge, {
    what: 'Days without charge',
    unit: '',
    least: 0.1,
    most: 30,
    remedy: 'count the days the bank must last alone',
  });
  within(bank.blockAh, {
    what: 'Capacity of a block',
    unit: 'Ah',
    least: 1,
    most: 2000,
    remedy: 'read it off the battery, at its 20-hour rate',
  });
  within(source.hoursPerDay, {
    what: 'Hours of charge',
    unit: 'h',
    least: 0.1,
    most: 24,
    remedy: 'give what the source runs in a day',
  });
}
