/** What an account may do. Employers get their role with their organisation. */
export const ROLES = ['trainee', 'trainer', 'certification-manager', 'administrator'] as const;
export type Role = (typeof ROLES)[number];

/** The person behind a request, read from the database for that request. */
export interface SignedInAccount {
  readonly id: string;
  readonly sessionId: string;
  readonly givenName: string;
  readonly familyName: string;
  readonly email: string;
  readonly roles: readonly Role[];
  /** When the password was last given in this session. */
  readonly authenticatedAt: Date;
  /** When a second factor was given in this session. */
  readonly secondFactorAt: Date | null;
}

/** An account as its own services see it. Never sent anywhere. */
export interface Account {
  readonly id: string;
  readonly email: string;
  readonly givenName: string;
  readonly familyName: string;
  readonly passwordHash: string | null;
  readonly isConfirmed: boolean;
  readonly isSuspended: boolean;
}

export const fullName = (person: { givenName: string; familyName: string }): string =>
  `${person.givenName} ${person.familyName}`.trim();
