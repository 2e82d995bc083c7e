import { z } from 'zod';
import { ROLES } from '../accounts/account.ts';

const instant = z.iso.datetime();

export const personViewSchema = z.strictObject({
  id: z.uuid(),
  givenName: z.string(),
  familyName: z.string(),
  email: z.string(),
  roles: z.array(z.enum(ROLES)),
  emailConfirmed: z.boolean(),
  suspended: z.strictObject({ at: instant, reason: z.string() }).nullable(),
  joinedAt: instant,
  lastSeenAt: instant.nullable(),
  secondFactor: z.boolean(),
  sessions: z.number().int(),
});
export type PersonView = z.infer<typeof personViewSchema>;

export const findPeopleSchema = z.strictObject({
  find: z.string().trim().max(100).default(''),
  cursor: z.string().max(600).default(''),
});
export type FindPeople = z.infer<typeof findPeopleSchema>;

export const peoplePageSchema = z.strictObject({
  people: z.array(personViewSchema),
  nextCursor: z.string().nullable(),
});
export type PeoplePage = z.infer<typeof peoplePageSchema>;

export const personPageSchema = z.strictObject({
  person: personViewSchema,
  lately: z.array(z.strictObject({ at: instant, what: z.string() })),
});
export type PersonPage = z.infer<typeof personPageSchema>;

export const roleSchema = z.enum(ROLES);
export const personIdSchema = z.uuid();

export const suspendSchema = z.strictObject({ reason: z.string().trim().min(1).max(500) });
export type Suspend = z.infer<typeof suspendSchema>;

export const acceptedSchema = z.strictObject({});
