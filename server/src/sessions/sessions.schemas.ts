import { z } from 'zod';
import { ROLES } from '../accounts/account.ts';

/** Long enough for any passphrase; whether it is right is for the sign-in to say. */
const givenPasswordSchema = z.string().min(1).max(1_024);
const instant = z.iso.datetime();

export const sessionViewSchema = z.strictObject({
  account: z.strictObject({
    id: z.uuid(),
    givenName: z.string(),
    familyName: z.string(),
    email: z.string(),
    roles: z.array(z.enum(ROLES)),
  }),
  secondFactor: z.enum(['none', 'needed', 'to-enrol', 'done']),
  idleEndsAt: instant,
  endsAt: instant,
  authenticatedAt: instant,
  demonstration: z.boolean(),
});
export type SessionView = z.infer<typeof sessionViewSchema>;

export const signInSchema = z.strictObject({
  email: z.string().min(1).max(254),
  password: givenPasswordSchema,
});
export type SignIn = z.infer<typeof signInSchema>;

export const secondFactorCodeSchema = z.strictObject({ code: z.string().min(6).max(40) });
export type SecondFactorCode = z.infer<typeof secondFactorCodeSchema>;

export const confirmPasswordSchema = z.strictObject({ password: givenPasswordSchema });
export type ConfirmPassword = z.infer<typeof confirmPasswordSchema>;

export const ownSessionsSchema = z.strictObject({
  sessions: z.array(
    z.strictObject({
      id: z.uuid(),
      current: z.boolean(),
      startedAt: instant,
      lastSeenAt: instant,
      device: z.string(),
      address: z.string(),
    }),
  ),
});
export type OwnSessions = z.infer<typeof ownSessionsSchema>;
