import { OutOfRange } from '../out-of-range.ts';
import { SourceChooser } from './inputs.ts';
import { type ChargeReading, type ChargeTotals, totalsOf } from './readings.ts';
import { requireRun } from './require-run.ts';
import { type ChargeRun, type Stage } from './settings.ts';
import { StageKeeper } from './stage-keeper.ts';
import { type Stand, stepFrom } from './step.ts';
import { fullOutputAt, isPaused, momentsOf, SAME_H } from './timetable.ts';
import { isTripping, isWorking, look, mayCloseAtH, type Sight, type World } from './world.ts';

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
  private now: Stand;
  private nextMoment = 0;
  private protectionOpensH: number | null = null;

  constructor(run: ChargeRun) {
    this.moments = momentsOf(run);
    const isShut = run.battery.refusesCharge ?? false;
    const keeper = new StageKeeper(run.charger, run.battery.restVolts[0] ?? NaN);
    this.world = { run, sources: new SourceChooser(run), keeper, isShut, shutFromH: null };
    const battery = { charge: run.charge, pairV: 0 };
    const moment = { hour: 0, battery, startCharge: run.vehicle?.charge ?? NaN };
    this.now = { moment, sight: look(this.world, moment, 0) };
  }

  log(): ChargeLog {
    const { readings, world } = this;
    const { keeper, sources, run } = world;
    this.settle();
    while (this.now.moment.hour < run.hours - SAME_H) this.goOn();
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

  private goOn(): void {
    const { world, moments } = this;
    const { hour } = this.now.moment;
    while ((moments[this.nextMoment] ?? Infinity) <= hour + SAME_H) this.nextMoment += 1;
    // A lithium battery fills its last per cent within minutes: twice as many steps follow it.
    const isSwift = world.run.battery.restVolts.length > 2;
    const stepH = world.run.stepS / (isSwift ? 7200 : 3600);
    const { spanH, isAppointed } = this.nextSpan(stepH);
    const { isChanged, ...next } = stepFrom(world, this.now, spanH);
    this.now = next;
    this.requireCharge();
    this.write(next.sight, next.moment.hour - 2 * SAME_H);
    if (isChanged || isAppointed) this.settle();
  }

  /** A whole step, or up to the next moment that is known beforehand. */
  private nextSpan(stepH: number): { spanH: number; isAppointed: boolean } {
    const { sources, keeper } = this.world;
    const { hour } = this.now.moment;
    let nextH = Infinity;
    const waits = [sources.changesAtH, keeper.waitsUntilH, mayCloseAtH(this.world)];
    for (const wait of [this.moments[this.nextMoment], ...waits]) {
      if (wait !== undefined && wait !== null && wait > hour + SAME_H)
        nextH = Math.min(nextH, wait);
    }
    const isAppointed = nextH - hour <= stepH + SAME_H;
    return { spanH: isAppointed ? nextH - hour : stepH, isAppointed };
  }

  /** Lets every switch that waits on the reading change, and reads again. */
  private settle(): void {
    const { moment } = this.now;
    const { hour } = moment;
    let sight = look(this.world, moment, hour);
    for (let changes = 0; changes < MOST_CHANGES && this.change(sight); changes += 1) {
      sight = look(this.world, moment, hour);
    }
    this.now = { moment, sight };
    this.write(sight, hour);
  }

  private change(sight: Sight): boolean {
    const { world } = this;
    const { keeper, sources } = world;
    const now = this.now.moment;
    if (sight.input && sources.look(now.hour, sight.input)) {
      keeper.begin();
      return true;
    }
    if (isTripping(world, now, sight)) {
      world.isShut = !world.isShut;
      world.shutFromH = world.isShut ? now.hour : null;
      if (world.isShut) this.protectionOpensH ??= now.hour;
      return true;
    }
    return isWorking(world, now.hour) && keeper.look(now.hour, sight.circuit);
  }

  private write({ circuit, input }: Sight, timetableH: number): void {
    const { hour, battery, startCharge } = this.now.moment;
    const reading: ChargeReading = {
      hour,
      volts: circuit.volts,
      batteryVolts: circuit.batteryVolts,
      inputVolts: input?.volts ?? NaN,
      startVolts: input?.postV ?? NaN,
      startCharge,
      amps: circuit.amps,
      batteryAmps: circuit.batteryAmps,
      charge: battery.charge,
      stage: this.shownStage(circuit.amps, circuit.at, timetableH),
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
    const { battery, hour } = this.now.moment;
    if (battery.charge > 0) return;
    throw new OutOfRange(
      `The battery is empty at ${hour.toFixed(1)} h; lower the load or give the charger a source.`,
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
