import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { cookiesOf, openAccount } from '../../test/account-steps.ts';
import { stranger, type Reply } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';

const PUBLIC_URL = 'https://ferrule.example';

let test: TestApp;
let folder: string;
beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'ferrule-site-'));
  mkdirSync(join(folder, 'assets'));
  writeFileSync(join(folder, 'index.html'), '<!doctype html><title>Ferrule</title>');
  writeFileSync(join(folder, 'assets', 'a-1.js'), 'export {};');
  test = await createTestApp({ publicUrl: PUBLIC_URL, siteFolder: folder });
});
afterAll(async () => {
  await test.close();
  rmSync(folder, { recursive: true, force: true });
});

const anyone = () => stranger(test.app);

/** One answer of every kind: pages, files, data, and each way to be refused. */
async function answers(headers: Record<string, string> = {}): Promise<Record<string, Reply>> {
  const caller = anyone();
  const call: typeof caller.call = (...request) => caller.call(...request);
  return {
    page: await call('GET', '/sign-in', undefined, headers),
    'page of a link': await call('GET', '/reset/new', undefined, headers),
    file: await call('GET', '/assets/a-1.js', undefined, headers),
    data: await call('GET', '/api/front', undefined, headers),
    alive: await call('GET', '/livez', undefined, headers),
    'not signed in': await call('GET', '/api/session', undefined, headers),
    'not found': await call('GET', '/api/nowhere', undefined, headers),
    'not in order': await call('POST', '/api/sessions', {}, headers),
    'not an address': await call('GET', '/api/%', undefined, headers),
    'another site': await call(
      'POST',
      '/api/sessions',
      {},
      {
        ...headers,
        'sec-fetch-site': 'cross-site',
      },
    ),
  };
}

describe('every answer', () => {
  it('carries the headers that keep a browser safe', async () => {
    for (const [kind, { headers }] of Object.entries(await answers())) {
      const policy = String(headers['content-security-policy']);
      expect([kind, policy]).toEqual([kind, expect.stringContaining("default-src 'none'")]);
      for (const rule of [
        "script-src 'self'",
        "object-src 'none'",
        "base-uri 'none'",
        "frame-ancestors 'none'",
        "form-action 'self'",
      ]) {
        expect(policy.split(';')).toContain(rule);
      }
      expect(policy).not.toMatch(/unsafe-eval|script-src[^;]*unsafe-inline|\*/);
      expect(headers).toMatchObject({
        'x-content-type-options': 'nosniff',
        'referrer-policy': 'no-referrer',
        'cross-origin-opener-policy': 'same-origin',
      });
      expect(String(headers['strict-transport-security'])).toMatch(/^max-age=31536000/);
      expect(headers['x-powered-by']).toBeUndefined();
    }
  });

  it('is stored nowhere when it may be personal', async () => {
    const { file, page, ...others } = await answers();
    expect(String(file?.headers['cache-control'])).toContain('immutable');
    expect(page?.headers['cache-control']).toBe('no-cache');
    const personal = Object.entries(others).filter(([kind]) => !kind.startsWith('page'));
    for (const [kind, { headers }] of personal) {
      expect([kind, headers['cache-control']]).toEqual([kind, 'no-store']);
    }
  });

  it('opens nothing to another origin, and repeats none', async () => {
    for (const origin of ['https://evil.example', 'null', `${PUBLIC_URL}.evil.example`]) {
      for (const { headers } of Object.values(await answers({ origin }))) {
        expect(Object.keys(headers).filter((name) => name.startsWith('access-control'))).toEqual(
          [],
        );
        expect(JSON.stringify(headers)).not.toContain('evil.example');
      }
    }
    const preflight = await test.app.inject({
      method: 'OPTIONS',
      url: '/api/sessions',
      headers: { origin: 'https://evil.example', 'access-control-request-method': 'POST' },
    });
    expect(preflight.headers['access-control-allow-origin']).toBeUndefined();
  });

  it('that is a refusal is a problem document without a trace of the program', async () => {
    const all = await answers();
    const served = ['page', 'page of a link', 'file', 'data', 'alive'];
    expect(served.map((kind) => all[kind]?.status)).toEqual([200, 200, 200, 200, 200]);
    const refusals = Object.fromEntries(
      Object.entries(all).filter(([kind]) => !served.includes(kind)),
    );
    expect(Object.keys(refusals)).toHaveLength(5);
    for (const { headers, body, status } of Object.values(refusals)) {
      expect(headers['content-type']).toBe('application/problem+json; charset=utf-8');
      expect(body).toMatchObject({ status, type: expect.stringMatching(/^\/problems\/[a-z-]+$/) });
      expect(JSON.stringify(body)).not.toMatch(/node_modules|\.ts:|at .+ \(|SELECT|sequelize/i);
    }
  });
});

describe('an unsafe request', () => {
  const body = { email: 'nobody@people.example', password: 'x' };
  const send = (headers: Record<string, string>) =>
    test.app.inject({ method: 'POST', url: '/api/sessions', headers, payload: body });

  it.each([
    ['from our own page', { 'sec-fetch-site': 'same-origin' }, 401],
    ['by an older browser from our own page', { origin: PUBLIC_URL }, 401],
    ['from another site', { 'sec-fetch-site': 'cross-site', origin: PUBLIC_URL }, 403],
    ['from a sister site', { 'sec-fetch-site': 'same-site' }, 403],
    ['from another origin', { origin: 'https://evil.example' }, 403],
    ['from nowhere said', {}, 403],
  ])('%s is answered with %j', async (_, headers, status) => {
    expect((await send(headers)).statusCode).toBe(status);
  });

  it.each(['application/x-www-form-urlencoded', 'text/plain'])(
    'of a form, as %s, is refused',
    async (type) => {
      const response = await test.app.inject({
        method: 'POST',
        url: '/api/sessions',
        headers: { 'content-type': type, 'sec-fetch-site': 'same-origin' },
        payload: 'email=a%40b.example&password=x',
      });
      expect(response.statusCode).toBe(422);
    },
  );
});

it('binds its cookies to this host and to https', async () => {
  const { email, password } = await openAccount(test);
  const reply = await anyone().call('POST', '/api/sessions', { email, password });
  const lines = [reply.headers['set-cookie']].flat().map(String);
  expect(lines).toHaveLength(2);
  for (const line of lines) {
    expect(line).toMatch(/^__Host-ferrule(-device)?=/);
    for (const attribute of ['Path=/', 'HttpOnly', 'Secure', 'SameSite=Lax']) {
      expect(line.split('; ')).toContain(attribute);
    }
    expect(line).not.toMatch(/domain=/i);
  }
  const cookie = cookiesOf(reply.headers);
  expect((await anyone().call('GET', '/api/session', undefined, { cookie })).status).toBe(200);
});
