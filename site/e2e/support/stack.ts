import { readFileSync } from 'node:fs';
import pg from 'pg';

function given(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is missing: run these tests through npm test.`);
  return value;
}

/** Looks into the database the demonstration runs on, with the owner's role. */
export async function query<T extends object>(sql: string, bind: unknown[] = []): Promise<T[]> {
  const client = new pg.Client({ connectionString: given('E2E_OWNER_URL') });
  await client.connect();
  try {
    return (await client.query<T>(sql, bind)).rows;
  } finally {
    await client.end();
  }
}

export function passphraseOf(email: string): string {
  const all = JSON.parse(readFileSync(given('E2E_PASSPHRASES_FILE'), 'utf8')) as Record<
    string,
    string
  >;
  return all[email] ?? '';
}

interface Mail {
  subject: string;
  text: string;
  attachments: { name: string; type: string; content: string }[];
}

/** Waits until a mail to that address has come whose subject fits. */
export async function mailTo(email: string, subject: RegExp): Promise<Mail> {
  const url = new URL('messages.json', given('E2E_MAIL_URL'));
  url.searchParams.set('to', email);
  for (let tries = 0; tries < 60; tries += 1) {
    const messages = (await (await fetch(url)).json()) as Mail[];
    const found = messages.find((mail) => subject.test(mail.subject));
    if (found) return found;
    await new Promise((resolve) => setTimeout(resolve, 500));
  }
  throw new Error(`No mail to ${email} with a subject like ${subject} came within half a minute.`);
}

/** The first link of a mail to a page of this site, as a path. */
export function linkIn(text: string, path: string): string {
  const link = (text.match(/https?:\/\/\S+/g) ?? []).find((url) =>
    new URL(url).pathname.startsWith(path),
  );
  if (!link) throw new Error(`The mail has no link to ${path}.`);
  const { pathname, hash } = new URL(link);
  return pathname + hash;
}
