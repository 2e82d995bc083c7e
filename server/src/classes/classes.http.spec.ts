import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { countQueries } from '../../test/count-queries.ts';
import { createAccount, type TestAccount } from '../../test/factories/account.ts';
import { createClass, type TestClass } from '../../test/factories/class.ts';
import { goodFiles, publishFiles } from '../../test/factories/content.ts';
import { createCandidate, type Candidate } from '../../test/factories/sitting.ts';
import { startWorksheet, workWorksheet } from '../../test/factories/worksheet.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { ClassView } from './class-view.schemas.ts';
import { ClassesService } from './classes.service.ts';

const NOWHERE = '00000000-0000-4000-8000-000000000000';

let test: TestApp;
let trainerAccount: TestAccount;
let trainer: Caller;
let group: TestClass;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, goodFiles());
});
beforeEach(async () => {
  test.clock.set('2026-12-01T10:00:00Z');
  const name = { givenName: 'Odile', familyName: 'Marchetti' };
  trainerAccount = await createAccount(test.app, { ...name, roles: ['trainer'] });
  trainer = await signIn(test.app, trainerAccount.id);
  group = await createClass(test, trainerAccount.id);
});
afterAll(() => test.close());

const join = (caller: Caller, joinCode = group.joinCode) =>
  caller.call('POST', '/api/class-memberships', { joinCode });

async function member(): Promise<Candidate> {
  const candidate = await createCandidate(test);
  await join(candidate.caller);
  return candidate;
}

const viewOf = async (caller = trainer) =>
  (await caller.call('GET', `/api/classes/${group.id}`)).body as ClassView;

describe('joining a class', () => {
  it('takes its code, however it is typed, and shows on the course map', async () => {
    const { caller } = await createCandidate(test);
    const reply = await join(caller, ` ${group.joinCode.toLowerCase()} `);
    expect(reply.status).toBe(201);
    expect(reply.body).toEqual({ class: { id: group.id, name: 'Autumn class' } });
    expect((await caller.call('GET', '/api/course')).body).toMatchObject({
      class: { id: group.id, name: 'Autumn class' },
      ...{ trainer: 'O. Marchetti', enrolledOn: '2026-12-01' },
    });
  });

  it('says so when one is in it already, and lets one back who had left', async () => {
    const { caller, account } = await member();
    const again = await join(caller);
    expect([again.status, again.body.type]).toEqual([409, '/problems/already-in-class']);
    await test.query(
      'UPDATE class_members SET left_at = now() WHERE account_id = $1 RETURNING class_id',
      [account.id],
    );
    expect((await join(caller)).status).toBe(201);
  });

  it('stops people who try codes one after the other, but not their class', async () => {
    const { caller } = await createCandidate(test);
    for (let guess = 0; guess < 10; guess += 1) {
      const reply = await join(caller, `GUESS-${guess}`);
      expect([reply.status, reply.body.type]).toEqual([404, '/problems/join-code-unknown']);
    }
    const stopped = await join(caller);
    expect([stopped.status, stopped.headers['retry-after']]).toEqual([429, '60']);
    expect((await join((await createCandidate(test)).caller)).status).toBe(201);
    test.clock.advance(2);
    expect((await join(caller)).status).toBe(201);
  });

  it.each([{}, { joinCode: '' }, { joinCode: 'A\u0000' }, { joinCode: 'A'.repeat(50) }])(
    'refuses %j',
    async (body) => {
      const { caller } = await createCandidate(test);
      expect((await caller.call('POST', '/api/class-memberships', body)).status).toBe(422);
    },
  );
});

describe('opening a class', () => {
  const spring = { name: 'Spring class', startsOn: '2027-01-11', endsOn: '2027-04-02' };
  const open = (caller: Caller, more: object = {}) =>
    caller.call('POST', '/api/classes', { ...spring, trainers: [trainerAccount.email], ...more });
  const desk = async () =>
    signIn(test.app, (await createAccount(test.app, { roles: ['administrator'] })).id);

  it('gives a code that trainees join by, and the class to its trainers', async () => {
    const administrator = await desk();
    const { status, body } = await open(administrator);
    expect(status).toBe(201);
    expect(body.class).toMatchObject({ name: 'Spring class' });
    expect(body.class.joinCode).toMatch(/^[A-HJ-NP-Z2-9]{4}-[A-HJ-NP-Z2-9]{4}$/);
    const joined = await join((await createCandidate(test)).caller, String(body.class.joinCode));
    expect(joined.status).toBe(201);
    for (const caller of [trainer, administrator]) {
      expect((await caller.call('GET', '/api/classes')).body.classes).toContainEqual(
        expect.objectContaining({ ...spring, joinCode: body.class.joinCode, members: 1 }),
      );
    }
  });

  it('is for administrators only', async () => {
    const { caller } = await createCandidate(test);
    expect((await open(caller)).status).toBe(403);
    expect((await open(trainer)).status).toBe(403);
    expect((await open(stranger(test.app))).status).toBe(401);
  });

  it.each<[string, object, string]>([
    ['an address of no trainer', { trainers: ['nobody@school.example'] }, '#/trainers'],
    ['no trainer at all', { trainers: [] }, '#/trainers'],
    ['an end before the beginning', { endsOn: '2026-12-31' }, '#/endsOn'],
    ['a day that is none', { startsOn: '2027-02-30' }, '#/startsOn'],
    ['a nameless class', { name: ' ' }, '#/name'],
  ])('refuses %s', async (_what, more, pointer) => {
    const { status, body } = await open(await desk(), more);
    expect([status, body.errors[0].pointer]).toEqual([422, pointer]);
  });
});

describe('the list of classes', () => {
  it('tells the join code to trainers only', async () => {
    const { caller } = await member();
    const listed = { id: group.id, course: 'Direct current', members: 1, startsOn: '2026-09-14' };
    expect((await trainer.call('GET', '/api/classes')).body.classes).toMatchObject([
      { ...listed, trainer: true, joinCode: group.joinCode },
    ]);
    expect((await caller.call('GET', '/api/classes')).body.classes).toMatchObject([
      { ...listed, trainer: false, joinCode: null },
    ]);
  });
});

describe('the class view', () => {
  it('says who has done what', async () => {
    const { caller, account } = await member();
    await caller.call('PUT', '/api/lessons/1.1/done', { revision: 'A' });
    await caller.call('PUT', '/api/lessons/1.2/progress', { paragraph: 1 });
    const sheet = await workWorksheet(caller);
    await startWorksheet(caller);
    test.clock.set('2026-12-04T10:00:00Z');
    const view = await viewOf(await signIn(test.app, trainerAccount.id));
    expect(view).toMatchObject({
      ...{ name: 'Autumn class', trainers: ['O. Marchetti'], joinCode: group.joinCode },
      course: { number: 'HQ-DC2', title: 'Direct current' },
      units: [
        { number: 1, sheets: 2, worksheet: 'W1' },
        { number: 2, sheets: 0, worksheet: null },
      ],
    });
    expect(view.members).toMatchObject([
      {
        ...{ id: account.id, joinedOn: '2026-12-01', at: '1.2 The pair', daysThere: 3 },
        units: [
          { number: 1, sheetsDone: 1, sheetsBegun: 1, lamp: 'lit', percent: 100 },
          { number: 2, sheetsDone: 0, lamp: 'none', percent: null },
        ],
        paper: 'not-sat',
        attempts: [{ id: sheet.id, worksheet: 'W1', attempt: 1, marks: 10, outOf: 10 }],
      },
    ]);
  });

  it('shows the same lamp and score as the trainee’s own map', async () => {
    const { caller } = await member();
    await workWorksheet(caller, 'slip');
    const [unit] = (await caller.call('GET', '/api/course')).body.units;
    const seen = (await viewOf()).members[0]?.units[0];
    expect(seen).toMatchObject({ lamp: 'lit', percent: unit.worksheet.best.percent });
  });

  it('names common slips only when five have answered', async () => {
    for (let person = 0; person < 4; person += 1) {
      await workWorksheet((await member()).caller, person < 2 ? 'slip' : 'right');
    }
    expect(await viewOf()).toMatchObject({ slips: [], tooFew: true });
    const fifth = (await member()).caller;
    await workWorksheet(fifth);
    await workWorksheet(fifth, 'slip');
    const { slips, tooFew } = await viewOf();
    expect(tooFew).toBe(false);
    expect(slips).toEqual(
      ['vd-feed', 'vd-lamp'].map((slug) => ({
        question: `Drop on the feed ${slug}`,
        ...{ part: 'a', says: 'You made the canaryerror.', count: 2, of: 5 },
      })),
    );
  });

  it('asks the database as often for a class of six as for a class of one', async () => {
    await workWorksheet((await member()).caller, 'slip');
    await viewOf();
    const one = await countQueries(test, () => viewOf());
    for (let person = 0; person < 5; person += 1) await workWorksheet((await member()).caller);
    expect(await countQueries(test, () => viewOf())).toBe(one);
  });

  it('is not for trainees, nor for the trainers of another class', async () => {
    const { caller } = await member();
    const otherAccount = await createAccount(test.app, { roles: ['trainer'] });
    const other = await signIn(test.app, otherAccount.id);
    const path = `/api/classes/${group.id}`;
    expect((await stranger(test.app).call('GET', path)).status).toBe(401);
    expect((await caller.call('GET', path)).status).toBe(403);
    expect((await other.call('GET', path)).status).toBe(404);
    expect((await trainer.call('GET', `/api/classes/${NOWHERE}`)).status).toBe(404);
    expect((await trainer.call('GET', '/api/classes/mine')).status).toBe(422);
  });

  it('opens for an administrator', async () => {
    const account = await createAccount(test.app, { roles: ['administrator'] });
    expect(await viewOf(await signIn(test.app, account.id))).toMatchObject({ id: group.id });
  });
});

describe('a worksheet of somebody else', () => {
  it('opens for a trainer of their class once it is marked, to look at only', async () => {
    const { caller, account } = await member();
    const open = await startWorksheet(caller);
    const path = `/api/worksheet-attempts/${open.id}`;
    expect((await trainer.call('GET', path)).status).toBe(404);
    await caller.call('POST', `${path}/hand-in`, {});
    const seen = await trainer.call('GET', path);
    expect(seen.body).toMatchObject({
      mine: false,
      trainee: { givenName: account.givenName, familyName: account.familyName },
    });
    expect((await trainer.call('POST', `${path}/hand-in`, {})).status).toBe(404);
  });

  it('does not open for another trainer, a classmate, or after the person has left', async () => {
    const { caller, account } = await member();
    const { id } = await workWorksheet(caller);
    const path = `/api/worksheet-attempts/${id}`;
    const otherAccount = await createAccount(test.app, { roles: ['trainer'] });
    await createClass(test, otherAccount.id);
    const other = await signIn(test.app, otherAccount.id);
    expect((await other.call('GET', path)).status).toBe(404);
    expect((await (await member()).caller.call('GET', path)).status).toBe(404);
    await test.query(
      'UPDATE class_members SET left_at = now() WHERE account_id = $1 RETURNING class_id',
      [account.id],
    );
    expect((await trainer.call('GET', path)).status).toBe(404);
    expect(await test.app.get(ClassesService).trains(trainerAccount.id, account.id)).toBe(false);
  });
});
