import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { randomUUID } from 'node:crypto';
import { keyFromMail, openAccount, PASSPHRASE } from '../../test/account-steps.ts';
import { createAccount, type TestAccount } from '../../test/factories/account.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, PUBLIC_URL, type TestApp } from '../../test/test-app.ts';
import { makeAdministratorLink } from '../accounts/administrator-link.ts';

let test: TestApp;
let administrator: TestAccount;
let office: Caller;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());

describe('the first administrator', () => {
  const claim = (link: string, more: object = {}) =>
    stranger(test.app).call('POST', '/api/administrator-claims', {
      token: link.split('#')[1] ?? '',
      givenName: 'Marit',
      familyName: 'Oyelaran',
      email: 'marit@school.example',
      password: PASSPHRASE,
      schoolName: 'Tidewater College of Trades',
      schoolAddress: '1 Slip Lane, Tidewater',
      ...more,
    });

  it('opens their account by the newest link, once, and nobody can sign in before', async () => {
    expect(await test.query('SELECT 1 FROM accounts WHERE password_hash IS NOT NULL')).toEqual([]);
    const older = await makeAdministratorLink(test.database.webUrl, PUBLIC_URL);
    const link = await makeAdministratorLink(test.database.webUrl, PUBLIC_URL);
    expect(link).toMatch(/^http:\/\/127\.0\.0\.1:4780\/first-administrator#[\w-]{43}$/);
    expect((await claim(older ?? '')).status).toBe(410);
    expect((await claim(link ?? '', { password: 'short' })).status).toBe(422);
    expect((await claim(link ?? '', { schoolName: ' ' })).body.errors[0].pointer).toBe(
      '#/schoolName',
    );
    const taken = await createAccount(test.app);
    expect((await claim(link ?? '', { email: taken.email })).body.errors[0].pointer).toBe(
      '#/email',
    );
    const replies = await Promise.all([
      claim(link ?? '', { email: 'marit@school.example' }),
      claim(link ?? '', { email: 'other@school.example' }),
    ]);
    expect(replies.map(({ status }) => status).sort()).toEqual([201, 410]);
    const front = await stranger(test.app).call('GET', '/api/front');
    expect(front.body.school).toEqual({
      ...{ name: 'Tidewater College of Trades', address: '1 Slip Lane, Tidewater' },
    });
    expect(await makeAdministratorLink(test.database.webUrl, PUBLIC_URL)).toBeNull();
    const held = await test.query(
      `SELECT a.given_name, r.role FROM account_roles r JOIN accounts a ON a.id = r.account_id WHERE r.role = 'administrator'`,
    );
    expect(held).toEqual([{ given_name: 'Marit', role: 'administrator' }]);
    await test.query(`DELETE FROM account_roles WHERE role = 'administrator' RETURNING role`);
  });
});

describe('the people page', () => {
  beforeEach(async () => {
    await test.query(`DELETE FROM account_roles WHERE role = 'administrator' RETURNING role`);
    administrator = await createAccount(test.app, { roles: ['administrator'] });
    office = await signIn(test.app, administrator.id);
  });

  it('finds people by name and email, a page at a time', async () => {
    const family = `Quay${randomUUID().slice(0, 8)}`;
    const names = Array.from({ length: 53 }, (_, n) => `Given${String(n).padStart(2, '0')}`);
    for (const givenName of names) await createAccount(test.app, { givenName, familyName: family });
    const first = await office.call('GET', `/api/people?find=${family.toLowerCase()}`);
    expect(first.body.people).toHaveLength(50);
    const cursor = encodeURIComponent(String(first.body.nextCursor));
    const second = await office.call('GET', `/api/people?find=${family}&cursor=${cursor}`);
    expect(second.body.nextCursor).toBeNull();
    const found = [...first.body.people, ...second.body.people] as { givenName: string }[];
    expect(found.map(({ givenName }) => givenName)).toEqual(names);
    const { email } = await createAccount(test.app);
    const byEmail = await office.call('GET', `/api/people?find=${email.slice(0, 20)}`);
    expect(byEmail.body.people).toMatchObject([{ email, roles: ['trainee'], suspended: null }]);
  });

  it('takes signs of the search language as letters, and refuses a cursor that is none', async () => {
    const strange = encodeURIComponent(`%_\\'; DROP TABLE accounts --`);
    expect((await office.call('GET', `/api/people?find=${strange}`)).body.people).toEqual([]);
    for (const cursor of ['x', 'W10', Buffer.from('["a","b","c"]').toString('base64url')]) {
      expect((await office.call('GET', `/api/people?cursor=${cursor}`)).status).toBe(422);
    }
  });

  it('shows one person with what happened lately', async () => {
    const person = await openAccount(test);
    const { email, password } = person;
    await stranger(test.app).call('POST', '/api/sessions', { email, password });
    await office.call('PUT', `/api/people/${person.id}/roles/trainer`);
    const page = await office.call('GET', `/api/people/${person.id}`);
    expect(page.body.person).toMatchObject({
      id: person.id,
      emailConfirmed: true,
      roles: ['trainee', 'trainer'],
      sessions: 1,
      secondFactor: false,
    });
    const said = (page.body.lately as { what: string }[]).map(({ what }) => what);
    expect(said).toEqual([
      'was made trainer by Ifeoma Castellan',
      'signed in',
      'confirmed the email',
      'opened the account',
    ]);
    expect((await office.call('GET', `/api/people/${randomUUID()}`)).status).toBe(404);
  });

  it('gives and takes roles, which count from the next request on', async () => {
    const person = await createAccount(test.app);
    const browser = await signIn(test.app, person.id);
    const role = `/api/people/${person.id}/roles/administrator`;
    expect((await browser.call('GET', '/api/people')).status).toBe(403);
    expect((await office.call('PUT', role)).body.roles).toEqual(['administrator', 'trainee']);
    expect((await browser.call('GET', '/api/people')).status).toBe(200);
    expect((await office.call('DELETE', role)).body.roles).toEqual(['trainee']);
    expect((await browser.call('GET', '/api/people')).status).toBe(403);
    expect((await office.call('PUT', `/api/people/${person.id}/roles/owner`)).status).toBe(422);
  });

  it('suspends with a reason: sessions end, sign-in stops, and it can be undone', async () => {
    const person = await openAccount(test);
    const browser = await signIn(test.app, person.id);
    const { email, password } = person;
    const signInAgain = () => stranger(test.app).call('POST', '/api/sessions', { email, password });
    const path = `/api/people/${person.id}/suspension`;
    for (const reason of ['  ', 'Left\u0000', 'x'.repeat(501)]) {
      expect((await office.call('PUT', path, { reason })).status).toBe(422);
    }
    const suspended = await office.call('PUT', path, { reason: 'Left the school' });
    expect(suspended.body.suspended).toEqual({
      at: test.clock.now().toISOString(),
      reason: 'Left the school',
    });
    expect((await browser.call('GET', '/api/session')).status).toBe(401);
    expect((await signInAgain()).status).toBe(401);
    expect((await office.call('DELETE', path)).body.suspended).toBeNull();
    expect((await browser.call('GET', '/api/session')).status).toBe(401);
    expect((await signInAgain()).status).toBe(201);
  });

  it('never loses its last administrator, nor lets one remove themselves', async () => {
    const own = `/api/people/${administrator.id}`;
    const onOneself = [
      await office.call('DELETE', `${own}/roles/administrator`),
      await office.call('PUT', `${own}/suspension`, { reason: 'test' }),
    ];
    for (const { body } of onOneself) expect(body.type).toBe('/problems/not-on-oneself');

    const second = await createAccount(test.app, { roles: ['administrator'] });
    const secondOffice = await signIn(test.app, second.id);
    const both = await Promise.all([
      office.call('DELETE', `/api/people/${second.id}/roles/administrator`),
      secondOffice.call('DELETE', `${own}/roles/administrator`),
    ]);
    const left = await test.query(
      `SELECT account_id FROM account_roles WHERE role = 'administrator'`,
    );
    expect(left).toHaveLength(1);
    expect(both.filter(({ status }) => status === 200)).toHaveLength(1);
  });

  it('starts a reset without setting or seeing the passphrase, and signs people out', async () => {
    const person = await openAccount(test);
    const browser = await signIn(test.app, person.id);
    const path = `/api/people/${person.id}`;
    const started = await office.call('POST', `${path}/password-reset`);
    expect([started.status, started.body]).toEqual([202, {}]);
    await test.runJobs();
    const token = keyFromMail(test, person.email);
    expect(JSON.stringify((await office.call('GET', path)).body)).not.toContain(token);
    expect((await office.call('PUT', `${path}/roles/trainer`, { password: 'x' })).status).toBe(200);
    expect((await office.call('DELETE', `${path}/sessions`)).status).toBe(204);
    expect((await browser.call('GET', '/api/session')).status).toBe(401);
    const reset = { token, password: 'copper lantern seven gulls' };
    const chosen = await stranger(test.app).call(
      'POST',
      '/api/password-resets/confirmations',
      reset,
    );
    expect(chosen.status).toBe(204);
  });

  it('records who did what to whom, from where', async () => {
    const person = await createAccount(test.app);
    const path = `/api/people/${person.id}`;
    await office.call('PUT', `${path}/roles/trainer`);
    await office.call('DELETE', `${path}/roles/trainer`);
    await office.call('PUT', `${path}/suspension`, { reason: 'Left' });
    await office.call('DELETE', `${path}/suspension`);
    await office.call('DELETE', `${path}/sessions`);
    await (await signIn(test.app, person.id)).call('GET', '/api/people');
    const events = await test.query(
      'SELECT kind, actor_id, address, detail FROM security_events WHERE account_id = $1 ORDER BY id',
      [person.id],
    );
    const by = { actor_id: administrator.id, address: '127.0.0.1' };
    expect(events).toEqual([
      { kind: 'role-given', ...by, detail: { role: 'trainer' } },
      { kind: 'role-taken', ...by, detail: { role: 'trainer' } },
      { kind: 'suspended', ...by, detail: { reason: 'Left' } },
      { kind: 'reinstated', ...by, detail: {} },
      { kind: 'sessions-ended', ...by, detail: {} },
      {
        kind: 'access-denied',
        actor_id: person.id,
        address: '127.0.0.1',
        detail: { method: 'GET', route: '/api/people' },
      },
    ]);
  });
});
