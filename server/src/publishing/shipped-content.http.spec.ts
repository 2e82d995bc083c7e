import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { keyAnswers } from '@ferrule/assessments';
import { fileURLToPath } from 'node:url';
import { createAccount } from '../../test/factories/account.ts';
import { saveItem, startWorksheet, handInWorksheet } from '../../test/factories/worksheet.ts';
import { signIn } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { CourseMap } from '../courses/courses.schemas.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import type { KeptItem } from '../worksheets/worksheet-attempt.ts';
import type { CompiledCourse } from './compiled-course.ts';
import type { CompiledLesson } from './compiled-lesson.ts';
import { publish } from './publish.ts';
import { PublishedContentService } from './published-content.service.ts';

const inCheckout = (folder: string) =>
  fileURLToPath(new URL(`../../../${folder}`, import.meta.url));
const folders = {
  lessons: inCheckout('lessons'),
  assessments: inCheckout('assessments'),
  withPaperPool: true,
};

/** The whole course is compiled: some seconds, and many more where a processor is short. */
const WHOLE_COURSE_MS = 240_000;
const SHEETS_OF_THE_COURSE = 36;
const LEAST_FIGURES = 45;

let test: TestApp;
let lessons: CompiledLesson[];
let course: CompiledCourse | undefined;
beforeAll(async () => {
  test = await createTestApp();
  await publish(test.database.ownerUrl, folders);
  const content = test.app.get(PublishedContentService, { strict: false });
  lessons = (await content.all('lesson')).map((lesson) => lesson.content);
  course = (await content.all('course'))[0]?.content;
}, WHOLE_COURSE_MS);
afterAll(() => test.close());

describe('the lessons and questions that come with the product', () => {
  it(
    'are in order, and publishing them again changes nothing',
    async () => {
      expect((await publish(test.database.ownerUrl, folders)).published).toEqual([]);
    },
    WHOLE_COURSE_MS,
  );

  it('are the whole course: every sheet under its unit, drawn throughout', () => {
    const numbers = lessons.map(({ number }) => number).sort();
    expect(numbers).toHaveLength(SHEETS_OF_THE_COURSE);
    expect(course?.units.flatMap(({ sheets }) => sheets).sort()).toEqual(numbers);
    const figures = lessons.flatMap((lesson) => Object.keys(lesson.figures));
    expect(figures.length).toBeGreaterThanOrEqual(LEAST_FIGURES);
  });

  it('give each unit with sheets a worksheet of four to six questions, and no other', () => {
    const counts = course?.units.map(({ number, sheets, worksheet }) => ({
      ...{ number, isIssued: sheets.length > 0 },
      fits:
        worksheet !== null && worksheet.questions.length >= 4 && worksheet.questions.length <= 6,
    }));
    expect(counts).toEqual(counts?.map((unit) => ({ ...unit, fits: unit.isIssued })));
    expect(counts?.length).toBe(7);
  });

  it('give each sheet a drawing, a worked example, a question to try and its cautions', () => {
    for (const lesson of lessons) {
      const holds = {
        drawing: Object.keys(lesson.figures).length > 0,
        worked: Object.keys(lesson.worked).length > 0,
        tries: lesson.tries.length > 0,
        cautions: lesson.cautions.length > 0 && lesson.body.includes(':::hazard'),
        localCode: lesson.body.includes(':::local'),
      };
      expect({ number: lesson.number, ...holds }).toEqual({
        number: lesson.number,
        ...{ drawing: true, worked: true, tries: true, cautions: true, localCode: true },
      });
    }
  });

  it('draw each figure for a narrow screen as well', () => {
    const wideOnly = lessons.flatMap(({ number, figures }) =>
      Object.entries(figures)
        .filter(([, { narrow }]) => narrow === null)
        .map(([name]) => `${number} ${name}`),
    );
    expect(wideOnly).toEqual([]);
  });

  it('light every lamp of the map when each worksheet is answered right', async () => {
    const trainee = await signIn(test.app, (await createAccount(test.app)).id);
    const numbers = course?.units.flatMap(({ worksheet }) => worksheet?.number ?? []) ?? [];
    expect(numbers.length).toBeGreaterThan(0);
    for (const number of numbers) {
      const { id } = await startWorksheet(trainee, number);
      const [row] = await test.query<{ items: KeptItem[] }>(
        'SELECT items FROM worksheet_attempts WHERE id = $1',
        [id],
      );
      for (const { key, revisionId, drawn } of row?.items ?? []) {
        const { question } = await test.app
          .get(QuestionsService, { strict: false })
          .byRevision(revisionId);
        await saveItem(trainee, { id, key }, keyAnswers(question, drawn, []));
      }
      const { status, body } = await handInWorksheet(trainee, id);
      expect({ number, status, percent: body.percent }).toEqual({
        ...{ number, status: 200, percent: 100 },
      });
    }
    const map = (await trainee.call('GET', '/api/course')).body as CourseMap;
    const lamps = map.units.flatMap(({ worksheet }) => worksheet?.lit ?? []);
    expect(lamps).toEqual(numbers.map(() => true));
  });
});
