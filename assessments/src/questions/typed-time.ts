import { sameDimension, type Unit, unitsSpelt } from './units.ts';

/** A time in several units, and what it may be where that is not certain. */
export type TimeReading =
  { state: 'time'; figure: number; unit: Unit } | { state: 'ambiguous'; readings: string[] };

const H = 'h|hr|hrs|hour|hours';
const MIN = 'm|min|mins|minute|minutes';
const S = 's|sec|secs|second|seconds';
const AND = ' ?(?:and|,)? ?';
const HOURS_MINUTES = new RegExp(
  `^(\\d{1,3}) ?(?:${H})\\.?${AND}(\\d{1,2}) ?(?:${MIN})?\\.?(?:${AND}(\\d{1,2}) ?(?:${S})\\.?)?$`,
  'i',
);
const MINUTES_SECONDS = new RegExp(
  `^(\\d{1,3}) ?(?:${MIN})\\.?${AND}(\\d{1,2}) ?(?:${S})\\.?$`,
  'i',
);
const CLOCK = /^(\d{1,3}):(\d\d)(?::(\d\d))?$/;

/** Reads "1 h 24 min", "1 min 30 s", "1:24" and "1:24:30"; null for anything else. */
export function readTime(text: string, wanted: Unit | null): TimeReading | null {
  const [hour, minute] = [unitsSpelt('h')[0], unitsSpelt('min')[0]];
  if (!hour || !minute) return null;
  const clock = CLOCK.exec(text);
  if (clock?.[3] === undefined && clock && isShort(wanted, hour)) return askClock(clock);
  const long = HOURS_MINUTES.exec(text) ?? clock;
  if (long) return sumOf(long.slice(1), hour);
  const short = MINUTES_SECONDS.exec(text);
  return short && sumOf(short.slice(1), minute);
}

/** Whether minutes or seconds are asked for: there 1:24 may well be a minute and 24 seconds. */
function isShort(wanted: Unit | null, hour: Unit): boolean {
  return (
    wanted !== null &&
    sameDimension(wanted.dimension, hour.dimension) &&
    wanted.factor < hour.factor
  );
}

function askClock([, first = '', second = '']: RegExpExecArray): TimeReading | null {
  if (Number(second) >= 60) return null;
  return {
    state: 'ambiguous',
    readings: [`${first} h ${second} min`, `${first} min ${second} s`],
  };
}

/** Each figure counts a sixtieth of the one before it, so none but the first may reach 60. */
function sumOf(figures: readonly (string | undefined)[], unit: Unit): TimeReading | null {
  const [first = 0, ...rest] = figures.map((text) => Number(text ?? 0));
  if (rest.some((figure) => figure >= 60)) return null;
  const figure = rest.reduce((sum, part, index) => sum + part / 60 ** (index + 1), first);
  return { state: 'time', figure, unit };
}
