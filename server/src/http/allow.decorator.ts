import { SetMetadata } from '@nestjs/common';
import type { Role } from '../accounts/account.ts';

/** Who may call a route: anyone, anyone signed in, or holders of one of the roles. */
export type Policy = 'anyone' | 'signed-in' | readonly Role[];

export const POLICY = 'ferrule:policy';

/**
 * The one policy of a route. A route without it answers nobody.
 * Whose things a caller may touch is decided further in, by the WHERE clause of the query.
 */
export const Allow = (policy: 'anyone' | 'signed-in' | Role, ...more: Role[]) =>
  SetMetadata(POLICY, policy === 'anyone' || policy === 'signed-in' ? policy : [policy, ...more]);
