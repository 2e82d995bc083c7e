import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { generate } from 'otplib';
import { cookiesOf, openAccount, type OpenedAccount } from '../../test/account-steps.ts';
import { createAccount } from '../../test/factories/account.ts';
import { signIn, stranger, type Reply } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { hashRecoveryCode, newRecoveryCodes } from './recovery-codes.ts';
import { seal, SealBroken, unseal } from './seal.ts';
import { stepOfCode } from './time-code.ts';

let test: TestApp;
let administrator: OpenedAccount;
beforeAll(async () => {
  test = await createTestApp();
});
afterAll(() => test.close());
beforeEach(async () => {
  test.clock.advance(61);
  administrator = await openAccount(test);
  await test.query(
    `INSERT INTO account_roles (account_id, role) VALUES ($1, 'administrator') RETURNING role`,
    [administrator.id],
  );
});

type Browser = (method: 'GET' | 'POST', path: string, body?: object) => Promise<Reply>;

/** A browser in which the administrator has given the passphrase, and no code. */
async function browser(): Promise<Browser> {
  const { email, password } = administrator;
  const reply = await stranger(test.app).call('POST', '/api/sessions', { email, password });
  const cookie = cookiesOf(reply.headers);
  return (method, path, body) => stranger(test.app).call(method, path, body, { cookie });
}

const codeNow = (secret: string) =>
  generate({ secret, epoch: Math.floor(test.clock.now().getTime() / 1_000) });

async function enrol(call: Browser): Promise<{ secret: string; recoveryCodes: string[] }> {
  const begun = await call('POST', '/api/me/second-factor');
  const secret = String(begun.body.secret);
  const path = '/api/me/second-factor/confirmation';
  const confirmed = await call('POST', path, { code: await codeNow(secret) });
  return { secret, recoveryCodes: confirmed.body.recoveryCodes as string[] };
}

describe('an administrator without a second factor', () => {
  it('gets the page to set one up, and nothing else of an administrator', async () => {
    const call = await browser();
    expect((await call('GET', '/api/session')).body.secondFactor).toBe('to-enrol');
    const people = await call('GET', '/api/people');
    expect(people.status).toBe(403);
    expect(people.body.type).toBe('/problems/second-factor-needed');
    await enrol(call);
    expect((await call('GET', '/api/session')).body.secondFactor).toBe('done');
    expect((await call('GET', '/api/people')).status).toBe(200);
  });

  it('is shown the secret as text, as an address and as a drawing', async () => {
    const { body } = await (await browser())('POST', '/api/me/second-factor');
    expect(body.secret).toMatch(/^[A-Z2-7]{32}$/);
    expect(body.otpauthUri).toContain(`secret=${body.secret}`);
    expect(body.qrSvg).toMatch(/^<svg /);
  });

  it('must have given the passphrase a short while ago', async () => {
    const call = await browser();
    test.clock.advance(16);
    const late = await call('POST', '/api/me/second-factor');
    expect(late.status).toBe(403);
    expect(late.body.type).toBe('/problems/fresh-sign-in-needed');
    await call('POST', '/api/session/confirmation', { password: administrator.password });
    expect((await call('POST', '/api/me/second-factor')).status).toBe(201);
  });

  it('is refused a wrong code, and a code before there is a secret', async () => {
    const call = await browser();
    const path = '/api/me/second-factor/confirmation';
    expect((await call('POST', path, { code: '000000' })).body.type).toBe('/problems/no-enrolment');
    const { body } = await call('POST', '/api/me/second-factor');
    const right = await codeNow(String(body.secret));
    const wrong = String((Number(right) + 1) % 1_000_000).padStart(6, '0');
    expect((await call('POST', path, { code: wrong })).body.errors[0].pointer).toBe('#/code');
    expect((await call('POST', path, { code: right })).body.recoveryCodes).toHaveLength(8);
  });
});

describe('an administrator with a second factor', () => {
  it('gives its code in each session, and each code counts once', async () => {
    const { secret } = await enrol(await browser());
    const call = await browser();
    expect((await call('GET', '/api/session')).body.secondFactor).toBe('needed');
    const give = async (code: string) =>
      (await call('POST', '/api/session/second-factor', { code })).status;
    expect(await give(await codeNow(secret))).toBe(422);
    test.clock.advance(1);
    const code = await codeNow(secret);
    const together = await Promise.all([give(code), give(code), give(code)]);
    expect(together.sort()).toEqual([200, 422, 422]);
    expect((await call('GET', '/api/people')).status).toBe(200);
  });

  it('cannot put another in its place before giving its code', async () => {
    const { secret } = await enrol(await browser());
    const call = await browser();
    const refused = await call('POST', '/api/me/second-factor');
    expect(refused.body.type).toBe('/problems/second-factor-needed');
    test.clock.advance(1);
    await call('POST', '/api/session/second-factor', { code: await codeNow(secret) });
    const next = await enrol(call);
    expect(next.secret).not.toBe(secret);
  });

  it('keeps the one in use until the new one is confirmed', async () => {
    const call = await browser();
    const { secret } = await enrol(call);
    await call('POST', '/api/me/second-factor');
    test.clock.advance(1);
    const given = await (
      await browser()
    )('POST', '/api/session/second-factor', {
      code: await codeNow(secret),
    });
    expect(given.body.secondFactor).toBe('done');
  });

  it('comes in by a recovery code once, however it is typed', async () => {
    const { recoveryCodes } = await enrol(await browser());
    const call = await browser();
    const code = (recoveryCodes[3] ?? '').toUpperCase().replaceAll('-', ' ');
    const give = () => call('POST', '/api/session/second-factor', { code });
    expect((await give()).body.secondFactor).toBe('done');
    expect((await give()).status).toBe(422);
    const rows = await test.query('SELECT * FROM recovery_codes');
    expect(JSON.stringify(rows)).not.toContain(recoveryCodes[0]);
  });

  it('is slowed down when codes are guessed', async () => {
    await enrol(await browser());
    const call = await browser();
    const give = async () =>
      (await call('POST', '/api/session/second-factor', { code: '000000' })).status;
    const statuses = [];
    for (let n = 0; n < 6; n += 1) statuses.push(await give());
    expect(statuses).toEqual([422, 422, 422, 422, 422, 429]);
  });
});

it('is for administrators: a trainee is refused', async () => {
  const trainee = await signIn(test.app, (await createAccount(test.app)).id);
  expect((await trainee.call('POST', '/api/me/second-factor')).status).toBe(403);
});

it('keeps no secret in clear', async () => {
  const { secret } = await enrol(await browser());
  for (const table of ['second_factors', 'security_events']) {
    const text = JSON.stringify(await test.query(`SELECT * FROM ${table}`));
    expect(text).not.toContain(secret);
    expect(text).not.toContain(JSON.stringify([...Buffer.from(secret)]).slice(1, -1));
  }
});

describe('a seal', () => {
  const key = '0f'.repeat(32);

  it('opens for its owner with its key, and for nothing else', () => {
    const sealed = seal('secret', 'owner', key);
    expect(unseal(sealed, 'owner', key)).toBe('secret');
    expect(seal('secret', 'owner', key).equals(sealed)).toBe(false);
    const changed = Buffer.from(sealed);
    changed[changed.length - 1] = (changed.at(-1) ?? 0) ^ 1;
    expect(() => unseal(sealed, 'other', key)).toThrow(SealBroken);
    expect(() => unseal(sealed, 'owner', '0e'.repeat(32))).toThrow(SealBroken);
    expect(() => unseal(changed, 'owner', key)).toThrow(SealBroken);
    expect(() => unseal(sealed.subarray(0, 8), 'owner', key)).toThrow(SealBroken);
  });
});

describe('the codes', () => {
  // RFC 6238, appendix B, SHA-1: the last six of its eight figures.
  it.each([
    [59, '287082'],
    [1_111_111_109, '081804'],
    [1_111_111_111, '050471'],
    [1_234_567_890, '005924'],
    [2_000_000_000, '279037'],
  ])('agree with RFC 6238 at second %i', async (second, code) => {
    const secret = 'GEZDGNBVGY3TQOJQGEZDGNBVGY3TQOJQ';
    const at = (s: number) => stepOfCode(secret, code, new Date(s * 1_000));
    expect(await at(second)).toBe(Math.floor(second / 30));
    expect(await at(second + 90)).toBeNull();
  });

  it('for recovery differ from one another and hold more than 128 bits', () => {
    const codes = newRecoveryCodes();
    expect(new Set(codes).size).toBe(codes.length);
    for (const code of codes) expect(code).toMatch(/^([2-9a-z]{4}-){6}[2-9a-z]{4}$/);
    expect(28 * Math.log2(29)).toBeGreaterThan(128);
    expect(hashRecoveryCode(' AB-cd ').equals(hashRecoveryCode('abcd'))).toBe(true);
  });
});
