import { type Drawn } from './drawing-data.ts';

type Timeline = Drawn<'source-timeline'>;

/** All that holds at one minute. */
export interface Instant {
  minute: number;
  inputV: number;
  spell: Timeline['spells'][number];
  /** What happens at this very minute. */
  event: Timeline['events'][number] | undefined;
}

export function instantAt({ points, spells, events }: Timeline, minute: number): Instant | null {
  const spell = spells.findLast(({ fromMinute }) => fromMinute <= minute) ?? spells[0];
  const point = points.findLast((one) => one.minute <= minute) ?? points[0];
  if (!spell || !point) return null;
  const event = events.find((one) => one.minute === minute);
  return { minute, inputV: point.inputV, spell, event };
}

/** The next stop of "Next event" or "Event before"; after the last one it begins again. */
export function stepEvent({ events }: Timeline, minute: number, way: 1 | -1): number {
  const stops = [0, ...events.map((event) => event.minute)];
  const [first = 0] = stops;
  return way > 0
    ? (stops.find((stop) => stop > minute) ?? first)
    : (stops.findLast((stop) => stop < minute) ?? stops.at(-1) ?? first);
}
