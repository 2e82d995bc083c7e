export interface NewSession {
  readonly accountId: string;
  readonly tokenHash: Buffer;
  readonly startedAt: Date;
  readonly endsAt: Date;
  readonly device: string;
  readonly address: string;
}

/** What the cookie's token says: which session, and the secret that proves it. */
export interface SessionToken {
  readonly sid: string;
  readonly key: string;
}

const MINUTE_MS = 60_000;
/** A session nobody uses ends after this time. */
export const IDLE_MS = 120 * MINUTE_MS;
/** Every session ends after this time, used or not. */
export const ABSOLUTE_MS = 12 * 60 * MINUTE_MS;
/** How long ago a password may have been given for an act that asks for a fresh sign-in. */
export const FRESH_MS = 15 * MINUTE_MS;
/** How stale `last_seen_at` may be: not every request writes. */
export const TOUCH_MS = MINUTE_MS;
