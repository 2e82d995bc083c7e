import { randomUUID } from 'node:crypto';
import { ROLES, type Role } from '../src/accounts/account.ts';
import { createAccount, type TestAccount } from './factories/account.ts';
import { goodFiles, publishFiles } from './factories/content.ts';
import { signIn, type Caller } from './sign-in.ts';
import type { TestApp } from './test-app.ts';

/** What one trainee has made: the addresses of it, by the name of the parameter. */
export interface Things {
  readonly owner: TestAccount;
  readonly caller: Caller;
  readonly values: Readonly<Record<string, readonly string[]>>;
}

const idOf = (body: unknown): string => String((body as { id?: unknown }).id);

/** Publishes a small course and lets a trainee begin something of every kind. */
export async function makeThings(test: TestApp): Promise<Things> {
  await publishFiles(test, goodFiles());
  const owner = await createAccount(test.app);
  const caller = await signIn(test.app, owner.id);
  const worksheet = await caller.call('POST', '/api/worksheets/W1/attempts');
  const practice = await caller.call('POST', '/api/practice', { question: 'vd-feed' });
  const paper = await caller.call('GET', '/api/papers/try-paper');
  const sitting = await caller.call('POST', '/api/sittings', {
    ...{ paper: 'try-paper', agreed: true, agreementHash: paper.body.agreementHash },
    ...{ givenName: owner.givenName, familyName: owner.familyName },
  });
  for (const reply of [worksheet, practice, sitting]) {
    if (reply.status !== 201) throw new Error(JSON.stringify(reply.body));
  }
  const classId = await addClass(test, owner.id);
  const firstItem = (body: unknown) => (body as { items: { key: string }[] }).items[0]?.key ?? '';
  return {
    owner,
    caller,
    values: {
      id: [
        ...[worksheet, practice, sitting].map(({ body }) => idOf(body)),
        ...[classId, owner.id, caller.sessionId ?? ''],
      ],
      key: [firstItem(worksheet.body), firstItem(sitting.body)],
      part: ['a', 'c'],
      number: ['1.1', 'W1'],
      slug: ['try-paper'],
      role: [...ROLES],
      code: ['A'.repeat(22)],
      sha256: ['0'.repeat(64)],
    },
  };
}

async function addClass(test: TestApp, memberId: string): Promise<string> {
  const trainer = await createAccount(test.app, { roles: ['trainer'] });
  const [school] = await test.query<{ id: string }>(
    `INSERT INTO organisations (kind, name) VALUES ('school', 'Harrow Quay Technical School') RETURNING id`,
  );
  const [made] = await test.query<{ id: string }>(
    `INSERT INTO classes (organisation_id, course_slug, name, join_code, starts_on, ends_on)
     VALUES ($1, 'hq-dc2', 'DC-26B', $2, '2026-09-14', '2026-12-18') RETURNING id`,
    [school?.id, randomUUID()],
  );
  const classId = made?.id ?? '';
  await test.query(
    'INSERT INTO class_trainers (class_id, account_id) VALUES ($1, $2) RETURNING class_id',
    [classId, trainer.id],
  );
  await test.query(
    'INSERT INTO class_members (class_id, account_id) VALUES ($1, $2) RETURNING class_id',
    [classId, memberId],
  );
  return classId;
}

export async function callerWith(test: TestApp, ...roles: Role[]): Promise<Caller> {
  return signIn(test.app, (await createAccount(test.app, { roles })).id);
}

/** Every combination of known values for the parameters of an address. */
export function combinations(
  names: readonly string[],
  values: Things['values'],
): Array<Record<string, string>> {
  return names.reduce<Array<Record<string, string>>>(
    (made, name) =>
      made.flatMap((so) => (values[name] ?? ['x']).map((value) => ({ ...so, [name]: value }))),
    [{}],
  );
}

/** A fingerprint of every table the server may write to, the queue of jobs included. */
export async function fingerprint(test: TestApp): Promise<Record<string, string>> {
  const tables = await test.query<{ name: string }>(
    `SELECT quote_ident(schemaname) || '.' || quote_ident(tablename) AS name FROM pg_tables
      WHERE schemaname = 'public' OR (schemaname = 'jobs' AND tablename = 'job') ORDER BY 1`,
  );
  const prints: Record<string, string> = {};
  for (const { name } of tables) {
    const [row] = await test.query<{ print: string | null }>(
      `SELECT md5(string_agg(t::text, '' ORDER BY t::text)) AS print FROM ${name} t`,
    );
    prints[name] = row?.print ?? '';
  }
  return prints;
}
