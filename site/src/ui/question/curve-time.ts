import { type CurveView } from './views.ts';

/** In what a curve's time is read: hours, or seconds where the whole of it is short. */
export interface CurveTime {
  unit: 'h' | 's';
  /** In words: "hours". */
  said: string;
  perHour: number;
  /** Of the cursor, in the unit. */
  step: number;
  /** Of the Page keys. */
  leap: number;
  places: number;
  /** Between the columns of the table of readings. */
  between: number;
  /** The whole of the curve, in the unit. */
  end: number;
}

/** Under this a log is taken second by second. */
const shortHours = 0.5;

export function timeOf(curve: CurveView): CurveTime {
  const hours = curve.hours.at(-1) ?? 0;
  if (hours > shortHours) {
    const between = hours <= 4 ? 0.25 : hours <= 8 ? 0.5 : 1;
    const inHours = { unit: 'h', said: 'hours', perHour: 1 } as const;
    return { ...inHours, step: 0.1, leap: 1, places: 1, between, end: hours };
  }
  const end = Math.round(hours * 3600);
  const between = end <= 300 ? 15 : end <= 900 ? 30 : 60;
  const inSeconds = { unit: 's', said: 'seconds', perHour: 3600 } as const;
  return { ...inSeconds, step: 1, leap: 30, places: 0, between, end };
}

/** The nearest place the cursor may stand at. */
export function placeCursor({ step, end }: CurveTime, at: number): number {
  const placed = Math.round(Math.round(at / step) * step * 10) / 10;
  return Math.min(end, Math.max(0, placed));
}
