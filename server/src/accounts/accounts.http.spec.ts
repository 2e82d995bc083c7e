import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { freshEmail, keyFromMail, openAccount, PASSPHRASE } from '../../test/account-steps.ts';
import { signIn, stranger } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';

const NEW_PASSPHRASE = 'copper lantern seven gulls';

let test: TestApp;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());
// Each test has an hour of its own, so that what the others asked for is not counted.
beforeEach(() => test.clock.advance(61));

const post = (path: string, body: object, headers: Record<string, string> = {}) =>
  stranger(test.app).call('POST', path, body, headers);
const signInAs = (email: string, password: string) => post('/api/sessions', { email, password });
const signUp = (email: string, more: object = {}) =>
  post('/api/accounts', {
    givenName: 'Wilf',
    familyName: 'Dragomir',
    email,
    password: PASSPHRASE,
    ...more,
  });
const mailsTo = (email: string) =>
  test.mails.sent.filter(({ to }) => (to as { address: string }).address === email);
const kindsOf = async (accountId: string) =>
  (
    await test.query<{ kind: string }>(
      'SELECT kind FROM security_events WHERE account_id = $1 ORDER BY id',
      [accountId],
    )
  ).map(({ kind }) => kind);

describe('sign-up', () => {
  it('opens the account of a trainee once the email is confirmed, and not before', async () => {
    const email = freshEmail();
    expect((await signUp(email)).status).toBe(202);
    await test.runJobs();
    expect((await signInAs(email, PASSPHRASE)).body.type).toBe('/problems/sign-in-refused');
    const confirmed = await post('/api/email-confirmations', { token: keyFromMail(test, email) });
    expect(confirmed.body).toEqual({ email });
    const session = await signInAs(email, PASSPHRASE);
    expect(session.status).toBe(201);
    expect(session.body.account).toMatchObject({ email, roles: ['trainee'], givenName: 'Wilf' });
  });

  it('takes a person of one name, and an address in capitals as the same address', async () => {
    const email = freshEmail();
    expect((await signUp(email.toUpperCase(), { familyName: '' })).status).toBe(202);
    await test.runJobs();
    await post('/api/email-confirmations', { token: keyFromMail(test, email) });
    const session = await signInAs(` ${email.toUpperCase()}`, PASSPHRASE);
    expect(session.body.account).toMatchObject({ email, familyName: '' });
  });

  it('answers the same, byte for byte, for a known and an unknown address', async () => {
    const known = await openAccount(test);
    const [first, second] = [await signUp(known.email), await signUp(freshEmail())];
    expect(first.status).toBe(second.status);
    expect(first.raw.equals(second.raw)).toBe(true);
    expect(Object.keys(first.headers).sort()).toEqual(Object.keys(second.headers).sort());
  });

  it('tells the owner of a known address by mail, and leaves the account as it is', async () => {
    const known = await openAccount(test);
    await signUp(known.email, { password: NEW_PASSPHRASE, givenName: 'Mallory' });
    await test.runJobs();
    expect(test.mails.lastTo(known.email)?.subject).toBe('You already have an account');
    expect((await signInAs(known.email, NEW_PASSPHRASE)).status).toBe(401);
    expect((await signInAs(known.email, known.password)).body.account.givenName).toBe('Wilf');
  });

  it('puts no word of the person who signed up into the mail', async () => {
    const email = freshEmail();
    await signUp(email, { givenName: 'Buy at spam.example now' });
    await test.runJobs();
    expect(JSON.stringify(test.mails.lastTo(email))).not.toContain('spam.example');
  });

  it('belongs to whoever signed up last while it waits: older links are cancelled', async () => {
    const email = freshEmail();
    await signUp(email, { password: NEW_PASSPHRASE });
    await test.runJobs();
    const older = keyFromMail(test, email);
    await signUp(email);
    await test.runJobs();
    expect((await post('/api/email-confirmations', { token: older })).status).toBe(410);
    await post('/api/email-confirmations', { token: keyFromMail(test, email) });
    expect((await signInAs(email, NEW_PASSPHRASE)).status).toBe(401);
    expect((await signInAs(email, PASSPHRASE)).status).toBe(201);
  });

  it.each([
    ['fourteen chars', 'Too short by one character: use 15 or more.'],
    ['wilf dragomir wilf', 'Choose another passphrase. It is mostly your own name or email.'],
    ['passwordpassword1', 'Choose another passphrase. It is mostly a word'],
  ])('refuses the passphrase %j and says why', async (password, detail) => {
    const reply = await signUp(freshEmail(), { password });
    expect(reply.status).toBe(422);
    expect(reply.body.errors[0].pointer).toBe('#/password');
    expect(reply.body.errors[0].detail).toContain(detail);
  });

  it('refuses fields it does not know, such as a role', async () => {
    expect((await signUp(freshEmail(), { roles: ['administrator'] })).status).toBe(422);
    expect((await signUp(freshEmail(), { emailConfirmedAt: '2026-12-01' })).status).toBe(422);
  });

  it('sends the link again when asked, to an address that waits for it', async () => {
    const email = freshEmail();
    await signUp(email);
    await test.runJobs();
    const first = keyFromMail(test, email);
    expect((await post('/api/email-confirmations/again', { email })).status).toBe(202);
    await test.runJobs();
    expect((await post('/api/email-confirmations', { token: first })).status).toBe(410);
    const token = keyFromMail(test, email);
    expect((await post('/api/email-confirmations', { token })).status).toBe(200);
    await post('/api/email-confirmations/again', { email });
    await test.runJobs();
    expect(mailsTo(email)).toHaveLength(2);
  });

  it('judges a passphrase before it is chosen', async () => {
    const judge = (password: string) => post('/api/password-checks', { password });
    const short = await judge('tin kettle over');
    expect(short.body).toEqual({ lengthShort: 0, common: false, reason: null });
    expect((await judge('aaaaaaaaaaaaaaaa')).body).toMatchObject({ lengthShort: 0, common: true });
    expect((await judge('tin kettle ')).body).toMatchObject({ lengthShort: 4 });
  });
});

describe('the links of mails', () => {
  it('are not used up by opening them', async () => {
    const email = freshEmail();
    await signUp(email);
    await test.runJobs();
    const token = keyFromMail(test, email);
    for (const path of ['/api/email-confirmations', `/confirm#${token}`, `/confirm?${token}`]) {
      for (let n = 0; n < 3; n += 1) await stranger(test.app).call('GET', path);
    }
    expect((await post('/api/email-confirmations', { token })).status).toBe(200);
  });

  it('work once, also when two come at the same time', async () => {
    const email = freshEmail();
    await signUp(email);
    await test.runJobs();
    const token = keyFromMail(test, email);
    const replies = await Promise.all(
      Array.from({ length: 6 }, () => post('/api/email-confirmations', { token })),
    );
    expect(replies.map(({ status }) => status).sort()).toEqual([200, 410, 410, 410, 410, 410]);
  });

  it('serve one purpose only', async () => {
    const { email } = await openAccount(test);
    await post('/api/password-resets', { email });
    await test.runJobs();
    const token = keyFromMail(test, email);
    for (const path of [
      'email-confirmations',
      'email-changes/confirmations',
      'email-changes/undo',
    ]) {
      expect((await post(`/api/${path}`, { token })).status).toBe(410);
    }
    const reset = { token, password: NEW_PASSPHRASE };
    expect((await post('/api/password-resets/confirmations', reset)).status).toBe(204);
  });

  it('end after their time', async () => {
    const email = freshEmail();
    await signUp(email);
    await test.runJobs();
    test.clock.advance(24 * 60 + 1);
    const token = keyFromMail(test, email);
    expect((await post('/api/email-confirmations', { token })).status).toBe(410);
  });

  it('are kept as hashes, and hold 256 random bits', async () => {
    const email = freshEmail();
    await signUp(email);
    await test.runJobs();
    const token = keyFromMail(test, email);
    expect(Buffer.from(token, 'base64url')).toHaveLength(32);
    const tables = ['account_tokens', 'mail_messages', 'security_events', 'jobs.job'];
    for (const table of tables) {
      const rows = await test.query(`SELECT * FROM ${table}`);
      expect(JSON.stringify(rows)).not.toContain(token);
    }
  });
});

describe('a passphrase reset', () => {
  const askFor = async (email: string) => {
    const reply = await post('/api/password-resets', { email });
    await test.runJobs();
    return reply;
  };

  it('changes the passphrase, ends every session, signs nobody in and tells the person', async () => {
    const account = await openAccount(test);
    const browser = await signIn(test.app, account.id);
    await askFor(account.email);
    const reset = { token: keyFromMail(test, account.email), password: NEW_PASSPHRASE };
    const reply = await post('/api/password-resets/confirmations', reset);
    await test.runJobs();
    expect(reply.status).toBe(204);
    expect(reply.headers['set-cookie']).toBeUndefined();
    expect((await browser.call('GET', '/api/session')).status).toBe(401);
    expect((await signInAs(account.email, account.password)).status).toBe(401);
    expect((await signInAs(account.email, NEW_PASSPHRASE)).status).toBe(201);
    expect(test.mails.lastTo(account.email)?.subject).toBe('Your passphrase was changed');
    expect(await kindsOf(account.id)).toContain('password-reset');
  });

  it('answers alike for an unknown address, and writes no mail to it', async () => {
    const account = await openAccount(test);
    const email = freshEmail();
    const [known, unknown] = [await askFor(account.email), await askFor(email)];
    expect(known.raw.equals(unknown.raw)).toBe(true);
    expect([known.status, unknown.status]).toEqual([202, 202]);
    expect(mailsTo(email)).toHaveLength(0);
  });

  it('keeps its link when the new passphrase is refused', async () => {
    const { email } = await openAccount(test);
    await askFor(email);
    const token = keyFromMail(test, email);
    const choose = (password: string) =>
      post('/api/password-resets/confirmations', { token, password });
    expect((await choose('too short')).status).toBe(422);
    expect((await choose(NEW_PASSPHRASE)).status).toBe(204);
    expect((await choose(NEW_PASSPHRASE)).status).toBe(410);
  });

  it('has a link for thirty minutes, cancelled by a newer one and by a change of passphrase', async () => {
    const account = await openAccount(test);
    const tryLink = async (token: string) =>
      (await post('/api/password-resets/confirmations', { token, password: NEW_PASSPHRASE }))
        .status;
    await askFor(account.email);
    const first = keyFromMail(test, account.email);
    await askFor(account.email);
    expect(await tryLink(first)).toBe(410);
    const second = keyFromMail(test, account.email);
    await (
      await signIn(test.app, account.id)
    ).call('PUT', '/api/me/password', {
      currentPassword: account.password,
      newPassword: NEW_PASSPHRASE,
      endOtherSessions: false,
    });
    expect(await tryLink(second)).toBe(410);
    await test.runJobs();
    await askFor(account.email);
    const third = keyFromMail(test, account.email);
    test.clock.advance(31);
    expect(await tryLink(third)).toBe(410);
  });

  it('cannot be made to flood a mailbox, nor to take the last good link away', async () => {
    const account = await openAccount(test);
    for (let n = 0; n < 12; n += 1) await askFor(account.email);
    expect(mailsTo(account.email).length).toBeLessThanOrEqual(7);
    const reset = { token: keyFromMail(test, account.email), password: NEW_PASSPHRASE };
    expect((await post('/api/password-resets/confirmations', reset)).status).toBe(204);
  });

  it('is held back at an address that asks too often, with the time to wait', async () => {
    const replies = [];
    for (let n = 0; n < 61; n += 1) {
      replies.push(
        await post('/api/email-confirmations/again', { email: 'nobody@people.example' }),
      );
    }
    const last = replies.at(-1);
    expect(last?.status).toBe(429);
    expect(last?.headers['retry-after']).toBe(String(last?.body.retryAfterSeconds));
    expect(last?.body.retryAfterSeconds).toBe(60);
  });
});

describe('a change of passphrase', () => {
  it('asks for the old one, leaves other sessions when told so, and tells the person', async () => {
    const account = await openAccount(test);
    const [here, there] = [await signIn(test.app, account.id), await signIn(test.app, account.id)];
    const change = (currentPassword: string, newPassword: string, endOtherSessions: boolean) =>
      here.call('PUT', '/api/me/password', { currentPassword, newPassword, endOtherSessions });
    const wrong = await change('not the passphrase', NEW_PASSPHRASE, true);
    expect(wrong.body.errors[0].pointer).toBe('#/currentPassword');
    expect((await change(PASSPHRASE, NEW_PASSPHRASE, false)).status).toBe(204);
    expect((await there.call('GET', '/api/session')).status).toBe(200);
    expect((await change(NEW_PASSPHRASE, PASSPHRASE, true)).status).toBe(204);
    expect((await there.call('GET', '/api/session')).status).toBe(401);
    expect((await here.call('GET', '/api/session')).status).toBe(200);
    await test.runJobs();
    expect(test.mails.lastTo(account.email)?.subject).toBe('Your passphrase was changed');
    expect(await kindsOf(account.id)).toEqual(
      expect.arrayContaining(['password-refused', 'password-changed']),
    );
  });
});

describe('a change of email', () => {
  const ask = async (account: { id: string; password: string }, email: string) => {
    const browser = await signIn(test.app, account.id);
    const reply = await browser.call('POST', '/api/me/email-changes', {
      email,
      password: account.password,
    });
    await test.runJobs();
    return reply;
  };

  it('is confirmed at the new address and told to the old one, which can take it back', async () => {
    const account = await openAccount(test);
    const email = freshEmail();
    expect((await ask(account, email)).status).toBe(202);
    expect((await signInAs(email, account.password)).status).toBe(401);
    const token = keyFromMail(test, email);
    expect((await post('/api/email-changes/confirmations', { token })).body).toEqual({ email });
    await test.runJobs();
    expect((await signInAs(email, account.password)).status).toBe(201);
    const browser = await signIn(test.app, account.id);

    const undo = { token: keyFromMail(test, account.email) };
    expect((await post('/api/email-changes/undo', undo)).body).toEqual({ email: account.email });
    await test.runJobs();
    expect((await browser.call('GET', '/api/session')).status).toBe(401);
    expect((await signInAs(account.email, account.password)).status).toBe(401);
    const reset = { token: keyFromMail(test, account.email), password: NEW_PASSPHRASE };
    expect((await post('/api/password-resets/confirmations', reset)).status).toBe(204);
    expect((await signInAs(account.email, NEW_PASSPHRASE)).status).toBe(201);
    expect((await post('/api/email-changes/undo', undo)).status).toBe(410);
  });

  it('can be taken back after a thief has changed it twice', async () => {
    const account = await openAccount(test);
    const [second, third] = [freshEmail(), freshEmail()];
    await ask(account, second);
    await post('/api/email-changes/confirmations', { token: keyFromMail(test, second) });
    await test.runJobs();
    const undo = keyFromMail(test, account.email);
    await ask(account, third);
    await post('/api/email-changes/confirmations', { token: keyFromMail(test, third) });
    const back = await post('/api/email-changes/undo', { token: undo });
    expect(back.body).toEqual({ email: account.email });
  });

  it('answers alike when the address is taken, and tells only its owner', async () => {
    const [account, other] = [await openAccount(test), await openAccount(test)];
    const [taken, free] = [await ask(account, other.email), await ask(account, freshEmail())];
    expect(taken.raw.equals(free.raw)).toBe(true);
    expect(test.mails.lastTo(other.email)?.subject).toBe('You already have an account');
  });

  it('asks for the passphrase', async () => {
    const account = await openAccount(test);
    const reply = await ask({ ...account, password: 'something else entirely' }, freshEmail());
    expect(reply.body.errors).toEqual([
      { pointer: '#/password', detail: 'That is not the passphrase of this account.' },
    ]);
  });
});

it('never shows a passphrase to the database in clear, or to the records at all', async () => {
  const canary = 'canary umbrella forty plums';
  const account = await openAccount(test, { password: canary });
  await signInAs(account.email, canary);
  await signInAs(account.email, `${canary}!`);
  await test.runJobs();
  const tables = ['accounts', 'security_events', 'mail_messages', 'failed_tries', 'jobs.job'];
  for (const table of tables) {
    expect(JSON.stringify(await test.query(`SELECT * FROM ${table}`))).not.toContain('canary');
  }
});
