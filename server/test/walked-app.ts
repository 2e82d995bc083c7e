import { randomUUID } from 'node:crypto';
import { ROLES, type Role } from '../src/accounts/account.ts';
import { PASSPHRASE } from './account-steps.ts';
import { createAccount, type TestAccount } from './factories/account.ts';
import { goodFiles, publishFiles } from './factories/content.ts';
import { signIn, type Caller } from './sign-in.ts';
import type { TestApp } from './test-app.ts';

/** What one trainee has made: the addresses of it, by the name of the parameter. */
export interface Things {
  readonly owner: TestAccount;
  readonly caller: Caller;
  readonly values: Readonly<Record<string, readonly string[]>>;
  /** The address that belongs under a part of a path, such as `sittings`. */
  readonly idUnder: Readonly<Record<string, string>>;
  /** What passes for right in the fields of a body. */
  readonly byField: Readonly<Record<string, readonly string[]>>;
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
  await saveAnswers({ worksheet: worksheet.body, sitting: sitting.body }, caller);
  return {
    owner,
    caller,
    idUnder: {
      'worksheet-attempts': idOf(worksheet.body),
      practice: idOf(practice.body),
      sittings: idOf(sitting.body),
      classes: classId,
      people: owner.id,
    },
    byField: {
      email: ['somebody@people.example', owner.email],
      password: [PASSPHRASE],
      currentPassword: [PASSPHRASE],
      newPassword: ['copper lantern seven gulls'],
      question: ['vd-feed'],
      paper: ['try-paper'],
      agreementHash: [String(paper.body.agreementHash)],
      revision: ['A'],
    },
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

const firstItem = (body: unknown): string =>
  (body as { items: { key: string }[] }).items[0]?.key ?? '';

async function saveAnswers(
  { worksheet, sitting }: { worksheet: unknown; sitting: unknown },
  caller: Caller,
): Promise<void> {
  const answer = { text: '1.5', unit: 'V', option: null, working: 'I × R' };
  const replies = [
    await caller.call(
      'PUT',
      `/api/worksheet-attempts/${idOf(worksheet)}/items/${firstItem(worksheet)}/answers`,
      { answers: { a: answer } },
    ),
    await caller.call('PUT', `/api/sittings/${idOf(sitting)}/items/${firstItem(sitting)}/parts/a`, {
      answer,
      sequence: 1,
      idempotencyKey: randomUUID(),
    }),
  ];
  for (const { status, body } of replies) {
    if (status !== 200) throw new Error(JSON.stringify(body));
  }
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

/**
 * A fingerprint of every table the server may write to, the queue of jobs included; only the
 * record of security events may grow when something is refused.
 */
export async function fingerprint(test: TestApp): Promise<Record<string, string>> {
  const tables = await test.query<{ name: string }>(
    `SELECT quote_ident(schemaname) || '.' || quote_ident(tablename) AS name FROM pg_tables
      WHERE (schemaname = 'public' AND tablename <> 'security_events') OR (schemaname = 'jobs' AND tablename = 'job') ORDER BY 1`,
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
