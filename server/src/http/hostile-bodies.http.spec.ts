import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import fc from 'fast-check';
import { createHash } from 'node:crypto';
import { ROLES } from '../accounts/account.ts';
import { bodiesFor, paramsFor, wellFormed } from '../../test/hostile.ts';
import { paramsOf, routesOf, type Route } from '../../test/route-table.ts';
import { signIn, stranger, type Caller, type Reply } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { callerWith, makeThings, type Things } from '../../test/walked-app.ts';

const RUNS_A_ROUTE = 15;

let test: TestApp;
let routes: Route[];
let things: Things;
beforeAll(async () => {
  test = await createTestApp();
  routes = routesOf(test.app).filter(({ path }) => path !== '/readyz');
  things = await makeThings(test);
});
afterAll(() => test.close());

/** Addresses of one's own things, so that what comes past the schemas meets real rows. */
const known = (name: string) => things.values[name] ?? ['x'];

/** The one address that fits a route, four times as likely as each of the others. */
function knownFor(route: Route, name: string): readonly string[] {
  const under = new RegExp(`/([^/]+)/:${name}\\b`).exec(route.path)?.[1] ?? '';
  const right = name === 'id' ? things.idUnder[under] : undefined;
  return right === undefined ? known(name) : [...known(name), right, right, right, right];
}
const allKnown = () => ({
  values: Object.values(things.values).flat(),
  byField: things.byField,
});

/** The same attacks on each run, and others on each route. */
const seedOf = ({ name }: Route) => createHash('sha256').update(name).digest().readInt32BE();

interface Attack {
  readonly path: string;
  readonly body: unknown;
}

function attacksOn(route: Route): fc.Arbitrary<Attack> {
  const params = fc.tuple(...paramsOf(route).map((name) => paramsFor(knownFor(route, name))));
  const query = route.querySchema
    ? bodiesFor(route.querySchema, allKnown())
    : fc.constant<unknown>(null);
  return fc
    .tuple(params, query, bodiesFor(route.bodySchema, allKnown()))
    .map(([values, search, body]) => ({
      path: address(route, values) + queryOf(search),
      body,
    }));
}

function address(route: Route, values: readonly string[]): string {
  let at = 0;
  return route.path.replaceAll(/:\w+/g, () => encodeURIComponent(values[at++] ?? 'x'));
}

function queryOf(search: unknown): string {
  if (typeof search !== 'object' || search === null) return '';
  const pairs = Object.entries(search).map(([key, value]) =>
    [key, String(value)].map((text) => encodeURIComponent(wellFormed(text.slice(0, 500)))),
  );
  return pairs.length > 0 ? `?${pairs.map((pair) => pair.join('=')).join('&')}` : '';
}

function expectClear(route: Route, attack: Attack, reply: Reply): void {
  const seen = { route: route.name, ...attack, status: reply.status };
  if (reply.status >= 500) throw new Error(JSON.stringify(seen).slice(0, 2_000));
  if (reply.status < 400) return;
  expect(reply.headers['content-type']).toBe('application/problem+json; charset=utf-8');
  expect(reply.body).toMatchObject({ status: reply.status, title: expect.any(String) });
  expect(String(reply.body.type)).toMatch(/^\/problems\/[a-z-]+$/);
}

async function attackAll(route: Route, callerOf: () => Promise<Caller>): Promise<void> {
  const caller = await callerOf();
  const hasBody = route.method === 'POST' || route.method === 'PUT';
  await fc.assert(
    fc.asyncProperty(attacksOn(route), async (attack) => {
      const payload = hasBody ? (attack.body as object) : undefined;
      expectClear(route, attack, await caller.call(route.method, attack.path, payload));
    }),
    { numRuns: RUNS_A_ROUTE, seed: seedOf(route) },
  );
}

/** All that the owner has written, row for row. */
async function written(): Promise<string[]> {
  const rows: string[] = [];
  for (const table of ['worksheet_attempts', 'practice_attempts', 'sittings']) {
    const found = await test.query(`SELECT * FROM ${table} WHERE account_id = $1`, [
      things.owner.id,
    ]);
    rows.push(...found.map((row) => JSON.stringify(row)));
  }
  return [...rows, ...(await savedAnswers())];
}

const savedAnswers = async (): Promise<string[]> =>
  (await test.query('SELECT * FROM sitting_answers ORDER BY id')).map((row) => JSON.stringify(row));

describe('hostile input', () => {
  it('from somebody with every role gets a clear problem, and touches nothing of another', async () => {
    const before = await written();
    expect(before.length).toBeGreaterThan(3);
    for (const route of routes) {
      test.clock.advance(1);
      await attackAll(route, () => callerWith(test, ...ROLES));
    }
    expect(await written()).toEqual(before);
  });

  it('from the owner gets a clear problem, and loses no answer that has a receipt', async () => {
    const own = routes.filter(
      ({ policy, method, path }) =>
        policy === 'signed-in' && method !== 'GET' && !/session/.test(path),
    );
    expect(own.length).toBeGreaterThan(10);
    const before = await savedAnswers();
    await test.query(
      'UPDATE accounts SET suspended_at = NULL, suspended_reason = NULL RETURNING id',
    );
    for (const route of own) await attackAll(route, () => signIn(test.app, things.owner.id));
    expect((await savedAnswers()).slice(0, before.length)).toEqual(before);
  });

  it('that is no JSON at all is a clear problem', async () => {
    const bodies = [
      '',
      '{',
      '[',
      'null',
      '"x"',
      '[]',
      '{"a":1,}',
      '[[[['.repeat(5_000),
      '{"__proto__":{"x":1}}',
      '\ufeff{}',
    ];
    for (const route of routes.filter(({ method }) => method === 'POST' || method === 'PUT')) {
      for (const payload of bodies) {
        const response = await test.app.inject({
          method: route.method,
          url: address(
            route,
            paramsOf(route).map((name) => known(name)[0] ?? 'x'),
          ),
          headers: { 'content-type': 'application/json', 'sec-fetch-site': 'same-origin' },
          payload,
        });
        expect({
          route: route.name,
          payload: payload.slice(0, 30),
          failed: response.statusCode >= 500,
        }).toEqual({
          route: route.name,
          payload: payload.slice(0, 30),
          failed: false,
        });
      }
    }
  });

  it('that is too large is refused as such', async () => {
    const reply = await stranger(test.app).call('POST', '/api/sessions', {
      email: 'x'.repeat(200_000),
    });
    expect([reply.status, reply.body.type]).toEqual([413, '/problems/payload-too-large']);
  });
});
