import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import pg from 'pg';
import { createAccount } from '../../test/factories/account.ts';
import { goodFiles, lessonSheet, publishFiles } from '../../test/factories/content.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';

const SECOND = 'lessons/hq-dc2/runs/02-the-pair.md';
const GLOSSARY = 'lessons/hq-dc2/glossary.md';

const glossary = (revision: string, words: string) =>
  `---\nrevision: ${revision}\nissued: 2026-09-14\nlanguage: en\nwords:\n${words}---\n`;

const WORDS = `  pair: { means: 'two conductors, out and back', also: [pairs], sheet: '1.2' }
  run: { means: the distance one way, also: [runs] }
  shunt: { means: a known small resistance }
  Ah: { means: 'a current times its hours', also: [amp-hour] }
`;

let test: TestApp;
let owner: pg.Client;
let trainee: Caller;
beforeAll(async () => {
  test = await createTestApp();
  owner = new pg.Client({ connectionString: test.database.ownerUrl });
  await owner.connect();
  await publishFiles(test, {
    ...goodFiles(),
    [GLOSSARY]: glossary('A', WORDS),
    [SECOND]: lessonSheet({
      number: '1.2',
      slug: 'the-pair',
      title: 'The pair',
      front: 'needs: ["1.1"]\n',
      body: 'Pairs lose twice; a shunted lamp none.\n\n::drawing{kind="charge-curve" title="x"}\n',
    }).replace('can: [size a run]', 'can: [{ does: pair, questions: [vd-lamp, recall 2] }]'),
  });
  trainee = await signIn(test.app, (await createAccount(test.app)).id);
});
afterAll(async () => {
  await owner.end();
  await test.close();
});

describe('the glossary', () => {
  it('has the words of the glossary and of all lessons, once each', async () => {
    const { status, body } = await trainee.call('GET', '/api/glossary');
    expect(status).toBe(200);
    expect(body).toMatchObject({ language: 'en', revision: 'A' });
    expect(body.terms).toEqual([
      {
        ...{ term: 'Ah', anchor: 'ah', means: 'a current times its hours' },
        ...{ also: ['amp-hour'], sheets: [] },
      },
      {
        ...{ term: 'pair', anchor: 'pair', means: 'two conductors, out and back' },
        ...{ also: ['pairs'], sheets: [{ number: '1.2', title: 'The pair' }] },
      },
      {
        ...{ term: 'run', anchor: 'run', means: 'the distance one way', also: ['runs'] },
        sheets: [
          { number: '1.1', title: 'The run' },
          { number: '1.2', title: 'The pair' },
        ],
      },
      {
        ...{ term: 'shunt', anchor: 'shunt', means: 'a known small resistance' },
        ...{ also: [], sheets: [] },
      },
    ]);
  });

  it('is for people who are signed in, as the tables are', async () => {
    for (const path of ['/api/glossary', '/api/tables']) {
      expect((await stranger(test.app).call('GET', path)).status).toBe(401);
    }
  });
});

describe('a lesson', () => {
  const lesson = (number: string) => trainee.call('GET', `/api/lessons/${number}`);

  it('comes with the terms it uses, in any of their forms, as whole words', async () => {
    const pair = { term: 'pair', means: 'two conductors, out and back', forms: ['pair', 'pairs'] };
    const run = { term: 'run', means: 'the distance one way', forms: ['run', 'runs'] };
    expect((await lesson('1.2')).body.terms).toEqual([pair, run]);
    expect((await lesson('1.1')).body.terms).toEqual([run]);
  });

  it('says what it needs and what asks for it, and has its drawings', async () => {
    const { body } = await lesson('1.2');
    expect(body).toMatchObject({
      needs: [{ number: '1.1', title: 'The run' }],
      can: ['pair'],
      objectives: [{ does: 'pair', questions: ['vd-lamp'], recall: [2] }],
      headings: [],
      drawings: { 'charge-curve': { kind: 'charge-curve', settings: { chargerA: 30 } } },
    });
    expect((await lesson('1.1')).body).toMatchObject({ drawings: {}, needs: [] });
  });

  it('opens as it was stored before any of this was kept', async () => {
    const run = "kind = 'lesson' AND slug = 'the-run'";
    await owner.query(`UPDATE content_revisions SET state = 'superseded' WHERE ${run}`);
    await owner.query(
      `INSERT INTO content_revisions
         (kind, slug, language, revision, source, hash, format_version, compiled, pool, subject, lesson)
       SELECT kind, slug, language, revision, source, hash, 1,
         compiled - '{objectives,needs,headings,drawings}'::text[], pool, subject, lesson
       FROM content_revisions WHERE ${run}`,
    );
    const { status, body } = await lesson('1.1');
    expect(status).toBe(200);
    expect(body).toMatchObject({
      objectives: [{ does: 'size a run', questions: [], recall: [] }],
      headings: [{ text: 'The run', paragraph: 2 }],
      ...{ needs: [], drawings: {} },
    });
  });

  it('is sent again when a term it uses has been explained anew', async () => {
    const first = await lesson('1.2');
    const etag = String(first.headers['etag']);
    const ask = () => trainee.call('GET', '/api/lessons/1.2', undefined, { 'if-none-match': etag });
    expect((await ask()).status).toBe(304);
    await owner.query("UPDATE content_revisions SET state = 'superseded' WHERE kind = 'glossary'");
    expect((await ask()).status).toBe(200);
  });
});

describe('the tables', () => {
  it('come as they are printed, with their sources and the symbols', async () => {
    const { status, body } = await trainee.call('GET', '/api/tables');
    expect(status).toBe(200);
    expect(body.tables[0]).toMatchObject({
      slug: 'conductors-metric',
      columns: [{ label: 'Area', unit: 'mm²' }, {}, {}, {}],
      sources: [{ provenance: 'from memory' }],
    });
    expect(body.symbols.list).toContainEqual(
      expect.objectContaining({ slug: 'fuse', letter: 'F' }),
    );
    expect(body.local).toContain('Your local code decides');
  });
});
