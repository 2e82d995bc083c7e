import { SetMetadata } from '@nestjs/common';
import type { Role } from '../accounts/account.ts';

/** Who may call a route: anyone, anyone signed in, or holders of one of the roles. */
export type Policy = 'anyone' | 'signed-in' | readonly Role[];

export const POLICY = 'ferrule:policy';
export const FRESH = 'ferrule:fresh';
export const BEFORE_SECOND_FACTOR = 'ferrule:before-second-factor';

/**
 * The one policy of a route. A route without it answers nobody.
 * Whose things a caller may touch is decided further in, by the WHERE clause of the query.
 */
export const Allow = (policy: 'anyone' | 'signed-in' | Role, ...more: Role[]) =>
  SetMetadata(POLICY, policy === 'anyone' || policy === 'signed-in' ? policy : [policy, ...more]);

/** The password must have been given a short while ago in this session. */
export const FreshSignIn = () => SetMetadata(FRESH, true);

/** For the routes by which an administrator sets up or gives the second factor. */
export const BeforeSecondFactor = () => SetMetadata(BEFORE_SECOND_FACTOR, true);
