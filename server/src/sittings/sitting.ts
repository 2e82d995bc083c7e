import type { Blueprint, RawAnswer } from '@ferrule/assessments';
import { SittingClosed, TakenOver } from './sittings.errors.ts';

/** How long after the time an answer that was on its way is still taken. */
const GRACE_MS = 2_000;

const MINUTE_MS = 60_000;

/** What a candidate sat under: copied at the start and never changed. */
export interface Rules {
  readonly formatVersion: 1;
  readonly paper: {
    readonly slug: string;
    readonly number: string;
    readonly title: string;
    readonly revision: string;
    readonly course: string;
  };
  readonly minutes: number;
  readonly extraTimePercent: number;
  readonly passPercent: number;
  readonly passMarks: number;
  readonly outOf: number;
  readonly waitDays: number;
  readonly sat: string;
  readonly aids: readonly string[];
  readonly agreement: string;
  readonly appeal: string;
  readonly scheme: Blueprint['scheme'];
}

export type HandedInHow = 'by-candidate' | 'at-the-deadline';

export interface Sitting {
  readonly id: string;
  readonly accountId: string;
  readonly paperSlug: string;
  readonly blueprintRevisionId: string;
  readonly schemeId: string;
  readonly rules: Rules;
  readonly agreementHash: string;
  readonly givenName: string;
  readonly familyName: string;
  readonly writingSessionId: string | null;
  readonly startedAt: Date;
  readonly closesAt: Date;
  readonly handedInAt: Date | null;
  readonly handedInHow: HandedInHow | null;
}

/** An answer as it was kept; nothing kept is ever changed. */
export interface SavedAnswer {
  readonly itemKey: string;
  readonly part: string;
  readonly sequence: number;
  readonly answer: RawAnswer;
  readonly receipt: string;
  readonly savedAt: Date;
}

/** The smallest whole number of marks that is the pass percentage or more. */
export function passMarks(outOf: number, passPercent: number): number {
  // Rounded first: 66.6 % of 500 is 333, whatever binary fractions make of it.
  return Math.ceil(Math.round(outOf * passPercent * 1_000) / 100_000);
}

/** Whole per cent, never rounded up: 69.9 is not a pass at 70. */
export function percentOf(marks: number, outOf: number): number {
  return outOf === 0 ? 0 : Math.floor((marks * 100) / outOf);
}

export function minutesAllowed(minutes: number, extraTimePercent: number): number {
  return (minutes * (100 + extraTimePercent)) / 100;
}

/** The rules as they stand now, to be frozen into a sitting. */
export function freezeRules(blueprint: Blueprint, outOf: number, extraTimePercent: number): Rules {
  const { slug, number, title, revision, course } = blueprint;
  const { minutes, passPercent, waitDays, sat, aids, agreement, appeal, scheme } = blueprint;
  return {
    formatVersion: 1,
    paper: { slug, number, title, revision, course },
    ...{ minutes, extraTimePercent, passPercent, waitDays, sat, aids, agreement, appeal, scheme },
    passMarks: passMarks(outOf, passPercent),
    outOf,
  };
}

/** When a sitting that starts now closes. */
export function closingTime(startedAt: Date, rules: Rules): Date {
  const minutes = minutesAllowed(rules.minutes, rules.extraTimePercent);
  return new Date(startedAt.getTime() + minutes * MINUTE_MS);
}

/** The last instant at which an answer is taken. */
export function takesAnswersUntil(sitting: Pick<Sitting, 'closesAt'>): Date {
  return new Date(sitting.closesAt.getTime() + GRACE_MS);
}

/** The one comparison of the clock with a sitting's time. */
export function isPastItsTime(
  sitting: Pick<Sitting, 'closesAt' | 'handedInAt'>,
  now: Date,
): boolean {
  return sitting.handedInAt === null && now > takesAnswersUntil(sitting);
}

/** When and how a sitting that is handed in now counts as handed in. */
export function handingIn(
  sitting: Pick<Sitting, 'closesAt' | 'handedInAt'>,
  now: Date,
): { at: Date; how: HandedInHow } {
  if (isPastItsTime(sitting, now)) return { at: sitting.closesAt, how: 'at-the-deadline' };
  return { at: now < sitting.closesAt ? now : sitting.closesAt, how: 'by-candidate' };
}

export function isWritableBy(
  sitting: Pick<Sitting, 'handedInAt' | 'writingSessionId'>,
  sessionId: string,
): boolean {
  return sitting.handedInAt === null && sitting.writingSessionId === sessionId;
}

/**
 * @throws {SittingClosed} when the paper has been handed in.
 * @throws {TakenOver} when another session of the candidate writes.
 */
export function requireWritable(
  sitting: Pick<Sitting, 'handedInAt' | 'writingSessionId'>,
  sessionId: string,
): void {
  if (sitting.handedInAt) throw new SittingClosed(sitting.handedInAt);
  if (!isWritableBy(sitting, sessionId)) throw new TakenOver();
}

/** What counts of all that was kept: for each part the highest sequence. */
export function answersThatCount(
  saved: readonly SavedAnswer[],
): Map<string, Map<string, SavedAnswer>> {
  const items = new Map<string, Map<string, SavedAnswer>>();
  for (const answer of saved) {
    const parts = items.get(answer.itemKey) ?? new Map<string, SavedAnswer>();
    const before = parts.get(answer.part);
    if (!before || answer.sequence > before.sequence) parts.set(answer.part, answer);
    items.set(answer.itemKey, parts);
  }
  return items;
}

/** No 0, 1, I or O: a receipt is read out on the telephone. */
const RECEIPT_ALPHABET = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';
const RECEIPT_CHARACTERS = 4;

/** @example newReceipt('F1', 19, new Uint8Array(4)) // 'F1-2222-19' */
export function newReceipt(paperNumber: string, sequence: number, random: Uint8Array): string {
  const characters = [...random.slice(0, RECEIPT_CHARACTERS)].map((byte) =>
    RECEIPT_ALPHABET.charAt(byte % RECEIPT_ALPHABET.length),
  );
  return `${paperNumber}-${characters.join('')}-${String(sequence).padStart(2, '0')}`;
}
