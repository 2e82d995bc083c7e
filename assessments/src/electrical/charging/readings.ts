import { type Source } from './inputs.ts';
import { type Stage } from './settings.ts';

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

/** What a log adds up to. */
export interface ChargeTotals {
  /** Out of the charger. */
  chargerAh: number;
  chargerWh: number;
  /** Put out before bulk ended the first time. */
  bulkAh: number;
  /** Into the battery less out of it. */
  batteryAh: number;
}

/** Adds a log up; between two readings it is straight. */
export function totalsOf(
  readings: readonly ChargeReading[],
  bulkEndsH: number | null,
): ChargeTotals {
  const totals = { chargerAh: 0, chargerWh: 0, bulkAh: 0, batteryAh: 0 };
  readings.forEach((to, index) => {
    const from = readings[index - 1];
    if (!from) return;
    const hours = to.hour - from.hour;
    const outAh = ((from.amps + to.amps) / 2) * hours;
    totals.chargerAh += outAh;
    totals.chargerWh += ((from.amps * from.volts + to.amps * to.volts) / 2) * hours;
    totals.batteryAh += ((from.batteryAmps + to.batteryAmps) / 2) * hours;
    if (to.hour <= (bulkEndsH ?? Infinity) + 1e-9) totals.bulkAh += outAh;
  });
  return totals;
}

/** The log at a time, between its readings; at a jump the reading after it. */
export function readingAt(readings: readonly ChargeReading[], hour: number): ChargeReading | null {
  const next = readings.findIndex((reading) => reading.hour > hour + 1e-9);
  const before = readings[next === -1 ? readings.length - 1 : next - 1];
  const after = next === -1 ? before : readings[next];
  if (!before || !after || hour > after.hour + 1e-9) return null;
  if (after.hour <= before.hour) return before;
  const share = (hour - before.hour) / (after.hour - before.hour);
  const between = { ...before, hour };
  for (const key of FIGURES) between[key] = before[key] + (after[key] - before[key]) * share;
  return between;
}

const FIGURES = [
  'volts',
  'batteryVolts',
  'inputVolts',
  'startVolts',
  'startCharge',
  'amps',
  'batteryAmps',
  'charge',
] as const;

/** A stretch of a log in which the lines show one stage; pauses do not break it. */
export interface Spell {
  stage: ChargeReading['stage'];
  fromH: number;
  toH: number;
}

export function spellsOf(readings: readonly ChargeReading[]): Spell[] {
  const spells: Spell[] = [];
  for (const { stage, hour, isPaused } of readings) {
    if (isPaused) continue;
    const last = spells.at(-1);
    if (last) last.toH = hour;
    if (last?.stage !== stage) spells.push({ stage, fromH: hour, toH: hour });
  }
  return spells;
}
