import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { randomUUID } from 'node:crypto';
import { createAccount } from '../../test/factories/account.ts';
import {
  goodFiles,
  lessonSheet,
  practiceSheet,
  publishFiles,
  type Files,
} from '../../test/factories/content.ts';
import { practise } from '../../test/factories/practice.ts';
import {
  answersTo,
  handInWorksheet,
  saveItem,
  startWorksheet,
  workWorksheet,
} from '../../test/factories/worksheet.ts';
import { signIn, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { WorksheetView } from '../worksheets/worksheets.schemas.ts';

const FEED = 'assessments/bank/drop/vd-feed.md';
const LESSON = 'lessons/hq-dc2/runs/01-the-run.md';
const files: Files = {
  ...goodFiles(),
  [FEED]: practiceSheet({ id: 'vd-feed' }).replace('\nprofile:', '\nread: The run\nprofile:'),
};

let test: TestApp;
let trainee: Caller;
let traineeId: string;
beforeAll(async () => {
  test = await createTestApp();
  await publishFiles(test, files);
  traineeId = (await createAccount(test.app)).id;
  trainee = await signIn(test.app, traineeId);
});
afterAll(() => test.close());

const opened = async (id: string) =>
  (await trainee.call('GET', `/api/worksheet-attempts/${id}`)).body as WorksheetView;
const readings = ({ items }: WorksheetView) =>
  items.map(({ marked }) => marked?.parts.map(({ read }) => read));

describe('after an answer that was not right', () => {
  const onTheRun = { sheet: '1.1', title: 'The run', heading: 'The run', paragraph: 2 };

  it('a worksheet names the step and the paragraph to read, as the sheet is now', async () => {
    const sheet = await workWorksheet(trainee, 'slip');
    const [feed, lamp] = readings(sheet);
    // Only (a) lost marks: its slip was carried on, and the choice is right.
    expect(feed).toEqual([{ ...onTheRun, issued: true }, null, null]);
    expect(lamp?.[0]).toEqual({
      ...{ sheet: '1.2', title: 'The pair', heading: null, paragraph: null, issued: true },
    });
    expect(sheet.items[0]?.marked?.parts[0]?.wrongStep).toMatchObject({ symbol: 'U_d' });
    await publishFiles(test, {
      ...files,
      [LESSON]: lessonSheet({ revision: 'B', body: 'One.\n\nTwo.\n\n## The run\n\nThree.\n' }),
    });
    expect(readings(await opened(sheet.id))[0]?.[0]).toMatchObject({ paragraph: 3 });
  });

  it('practice names them too', async () => {
    const { marked } = await practise(trainee, {
      question: 'vd-feed',
      answers: (question) => answersTo(question, 'slip'),
    });
    expect(marked.parts.map(({ read }) => read?.heading ?? null)).toEqual(['The run', null, null]);
  });
});

/** As it was kept before there were tables, rows of pairs, wrong steps and readings. */
const earlier = <T>(kept: T): T =>
  JSON.parse(
    JSON.stringify(kept, (key, value: unknown) =>
      ['tables', 'rows', 'wrongStep', 'read'].includes(key) ? undefined : value,
    ),
  ) as T;

interface Row {
  items: object;
  marked: object | null;
}

/** Puts an attempt of the earlier form in the place of another of one's own. */
async function keepEarlierFormOf(id: string, attempt: number): Promise<string> {
  const [row] = await test.query<Row>(
    'SELECT items, marked FROM worksheet_attempts WHERE id = $1',
    [id],
  );
  const copy = randomUUID();
  await test.query(
    `INSERT INTO worksheet_attempts (id, account_id, worksheet, course_revision_id, attempt, variant,
       items, answers, out_of, started_at, saved_at, handed_in_at, marks, marked, marker_version)
     SELECT $1, $5, worksheet, course_revision_id, $6, variant, $3::jsonb, answers, out_of,
       started_at, saved_at, handed_in_at, marks, $4::jsonb, marker_version
       FROM worksheet_attempts WHERE id = $2`,
    [
      ...[copy, id, JSON.stringify(earlier(row?.items))],
      ...[row?.marked ? JSON.stringify(earlier(row.marked)) : null, traineeId, attempt],
    ],
  );
  return copy;
}

describe('attempts kept in the earlier form', () => {
  it('open marked as they were, with what to read by sheet', async () => {
    const sheet = await workWorksheet(trainee, 'slip');
    const copy = await opened(await keepEarlierFormOf(sheet.id, 90));
    expect(copy.items[0]?.question).toMatchObject({ tables: [], parts: [{ rows: [] }, {}, {}] });
    const [a, b] = copy.items[0]?.marked?.parts ?? [];
    expect([a?.marks, a?.wrongStep, b?.read]).toEqual([1, null, null]);
    expect(a?.read).toMatchObject({ sheet: '1.1', heading: null, issued: true });
  });

  it('go on and are marked', async () => {
    const other = await createAccount(test.app);
    const begun = await startWorksheet(await signIn(test.app, other.id));
    const id = await keepEarlierFormOf(begun.id, 91);
    const { items } = await startWorksheet(trainee);
    for (const { key, question } of items) {
      expect((await saveItem(trainee, { id, key }, answersTo(question))).status).toBe(200);
    }
    const { status, body } = await handInWorksheet(trainee, id);
    expect([status, body.percent]).toEqual([200, 100]);
  });
});
