import { randomUUID } from 'node:crypto';
import type { TestApp } from './test-app.ts';
import { stranger } from './sign-in.ts';

/** Long enough, and on no list. */
export const PASSPHRASE = 'tin kettle over harbour';

export const freshEmail = (): string => `${randomUUID()}@people.example`;

/** What the newest mail to an address says behind the # of its link. */
export function keyFromMail(test: TestApp, email: string): string {
  const text = test.mails.lastTo(email)?.text;
  const key = typeof text === 'string' ? /#([\w-]{43})/.exec(text)?.[1] : undefined;
  if (!key) throw new Error(`The newest mail to ${email} holds no key.`);
  return key;
}

export interface OpenedAccount {
  readonly id: string;
  readonly email: string;
  readonly password: string;
}

/** An account opened as people do it: signed up and confirmed by the link of the mail. */
export async function openAccount(
  test: TestApp,
  options: { email?: string; password?: string; givenName?: string; familyName?: string } = {},
): Promise<OpenedAccount> {
  const email = options.email ?? freshEmail();
  const password = options.password ?? PASSPHRASE;
  const anyone = stranger(test.app);
  const { givenName = 'Wilf', familyName = 'Dragomir' } = options;
  await anyone.call('POST', '/api/accounts', { givenName, familyName, email, password });
  await test.runJobs();
  await anyone.call('POST', '/api/email-confirmations', { token: keyFromMail(test, email) });
  const [row] = await test.query<{ id: string }>('SELECT id FROM accounts WHERE email = $1', [
    email,
  ]);
  return { id: row?.id ?? '', email, password };
}

/** The cookies of an answer, as a browser would send them back. */
export function cookiesOf(headers: Record<string, unknown>): string {
  const lines = [headers['set-cookie']].flat().filter((line) => typeof line === 'string');
  return lines.map((line) => line.split(';')[0] ?? '').join('; ');
}
