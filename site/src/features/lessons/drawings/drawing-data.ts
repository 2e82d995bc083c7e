import { type LessonView } from '../queries.ts';

export type DrawingKind = keyof LessonView['drawings'];
/** What one kind of drawing was sent with. */
export type Drawn<Kind extends DrawingKind> = NonNullable<LessonView['drawings'][Kind]>;

/** A figure to so many places, with a true minus. */
export function sayFigure(value: number, places: number): string {
  const rounded = value.toFixed(places);
  return (Number(rounded) === 0 ? rounded.replace('-', '') : rounded).replace('-', '\u2212');
}

/** Places a value between two ends on a line between two others. */
export function scaleBetween(values: [number, number], places: [number, number]) {
  const [from, to] = values;
  const [start, end] = places;
  return (value: number) => start + ((value - from) / (to - from)) * (end - start);
}

/** Round figures from one end to the other. */
export function ticksBetween(from: number, to: number, step: number): number[] {
  const count = Math.floor((to - from) / step + 1e-9);
  return Array.from({ length: count + 1 }, (_, index) => from + index * step);
}

/** A line through points already placed. */
export function pathThrough(points: readonly (readonly [number, number])[]): string {
  return points
    .map(([x, y], index) => `${index ? 'L' : 'M'}${+x.toFixed(1)} ${+y.toFixed(1)}`)
    .join('');
}
