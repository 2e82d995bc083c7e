const MINUTE_MS = 60_000;
const HOUR_MS = 60 * MINUTE_MS;
const DAY_MS = 24 * HOUR_MS;

/** How many tries are free, and how the wait grows after them. */
export interface ThrottleRule {
  readonly kind: string;
  readonly freeTries: number;
  readonly firstWaitMs: number;
  readonly longestWaitMs: number;
  /** Tries older than this count no more. */
  readonly memoryMs: number;
  /** From this many tries on there is one try in `lastWaitMs`. */
  readonly mostTries?: number;
  readonly lastWaitMs?: number;
}

/**
 * A stranger can slow an account down for new devices, never lock it: a device known to the
 * account has a count of its own, the wait has an end, and a reset by mail clears the count.
 * At most 100 tries in a row come without a day between them (NIST SP 800-63B, 3.2.2).
 */
export const signInAtAccount: ThrottleRule = {
  kind: 'sign-in-account',
  freeTries: 5,
  firstWaitMs: 10_000,
  longestWaitMs: HOUR_MS,
  memoryMs: 30 * DAY_MS,
  mostTries: 100,
  lastWaitMs: DAY_MS,
};

export const signInFromDevice: ThrottleRule = { ...signInAtAccount, kind: 'sign-in-device' };

/** A school's classroom shares one address, so many tries are free. */
export const signInFromAddress: ThrottleRule = {
  kind: 'sign-in-address',
  freeTries: 60,
  firstWaitMs: 10_000,
  longestWaitMs: 15 * MINUTE_MS,
  memoryMs: HOUR_MS,
};

export const secondFactorTry: ThrottleRule = {
  ...signInAtAccount,
  kind: 'second-factor',
};

export const passwordConfirmation: ThrottleRule = {
  kind: 'password-confirmation',
  freeTries: 5,
  firstWaitMs: 30_000,
  longestWaitMs: 15 * MINUTE_MS,
  memoryMs: DAY_MS,
};

/** Asking for accounts and for mails with links, from one address. */
export const askFromAddress: ThrottleRule = {
  kind: 'ask-address',
  freeTries: 60,
  firstWaitMs: MINUTE_MS,
  longestWaitMs: 15 * MINUTE_MS,
  memoryMs: HOUR_MS,
};

/** Mails with links to one mailbox. */
export const mailToMailbox: ThrottleRule = {
  kind: 'mail-mailbox',
  freeTries: 5,
  firstWaitMs: HOUR_MS,
  longestWaitMs: HOUR_MS,
  memoryMs: HOUR_MS,
};

export interface PastTries {
  readonly count: number;
  readonly lastAt: Date | null;
}

function waitAfterMs(rule: ThrottleRule, count: number): number {
  if (rule.mostTries !== undefined && count >= rule.mostTries) {
    return rule.lastWaitMs ?? rule.longestWaitMs;
  }
  if (count < rule.freeTries) return 0;
  return Math.min(rule.longestWaitMs, rule.firstWaitMs * 2 ** (count - rule.freeTries));
}

/** Whole seconds until the next try may be made; 0 when it may be made now. */
export function secondsToWait(rule: ThrottleRule, past: PastTries, now: Date): number {
  if (past.lastAt === null) return 0;
  const endsAt = past.lastAt.getTime() + waitAfterMs(rule, past.count);
  return Math.max(0, Math.ceil((endsAt - now.getTime()) / 1_000));
}

/** The part of an address that one subscriber holds: all of IPv4, the first half of IPv6. */
export function subscriberOf(address: string): string {
  const mapped = /^::ffff:(\d+\.\d+\.\d+\.\d+)$/i.exec(address)?.[1];
  if (mapped) return mapped;
  if (!address.includes(':')) return address;
  const [head = '', tail] = address.split('::');
  const groups = head.split(':').filter((group) => group !== '');
  const after = (tail ?? '').split(':').filter((group) => group !== '');
  if (tail !== undefined) {
    while (groups.length + after.length < 8) groups.push('0');
  }
  return [...groups, ...after]
    .slice(0, 4)
    .map((group) => group.toLowerCase().replace(/^0+(?=.)/, ''))
    .join(':');
}
