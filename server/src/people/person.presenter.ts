import type { Person } from './person.ts';
import type { PersonView } from './people.schemas.ts';

export function presentPerson(person: Person): PersonView {
  return {
    id: person.id,
    givenName: person.givenName,
    familyName: person.familyName,
    email: person.email,
    roles: [...person.roles],
    emailConfirmed: person.emailConfirmedAt !== null,
    suspended:
      person.suspendedAt === null
        ? null
        : { at: person.suspendedAt.toISOString(), reason: person.suspendedReason ?? '' },
    joinedAt: person.joinedAt.toISOString(),
    lastSeenAt: person.lastSeenAt?.toISOString() ?? null,
    secondFactor: person.hasSecondFactor,
    sessions: person.openSessions,
  };
}
