import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { createHmac } from 'node:crypto';
import { createAccount } from '../../test/factories/account.ts';
import {
  courseSheet,
  goodFiles,
  lessonSheet,
  practiceSheet,
  publishFiles,
} from '../../test/factories/content.ts';
import { handInWorksheet, startWorksheet } from '../../test/factories/worksheet.ts';
import { signIn, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { WorksheetView } from './worksheets.schemas.ts';

/** A course with a second unit, whose worksheet comes after the sheets of the first. */
function twoUnits() {
  const course = courseSheet().replace(
    'sheets: []',
    `sheets: ["2.1"]
    worksheet: { number: W2, title: Ends, questions: [tm-crimp], passPercent: 80 }`,
  );
  return {
    ...goodFiles(),
    'lessons/hq-dc2/course.md': course,
    'lessons/hq-dc2/terminations/01-the-crimp.md': lessonSheet({
      ...{ number: '2.1', slug: 'the-crimp', title: 'The crimp', body: 'A crimp.\n' },
    }),
    'assessments/bank/ends/tm-crimp.md': practiceSheet({ id: 'tm-crimp', lesson: '2.1' }),
  };
}

let test: TestApp;
let trainee: Caller;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, twoUnits());
});
beforeEach(async () => {
  trainee = await signIn(test.app, (await createAccount(test.app)).id);
});
afterAll(() => test.close());

const open = async (id: string): Promise<WorksheetView> =>
  (await trainee.call('GET', `/api/worksheet-attempts/${id}`)).body as WorksheetView;
const named = ({ recall }: WorksheetView) =>
  recall.map(({ sheet, ask }) => `${sheet.number} ${ask}`);

describe('questions from earlier sheets', () => {
  it('are three of the units before, the same however often it is opened', async () => {
    const sheet = await startWorksheet(trainee, 'W2');
    expect(sheet.recall).toHaveLength(3);
    expect(new Set(sheet.recall.map(({ sheet: { title } }) => title))).toEqual(
      new Set(['The run', 'The pair']),
    );
    expect((await open(sheet.id)).recall).toEqual(sheet.recall);
    expect((await startWorksheet(trainee, 'W2')).recall).toEqual(sheet.recall);
  });

  it('come from its own sheets in the first unit', async () => {
    const { recall } = await startWorksheet(trainee);
    expect(recall.map(({ sheet }) => sheet.number.slice(0, 2))).toEqual(['1.', '1.', '1.']);
  });

  it('are others in the next attempt', async () => {
    const first = await startWorksheet(trainee, 'W2');
    await handInWorksheet(trainee, first.id);
    const second = await startWorksheet(trainee, 'W2');
    expect(new Set([...named(first), ...named(second)]).size).toBe(6);
  });

  it('keep their answers back until it is handed in, and carry no marks', async () => {
    const sheet = await startWorksheet(trainee, 'W2');
    expect(sheet.recall.map(({ answer }) => answer)).toEqual([null, null, null]);
    expect(JSON.stringify([sheet, await open(sheet.id)])).not.toMatch(/First|Second|Third/);
    const { body } = await handInWorksheet(trainee, sheet.id);
    const marked = body as WorksheetView;
    const answers: Record<string, string> = { 'One?': 'First.', 'Two?': 'Second.' };
    expect(marked.recall).toEqual(
      sheet.recall.map((one) => ({ ...one, answer: answers[one.ask] ?? 'Third.' })),
    );
    expect(marked.outOf).toBe(5);
  });

  it('are drawn with the secret and the attempt', async () => {
    const sheet = await startWorksheet(trainee, 'W2');
    const rank = (name: string) =>
      createHmac('sha256', Buffer.from('b2'.repeat(32), 'hex'))
        .update(`worksheet-recall:${sheet.id}|${name}|A`)
        .digest('hex');
    const pool = ['1.1', '1.2'].flatMap((number) =>
      ['One?', 'Two?', 'Three?'].map((ask) => `${number} ${ask}`),
    );
    const [lowest] = pool.sort((one, other) => (rank(one) < rank(other) ? -1 : 1));
    expect(named(sheet)[0]).toBe(lowest);
  });

  it('stay as they were asked when the lesson is issued anew', async () => {
    const sheet = await startWorksheet(trainee, 'W2');
    const revised = lessonSheet({ revision: 'B' }).replace(/(First|Second|Third)\./g, 'Changed.');
    await publishFiles(test, { ...twoUnits(), 'lessons/hq-dc2/runs/01-the-run.md': revised });
    const { body } = await handInWorksheet(trainee, sheet.id);
    expect(JSON.stringify((body as WorksheetView).recall)).not.toContain('Changed');
  });

  it('are missing from an attempt started before there were any', async () => {
    const sheet = await startWorksheet(trainee, 'W2');
    await test.query('UPDATE worksheet_attempts SET recall = DEFAULT WHERE id = $1', [sheet.id]);
    expect((await open(sheet.id)).recall).toEqual([]);
    expect((await handInWorksheet(trainee, sheet.id)).body.recall).toEqual([]);
  });
});
