import { OutOfRange } from '../out-of-range.ts';
import { type Source, SourceChooser } from './inputs.ts';
import { type ChargeTotals, totalsOf } from './readings.ts';
import { requireRun } from './require-run.ts';
import { type ChargeRun, type Stage } from './settings.ts';
import { StageKeeper } from './stage-keeper.ts';
import { stepFrom } from './step.ts';
import { fullOutputAt, isPaused, momentsOf, SAME_H } from './timetable.ts';
import { isTripping, isWorking, look, type Moment, type Sight, type World } from './world.ts';

export interface ChargeReading {
  hour: number;
  /** At the charger's posts. */
  volts: number;
  batteryVolts: number;
  /** At the charger's vehicle input; NaN without one. */
  inputVolts: number;
  /** At the start battery's posts, and the share it is charged; NaN without one. */
  startVolts: number;
  startCharge: number;
  /** Out of the charger; the battery takes this less the load. */
  amps: number;
  batteryAmps: number;
  charge: number;
  stage: Stage;
  source: Source;
  /** The charger has stopped to look at its source. */
  isPaused: boolean;
}

export interface ChargeLog {
  readings: ChargeReading[];
  /** The first time, h; null for never. */
  bulkEndsH: number | null;
  /** Absorption is over, and float or rest begins. */
  floatStartsH: number | null;
  /** Quiet running is over within the log. */
  quietEndsH: number | null;
  protectionOpensH: number | null;
  vehicleTakenH: number | null;
  vehicleLetGoH: number | null;
  totals: ChargeTotals;
}

/** Under this share of what it gives when nothing holds it back, a charger is held back. */
const SHOWN_FULL = 0.98;
const NO_AMPS = 1e-9;
/** Switches that wait on one another have settled long before. */
const MOST_CHANGES = 8;

/**
 * Runs a staged charger against a battery: bulk at the current limit, absorption at a held voltage,
 * then a lower one, with what feeds it and what hangs on the bank. Deterministic; second order in
 * the step, with the moment a limit is crossed found inside the step.
 *
 * The model is illustrative and fitted to no battery (from memory).
 *
 * @throws {OutOfRange} when a setting makes no sense or the loads empty the battery.
 */
export function logCharge(run: ChargeRun): ChargeLog {
  requireRun(run);
  return new ChargeLogger(run).log();
}

class ChargeLogger {
  private readonly world: World;
  private readonly moments: readonly number[];
  private readonly readings: ChargeReading[] = [];
  private now: Moment;
  private nextMoment = 0;
  private protectionOpensH: number | null = null;

  constructor(run: ChargeRun) {
    this.moments = momentsOf(run);
    const isShut = run.battery.refusesCharge ?? false;
    const keeper = new StageKeeper(run.charger, run.battery.restVolts[0] ?? NaN);
    this.world = { run, sources: new SourceChooser(run), keeper, isShut };
    const battery = { charge: run.charge, pairV: 0 };
    this.now = { hour: 0, battery, startCharge: run.vehicle?.charge ?? NaN };
  }

  log(): ChargeLog {
    const { readings, world, moments } = this;
    const { keeper, sources, run } = world;
    this.settle();
    while (this.now.hour < run.hours - SAME_H) {
      while ((moments[this.nextMoment] ?? Infinity) <= this.now.hour + SAME_H) this.nextMoment += 1;
      this.now = stepFrom(world, this.now, this.nextSpanH());
      this.requireCharge();
      this.settle();
    }
    return {
      readings,
      bulkEndsH: keeper.bulkEndsH,
      floatStartsH: keeper.floatStartsH,
      quietEndsH: quietEnd(run),
      protectionOpensH: this.protectionOpensH,
      vehicleTakenH: sources.takenH,
      vehicleLetGoH: sources.letGoH,
      totals: totalsOf(readings, keeper.bulkEndsH),
    };
  }

  private nextSpanH(): number {
    const { run, sources, keeper } = this.world;
    const { hour } = this.now;
    const waits = [this.moments[this.nextMoment], sources.changesAtH, keeper.waitsUntilH];
    const ahead = waits.map((wait) => (wait ?? Infinity) - hour).filter((span) => span > SAME_H);
    return Math.min(run.stepS / 3600, ...ahead);
  }

  /** Reads, lets every switch that waits on the reading change, and reads again. */
  private settle(): void {
    const { hour } = this.now;
    const before = Math.max(0, hour - 2 * SAME_H);
    this.write(look(this.world, this.now, before), before);
    for (let changes = 0; changes < MOST_CHANGES; changes += 1) {
      if (!this.change(look(this.world, this.now, hour))) break;
    }
    this.write(look(this.world, this.now, hour), hour);
  }

  private change(sight: Sight): boolean {
    const { world, now } = this;
    const { keeper, sources } = world;
    if (sight.input && sources.look(now.hour, sight.input)) {
      keeper.begin();
      return true;
    }
    if (isTripping(world, now, sight)) {
      world.isShut = !world.isShut;
      if (world.isShut) this.protectionOpensH ??= now.hour;
      return true;
    }
    return isWorking(world, now.hour) && keeper.look(now.hour, sight.circuit);
  }

  private write({ circuit, input }: Sight, timetableH: number): void {
    const { hour, battery, startCharge } = this.now;
    const { volts, batteryVolts, amps, batteryAmps } = circuit;
    const reading = {
      ...{ hour, volts, batteryVolts, amps, batteryAmps, startCharge },
      inputVolts: input?.volts ?? NaN,
      startVolts: input?.postV ?? NaN,
      charge: battery.charge,
      stage: this.shownStage(amps, circuit.at, timetableH),
      source: this.world.sources.source,
      isPaused: isPaused(this.world.run.charger, timetableH),
    };
    const last = this.readings.at(-1);
    if (last && isSame(last, reading)) this.readings.pop();
    this.readings.push(reading);
  }

  private shownStage(amps: number, at: Sight['branch']['at'], hour: number): Stage {
    const { sources, keeper, run } = this.world;
    if (sources.source === 'none') return 'off';
    if (isPaused(run.charger, hour)) return keeper.stage;
    if (keeper.stage === 'rest' || (amps < NO_AMPS && at === 'idle')) return 'rest';
    if (at !== 'limit') return keeper.stage;
    return amps < SHOWN_FULL * fullOutputAt(run.charger, hour) ? 'held back' : 'bulk';
  }

  private requireCharge(): void {
    if (this.now.battery.charge > 0) return;
    const hour = this.now.hour.toFixed(1);
    throw new OutOfRange(
      `The battery is empty at ${hour} h; lower the load or give the charger a source.`,
    );
  }
}

function quietEnd({ charger: { quietUntilH = 0 }, hours }: ChargeRun): number | null {
  return quietUntilH > 0 && quietUntilH < hours ? quietUntilH : null;
}

/** The same moment read alike: nothing jumped. */
function isSame(one: ChargeReading, other: ChargeReading): boolean {
  return (
    one.hour === other.hour &&
    one.stage === other.stage &&
    one.source === other.source &&
    one.isPaused === other.isPaused &&
    Math.abs(one.volts - other.volts) < 1e-9 &&
    Math.abs(one.amps - other.amps) < 1e-9 &&
    !(Math.abs(one.inputVolts - other.inputVolts) > 1e-9)
  );
}
