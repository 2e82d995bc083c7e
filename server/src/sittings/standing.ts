import { longDay } from './days.ts';

/** A sitting of one paper by one person, as far as the next start depends on it. */
export interface EarlierSitting {
  readonly id: string;
  readonly startedAt: Date;
  readonly handedInAt: Date | null;
  readonly passed: boolean | null;
  readonly maySitAgainAt: Date | null;
}

export interface Standing {
  readonly state: 'open' | 'waiting' | 'sitting' | 'passed';
  readonly reasons: readonly string[];
  readonly mayStartAt: Date | null;
  readonly sittingId: string | null;
  readonly certificateId: string | null;
  /** A paper handed in that is not marked yet. */
  readonly isMarking: boolean;
  /** The newest first. */
  readonly sittings: readonly EarlierSitting[];
}

interface Circumstances {
  readonly sittings: readonly EarlierSitting[];
  readonly certificateId: string | null;
  readonly now: Date;
  readonly zone: string;
}

const nothing = { reasons: [], mayStartAt: null, sittingId: null, isMarking: false };

function latestWait(sittings: readonly EarlierSitting[]): Date | null {
  const waits = sittings.map(({ maySitAgainAt }) => maySitAgainAt).filter((at) => at !== null);
  return waits.reduce<Date | null>((latest, at) => (latest && latest > at ? latest : at), null);
}

/** Whether someone may start a paper now, and if not, why. */
export function decideStanding({ sittings, certificateId, now, zone }: Circumstances): Standing {
  const base = { ...nothing, certificateId, sittings };
  const open = sittings.find(({ handedInAt }) => handedInAt === null);
  if (open) {
    return { ...base, state: 'sitting', sittingId: open.id, reasons: ['Your paper is open.'] };
  }
  if (certificateId) {
    return { ...base, state: 'passed', reasons: ['You hold the certificate this paper leads to.'] };
  }
  if (sittings.some(({ passed }) => passed === null)) {
    return { ...base, state: 'waiting', isMarking: true, reasons: ['Your paper is being marked.'] };
  }
  const mayStartAt = latestWait(sittings);
  if (mayStartAt && mayStartAt > now) {
    const reasons = [`You may sit again from ${longDay(zone, mayStartAt)}.`];
    return { ...base, state: 'waiting', mayStartAt, reasons };
  }
  return { ...base, state: 'open' };
}
