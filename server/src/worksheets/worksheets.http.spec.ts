import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { drawQuestion, presentQuestion } from '@ferrule/assessments';
import { createHmac } from 'node:crypto';
import { createAccount } from '../../test/factories/account.ts';
import {
  goodFiles,
  PRACTICE_CANARIES,
  practiceSheet,
  publishFiles,
} from '../../test/factories/content.ts';
import {
  answersTo,
  handInWorksheet,
  saveItem,
  startWorksheet,
  typed,
  workWorksheet,
} from '../../test/factories/worksheet.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { Hint, PracticeView } from '../practice/practice.schemas.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import type { WorksheetView } from './worksheets.schemas.ts';

/** Of the recall questions of the lessons. */
const RECALL_ANSWER = /"(First|Second|Third)\."/;
const NOWHERE = '00000000-0000-4000-8000-000000000000';

let test: TestApp;
let trainee: Caller;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, goodFiles());
});
beforeEach(async () => {
  trainee = await signIn(test.app, (await createAccount(test.app)).id);
});
afterAll(() => test.close());

const firstItem = <T>(items: readonly T[]): T => {
  const [item] = items;
  if (item === undefined) throw new Error('the worksheet has no questions');
  return item;
};

describe('a worksheet', () => {
  it('starts once and goes on, with the answers that were saved', async () => {
    const sheet = await startWorksheet(trainee);
    expect(sheet).toMatchObject({
      ...{ number: 'W1', attempt: 1, mine: true, outOf: 10, marks: null, handedInAt: null },
      ...{ unit: { number: 1, title: 'Runs' }, passPercent: 80, setBy: 'Odile Marchetti' },
    });
    expect(sheet.variant).toMatch(/^[A-Z]\d-\d{3}$/);
    const { key, question } = firstItem(sheet.items);
    const answers = answersTo(question);
    const saved = await saveItem(trainee, { id: sheet.id, key }, { a: answers['a'] });
    expect(saved.status).toBe(200);
    expect(saved.body.readings.a).toMatchObject({ state: 'understood' });
    expect(saved.body.readings.b).toEqual({ state: 'blank' });
    await saveItem(trainee, { id: sheet.id, key }, { b: answers['b'] });
    const again = await startWorksheet(trainee);
    expect(again.id).toBe(sheet.id);
    expect(firstItem(again.items)).toEqual({
      ...{ key, slug: 'vd-feed', question, marked: null, readAgain: null },
      answers: { a: answers['a'], b: answers['b'] },
    });
  });

  it('comes to one attempt when twenty starts arrive at once', async () => {
    const started = await Promise.all(Array.from({ length: 20 }, () => startWorksheet(trainee)));
    expect(new Set(started.map(({ id }) => id)).size).toBe(1);
  });

  it('is marked line by line beside the worked answer', async () => {
    const marked = await workWorksheet(trainee, 'slip');
    const { marked: paper, readAgain } = firstItem(marked.items);
    expect(paper?.parts.map(({ verdict }) => verdict)).toEqual([
      'slip',
      'carried-forward',
      'right',
    ]);
    expect(paper?.parts[0]?.worked.length).toBeGreaterThan(0);
    expect(paper?.trace.map(({ rule }) => rule)).toEqual(['slip', 'carried-forward', 'right']);
    expect(readAgain).toEqual({ sheet: '1.1', title: 'The run' });
    expect(marked).toMatchObject({ marks: 8, outOf: 10, percent: 80, passed: true });
  });

  it('gives fresh figures each time', async () => {
    const seen = new Set<string>();
    for (let attempt = 1; attempt <= 6; attempt += 1) {
      const sheet = await workWorksheet(trainee);
      expect(sheet.attempt).toBe(attempt);
      seen.add(JSON.stringify(sheet.items.map(({ question }) => question.given)));
    }
    expect(seen.size).toBe(6);
  });

  it('asks unclear answers back and uses nothing up', async () => {
    const sheet = await startWorksheet(trainee);
    const { key } = firstItem(sheet.items);
    const answers = { a: typed('1,234', 'V'), b: typed('a lot', 'V') };
    const saved = await saveItem(trainee, { id: sheet.id, key }, answers);
    expect(saved.body.readings).toMatchObject({
      a: { state: 'ambiguous', readings: ['1.234', '1234'] },
      b: { state: 'not-understood' },
    });
    const reply = await handInWorksheet(trainee, sheet.id);
    expect(reply.status).toBe(422);
    expect(reply.body).toMatchObject({
      type: '/problems/answer-unclear',
      unclear: [
        { key, part: 'a', readings: ['1.234', '1234'] },
        { key, part: 'b', readings: [] },
      ],
    });
    expect((await startWorksheet(trainee)).id).toBe(sheet.id);
    await saveItem(trainee, { id: sheet.id, key }, { a: typed('1.234', 'V'), b: typed('') });
    expect((await handInWorksheet(trainee, sheet.id)).status).toBe(200);
  });

  it('is marked once, whoever asks and how often', async () => {
    const sheet = await startWorksheet(trainee);
    const replies = await Promise.all(
      Array.from({ length: 5 }, () => handInWorksheet(trainee, sheet.id)),
    );
    expect(new Set(replies.map(({ status }) => status))).toEqual(new Set([200]));
    expect(new Set(replies.map(({ body }) => String(body.handedInAt))).size).toBe(1);
    const { key, question } = firstItem(sheet.items);
    const late = await saveItem(trainee, { id: sheet.id, key }, answersTo(question));
    expect(late.status).toBe(409);
    expect(late.body.type).toBe('/problems/worksheet-handed-in');
  });

  it('lists every attempt with its score', async () => {
    const first = await workWorksheet(trainee, 'slip');
    const open = await startWorksheet(trainee);
    const { body } = await trainee.call('GET', '/api/worksheets/W1');
    expect(body).toMatchObject({ number: 'W1', questions: 2, passPercent: 80 });
    expect(body.practise).toEqual(['vd-feed', 'vd-lamp']);
    expect(body.attempts).toMatchObject([
      { id: first.id, attempt: 1, marks: 8, outOf: 10, percent: 80 },
      { id: open.id, attempt: 2, marks: null, percent: null, handedInAt: null },
    ]);
  });
});

describe('what nobody else may', () => {
  it('opens, saves or hands in the worksheet of another person', async () => {
    const sheet = await startWorksheet(trainee);
    const other = await signIn(test.app, (await createAccount(test.app)).id);
    const { key } = firstItem(sheet.items);
    const replies = await Promise.all([
      other.call('GET', `/api/worksheet-attempts/${sheet.id}`),
      saveItem(other, { id: sheet.id, key }, { a: typed('1', 'V') }),
      handInWorksheet(other, sheet.id),
      other.call('GET', `/api/worksheet-attempts/${NOWHERE}`),
    ]);
    expect(replies.map(({ status }) => status)).toEqual([404, 404, 404, 404]);
  });

  it('works without signing in', async () => {
    const visitor = stranger(test.app);
    const replies = await Promise.all([
      visitor.call('GET', '/api/worksheets/W1'),
      visitor.call('POST', '/api/worksheets/W1/attempts'),
      visitor.call('GET', `/api/worksheet-attempts/${NOWHERE}`),
      visitor.call('POST', '/api/practice', { question: 'vd-feed' }),
    ]);
    expect(replies.map(({ status }) => status)).toEqual([401, 401, 401, 401]);
  });

  it.each<[string, object]>([
    ['an answer to a part that is not there', { z: typed('1') }],
    ['more than an answer holds', { a: { ...typed('1'), marks: 2 } }],
    ['an answer without end', { a: typed('1'.repeat(5_000)) }],
    ['a text that cannot be kept', { a: typed('1\u0000') }],
    ['half a character', { a: { ...typed('1'), working: '\ud800' } }],
    ['a list', { a: [] }],
  ])('saves %s', async (_what, answers) => {
    const sheet = await startWorksheet(trainee);
    const { key } = firstItem(sheet.items);
    const reply = await saveItem(trainee, { id: sheet.id, key }, answers);
    expect(reply.status).toBe(422);
    expect(reply.body.errors.length).toBeGreaterThan(0);
  });

  it('finds worksheets and items that are not there', async () => {
    const sheet = await startWorksheet(trainee);
    expect((await trainee.call('GET', '/api/worksheets/W9')).status).toBe(404);
    expect((await saveItem(trainee, { id: sheet.id, key: '9' }, {})).status).toBe(404);
    expect((await trainee.call('GET', '/api/worksheet-attempts/me')).status).toBe(422);
  });
});

describe('a question to try', () => {
  const start = async () =>
    (await trainee.call('POST', '/api/practice', { question: 'vd-feed' })).body as PracticeView;
  const answer = (id: string, answers: object, from = trainee) =>
    from.call('POST', `/api/practice/${id}/answers`, { answers });

  it('is marked in place, once', async () => {
    const { id, question } = await start();
    const reply = await answer(id, answersTo(question));
    expect(reply.status).toBe(200);
    expect(reply.body.marked).toMatchObject({ marks: 5, outOf: 5 });
    const again = await answer(id, answersTo(question));
    expect([again.status, again.body.type]).toEqual([409, '/problems/practice-answered']);
  });

  it('asks back what cannot be read, and may then be answered', async () => {
    const { id, question } = await start();
    const unclear = await answer(id, { ...answersTo(question), a: typed('1,234', 'V') });
    expect(unclear.status).toBe(422);
    expect(unclear.body.unclear).toMatchObject([{ part: 'a', readings: ['1.234', '1234'] }]);
    expect((await answer(id, answersTo(question))).status).toBe(200);
  });

  it('gives the formula of a part as a hint, and keeps that it did', async () => {
    const { id, question } = await start();
    const hint = (part: string, from = trainee) =>
      from.call('POST', `/api/practice/${id}/hints`, { part });
    const { status, body } = await hint('b');
    const said = (body as Hint).line?.map(({ text }) => text).join(' ');
    expect([status, said]).toEqual([200, 'U_p = U_d × 2']);
    expect((await hint('b')).body).toEqual(body);
    expect((await hint('c')).body).toEqual({ line: null });
    const other = await signIn(test.app, (await createAccount(test.app)).id);
    expect((await hint('b', other)).status).toBe(404);
    expect((await hint('z')).status).toBe(422);
    expect((await answer(id, answersTo(question))).body.hints).toEqual(['b']);
    expect((await hint('a')).body.type).toBe('/problems/practice-answered');
  });

  it('is not for others, and there is none of the paper pool', async () => {
    const { id } = await start();
    const other = await signIn(test.app, (await createAccount(test.app)).id);
    expect((await answer(id, {}, other)).status).toBe(404);
    const paper = await trainee.call('POST', '/api/practice', { question: 'vd-one' });
    const nothing = await trainee.call('POST', '/api/practice', { question: 'vd-none' });
    expect([paper.status, nothing.status]).toEqual([404, 404]);
    const detail = ({ body }: { body: { detail: string } }) => body.detail.replace(/".*"/, '');
    expect(detail(paper)).toBe(detail(nothing));
  });
});

describe('before marking', () => {
  it('no answer carries a key, tolerance, rule, slip or seed', async () => {
    const sent: string[] = [];
    const keep = (reply: { body: unknown }) => sent.push(JSON.stringify(reply.body));
    const sheet = await startWorksheet(trainee);
    sent.push(JSON.stringify(sheet));
    const practice = await trainee.call('POST', '/api/practice', { question: 'vd-feed' });
    keep(practice);
    for (const { key, question } of sheet.items) {
      keep(await saveItem(trainee, { id: sheet.id, key }, answersTo(question, 'slip')));
      keep(await saveItem(trainee, { id: sheet.id, key }, { a: typed('1,234', 'V') }));
    }
    keep(await handInWorksheet(trainee, sheet.id));
    keep(await saveItem(trainee, { id: sheet.id, key: '1' }, { z: typed('') }));
    keep(await trainee.call('GET', `/api/worksheet-attempts/${sheet.id}`));
    keep(await trainee.call('GET', '/api/worksheets/W1'));
    keep(await trainee.call('GET', '/api/course'));
    keep(await trainee.call('GET', '/api/front'));
    const all = sent.join('\n');
    for (const canary of PRACTICE_CANARIES) expect(all).not.toContain(canary);
    expect(all).not.toMatch(RECALL_ANSWER);
    const rows = await test.query<{ kept: string }>(
      `SELECT items::text AS kept FROM worksheet_attempts WHERE id = $1
        UNION ALL SELECT drawn::text FROM practice_attempts WHERE id = $2`,
      [sheet.id, practice.body.id],
    );
    const drawnNumbers = rows.flatMap(({ kept }) => kept.match(/\d\.\d{9,}/g) ?? []);
    expect(drawnNumbers.length).toBeGreaterThan(0);
    for (const number of drawnNumbers) expect(all).not.toContain(number);
    for (const seed of await seedsOf(sheet)) expect(all).not.toContain(seed);
  });

  it('and the canaries do show once it is marked, so that this test can fail', async () => {
    const marked = JSON.stringify(await workWorksheet(trainee, 'slip'));
    expect(marked).toContain('canarylesson');
    expect(marked).toContain('canarykept');
    expect(marked).toMatch(RECALL_ANSWER);
  });
});

describe('when questions are revised', () => {
  it('a kept attempt opens again exactly as it was', async () => {
    const marked = await workWorksheet(trainee, 'slip');
    const lamp = practiceSheet({ id: 'vd-lamp', lesson: '1.2', revision: 'B' });
    await publishFiles(test, {
      ...goodFiles(),
      'assessments/bank/drop/vd-lamp.md': lamp.replace('Drop on the feed', 'Loss on the feed'),
    });
    const again = await trainee.call('GET', `/api/worksheet-attempts/${marked.id}`);
    expect(again.body).toEqual(marked);
    const fresh = await startWorksheet(trainee);
    expect(fresh.items[1]?.question.title).toBe('Loss on the feed vd-lamp');
  });

  it('a question with few figures repeats none as long as there are others', async () => {
    const few = practiceSheet({ id: 'vd-lamp', lesson: '1.2', revision: 'C' })
      .replace('from: 5 A, to: 19.5 A, step: 0.5 A', 'one of: [5 A, 6 A]')
      .replace('[17 mΩ, 23 mΩ, 41 mΩ]', '[17 mΩ, 23 mΩ]');
    await publishFiles(test, { ...goodFiles(), 'assessments/bank/drop/vd-lamp.md': few });
    const seen = new Set<string>();
    for (let attempt = 0; attempt < 4; attempt += 1) {
      const { items } = await workWorksheet(trainee);
      seen.add(JSON.stringify(items[1]?.question.given));
    }
    expect(seen.size).toBe(4);
  });
});

/** What the figures of an attempt were drawn with: that they were is checked, too. */
async function seedsOf({ id, items }: WorksheetView): Promise<string[]> {
  const seeds: string[] = [];
  for (const [at, slug] of ['vd-feed', 'vd-lamp'].entries()) {
    const { question } = await test.app.get(QuestionsService).current(slug);
    const seed = createHmac('sha256', Buffer.from('b2'.repeat(32), 'hex'))
      .update(`worksheet:${id}|${slug}|A`)
      .digest('hex');
    const drawn = presentQuestion(question, drawQuestion(question, seed));
    expect(drawn).toEqual(items[at]?.question);
    seeds.push(seed);
  }
  return seeds;
}
