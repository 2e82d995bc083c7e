import type { Role } from '../accounts/account.ts';

/** Somebody with an account, as an administrator sees them. */
export interface Person {
  readonly id: string;
  readonly givenName: string;
  readonly familyName: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly emailConfirmedAt: Date | null;
  readonly suspendedAt: Date | null;
  readonly suspendedReason: string | null;
  readonly joinedAt: Date;
  readonly lastSeenAt: Date | null;
  readonly hasSecondFactor: boolean;
  readonly openSessions: number;
}

/** Where a page of people ends. */
export interface PeopleCursor {
  readonly familyName: string;
  readonly givenName: string;
  readonly id: string;
}

export const writeCursor = ({ familyName, givenName, id }: PeopleCursor): string =>
  Buffer.from(JSON.stringify([familyName, givenName, id])).toString('base64url');

/** @returns null when it is none of ours. */
export function readCursor(text: string): PeopleCursor | null {
  try {
    const parts: unknown = JSON.parse(Buffer.from(text, 'base64url').toString('utf8'));
    if (!Array.isArray(parts) || parts.length !== 3) return null;
    const [familyName, givenName, id] = parts as unknown[];
    if (typeof familyName !== 'string' || typeof givenName !== 'string') return null;
    if (typeof id !== 'string' || !/^[0-9a-f-]{36}$/.test(id)) return null;
    return { familyName, givenName, id };
  } catch {
    return null;
  }
}
