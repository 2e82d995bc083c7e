import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { countQueries } from '../../test/count-queries.ts';
import { createAccount, type TestAccount } from '../../test/factories/account.ts';
import { goodFiles, lessonSheet, publishFiles } from '../../test/factories/content.ts';
import { workWorksheet } from '../../test/factories/worksheet.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { CourseMap } from './courses.schemas.ts';

let test: TestApp;
let account: TestAccount;
let trainee: Caller;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, goodFiles());
});
beforeEach(async () => {
  test.clock.set('2026-12-01T10:00:00Z');
  account = await createAccount(test.app);
  trainee = await signIn(test.app, account.id);
});
afterAll(() => test.close());

const mapOf = async (caller = trainee) =>
  (await caller.call('GET', '/api/course')).body as CourseMap;
const readTo = (number: string, paragraph: number) =>
  trainee.call('PUT', `/api/lessons/${number}/progress`, { paragraph });
const markDone = (number: string, revision = 'A') =>
  trainee.call('PUT', `/api/lessons/${number}/done`, { revision });

describe('the front page', () => {
  it('says what the course holds to anyone', async () => {
    const { status, body } = await stranger(test.app).call('GET', '/api/front');
    expect(status).toBe(200);
    expect(body).toMatchObject({
      demonstration: true,
      school: { name: 'Harrow Quay Technical School' },
      course: { number: 'HQ-DC2', sheets: 2, units: 2, questions: 2, minutesToRead: 24 },
    });
    expect(body.joinCode).toBe('QUAY-2026');
    expect(JSON.stringify(body)).not.toMatch(/pass(word|phrase)/i);
    expect(body.people).toContainEqual({
      role: 'Trainer',
      name: 'Odile Marchetti',
      email: 'odile.marchetti@harrow-quay.example',
    });
  });
});

describe('the course map', () => {
  it('begins at the first sheet, with nothing done and the paper open', async () => {
    const map = await mapOf();
    expect(map).toMatchObject({
      ...{ number: 'HQ-DC2', revision: 'A', class: null, enrolledOn: null, trainer: null },
      carryOn: { sheet: '1.1', title: 'The run', paragraph: 1, of: 2, minutesLeft: 12 },
      paper: { slug: 'try-paper', number: 'F1', state: 'open', sittingId: null },
    });
    expect(map.units).toMatchObject([
      {
        ...{ number: 1, issued: true },
        sheets: [
          { number: '1.1', state: 'not-begun', revised: null, paragraph: null, doneOn: null },
          { number: '1.2', state: 'not-begun' },
        ],
        worksheet: { number: 'W1', questions: 2, passPercent: 80, best: null, lit: false },
      },
      { number: 2, issued: false, sheets: [], worksheet: null },
    ]);
  });

  it('moves with reading, and with marking a sheet done and undone', async () => {
    await readTo('1.1', 2);
    expect(await mapOf()).toMatchObject({
      carryOn: { sheet: '1.1', paragraph: 2, of: 2, minutesLeft: 6 },
      units: [{ sheets: [{ state: 'begun', paragraph: 2 }, {}] }, {}],
    });
    // After midnight at the school, though not yet in UTC.
    test.clock.set('2027-06-30T23:30:00Z');
    trainee = await signIn(test.app, account.id);
    expect((await markDone('1.1')).body).toEqual({
      ...{ state: 'done', paragraph: 2, revisionRead: 'A', current: 'A' },
    });
    expect(await mapOf()).toMatchObject({
      carryOn: { sheet: '1.2' },
      units: [{ sheets: [{ state: 'done', doneOn: '2027-07-01' }, {}] }, {}],
    });
    const undone = await trainee.call('DELETE', '/api/lessons/1.1/done');
    expect(undone.body).toMatchObject({ state: 'begun', revisionRead: null });
  });

  it('has nothing to carry on with when every sheet is done', async () => {
    await markDone('1.1');
    await markDone('1.2');
    expect((await mapOf()).carryOn).toBeNull();
  });

  it('lights the lamp at the pass mark and shows the same score everywhere', async () => {
    const sheet = await workWorksheet(trainee, 'slip');
    const { worksheet } = (await mapOf()).units[0] ?? {};
    expect(worksheet).toMatchObject({
      best: { marks: 8, outOf: 10, percent: 80, on: '2026-12-01' },
      ...{ lit: true, attempts: 1, openAttemptId: null },
    });
    expect([sheet.percent, sheet.passed]).toEqual([worksheet?.best?.percent, worksheet?.lit]);
  });

  it('asks the database as often for a worked course as for an untouched one', async () => {
    await mapOf();
    const untouched = await countQueries(test, () => mapOf());
    await markDone('1.1');
    await readTo('1.2', 1);
    for (let attempt = 0; attempt < 3; attempt += 1) await workWorksheet(trainee);
    const worked = await countQueries(test, () => mapOf());
    expect(worked).toBe(untouched);
    expect(worked).toBeLessThanOrEqual(15);
  });

  it('is for people who are signed in', async () => {
    expect((await stranger(test.app).call('GET', '/api/course')).status).toBe(401);
  });
});

describe('a lesson', () => {
  it('is sent with all that its page needs', async () => {
    const { status, body, headers } = await trainee.call('GET', '/api/lessons/1.1');
    expect(status).toBe(200);
    expect(headers['cache-control']).toBe('private, no-cache');
    expect(body).toMatchObject({
      ...{ number: '1.1', revision: 'A', unit: { number: 1, title: 'Runs' }, paragraphs: 2 },
      words: [{ term: 'run', meaning: 'the distance one way' }],
      ...{ previous: null, next: { number: '1.2', title: 'The pair' }, tries: ['vd-feed'] },
    });
    expect(body.recall).toHaveLength(3);
    expect(body.worked).toHaveProperty(['vd-feed#1', 'title']);
    expect(body.figures['fig-1.svg'].tree.type).toBe('root');
    expect(body.source).toBeUndefined();
  });

  it('is sent again only when it has changed', async () => {
    const first = await trainee.call('GET', '/api/lessons/1.2');
    const etag = String(first.headers['etag']);
    const again = await trainee.call('GET', '/api/lessons/1.2', undefined, {
      'if-none-match': etag,
    });
    expect([again.status, again.raw.length]).toEqual([304, 0]);
    await publishFiles(test, revisedFiles());
    const changed = await trainee.call('GET', '/api/lessons/1.2', undefined, {
      'if-none-match': etag,
    });
    expect([changed.status, changed.body.title]).toEqual([200, 'Both cores']);
  });

  it('tells who read the old revision that a new one is out', async () => {
    const slug = { number: '1.2', slug: 'the-pair' };
    const before = (await trainee.call('GET', '/api/lessons/1.2')).body.revision as string;
    await markDone('1.2', before);
    await publishFiles(test, {
      ...revisedFiles(),
      [PAIR]: lessonSheet({ ...slug, title: 'The pair', revision: 'D', body: 'Once more.\n' }),
    });
    const progress = await trainee.call('GET', '/api/lessons/1.2/progress');
    expect(progress.body).toMatchObject({ state: 'done', revisionRead: before, current: 'D' });
    expect((await mapOf()).units[0]?.sheets[1]).toMatchObject({
      state: 'done',
      revised: { from: before, to: 'D' },
    });
    const stale = await markDone('1.2', before);
    expect([stale.status, stale.body.type]).toEqual([409, '/problems/lesson-revised']);
    expect((await markDone('1.2', 'D')).body).toMatchObject({ revisionRead: 'D' });
    expect((await mapOf()).units[0]?.sheets[1]?.revised).toBeNull();
  });

  it.each<[string, number, () => Promise<{ status: number }>]>([
    ['a sheet that is not there', 404, () => trainee.call('GET', '/api/lessons/9.9')],
    ['progress on it', 404, () => readTo('9.9', 1)],
    ['a number that is none', 422, () => trainee.call('GET', '/api/lessons/%00')],
    ['paragraph nought', 422, () => readTo('1.1', 0)],
    ['half a paragraph', 422, () => readTo('1.1', 1.5)],
    ['no revision', 422, () => trainee.call('PUT', '/api/lessons/1.1/done', {})],
    ['a stranger', 401, () => stranger(test.app).call('GET', '/api/lessons/1.1')],
  ])('refuses %s', async (_what, status, ask) => {
    expect((await ask()).status).toBe(status);
  });

  it('does not read past its end', async () => {
    expect((await readTo('1.1', 999)).body.paragraph).toBe(2);
  });
});

const PAIR = 'lessons/hq-dc2/runs/02-the-pair.md';

function revisedFiles() {
  const options = { number: '1.2', slug: 'the-pair', title: 'Both cores', revision: 'B' };
  return { ...goodFiles(), [PAIR]: lessonSheet({ ...options, body: 'Two cores, both.\n' }) };
}
