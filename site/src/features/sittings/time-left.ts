import { useEffect, useState } from 'react';

const warnings = [
  { secondsLeft: 600, says: 'Ten minutes left.' },
  { secondsLeft: 60, says: 'One minute left.' },
];

const shortOfTimeSeconds = 300;

/** Under five minutes the clock is shown, hidden or not. */
export const isShortOfTime = (secondsLeft: number) => secondsLeft <= shortOfTimeSeconds;

/** Whole seconds until the server closes the sitting, by the server's clock. */
export function useSecondsLeft(closesAt: string, clockOffsetMs: number): number {
  const [now, setNow] = useState(() => Date.now());
  useEffect(() => {
    const tick = setInterval(() => setNow(Date.now()), 500);
    return () => clearInterval(tick);
  }, []);
  return Math.max(0, Math.ceil((Date.parse(closesAt) - (now + clockOffsetMs)) / 1000));
}

/** "17:40", or "1:02:05" beyond an hour. */
export function sayClock(seconds: number): string {
  const two = (value: number) => String(value).padStart(2, '0');
  const [hours, minutes] = [Math.floor(seconds / 3600), Math.floor(seconds / 60) % 60];
  const rest = `${hours > 0 ? two(minutes) : minutes}:${two(seconds % 60)}`;
  return hours > 0 ? `${hours}:${rest}` : rest;
}

/**
 * What to announce at this moment: at half time, ten minutes and one minute, and nothing between,
 * so that a screen reader is not read the clock every second (WCAG 4.1.3).
 */
export function warningAt(secondsLeft: number, secondsInAll: number): string {
  const due = warnings.filter((warning) => secondsLeft <= warning.secondsLeft).at(-1);
  if (due) return due.says;
  return secondsLeft <= secondsInAll / 2 ? 'Half of the time is left.' : '';
}
