import type { ThrottleRule } from '../throttles/throttle.ts';

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;

/** Checks that found nothing, from one address. An office that checks many seldom mistypes. */
export const missedFromAddress: ThrottleRule = {
  kind: 'register-address',
  freeTries: 30,
  firstWaitMs: 10_000,
  longestWaitMs: 15 * MINUTE_MS,
  memoryMs: HOUR_MS,
};

/**
 * Wrong names for one number, from anywhere: names cannot be tried out. The wait stays short,
 * since whoever holds the paper can cause it; the code on it and the file answer meanwhile.
 */
export const missedForNumber: ThrottleRule = {
  kind: 'register-number',
  freeTries: 10,
  firstWaitMs: 10_000,
  longestWaitMs: 5 * MINUTE_MS,
  memoryMs: 24 * HOUR_MS,
};

/** Files sent to be looked at, from one address: each costs time. */
export const fileFromAddress: ThrottleRule = {
  kind: 'register-file',
  freeTries: 30,
  firstWaitMs: 30_000,
  longestWaitMs: 15 * MINUTE_MS,
  memoryMs: HOUR_MS,
};
