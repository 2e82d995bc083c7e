import { hash, verify } from '@node-rs/argon2';
import { randomBytes } from 'node:crypto';
import { availableParallelism } from 'node:os';
import { WorkGate } from './work-gate.ts';

/** argon2id with the least OWASP's password storage cheat sheet advises: 19 MiB, two passes, one lane. */
const COST = { algorithm: 2, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;
const MOST_WAITING = 200;

const gate = new WorkGate(availableParallelism(), MOST_WAITING);

/** The same characters typed on another keyboard must give the same bytes; none are cut off. */
const bytesOf = (password: string) => password.normalize('NFKC');

export const hashPassword = (password: string): Promise<string> =>
  gate.run(() => hash(bytesOf(password), COST));

let decoy: Promise<string> | undefined;

/** A hash that no password has, so that an unknown account costs as much time as a known one. */
export function decoyHash(): Promise<string> {
  decoy ??= hashPassword(randomBytes(32).toString('hex'));
  return decoy;
}

export const isPassword = (passwordHash: string, password: string): Promise<boolean> =>
  gate.run(() => verify(passwordHash, bytesOf(password)));

/** Whether a stored hash was made with less work than is asked for now. */
export function isOutdated(passwordHash: string): boolean {
  const found = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=(\d+)\$/.exec(passwordHash);
  if (!found) return true;
  return Number(found[1]) < COST.memoryCost || Number(found[2]) < COST.timeCost;
}
