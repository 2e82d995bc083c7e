import type { SignedInAccount } from '../accounts/account.ts';

export interface NewSession {
  readonly accountId: string;
  readonly tokenHash: Buffer;
  readonly startedAt: Date;
  readonly endsAt: Date;
  readonly device: string;
  readonly address: string;
}

/** How a session stands, read for the person it belongs to. */
export interface SessionStanding {
  readonly account: SignedInAccount;
  readonly lastSeenAt: Date;
  readonly endsAt: Date;
  readonly hasSecondFactor: boolean;
}

/** One line of somebody's list of sessions. */
export interface OpenSession {
  readonly id: string;
  readonly startedAt: Date;
  readonly lastSeenAt: Date;
  readonly device: string;
  readonly address: string;
}

/** What the cookie's token says: which session, and the secret that proves it. */
export interface SessionToken {
  readonly sid: string;
  readonly key: string;
}

/** Whom the cookie's token is for: no other token of ours is taken for one. */
export const TOKEN_AUDIENCE = 'ferrule-session';

const MINUTE_MS = 60_000;
/** A session nobody uses ends after this time. */
export const IDLE_MS = 120 * MINUTE_MS;
/** Every session ends after this time, used or not. */
export const ABSOLUTE_MS = 12 * 60 * MINUTE_MS;
/** How long ago a password may have been given for an act that asks for a fresh sign-in. */
export const FRESH_MS = 15 * MINUTE_MS;
/** How stale `last_seen_at` may be: not every request writes. */
export const TOUCH_MS = MINUTE_MS;
