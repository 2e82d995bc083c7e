import { randomUUID } from 'node:crypto';
import type { TestApp } from '../test-app.ts';

export interface TestClass {
  readonly id: string;
  readonly joinCode: string;
}

/** A class of the course with its trainer, at a school of its own. */
export async function createClass(test: TestApp, trainerId: string): Promise<TestClass> {
  const joinCode = `HQ-${randomUUID().slice(0, 6).toUpperCase()}`;
  const rows = await test.query<{ id: string }>(
    `WITH school AS (
       INSERT INTO organisations (kind, name, address)
       VALUES ('school', 'Harrow Quay Technical School', 'The Old Ropewalk') RETURNING id),
     class AS (
       INSERT INTO classes (organisation_id, course_slug, name, join_code, starts_on, ends_on)
       SELECT id, 'hq-dc2', 'Autumn class', $1, '2026-09-14', '2026-12-18' FROM school RETURNING id),
     trainer AS (
       INSERT INTO class_trainers (class_id, account_id) SELECT id, $2 FROM class)
     SELECT id FROM class`,
    [joinCode, trainerId],
  );
  const [row] = rows;
  if (!row) throw new Error('the class was not made');
  return { id: row.id, joinCode };
}
