import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { randomUUID } from 'node:crypto';
import type { Role } from '../accounts/account.ts';
import { createAccount } from '../../test/factories/account.ts';
import { CANARIES, PAPER, publishCourse, publishPaper } from '../../test/factories/paper.ts';
import {
  answerAll,
  askToStart,
  createCandidate,
  handIn,
  markWaiting,
  save,
  startPaper,
  typed,
  type Candidate,
} from '../../test/factories/sitting.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { SittingView } from './sittings.schemas.ts';

let test: TestApp;
let candidate: Candidate;
let sitting: SittingView;

beforeAll(async () => {
  test = await createTestApp();
  await publishPaper(test);
  candidate = await createCandidate(test);
  sitting = await startPaper(candidate);
});
afterAll(() => test?.close());

const desk = async (role: Role): Promise<Caller> =>
  signIn(test.app, (await createAccount(test.app, { roles: [role] })).id);

/** Every route about one sitting, with a body it would take. */
function routesOf(id: string, key: string) {
  const answer = { answer: typed('1', 'V'), sequence: 1, idempotencyKey: randomUUID() };
  return [
    ['GET', `/api/sittings/${id}`, undefined],
    ['GET', `/api/sittings/${id}/result`, undefined],
    ['PUT', `/api/sittings/${id}/items/${key}/parts/a`, answer],
    ['PUT', `/api/sittings/${id}/items/${key}/come-back`, { comeBack: true }],
    ['POST', `/api/sittings/${id}/take-over`, {}],
    ['POST', `/api/sittings/${id}/hand-in`, {}],
  ] as const;
}
const keyOf = ({ items }: SittingView) => items[0]?.key ?? '';

describe('the routes of papers and sittings', () => {
  it('are for people who are signed in', async () => {
    const start = ['POST', '/api/sittings', {}] as const;
    const paper = ['GET', `/api/papers/${PAPER}`, undefined] as const;
    for (const [method, path, body] of [start, paper, ...routesOf(sitting.id, keyOf(sitting))]) {
      expect((await stranger(test.app).call(method, path, body)).status).toBe(401);
    }
  });

  it("show nobody someone else's sitting", async () => {
    const others = [(await createCandidate(test)).caller, await desk('certification-manager')];
    for (const other of [...others, await desk('administrator'), await desk('trainer')]) {
      for (const [method, path, body] of routesOf(sitting.id, keyOf(sitting))) {
        expect((await other.call(method, path, body)).status).toBe(404);
      }
    }
    for (const [method, path, body] of routesOf(randomUUID(), keyOf(sitting))) {
      expect((await candidate.caller.call(method, path, body)).status).toBe(404);
    }
  });

  it('tell a candidate beforehand what the paper asks', async () => {
    const newcomer = await createCandidate(test);
    const { status, body } = await newcomer.caller.call('GET', `/api/papers/${PAPER}`);
    expect(status).toBe(200);
    expect(body).toMatchObject({
      ...{ number: 'F1', minutes: 45, questions: 3, marks: 18, passPercent: 70, waitDays: 14 },
      ...{ agreement: 'I work alone.', aids: ['Calculator', 'Cable table'] },
      standing: { state: 'open', reasons: [], sittings: [] },
    });
    expect((await newcomer.caller.call('GET', '/api/papers/no-such-paper')).status).toBe(404);
  });

  it('refuse what is not in order and name it', async () => {
    const { caller } = candidate;
    const answer = typed('1', 'V');
    const item = { key: keyOf(sitting) };
    const wrong = [
      await save(caller, { sitting, item, part: 'a' }, { answer, sequence: 0 }),
      await save(
        caller,
        { sitting, item, part: 'a' },
        { answer, sequence: 1, idempotencyKey: 'x' },
      ),
      await save(caller, { sitting, item, part: 'a' }, { answer, sequence: 1, extra: true }),
      await save(caller, { sitting, item, part: 'a' }, { answer: typed('a\0b'), sequence: 1 }),
      await save(caller, { sitting, item, part: 'a' }, { answer: typed('\ud800'), sequence: 1 }),
      await askToStart(await createCandidate(test), { agreed: false }),
      await askToStart(await createCandidate(test), { givenName: ' ' }),
      await askToStart(await createCandidate(test), { familyName: 'a\u0007b' }),
    ];
    for (const { status, body } of wrong) {
      expect(status).toBe(422);
      expect(body.errors[0].pointer).toMatch(/^#/);
    }
    for (const [key, part] of [
      ['zzzz', 'a'],
      [item.key, 'z'],
    ] as const) {
      const lost = await save(caller, { sitting, item: { key }, part }, { answer, sequence: 1 });
      expect(lost.status).toBe(404);
    }
    expect((await caller.call('GET', '/api/sittings/not-an-id')).status).toBe(422);
  });

  it('keep the result back until the paper is marked', async () => {
    const reply = await candidate.caller.call('GET', `/api/sittings/${sitting.id}/result`);
    expect(reply).toMatchObject({ status: 409, body: { type: '/problems/result-not-ready' } });
  });
});

describe('a candidate', () => {
  it('never receives a key, step, tolerance or slip, from the first look to the result', async () => {
    const person = await createCandidate(test);
    const seen: string[] = [];
    const caller: Caller = {
      sessionId: person.caller.sessionId,

      call: async (...request) => {
        const reply = await person.caller.call(...request);
        seen.push(JSON.stringify([reply.headers, reply.body]));
        return reply;
      },
    };
    const mine = { ...person, caller };
    const paper = await startPaper(mine);
    await answerAll(caller, paper);
    const item = paper.items[0] ?? { key: '' };
    const wrong = { answer: typed('77777', 'V'), sequence: 50 };
    await save(caller, { sitting: paper, item, part: 'b' }, wrong);
    await save(caller, { sitting: paper, item, part: 'zz' }, wrong);
    await caller.call('GET', `/api/sittings/${paper.id}`);
    await handIn(caller, paper);
    await save(caller, { sitting: paper, item, part: 'a' }, { ...wrong, sequence: 60 });
    await markWaiting(test);
    await caller.call('GET', `/api/sittings/${paper.id}`);
    const result = await caller.call('GET', `/api/sittings/${paper.id}/result`);
    const { passed, marks, outOf } = result.body as {
      passed: boolean;
      marks: number;
      outOf: number;
    };
    expect(passed).toBe(true);
    expect(marks).toBeLessThan(outOf);
    const letters = await test.query<{ subject: string; body_text: string; body_html: string }>(
      'SELECT subject, body_text, body_html FROM mail_messages WHERE account_id = $1',
      [person.account.id],
    );
    expect(letters.length).toBeGreaterThan(0);
    for (const { subject } of letters) expect(subject).not.toMatch(/\d+ of|%|passed/i);
    const everything = [...seen, JSON.stringify(letters)].join('\n');
    const drawn = await test.query<{ key: number }>(
      `SELECT (jsonb_path_query(drawn, '$.parts.*.key'))::float AS key FROM sitting_items
        WHERE sitting_id = $1`,
      [paper.id],
    );
    expect(drawn.length).toBe(6);
    const planted = [...CANARIES, ...drawn.map(({ key }) => key.toPrecision(5))];
    expect(planted.filter((word) => everything.includes(word))).toEqual([]);
    // The same search finds them where they may stand: in what a certification manager opens.
    const manager = await desk('certification-manager');
    const look = await manager.call('POST', `/api/sittings/${paper.id}/looks`, {
      reason: 'Appeal of 3 December.',
    });
    const opened = JSON.stringify(look.body);
    expect(CANARIES.filter((word) => opened.includes(word)).length).toBeGreaterThan(0);
  });

  it('learns after a failed paper what to practise and when to sit again', async () => {
    await publishCourse(test);
    const person = await createCandidate(test);
    const paper = await startPaper(person);
    await handIn(person.caller, paper);
    await markWaiting(test);
    const { body } = await person.caller.call('GET', `/api/sittings/${paper.id}/result`);
    expect(body).toMatchObject({
      ...{ marks: 0, outOf: 18, percent: 0, passMarks: 13, passed: false, certificate: null },
      ...{ satOn: '2026-12-01', maySitAgainAt: '2026-12-15T00:00:00.000Z' },
      appeal: 'Write to the school within ten working days.',
      bySubject: [
        {
          ...{ subject: 'VD', name: 'voltage drop', marks: 0, outOf: 12 },
          practise: { sheet: '3.4', title: 'The long run', worksheet: 'W3' },
        },
        { subject: 'RD', marks: 0, outOf: 6, practise: null },
      ],
    });
  });
});

describe('a certification manager', () => {
  const reason = 'Appeal of 3 December.';

  it('lists the results, page by page', async () => {
    const manager = await desk('certification-manager');
    const { status, body } = await manager.call('GET', `/api/papers/${PAPER}/results`);
    expect(status).toBe(200);
    expect(body.results.length).toBeGreaterThanOrEqual(2);
    expect(body.results[0]).toMatchObject({ name: 'Ifeoma Castellan', satOn: '2026-12-01' });
    const bad = await manager.call('GET', `/api/papers/${PAPER}/results?cursor=bm90aGluZw`);
    expect(bad.status).toBe(422);
  });

  it('opens items for a reason only, and every look is recorded', async () => {
    const person = await createCandidate(test);
    const paper = await startPaper(person);
    await handIn(person.caller, paper);
    const manager = await desk('certification-manager');
    const path = `/api/sittings/${paper.id}/looks`;
    expect((await manager.call('POST', path, { reason })).status).toBe(409);
    await markWaiting(test);
    expect((await manager.call('POST', path, { reason: 'why not' })).status).toBe(422);
    const looks = [
      await manager.call('POST', path, { reason }),
      await manager.call('POST', path, { reason }),
    ];
    expect(looks[1]?.body.looks).toHaveLength(2);
    expect(looks[1]?.body.items).toHaveLength(3);
    expect(looks[1]?.body.items[0].marked.parts[0].verdict).toBe('blank');
    const recorded = await test.query('SELECT reason FROM item_looks WHERE sitting_id = $1', [
      paper.id,
    ]);
    expect(recorded).toEqual([{ reason }, { reason }]);
  });

  it('alone opens them, and never those of a paper of their own', async () => {
    const path = `/api/sittings/${sitting.id}/looks`;
    for (const role of ['trainee', 'trainer', 'administrator'] as const) {
      expect((await (await desk(role)).call('POST', path, { reason })).status).toBe(403);
    }
    const account = await createAccount(test.app, { roles: ['trainee', 'certification-manager'] });
    const both = { account, caller: await signIn(test.app, account.id) };
    const own = await startPaper(both);
    await handIn(both.caller, own);
    await markWaiting(test);
    const refused = await both.caller.call('POST', `/api/sittings/${own.id}/looks`, { reason });
    expect(refused.status).toBe(403);
    expect(await test.query('SELECT 1 FROM item_looks WHERE sitting_id = $1', [own.id])).toEqual(
      [],
    );
  });

  it('grants extra time and ends it again', async () => {
    const manager = await desk('certification-manager');
    const { email } = candidate.account;
    const grant = (percent: number, to = email) =>
      manager.call('POST', '/api/time-allowances', { email: to, percent, reason });
    expect((await grant(25)).body.allowances).toMatchObject([{ email, percent: 25, reason }]);
    expect((await grant(0)).body.allowances).toEqual([]);
    expect((await grant(25, 'nobody@people.example')).status).toBe(404);
    const before = await candidate.caller.call('GET', `/api/sittings/${sitting.id}`);
    expect(before.body.closesAt).toBe(sitting.closesAt);
  });
});
