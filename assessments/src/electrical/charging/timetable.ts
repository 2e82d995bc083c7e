import { type ChargeRun, type ChargerSettings } from './settings.ts';

/** Same moment, h: a few microseconds of rounding apart. */
export const SAME_H = 1e-9;

/** Every moment known beforehand at which something changes, rising, within the log. */
export function momentsOf({ charger, load, vehicle, solar, hours }: ChargeRun): number[] {
  const { quietUntilH, derate } = charger;
  const known = [
    load.fromH,
    load.untilH,
    quietUntilH,
    derate?.fromH,
    derate && derate.fromH + derate.overH,
    vehicle?.fromH,
    vehicle?.untilH,
    solar?.shade?.fromH,
    solar?.shade?.untilH,
    ...pausesOf(charger, hours),
    hours,
  ];
  const within = known.filter(
    (hour): hour is number => hour !== undefined && hour > SAME_H && hour <= hours,
  );
  return [...new Set(within)].sort((a, b) => a - b);
}

function pausesOf({ pauses }: ChargerSettings, hours: number): number[] {
  if (!pauses) return [];
  const { everyH, forH } = pauses;
  const count = Math.floor(hours / everyH + SAME_H);
  return Array.from({ length: count }, (_, index) => (index + 1) * everyH).flatMap((startH) => [
    startH,
    startH + forH,
  ]);
}

/** Whether the charger stops here to look at its source; the first look is after the first spell. */
export function isPaused({ pauses }: ChargerSettings, hour: number): boolean {
  if (!pauses) return false;
  const spell = Math.floor(hour / pauses.everyH + SAME_H);
  return spell > 0 && hour - spell * pauses.everyH < pauses.forH - SAME_H;
}

export function isBetween(hour: number, fromH: number, untilH = Infinity): boolean {
  return hour >= fromH - SAME_H && hour < untilH - SAME_H;
}

export function loadAt({ load }: ChargeRun, hour: number): number {
  return isBetween(hour, load.fromH, load.untilH) ? load.amps : 0;
}

/** Half output in quiet running: what a charger not held back would give, A. */
export function fullOutputAt({ limitA, quietUntilH = 0 }: ChargerSettings, hour: number): number {
  return hour < quietUntilH - SAME_H ? limitA / 2 : limitA;
}

/** What the charger can give of itself: quiet running and heat, A. */
export function ownLimitAt(charger: ChargerSettings, hour: number): number {
  const { derate, limitA } = charger;
  const full = fullOutputAt(charger, hour);
  if (!derate || hour < derate.fromH) return full;
  const slid = derate.overH > 0 ? Math.min(1, (hour - derate.fromH) / derate.overH) : 1;
  return Math.min(full, limitA + (derate.toA - limitA) * slid);
}

/** What the sun lets a charger give, A. */
export function sunAmpsAt({ solar }: ChargeRun, hour: number): number {
  if (!solar) return 0;
  const { shade } = solar;
  return shade && isBetween(hour, shade.fromH, shade.untilH) ? shade.amps : solar.amps;
}
