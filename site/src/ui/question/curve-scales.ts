import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { type CurveLine, headOf, linesOf } from './curve-lines.ts';
import { timeOf } from './curve-time.ts';
import { type CurveView } from './views.ts';

export interface CurveLayout {
  width: number;
  height: number;
  /** Room at the left for the figures of the axes. */
  left: number;
  right: number;
}

export interface Reading {
  hours: number;
  /** One for each line of the curve. */
  values: number[];
}

const bracketTop = 30;
const voltsTop = 52;
const gap = 44;
const foot = 40;

/** What each line reads at that time, between the samples by a straight line. */
export function readAt(curve: CurveView, hours: number): Reading {
  const next = curve.hours.findIndex((sample) => sample >= hours);
  const after = next === -1 ? curve.hours.length - 1 : next;
  const before = Math.max(0, after - 1);
  const [from = 0, to = 0] = [curve.hours[before], curve.hours[after]];
  const share = to === from ? 1 : (hours - from) / (to - from);
  const between = ({ values }: CurveLine) => {
    const [start = 0, end = 0] = [values[before], values[after]];
    return start + (end - start) * share;
  };
  return { hours, values: linesOf(curve).map(between) };
}

/** Readings at even times, at most some two dozen, for the table beside the drawing. */
export function readingsOf(curve: CurveView): Reading[] {
  const { end, between, perHour } = timeOf(curve);
  const count = Math.floor(end / between + 1e-9) + 1;
  return Array.from({ length: count }, (_, index) => readAt(curve, (index * between) / perHour));
}

/** Everything the drawing needs to place a curve: scales, ticks and paths. */
export function placeCurve(curve: CurveView, layout: CurveLayout) {
  const end = curve.hours.at(-1) ?? 1;
  const time = timeOf(curve);
  const plot = layout.height - voltsTop - gap - foot;
  const voltsFoot = voltsTop + plot * 0.58;
  const ampsTop = voltsFoot + gap;
  const ampsFoot = layout.height - foot;
  const lines = linesOf(curve);
  const valuesIn = (pane: CurveLine['pane']) =>
    lines.filter((one) => one.pane === pane).flatMap(({ values }) => values);
  const x = scaleLinear([0, end], [layout.left, layout.width - layout.right]).clamp(true);
  const lowest = Math.floor(Math.min(...valuesIn('volts')));
  const highest = Math.ceil(Math.max(...valuesIn('volts')) + 0.2);
  const volts = scaleLinear([lowest, highest], [voltsFoot, voltsTop]);
  const leastAmps = Math.min(0, ...valuesIn('amps')) * 1.15;
  const mostAmps = Math.max(...valuesIn('amps')) * 1.15;
  const amps = scaleLinear([leastAmps, mostAmps], [ampsFoot, ampsTop]).nice(3);
  const scales = { volts, amps };
  const drawn = lines.map((one) => {
    const y = scales[one.pane];
    const path = line<number>(
      (_, index) => x(curve.hours[index] ?? 0),
      (value) => y(value),
    )([...one.values]);
    return { ...one, y, path: path ?? '' };
  });
  return {
    ...{ x, volts, amps, bracketTop, voltsTop, voltsFoot, ampsTop, ampsFoot },
    lines: drawn.map((one) => ({ ...one, label: placeLabel(one, drawn, { curve, x }) })),
    time,
    timeTicks: scaleLinear([0, time.end], [0, 1]).ticks(
      Math.min(10, Math.max(4, Math.round(layout.width / 70))),
    ),
    voltTicks: volts.ticks(Math.min(5, highest - lowest)),
    ampTicks: amps.ticks(3),
  };
}

export type PlacedCurve = ReturnType<typeof placeCurve>;

interface Drawn extends CurveLine {
  y: (value: number) => number;
}

interface Axis {
  curve: CurveView;
  x: (hours: number) => number;
}

/** Where a name may begin along the time axis, the likeliest place first. */
const labelAt = [0.6, 0.5, 0.65, 0.4, 0.3, 0.2, 0.1];
const letterWidth = 7;

/** A line is named where it stands clearest of the others of its pane, on the side away from them. */
function placeLabel(drawn: Drawn, all: readonly Drawn[], { curve, x }: Axis) {
  const end = curve.hours.at(-1) ?? 1;
  const own = all.indexOf(drawn);
  const share = (headOf(drawn).length * letterWidth) / (x(end) - x(0));
  const spots = labelAt.map((from) => {
    // The name must stay clear of the line as far as it runs.
    const run = [0, 0.5, 1].map((part) => {
      const { values } = readAt(curve, end * Math.min(1, from + share * part));
      return all.map((one, index) => one.y(values[index] ?? 0));
    });
    const heights = run.map((ofAll) => ofAll[own] ?? 0);
    const others = all.flatMap((one, index) =>
      index === own || one.pane !== drawn.pane ? [] : [run.map((ofAll) => ofAll[index] ?? 0)],
    );
    // Which line is meant is told where the name begins, less where it ends.
    const above = roomOn(heights.slice(0, 2), others, -1);
    const below = roomOn(heights.slice(0, 2), others, 1);
    const isAbove = above >= below;
    const y = isAbove ? Math.min(...heights) - 10 : Math.max(...heights) + 20;
    return { x: x(end * from), y, room: Math.min(Math.max(above, below), 60) };
  });
  const [first = { x: 0, y: 0, room: 0 }] = spots;
  const best = spots.reduce((kept, spot) => (spot.room > kept.room + 4 ? spot : kept), first);
  return { x: best.x, y: best.y };
}

/** How far away the next line is on one side (-1 above, 1 below), where it is nearest. */
function roomOn(own: readonly number[], others: readonly number[][], side: -1 | 1): number {
  const gaps = others.flatMap((other) =>
    own.map((y, index) => ((other[index] ?? 0) - y) * side).filter((room) => room > -4),
  );
  return Math.min(...gaps, side === -1 ? 61 : 60);
}
