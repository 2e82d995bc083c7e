import { scaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
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
  volts: number;
  amps: number;
}

const bracketTop = 30;
const voltsTop = 52;
const gap = 44;
const foot = 40;
/** Where along the time axis the curves are named. */
const labelAt = 0.6;

/** Volts at that time, between the samples by a straight line; likewise amps. */
export function readAt(curve: CurveView, hours: number): Reading {
  const next = curve.hours.findIndex((sample) => sample >= hours);
  const after = next === -1 ? curve.hours.length - 1 : next;
  const before = Math.max(0, after - 1);
  const [from = 0, to = 0] = [curve.hours[before], curve.hours[after]];
  const share = to === from ? 1 : (hours - from) / (to - from);
  const between = (values: number[]) => {
    const [start = 0, end = 0] = [values[before], values[after]];
    return start + (end - start) * share;
  };
  return { hours, volts: between(curve.volts), amps: between(curve.amps) };
}

/** Readings at even times, at most sixteen, for the table beside the drawing. */
export function readingsOf(curve: CurveView): Reading[] {
  const end = curve.hours.at(-1) ?? 0;
  const step = end <= 4 ? 0.25 : end <= 8 ? 0.5 : 1;
  const count = Math.floor(end / step + 1e-9) + 1;
  return Array.from({ length: count }, (_, index) => readAt(curve, index * step));
}

/** Everything the drawing needs to place a curve: scales, ticks and paths. */
export function placeCurve(curve: CurveView, layout: CurveLayout) {
  const end = curve.hours.at(-1) ?? 1;
  const plot = layout.height - voltsTop - gap - foot;
  const voltsFoot = voltsTop + plot * 0.58;
  const ampsTop = voltsFoot + gap;
  const ampsFoot = layout.height - foot;
  const x = scaleLinear([0, end], [layout.left, layout.width - layout.right]).clamp(true);
  const lowest = Math.floor(Math.min(...curve.volts));
  const highest = Math.ceil(Math.max(...curve.volts) + 0.2);
  const volts = scaleLinear([lowest, highest], [voltsFoot, voltsTop]);
  const amps = scaleLinear([0, Math.max(...curve.amps) * 1.15], [ampsFoot, ampsTop]).nice(3);
  const path = (values: number[], y: (value: number) => number) =>
    line<number>(
      (_, index) => x(curve.hours[index] ?? 0),
      (value) => y(value),
    )(values) ?? '';
  const named = readAt(curve, end * labelAt);
  return {
    ...{ x, volts, amps, bracketTop, voltsTop, voltsFoot, ampsTop, ampsFoot },
    voltsPath: path(curve.volts, volts),
    ampsPath: path(curve.amps, amps),
    voltsLabel: { x: x(named.hours), y: volts(named.volts) - 10 },
    ampsLabel: { x: x(named.hours), y: amps(named.amps) - 10 },
    hourTicks: x.ticks(Math.min(10, Math.max(4, Math.round(layout.width / 70)))),
    voltTicks: volts.ticks(Math.min(5, highest - lowest)),
    ampTicks: amps.ticks(3),
  };
}

export type PlacedCurve = ReturnType<typeof placeCurve>;
