import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { createAccount } from '../../test/factories/account.ts';
import { createClass } from '../../test/factories/class.ts';
import { goodFiles, publishFiles } from '../../test/factories/content.ts';
import {
  answerPractice,
  answersToLists,
  listsSheet,
  onlyAsked,
  practise,
  startPractice,
} from '../../test/factories/practice.ts';
import { answersTo, typed } from '../../test/factories/worksheet.ts';
import { signIn, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { PracticeList } from './practice.schemas.ts';

let test: TestApp;
let trainee: Caller;
let traineeId: string;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, {
    ...goodFiles(),
    'assessments/bank/terminations/te-lists.md': listsSheet(),
  });
});
beforeEach(async () => {
  traineeId = (await createAccount(test.app)).id;
  trainee = await signIn(test.app, traineeId);
});
afterAll(() => test.close());

describe('a question with steps worked beforehand', () => {
  it('is asked whole unless told otherwise', async () => {
    const view = await startPractice(trainee, 'vd-feed');
    expect(view).toMatchObject({
      levels: [0, 1, 2, 3],
      left: 3,
      shown: [],
      asked: ['a', 'b', 'c'],
    });
  });

  it('shows at nought everything and asks nothing', async () => {
    const view = await startPractice(trainee, 'vd-feed', 0);
    expect(view).toMatchObject({ left: 0, asked: [] });
    expect(view.shown.map(({ part }) => part)).toEqual(['a', 'b', 'c']);
    const strange = await trainee.call('POST', `/api/practice/${view.id}/answers`, {
      answers: { a: typed('1', 'V') },
    });
    expect([strange.status, strange.body.errors[0].detail]).toEqual([
      422,
      'Part a is not asked: the question is worked in full.',
    ]);
    expect((await answerPractice(trainee, view.id, {})).marked).toMatchObject({
      ...{ marks: 0, outOf: 0, parts: [] },
    });
  });

  it('marks what was left, out of what that is worth', async () => {
    const view = await startPractice(trainee, 'vd-feed', 2);
    expect(view).toMatchObject({ left: 2, asked: ['b', 'c'], shown: [{ part: 'a' }] });
    const answers = onlyAsked(view, answersTo(view.question));
    const { marked } = await answerPractice(trainee, view.id, answers);
    expect(marked).toMatchObject({ marks: 3, outOf: 3 });
    expect(marked.parts.map(({ id }) => id)).toEqual(['b', 'c']);
  });

  it('gives the same answer the same verdict however much was shown', async () => {
    const verdicts: Record<string, string[]> = { b: [], c: [] };
    for (const left of [1, 2, 3]) {
      const { marked } = await practise(trainee, {
        ...{ question: 'vd-feed', left },
        answers: (question) => ({
          ...answersTo(question),
          b: answersTo(question, 'slip')['b'] ?? typed(''),
        }),
      });
      for (const { id, verdict } of marked.parts) verdicts[id]?.push(verdict);
    }
    expect(new Set(verdicts['b']).size).toBe(1);
    expect(verdicts['b']).not.toContain('right');
    expect(verdicts['c']).toEqual(['right', 'right', 'right']);
  });

  it('asks back and hints only where something is left to do', async () => {
    const { id, question } = await startPractice(trainee, 'vd-feed', 1);
    const hint = await trainee.call('POST', `/api/practice/${id}/hints`, { part: 'a' });
    expect(hint.status).toBe(422);
    const { c } = answersTo(question);
    const reply = await trainee.call('POST', `/api/practice/${id}/answers`, { answers: { c } });
    expect(reply.status).toBe(200);
  });

  it.each([4, -1, 1.5, 1e9, '2', null])('has no level %p', async (left) => {
    const reply = await trainee.call('POST', '/api/practice', { question: 'vd-feed', left });
    expect([reply.status, reply.body.errors[0].pointer]).toEqual([422, '#/left']);
  });
});

describe('a question that lists', () => {
  it('is read and marked when all, an order or pairs are asked for', async () => {
    const view = await startPractice(trainee, 'te-lists');
    expect(view.question.parts.map(({ kind }) => kind)).toEqual([
      ...['choices', 'order', 'match', 'quantity'],
    ]);
    expect(view.question.tables[0]?.rows).toHaveLength(3);
    const { marked } = await answerPractice(trainee, view.id, answersToLists(view.question));
    expect(marked).toMatchObject({ marks: 7, outOf: 7 });
  });

  it('names the sheet to read although it is not issued yet', async () => {
    const { marked } = await practise(trainee, { question: 'te-lists', answers: () => ({}) });
    expect(marked.parts[0]?.read).toEqual({
      ...{ sheet: '2.1', title: null, heading: null, paragraph: null, issued: false },
    });
  });

  it.each<[string, unknown]>([
    ['more than could be chosen', Array.from({ length: 21 }, String)],
    ['a choice without end', ['x'.repeat(81)]],
    ['numbers', [1]],
    ['no list', 'o1'],
  ])('refuses %s', async (_what, options) => {
    const { id } = await startPractice(trainee, 'te-lists');
    const answers = { a: { ...typed(''), options } };
    const reply = await trainee.call('POST', `/api/practice/${id}/answers`, { answers });
    expect(reply.status).toBe(422);
  });

  it('asks back what is on no paper', async () => {
    const { id } = await startPractice(trainee, 'te-lists');
    const answers = { b: { ...typed(''), options: ['nowhere', ''] } };
    const reply = await trainee.call('POST', `/api/practice/${id}/answers`, { answers });
    expect([reply.status, reply.body.type]).toEqual([422, '/problems/answer-unclear']);
  });
});

describe('the list of practice questions', () => {
  const list = async (search = '', from = trainee): Promise<PracticeList> =>
    (await from.call('GET', `/api/practice/questions${search}`)).body as PracticeList;
  const slugs = ({ questions }: PracticeList) => questions.map(({ slug }) => slug);

  it('has the practice pool and nothing of the papers', async () => {
    const { profile, questions } = await list();
    expect([profile, ...questions.map(({ slug }) => slug)]).toEqual([
      ...['metric', 'vd-feed', 'vd-lamp', 'te-lists'],
    ]);
    expect(questions[0]).toEqual({
      ...{ slug: 'vd-feed', title: 'Drop on the feed vd-feed', level: 'apply', lesson: '1.1' },
      ...{ subject: { code: 'VD', name: 'voltage drop' }, marks: 5, profile: 'metric' },
      ...{ kinds: ['quantity', 'choice'], readsCurve: false, tries: 0, best: null },
    });
  });

  it('is narrowed down by subject, level and sheet', async () => {
    expect(slugs(await list('?subject=TE'))).toEqual(['te-lists']);
    expect(slugs(await list('?level=apply'))).toEqual(['vd-feed', 'vd-lamp']);
    expect(slugs(await list('?lesson=1.2&subject=VD'))).toEqual(['vd-lamp']);
    expect(slugs(await list('?lesson=7.1'))).toEqual([]);
    const strange = await trainee.call('GET', '/api/practice/questions?subject=XX');
    expect([strange.status, strange.body.type]).toEqual([422, '/problems/invalid-request']);
  });

  it('says what was shown whole and when, and forgets what was helped', async () => {
    const wrong = { question: 'vd-feed', answers: () => ({ a: typed('900', 'V') }) };
    await practise(trainee, { question: 'vd-feed', left: 1 });
    const { id, question } = await startPractice(trainee, 'vd-feed');
    await trainee.call('POST', `/api/practice/${id}/hints`, { part: 'a' });
    await answerPractice(trainee, id, answersTo(question));
    expect((await list()).questions[0]).toMatchObject({ tries: 2, best: null });
    await practise(trainee, wrong);
    await practise(trainee, { question: 'vd-feed' });
    test.clock.advance(48 * 60);
    trainee = await signIn(test.app, traineeId);
    await practise(trainee, { question: 'vd-feed' });
    const best = { percent: 100, on: '2026-12-01' };
    expect((await list()).questions[0]).toMatchObject({ tries: 5, best });
    const other = await signIn(test.app, (await createAccount(test.app)).id);
    expect((await list('', other)).questions[0]).toMatchObject({ tries: 0, best: null });
  });

  it('begins with the profile the school asks under', async () => {
    const trainer = await createAccount(test.app, { roles: ['trainer'] });
    const { id } = await createClass(test, trainer.id);
    await test.query(
      `UPDATE organisations SET practice_profile = 'awg' WHERE id =
        (SELECT organisation_id FROM classes WHERE id = $1)`,
      [id],
    );
    await test.query('INSERT INTO class_members (class_id, account_id) VALUES ($1, $2)', [
      ...[id, traineeId],
    ]);
    const { profile, questions } = await list();
    expect([profile, questions[0]?.slug, questions[0]?.profile]).toEqual([
      ...['awg', 'te-lists', 'awg'],
    ]);
  });
});
