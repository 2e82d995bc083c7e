import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { randomUUID } from 'node:crypto';
import {
  cookiesOf,
  keyFromMail,
  openAccount,
  type OpenedAccount,
} from '../../test/account-steps.ts';
import { createAccount } from '../../test/factories/account.ts';
import { signIn, stranger } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { SessionsService } from './sessions.service.ts';

let test: TestApp;
let account: OpenedAccount;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());
beforeEach(async () => {
  test.clock.advance(61);
  account = await openAccount(test);
});

const post = (path: string, body: object, headers: Record<string, string> = {}) =>
  stranger(test.app).call('POST', path, body, headers);
const tryToSignIn = (password: string, cookie = '', email = account.email) =>
  post('/api/sessions', { email, password }, cookie ? { cookie } : {});
const get = (path: string, cookie: string) =>
  stranger(test.app).call('GET', path, undefined, { cookie });
const deviceCookie = (cookies: string) =>
  cookies.split('; ').find((cookie) => cookie.startsWith('ferrule-device=')) ?? '';

describe('signing in', () => {
  it('sets one HttpOnly cookie for the session, and shows the session', async () => {
    const reply = await tryToSignIn(account.password);
    expect(reply.status).toBe(201);
    expect(reply.body).toEqual({
      account: {
        id: account.id,
        email: account.email,
        givenName: 'Wilf',
        familyName: 'Dragomir',
        roles: ['trainee'],
      },
      secondFactor: 'none',
      authenticatedAt: test.clock.now().toISOString(),
      idleEndsAt: new Date(test.clock.now().getTime() + 2 * 3_600_000).toISOString(),
      endsAt: new Date(test.clock.now().getTime() + 12 * 3_600_000).toISOString(),
      demonstration: true,
    });
    const lines = [reply.headers['set-cookie']].flat().map(String);
    for (const line of lines) expect(line).toMatch(/; Path=\/; .*HttpOnly; SameSite=Lax/);
    const current = await get('/api/session', cookiesOf(reply.headers));
    expect(current.body).toEqual(reply.body);
  });

  it('refuses a wrong passphrase, an unknown address, an unconfirmed and a suspended account alike', async () => {
    const waiting = `${randomUUID()}@people.example`;
    await post('/api/accounts', {
      givenName: 'A',
      familyName: '',
      email: waiting,
      password: account.password,
    });
    const suspended = await openAccount(test);
    const administrator = await signIn(
      test.app,
      (await createAccount(test.app, { roles: ['administrator'] })).id,
    );
    await administrator.call('PUT', `/api/people/${suspended.id}/suspension`, { reason: 'left' });
    const replies = [
      await tryToSignIn('not the passphrase'),
      await tryToSignIn(account.password, '', `${randomUUID()}@people.example`),
      await tryToSignIn(account.password, '', waiting),
      await tryToSignIn(suspended.password, '', suspended.email),
    ];
    const bodies = replies.map(({ body }) => ({ ...(body as object), instance: '' }));
    expect(bodies[0]).toMatchObject({ type: '/problems/sign-in-refused', status: 401 });
    for (const body of bodies) expect(body).toEqual(bodies[0]);
    const shapes = replies.map(({ headers, raw }) => [Object.keys(headers).sort(), raw.length]);
    for (const shape of shapes) expect(shape).toEqual(shapes[0]);
  });

  it('cuts no passphrase off', async () => {
    const long = Array.from({ length: 18 }, (_, n) => `plum${n * 7} `).join('');
    const person = await openAccount(test, { password: `${long.slice(0, 72)}x` });
    expect((await tryToSignIn(`${long.slice(0, 72)}y`, '', person.email)).status).toBe(401);
    expect((await tryToSignIn(long.slice(0, 72), '', person.email)).status).toBe(401);
    expect((await tryToSignIn(`${long.slice(0, 72)}x`, '', person.email)).status).toBe(201);
  });

  it('ends the session it takes the place of', async () => {
    const first = cookiesOf((await tryToSignIn(account.password)).headers);
    const second = cookiesOf((await tryToSignIn(account.password, first)).headers);
    expect((await get('/api/session', first)).status).toBe(401);
    expect((await get('/api/session', second)).status).toBe(200);
  });

  it('keeps a hash of 19 MiB and two passes, and renews one made with less', async () => {
    const hashOf = async () =>
      (
        await test.query<{ password_hash: string }>(
          'SELECT password_hash FROM accounts WHERE id = $1',
          [account.id],
        )
      )[0]?.password_hash ?? '';
    const cost = /^\$argon2id\$v=19\$m=19456,t=2,p=1\$[\w+/]{22,}\$/;
    expect(await hashOf()).toMatch(cost);
    const { hash } = await import('@node-rs/argon2');
    const weak = await hash(account.password, { algorithm: 2, memoryCost: 8_192, timeCost: 1 });
    await test.query('UPDATE accounts SET password_hash = $2 WHERE id = $1', [account.id, weak]);
    await tryToSignIn('not the passphrase');
    expect(await hashOf()).toBe(weak);
    await tryToSignIn(account.password);
    expect(await hashOf()).toMatch(cost);
  });
});

describe('guessing', () => {
  it('is slowed down after five tries, with the time to wait', async () => {
    for (let n = 0; n < 5; n += 1) expect((await tryToSignIn(`guess ${n}`)).status).toBe(401);
    const held = await tryToSignIn(account.password);
    expect(held.status).toBe(429);
    expect(held.body).toMatchObject({
      type: '/problems/too-many-attempts',
      retryAfterSeconds: 10,
    });
    expect(held.headers['retry-after']).toBe('10');
    test.clock.advance(11 / 60);
    expect((await tryToSignIn(account.password)).status).toBe(201);
    expect((await tryToSignIn('one more guess')).status).toBe(401);
  });

  it('is counted the same for an address without an account', async () => {
    const email = `${randomUUID()}@people.example`;
    const statuses = [];
    for (let n = 0; n < 6; n += 1) statuses.push((await tryToSignIn('x', '', email)).status);
    expect(statuses).toEqual([401, 401, 401, 401, 401, 429]);
  });

  it('cannot slip past the count by coming all at once', async () => {
    const replies = await Promise.all(
      Array.from({ length: 12 }, (_, n) => tryToSignIn(`guess ${n}`)),
    );
    expect(replies.filter(({ status }) => status === 401)).toHaveLength(5);
    expect(replies.filter(({ status }) => status === 429)).toHaveLength(7);
  });

  it('shuts nobody out: after 101 wrong tries a device known before still signs in', async () => {
    const device = deviceCookie(cookiesOf((await tryToSignIn(account.password)).headers));
    await test.query(
      `INSERT INTO failed_tries (kind, subject_hash, at)
       SELECT 'sign-in-account', sha256(convert_to($1, 'UTF8')), $2 FROM generate_series(1, 101) RETURNING id`,
      [account.email, test.clock.now()],
    );
    const fromNew = await tryToSignIn(account.password);
    expect(fromNew.status).toBe(429);
    expect(fromNew.body.retryAfterSeconds).toBeLessThanOrEqual(86_400);
    const fromKnown = await tryToSignIn(account.password, device);
    expect(fromKnown.status).toBe(201);
    expect((await tryToSignIn(account.password)).status).toBe(429);
    test.clock.advance(24 * 60 + 1);
    expect((await tryToSignIn(account.password)).status).toBe(201);
  });

  it('from a known device is slowed down too, and its cookie helps with no other account', async () => {
    const device = deviceCookie(cookiesOf((await tryToSignIn(account.password)).headers));
    for (let n = 0; n < 5; n += 1) await tryToSignIn(`guess ${n}`, device);
    expect((await tryToSignIn(account.password, device)).status).toBe(429);
    const other = await openAccount(test);
    for (let n = 0; n < 5; n += 1) await tryToSignIn(`guess ${n}`, device, other.email);
    expect((await tryToSignIn(other.password, device, other.email)).status).toBe(429);
  });

  it('is forgotten after a reset by mail', async () => {
    for (let n = 0; n < 5; n += 1) await tryToSignIn(`guess ${n}`);
    await post('/api/password-resets', { email: account.email });
    await test.runJobs();
    const token = keyFromMail(test, account.email);
    const password = 'copper lantern seven gulls';
    await post('/api/password-resets/confirmations', { token, password });
    expect((await tryToSignIn(password)).status).toBe(201);
  });

  it('is counted at the address it comes from, whatever a header claims', async () => {
    await test.query(
      `INSERT INTO failed_tries (kind, subject_hash, at)
       SELECT 'sign-in-address', sha256(convert_to('127.0.0.1', 'UTF8')), $1 FROM generate_series(1, 59) RETURNING id`,
      [test.clock.now()],
    );
    const statuses = [];
    for (const claimed of ['203.0.113.1', '203.0.113.2', '203.0.113.3']) {
      const body = { email: `${randomUUID()}@people.example`, password: 'x' };
      const reply = await post('/api/sessions', body, { 'x-forwarded-for': claimed });
      statuses.push(reply.status);
    }
    expect(statuses).toEqual([401, 429, 429]);
  });
});

it('asks the database the same for a known and an unknown address', async () => {
  const { email } = account;
  const nobody = `${randomUUID()}@people.example`;
  const [known, unknown] = [
    await test.countQueries(() => tryToSignIn('not the passphrase', '', email)),
    await test.countQueries(() => tryToSignIn('not the passphrase', '', nobody)),
  ];
  expect(known).toBe(unknown);
  const asks = (to: string) =>
    test.countQueries(async () => {
      await post('/api/password-resets', { email: to });
      await post('/api/email-confirmations/again', { email: to });
      await post('/api/accounts', {
        givenName: 'A',
        familyName: 'B',
        email: to,
        password: account.password,
      });
    });
  expect(await asks(email)).toBe(await asks(nobody));
});

it('records who came in, who was refused, held back and went out, without what they typed', async () => {
  await tryToSignIn(account.password);
  for (let n = 0; n < 6; n += 1) await tryToSignIn(`guess ${n}`);
  const browser = await signIn(test.app, account.id);
  await browser.call('POST', '/api/session/confirmation', { password: account.password });
  await browser.call('DELETE', '/api/session');
  const events = await test.query<{ kind: string }>(
    'SELECT kind, address, detail FROM security_events WHERE account_id = $1 ORDER BY id',
    [account.id],
  );
  expect(events.map(({ kind }) => kind)).toEqual([
    ...['account-opened', 'email-confirmed', 'sign-in'],
    ...Array.from({ length: 5 }, () => 'sign-in-refused'),
    ...['sign-in-held-back', 'password-confirmed', 'sign-out'],
  ]);
  expect(JSON.stringify(events)).not.toMatch(/guess|kettle/);
  expect(events[3]).toMatchObject({ address: '127.0.0.1', detail: { why: 'wrong passphrase' } });
});

describe('a session', () => {
  it.each([
    ['two hours without use', [121]],
    ['twelve hours, however busy', Array.from({ length: 8 }, () => 91)],
  ])('ends after %s', async (_, steps) => {
    const cookie = cookiesOf((await tryToSignIn(account.password)).headers);
    const statuses = [];
    for (const minutes of steps) {
      test.clock.advance(minutes);
      statuses.push((await get('/api/session', cookie)).status);
    }
    expect(statuses.pop()).toBe(401);
    expect(statuses.every((status) => status === 200)).toBe(true);
  });

  it('ends when signed out, and the cookie goes', async () => {
    const cookie = cookiesOf((await tryToSignIn(account.password)).headers);
    const out = await stranger(test.app).call('DELETE', '/api/session', undefined, { cookie });
    expect(out.status).toBe(204);
    expect(String(out.headers['set-cookie'])).toMatch(/^ferrule=;.*Expires=Thu, 01 Jan 1970/);
    expect((await get('/api/session', cookie)).status).toBe(401);
  });

  it('is seen and ended by its owner, and by nobody else', async () => {
    const [here, there] = [await signIn(test.app, account.id), await signIn(test.app, account.id)];
    const other = await signIn(test.app, (await createAccount(test.app)).id);
    const { sessions } = (await here.call('GET', '/api/me/sessions')).body as {
      sessions: { id: string; current: boolean }[];
    };
    expect(sessions).toHaveLength(2);
    expect(sessions.filter(({ current }) => current).map(({ id }) => id)).toEqual([here.sessionId]);
    const path = `/api/me/sessions/${there.sessionId}`;
    expect((await other.call('DELETE', path)).status).toBe(404);
    expect((await there.call('GET', '/api/session')).status).toBe(200);
    expect((await here.call('DELETE', path)).status).toBe(204);
    expect((await there.call('GET', '/api/session')).status).toBe(401);
    expect((await here.call('DELETE', path)).status).toBe(404);
    expect((await here.call('DELETE', '/api/me/sessions/none')).status).toBe(422);
  });

  it('ends with all the others of the account when their owner says so', async () => {
    const [here, there] = [await signIn(test.app, account.id), await signIn(test.app, account.id)];
    expect((await here.call('DELETE', '/api/me/sessions')).status).toBe(204);
    expect((await there.call('GET', '/api/session')).status).toBe(401);
    expect((await here.call('GET', '/api/session')).status).toBe(200);
  });

  it('is made fresh by giving the passphrase once more', async () => {
    const here = await signIn(test.app, account.id);
    test.clock.advance(20);
    const confirm = (password: string) =>
      here.call('POST', '/api/session/confirmation', { password });
    expect((await confirm('not the passphrase')).body.errors[0].pointer).toBe('#/password');
    const fresh = await confirm(account.password);
    expect(fresh.body.authenticatedAt).toBe(test.clock.now().toISOString());
  });
});

describe('a token', () => {
  const base64 = (value: object) => Buffer.from(JSON.stringify(value)).toString('base64url');

  it('that is forged, altered or meant for something else opens nothing', async () => {
    const service = test.app.get(SessionsService);
    const { token } = await service.open(account.id, { device: '', address: '' });
    const [head = '', claims = '', signature = ''] = token.split('.');
    const payload = JSON.parse(Buffer.from(claims, 'base64url').toString()) as object;
    const cookies = cookiesOf((await tryToSignIn(account.password)).headers);
    const device = deviceCookie(cookies).split('=')[1] ?? '';
    const forged = [
      `${base64({ alg: 'none', typ: 'JWT' })}.${claims}.`,
      `${base64({ alg: 'RS256', typ: 'JWT' })}.${claims}.${signature}`,
      `${base64({ alg: 'HS256', typ: 'JWT', jku: 'https://keys.example' })}.${claims}.${signature}`,
      `${head}.${base64({ ...payload, sid: randomUUID() })}.${signature}`,
      `${head}.${claims}.${signature.slice(0, -2)}`,
      device,
      'nonsense',
      '',
    ];
    expect((await get('/api/session', `ferrule=${token}`)).status).toBe(200);
    for (const other of forged) {
      expect((await get('/api/session', `ferrule=${other}`)).status).toBe(401);
    }
  });

  it('is not taken from a header or the address', async () => {
    const { token } = await test.app.get(SessionsService).open(account.id, {
      device: '',
      address: '',
    });
    const headers = { authorization: `Bearer ${token}` };
    const anyone = stranger(test.app);
    expect((await anyone.call('GET', '/api/session', undefined, headers)).status).toBe(401);
    expect((await anyone.call('GET', `/api/session?token=${token}`)).status).toBe(401);
  });
});
