import { type Battery, chargingOhms, openCircuitV } from './battery.ts';
import { OutOfRange, within } from './out-of-range.ts';

export type Stage = 'bulk' | 'absorption' | 'float';

/** What a staged charger is set to. Voltages are at its own posts, which are the battery's here. */
export interface ChargerSettings {
  limitA: number;
  absorptionV: number;
  floatV: number;
  /** Absorption ends when the charger's current has been under this for the hold time. */
  tailA: number;
  tailHoldH: number;
  /** Absorption ends at this time whatever the current, h; Infinity for no limit. */
  longestAbsorptionH: number;
}

/** A steady load on the bank, from one time on. */
export interface SteadyLoad {
  amps: number;
  fromH: number;
}

export interface ChargeRun {
  battery: Battery;
  /** Share charged at the start, 0 to 1. */
  charge: number;
  charger: ChargerSettings;
  load: SteadyLoad;
  hours: number;
  stepS: number;
}

export interface ChargeReading {
  hour: number;
  volts: number;
  /** Out of the charger; the battery takes this less the load. */
  amps: number;
  batteryAmps: number;
  charge: number;
  stage: Stage;
}

export interface ChargeLog {
  readings: ChargeReading[];
  bulkEndsH: number | null;
  floatStartsH: number | null;
}

/**
 * Runs a staged charger against a battery: bulk at the current limit, absorption at a held
 * voltage, float at a lower one. Deterministic; second order in the step, with the moment a
 * limit is crossed found inside the step.
 *
 * The model is illustrative and fitted to no battery (from memory).
 *
 * @throws {OutOfRange} when a setting makes no sense or the current limit cannot carry the load.
 */
export function logCharge(run: ChargeRun): ChargeLog {
  requireSettings(run);
  return new Logger(run).log();
}

class Logger {
  private readonly run: ChargeRun;
  private hour = 0;
  private charge: number;
  private stage: Stage = 'bulk';
  private bulkEndsH: number | null = null;
  private floatStartsH: number | null = null;
  private underTailFromH: number | null = null;
  private readonly readings: ChargeReading[] = [];

  constructor(run: ChargeRun) {
    this.run = run;
    this.charge = run.charge;
  }

  log(): ChargeLog {
    this.read();
    while (this.hour < this.run.hours - 1e-9) {
      this.advance();
      this.read();
      this.changeStage();
    }
    const { readings, bulkEndsH, floatStartsH } = this;
    return { readings, bulkEndsH, floatStartsH };
  }

  private read(): void {
    const { hour, charge, stage } = this;
    const amps = this.chargerAmps(charge);
    const batteryAmps = amps - this.loadAmps();
    const { battery } = this.run;
    const volts = openCircuitV(battery, charge) + batteryAmps * chargingOhms(battery, charge);
    this.readings.push({ hour, volts, amps, batteryAmps, charge, stage });
  }

  /** One step, cut short where bulk reaches its voltage, the tail is crossed or a time runs out. */
  private advance(): void {
    const wholeH = Math.min(this.run.stepS / 3600, this.untilNextEvent());
    let spanH = wholeH;
    if (this.isCrossed(this.after(wholeH))) {
      let before = 0;
      for (let cut = 0; cut < 24; cut += 1) {
        const middle = (before + spanH) / 2;
        if (this.isCrossed(this.after(middle))) spanH = middle;
        else before = middle;
      }
    }
    this.charge = this.after(spanH);
    this.hour += spanH;
  }

  /** Hours to the next moment that is known beforehand. */
  private untilNextEvent(): number {
    const { charger, load, hours } = this.run;
    const timed = [hours];
    if (load.fromH > this.hour + 1e-9) timed.push(load.fromH);
    if (this.stage === 'absorption') {
      timed.push((this.bulkEndsH ?? 0) + charger.longestAbsorptionH);
      if (this.underTailFromH !== null) timed.push(this.underTailFromH + charger.tailHoldH);
    }
    return Math.max(1e-9, Math.min(...timed) - this.hour);
  }

  /** Charge after so long; the slope half-way through carries the whole step (midpoint rule). */
  private after(spanH: number): number {
    const middle = clampShare(this.charge + (this.slopePerH(this.charge) * spanH) / 2);
    return clampShare(this.charge + this.slopePerH(middle) * spanH);
  }

  private isCrossed(charge: number): boolean {
    const { limitA, tailA } = this.run.charger;
    if (this.stage === 'bulk') return this.chargerAmps(charge) < limitA * (1 - 1e-9);
    const isTailOpen = this.stage === 'absorption' && this.underTailFromH === null;
    return isTailOpen && this.chargerAmps(charge) < tailA;
  }

  /** Moves to the next stage where its time has come; float is read once more, at its own voltage. */
  private changeStage(): void {
    if (this.stage === 'bulk' && this.isCrossed(this.charge)) {
      this.stage = 'absorption';
      this.bulkEndsH = this.hour;
    } else if (this.stage === 'absorption' && this.isAbsorptionOver()) {
      this.stage = 'float';
      this.floatStartsH = this.hour;
      this.read();
    }
  }

  private isAbsorptionOver(): boolean {
    const { tailA, tailHoldH, longestAbsorptionH } = this.run.charger;
    if (this.chargerAmps(this.charge) >= tailA) this.underTailFromH = null;
    else this.underTailFromH ??= this.hour;
    const isHeld =
      this.underTailFromH !== null && this.hour - this.underTailFromH >= tailHoldH - 1e-9;
    return isHeld || this.hour - (this.bulkEndsH ?? 0) >= longestAbsorptionH - 1e-9;
  }

  private slopePerH(charge: number): number {
    const amps = this.chargerAmps(charge) - this.loadAmps();
    const { efficiency, capacityAh } = this.run.battery;
    return (amps > 0 ? amps * efficiency : amps) / capacityAh;
  }

  private chargerAmps(charge: number): number {
    const { battery, charger } = this.run;
    const holdV = this.stage === 'float' ? charger.floatV : charger.absorptionV;
    const taken = (holdV - openCircuitV(battery, charge)) / chargingOhms(battery, charge);
    return Math.max(0, Math.min(charger.limitA, taken + this.loadAmps()));
  }

  private loadAmps(): number {
    const { amps, fromH } = this.run.load;
    return this.hour >= fromH - 1e-9 ? amps : 0;
  }
}

function clampShare(charge: number): number {
  return Math.min(1, Math.max(0, charge));
}

function requireSettings(run: ChargeRun): void {
  const { charger, load } = run;
  within(run.charge, {
    what: 'Charge at the start',
    unit: 'of full',
    least: 0,
    most: 0.99,
    remedy: 'give it as a share of the capacity',
  });
  within(run.hours, { what: 'Log', unit: 'h', least: 0.1, most: 48, remedy: 'shorten it' });
  within(run.stepS, {
    what: 'Step',
    unit: 's',
    least: 1,
    most: 600,
    remedy: 'choose a shorter one',
  });
  if (charger.floatV >= charger.absorptionV) {
    throw new OutOfRange(
      `Float ${charger.floatV} V is not below absorption ${charger.absorptionV} V; lower the float setting.`,
    );
  }
  if (charger.limitA <= load.amps) {
    throw new OutOfRange(
      `A ${charger.limitA} A charger cannot charge behind a ${load.amps} A load; lower the load.`,
    );
  }
}
