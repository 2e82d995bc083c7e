import { IDLE_MS, type OpenSession, type SessionStanding } from './session.ts';
import type { OwnSessions, SessionView } from './sessions.schemas.ts';

function secondFactorOf({
  account,
  hasSecondFactor,
}: SessionStanding): SessionView['secondFactor'] {
  if (!account.roles.includes('administrator')) return 'none';
  if (account.secondFactorAt !== null) return 'done';
  return hasSecondFactor ? 'needed' : 'to-enrol';
}

export function presentSession(standing: SessionStanding, isDemonstration: boolean): SessionView {
  const { id, givenName, familyName, email, roles, authenticatedAt } = standing.account;
  return {
    account: { id, givenName, familyName, email, roles: [...roles] },
    secondFactor: secondFactorOf(standing),
    idleEndsAt: new Date(standing.lastSeenAt.getTime() + IDLE_MS).toISOString(),
    endsAt: standing.endsAt.toISOString(),
    authenticatedAt: authenticatedAt.toISOString(),
    demonstration: isDemonstration,
  };
}

export const presentOwnSessions = (open: OpenSession[], currentId: string): OwnSessions => ({
  sessions: open.map((session) => ({
    id: session.id,
    current: session.id === currentId,
    startedAt: session.startedAt.toISOString(),
    lastSeenAt: session.lastSeenAt.toISOString(),
    device: session.device,
    address: session.address,
  })),
});
