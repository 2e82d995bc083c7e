import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import pg from 'pg';
import { createAccount } from '../../test/factories/account.ts';
import { goodFiles, publishFiles } from '../../test/factories/content.ts';
import {
  answerAll,
  createCandidate,
  handIn,
  markWaiting,
  save,
  startPaper,
} from '../../test/factories/sitting.ts';
import { answersTo, typed, workWorksheet } from '../../test/factories/worksheet.ts';
import { signIn, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import type { PracticeView } from '../practice/practice.schemas.ts';
import type { Difference } from './remark.ts';
import { type Progress, RemarkingService } from './remarking.service.ts';

let test: TestApp;
let owner: pg.Client;
let ids: { worksheet: string; practice: string; sitting: string };

/** Part (a) is left to do only where the question is asked whole. */
async function practise(caller: Caller, left?: number): Promise<string> {
  const started = await caller.call('POST', '/api/practice', { question: 'vd-feed', left });
  const { id, question, asked } = started.body as PracticeView;
  const { a, ...later } = answersTo(question);
  const answers = { ...(asked.includes('a') && { a }), ...later, b: typed('0.5', 'V') };
  const reply = await caller.call('POST', `/api/practice/${id}/answers`, { answers });
  if (reply.status !== 200) throw new Error(JSON.stringify(reply.body));
  return id;
}

/** A paper with a change of mind: of two answers to a part only the last one counts. */
async function sit(): Promise<string> {
  const candidate = await createCandidate(test);
  const sitting = await startPaper(candidate);
  await answerAll(candidate.caller, sitting);
  const [item] = sitting.items;
  if (!item) throw new Error('the paper has no questions');
  const place = { sitting, item, part: 'a' };
  await save(candidate.caller, place, { answer: typed('77', 'V'), sequence: 99 });
  await handIn(candidate.caller, sitting);
  await markWaiting(test);
  return sitting.id;
}

beforeAll(async () => {
  test = await createTestApp();
  owner = new pg.Client({ connectionString: test.database.ownerUrl });
  await owner.connect();
  await publishFiles(test, goodFiles());
  const trainee = await signIn(test.app, (await createAccount(test.app)).id);
  await workWorksheet(trainee, 'right');
  const { id: worksheet } = await workWorksheet(trainee, 'slip');
  await practise(trainee, 2);
  ids = { worksheet, practice: await practise(trainee), sitting: await sit() };
});
afterAll(async () => {
  await owner?.end();
  await test?.close();
});

async function remark() {
  const differences: Difference[] = [];
  const progress: Progress[] = [];
  const attempts = await test.app.get(RemarkingService, { strict: false }).remarkAll({
    onDifference: (difference) => differences.push(difference),
    onProgress: (step) => progress.push(step),
  });
  return { attempts, differences, progress };
}

/** The owner can do what the server cannot: change what was kept for good. */
async function tamper(table: string, change: string, bind: unknown[]): Promise<void> {
  await owner.query(`ALTER TABLE ${table} DISABLE TRIGGER USER`);
  await owner.query(`UPDATE ${table} SET ${change}`, bind);
  await owner.query(`ALTER TABLE ${table} ENABLE TRIGGER USER`);
}

/** Changes a table, looks, and puts it back as it was. */
async function remarkAfter(table: string, change: string, bind: unknown[]) {
  await owner.query(`CREATE TABLE kept AS TABLE ${table}`);
  await tamper(table, change, bind);
  try {
    return await remark();
  } finally {
    const { rows } = await owner.query<{ name: string }>(
      `SELECT column_name AS name FROM information_schema.columns
        WHERE table_name = $1 AND column_name <> ALL ('{id,sitting_id}')`,
      [table],
    );
    const key = table === 'sitting_results' ? 'sitting_id' : 'id';
    const back = rows.map(({ name }) => `${name} = kept.${name}`).join(', ');
    await tamper(table, `${back} FROM kept WHERE kept.${key} = ${table}.${key}`, []);
    await owner.query('DROP TABLE kept');
  }
}

describe('marking every attempt again', () => {
  it('finds what was stored, whatever its kind, and says how far it is', async () => {
    const { attempts, differences, progress } = await remark();
    expect(differences).toEqual([]);
    expect(attempts).toBe(5);
    expect(progress).toEqual([
      { kind: 'worksheet', done: 2, outOf: 2 },
      { kind: 'practice', done: 2, outOf: 2 },
      { kind: 'sitting', done: 1, outOf: 1 },
    ]);
  });

  it('reports a verdict of a worksheet that was changed', async () => {
    const { differences } = await remarkAfter(
      'worksheet_attempts',
      `marked = (SELECT jsonb_object_agg(key, jsonb_set(value, '{parts,0,verdict}', '"right"'))
                   FROM jsonb_each(marked)) WHERE id = $1`,
      [ids.worksheet],
    );
    expect(differences).toHaveLength(2);
    expect(differences).toContainEqual({
      ...{ kind: 'worksheet', id: ids.worksheet, question: 'vd-feed' },
      ...{ what: 'verdict of (a)', stored: 'right', again: 'slip' },
    });
  });

  it('reports an answer that was changed, and a total', async () => {
    const answer = JSON.stringify(typed('0', 'V'));
    const { differences } = await remarkAfter(
      'practice_attempts',
      `answers = jsonb_set(answers, '{a}', $2) WHERE id = $1`,
      [ids.practice, answer],
    );
    expect(differences.map(({ kind, what }) => [kind, what])).toEqual([
      ['practice', 'verdict of (a)'],
      ['practice', 'marks of (a)'],
      ['practice', 'marks'],
    ]);
    const later = await remarkAfter('worksheet_attempts', 'marks = marks - 1 WHERE id = $1', [
      ids.worksheet,
    ]);
    expect(later.differences).toMatchObject([
      { id: ids.worksheet, question: null, what: 'total marks' },
    ]);
  });

  it('reports a result that says the paper was failed', async () => {
    const { differences } = await remarkAfter(
      'sitting_results',
      'marks = 1, passed = NOT passed WHERE sitting_id = $1',
      [ids.sitting],
    );
    expect(differences).toMatchObject([
      { kind: 'sitting', id: ids.sitting, question: null, what: 'total marks', stored: '1' },
      { kind: 'sitting', id: ids.sitting, question: null, what: 'passed' },
    ]);
  });

  it('reports a question that can be marked no more, with the reason', async () => {
    const { differences } = await remarkAfter(
      'practice_attempts',
      `drawn = jsonb_set(drawn, '{drawn,revision}', '"Z"') WHERE id = $1`,
      [ids.practice],
    );
    expect(differences).toMatchObject([{ what: 'marking', stored: expect.stringMatching(/of 5/) }]);
    expect(differences[0]?.again).toContain('revision Z');
  });

  it('marks what was stored before questions had tables and pointers to a paragraph', async () => {
    const { attempts, differences } = await remarkAfter(
      'content_revisions',
      `compiled = compiled - '{tables,read}'::text[] || jsonb_build_object(
         'steps', (SELECT jsonb_agg(step - 'says') FROM jsonb_array_elements(compiled->'steps') step),
         'parts', (SELECT jsonb_agg(part - 'read') FROM jsonb_array_elements(compiled->'parts') part))
       WHERE kind = 'question'`,
      [],
    );
    expect([attempts, differences]).toEqual([5, []]);
  });
});

describe('the nightly job', () => {
  const run = async () => {
    const jobs = test.app.get(JobsService);
    await jobs.enqueue('remark-attempts', {});
    await jobs.runWaiting(['remark-attempts']);
    return test.query<{ detail: object }>(
      `SELECT detail FROM security_events WHERE kind = 'marking-differs'`,
    );
  };

  it('is due every night', async () => {
    const { rows } = await owner.query('SELECT name, cron FROM jobs.schedule');
    expect(rows).toEqual([{ name: 'remark-attempts', cron: '40 2 * * *' }]);
  });

  it('records an event where something differs, and none otherwise', async () => {
    expect(await run()).toEqual([]);
    await tamper('worksheet_attempts', 'marks = marks - 1 WHERE id = $1', [ids.worksheet]);
    const detail = { attempts: 5, differences: 1, firstKind: 'worksheet', firstId: ids.worksheet };
    expect(await run()).toEqual([{ detail }]);
  });
});
