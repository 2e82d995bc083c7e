import { type CircuitReading } from './circuit.ts';
import { type ChargerSettings } from './settings.ts';
import { SAME_H } from './timetable.ts';

type OwnStage = 'bulk' | 'absorption' | 'float' | 'rest';

/** A fall this far under the setting, as a share of the empty battery’s volts, ends absorption: 0.15 V of 12 V. */
const FALL_BACK_SHARE = 0.0125;
const RESTART_HOLD_H = 1 / 60;

/** The charger's own stages: what it holds, and when it goes on to the next. */
export class StageKeeper {
  private readonly charger: ChargerSettings;
  private readonly fallBackV: number;
  private absorptionFromH = 0;
  private underTailFromH: number | null = null;
  private underRestartFromH: number | null = null;
  stage: OwnStage = 'bulk';
  bulkEndsH: number | null = null;
  floatStartsH: number | null = null;

  constructor(charger: ChargerSettings, emptyV: number) {
    this.charger = charger;
    this.fallBackV = FALL_BACK_SHARE * emptyV;
  }

  /** Held at 25 °C plus what the charger adds for the temperature; null at rest. */
  get holdV(): number | null {
    const { absorptionV, floatV, compensationV = 0 } = this.charger;
    if (this.stage === 'rest') return null;
    return (this.stage === 'float' ? floatV : absorptionV) + compensationV;
  }

  /** A source taken anew starts with bulk. */
  begin(): void {
    this.stage = 'bulk';
    this.underTailFromH = null;
    this.underRestartFromH = null;
  }

  isUnderTail({ amps, batteryAmps }: CircuitReading): boolean {
    const { tailA, tailAt } = this.charger;
    return (tailAt === 'battery' ? batteryAmps : amps) < tailA;
  }

  isUnderRestart({ batteryVolts }: CircuitReading): boolean {
    return batteryVolts < (this.charger.restartV ?? -Infinity);
  }

  /** The next moment at which a wait of the stage is over; Infinity with none. */
  get waitsUntilH(): number {
    const { tailHoldH, leastAbsorptionH = 0, longestAbsorptionH, afterAbsorption } = this.charger;
    if (this.stage === 'absorption') {
      if (afterAbsorption === 'hold') return Infinity;
      const longestH = this.absorptionFromH + longestAbsorptionH;
      if (this.underTailFromH === null) return longestH;
      const heldH = this.underTailFromH + tailHoldH;
      return Math.min(longestH, Math.max(heldH, this.absorptionFromH + leastAbsorptionH));
    }
    return this.underRestartFromH === null ? Infinity : this.underRestartFromH + RESTART_HOLD_H;
  }

  /** Goes on where the reading says so; true when the stage has changed. */
  look(hour: number, reading: CircuitReading): boolean {
    if (this.stage === 'bulk') return this.leaveBulk(hour, reading);
    if (this.stage === 'absorption') return this.leaveAbsorption(hour, reading);
    return this.leaveFloat(hour, reading);
  }

  private leaveBulk(hour: number, reading: CircuitReading): boolean {
    if (reading.at === 'limit') return false;
    this.stage = 'absorption';
    this.absorptionFromH = hour;
    this.underTailFromH = null;
    this.bulkEndsH ??= hour;
    return true;
  }

  private leaveAbsorption(hour: number, reading: CircuitReading): boolean {
    if (this.isFallenBack(reading)) {
      this.stage = 'bulk';
      return true;
    }
    if (this.isUnderTail(reading)) this.underTailFromH ??= hour;
    else this.underTailFromH = null;
    if (hour < this.waitsUntilH - SAME_H) return false;
    this.stage = this.charger.afterAbsorption === 'rest' ? 'rest' : 'float';
    this.floatStartsH ??= hour;
    return true;
  }

  /** A load has taken all the charger gives, and the voltage with it. */
  isFallenBack({ at, volts, batteryVolts }: CircuitReading): boolean {
    const sensedV = this.charger.sense === 'battery' ? batteryVolts : volts;
    return at === 'limit' && sensedV < (this.holdV ?? 0) - this.fallBackV;
  }

  private leaveFloat(hour: number, reading: CircuitReading): boolean {
    if (this.isUnderRestart(reading)) this.underRestartFromH ??= hour;
    else this.underRestartFromH = null;
    if (hour < this.waitsUntilH - SAME_H) return false;
    this.begin();
    return true;
  }
}
