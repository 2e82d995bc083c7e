import { createHash, randomBytes } from 'node:crypto';

const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;

/** What a link may be used for, and for how long. */
export const TOKEN_LIFE_MS = {
  'confirm-email': 24 * HOUR_MS,
  'reset-password': 30 * MINUTE_MS,
  'change-email': 24 * HOUR_MS,
  'undo-email-change': 7 * 24 * HOUR_MS,
  'claim-administrator': 24 * HOUR_MS,
} as const;

const TOKEN_BYTES = 32;

/** A key for a link: 256 random bits. */
export const newToken = (): string => randomBytes(TOKEN_BYTES).toString('base64url');

/** What is kept of it. */
export const hashToken = (token: string): Buffer => createHash('sha256').update(token).digest();

export type TokenPurpose = keyof typeof TOKEN_LIFE_MS;

export interface OpenToken {
  readonly id: string;
  readonly accountId: string | null;
  readonly email: string | null;
}
