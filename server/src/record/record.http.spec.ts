import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { createAccount } from '../../test/factories/account.ts';
import { goodFiles, publishFiles } from '../../test/factories/content.ts';
import { practise } from '../../test/factories/practice.ts';
import {
  startWorksheet,
  handInWorksheet,
  typed,
  workWorksheet,
} from '../../test/factories/worksheet.ts';
import { signIn, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { SubjectRecords } from './record.schemas.ts';

let test: TestApp;
let trainee: Caller;
let traineeId: string;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, goodFiles());
});
beforeEach(async () => {
  test.clock.set('2026-12-01T10:00:00Z');
  traineeId = (await createAccount(test.app)).id;
  trainee = await signIn(test.app, traineeId);
});
afterAll(() => test.close());

/** Sessions end by themselves: on another day one signs in anew. */
async function comeBackAt(instant: string): Promise<void> {
  test.clock.set(instant);
  trainee = await signIn(test.app, traineeId);
}

const record = async (of = trainee): Promise<SubjectRecords> =>
  (await of.call('GET', '/api/record/subjects')).body as SubjectRecords;
const drop = ({ subjects }: SubjectRecords) => subjects.find(({ code }) => code === 'VD');
const reasons = ({ next }: SubjectRecords) => next.map(({ slug, reason }) => `${slug} ${reason}`);
const wrong = { answers: () => ({ a: typed('900', 'V') }) };

describe('my record by subject', () => {
  it('has the twelve subjects, nothing shown, and where to begin', async () => {
    const mine = await record();
    expect(mine.subjects).toHaveLength(12);
    expect(drop(mine)).toEqual({
      ...{ code: 'VD', name: 'voltage drop', questions: 2, shown: 0, days: 0, lastDay: null },
    });
    expect(mine.next[0]).toEqual({
      ...{ slug: 'vd-feed', title: 'Drop on the feed vd-feed', level: 'apply', lesson: '1.1' },
      ...{ subject: { code: 'VD', name: 'voltage drop' }, marks: 5, lastDay: null },
      ...{ reason: 'never-tried', says: 'You have never tried it.' },
    });
  });

  it('counts a worksheet and practice alike, by days of the scheme', async () => {
    await workWorksheet(trainee);
    expect(drop(await record())).toMatchObject({ shown: 2, days: 1, lastDay: '2026-12-01' });
    // Nearly midnight in winter, and past it in summer, where the scheme is.
    await comeBackAt('2026-12-02T23:59:00Z');
    await practise(trainee, { question: 'vd-feed' });
    expect(drop(await record())).toMatchObject({ shown: 2, days: 2, lastDay: '2026-12-02' });
    await comeBackAt('2026-07-01T23:30:00Z');
    await practise(trainee, { question: 'vd-lamp' });
    const { body } = await trainee.call('GET', '/api/practice/questions?lesson=1.2');
    expect(body.questions[0].best).toEqual({ percent: 100, on: '2026-07-02' });
  });

  it('does not count what was helped, went wrong or was left blank', async () => {
    await practise(trainee, { question: 'vd-feed', left: 2 });
    await practise(trainee, { question: 'vd-feed', ...wrong });
    const sheet = await startWorksheet(trainee);
    await handInWorksheet(trainee, sheet.id);
    const mine = await record();
    expect(drop(mine)).toMatchObject({ shown: 0, days: 0, lastDay: null });
    expect(reasons(mine)).toEqual(['vd-feed went-wrong', 'vd-lamp never-tried']);
    expect(mine.next[0]).toMatchObject({ says: 'It went wrong last time.', lastDay: '2026-12-01' });
  });

  it('comes back on another day to what was shown on one', async () => {
    await practise(trainee, { question: 'vd-feed' });
    expect(reasons(await record())).toEqual(['vd-lamp never-tried']);
    await comeBackAt('2026-12-02T10:00:00Z');
    expect(reasons(await record())).toEqual(['vd-feed one-day-only', 'vd-lamp never-tried']);
  });

  it('is of the person alone', async () => {
    await practise(trainee, { question: 'vd-feed' });
    const other = await signIn(test.app, (await createAccount(test.app)).id);
    expect(drop(await record(other))).toMatchObject({ shown: 0 });
  });
});
