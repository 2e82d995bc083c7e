import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { fileURLToPath } from 'node:url';
import pg from 'pg';
import { createTestDatabase, type TestDatabase } from '../../test/test-database.ts';
import type { CompiledCourse } from './compiled-course.ts';
import type { CompiledLesson } from './compiled-lesson.ts';
import { publish } from './publish.ts';

const inCheckout = (folder: string) =>
  fileURLToPath(new URL(`../../../${folder}`, import.meta.url));
const folders = { lessons: inCheckout('lessons'), assessments: inCheckout('assessments') };

let database: TestDatabase;
let lessons: CompiledLesson[];
let course: CompiledCourse | undefined;
beforeAll(async () => {
  database = await createTestDatabase();
  await publish(database.ownerUrl, folders);
  const client = new pg.Client({ connectionString: database.ownerUrl });
  await client.connect();
  const read = async <T>(kind: string) =>
    (
      await client.query<{ compiled: T }>(
        "SELECT compiled FROM content_revisions WHERE kind = $1 AND state = 'current'",
        [kind],
      )
    ).rows.map(({ compiled }) => compiled);
  lessons = await read<CompiledLesson>('lesson');
  [course] = await read<CompiledCourse>('course');
  await client.end();
});
afterAll(() => database.drop());

describe('the lessons and questions that come with the product', () => {
  it('are in order, and publishing them again changes nothing', async () => {
    expect((await publish(database.ownerUrl, folders)).published).toEqual([]);
  });

  it('cover the five sheets of the course', () => {
    const numbers = lessons.map(({ number }) => number).sort();
    expect(numbers).toEqual(['1.4', '3.4', '4.1', '5.6', '6.7']);
    expect(course?.units.flatMap(({ sheets }) => sheets).sort()).toEqual(numbers);
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
});
