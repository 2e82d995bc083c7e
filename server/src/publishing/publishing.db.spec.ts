import { afterAll, beforeAll, beforeEach, describe, expect, it } from '@jest/globals';
import { createHash } from 'node:crypto';
import pg from 'pg';
import {
  courseSheet,
  DRAWING,
  goodFiles,
  LESSON_BODY,
  lessonSheet,
  practiceSheet,
  problemsOf,
  publishFiles,
  type Files,
} from '../../test/factories/content.ts';
import { blueprintSheet } from '../../test/factories/paper.ts';
import { createTestDatabase, type TestDatabase } from '../../test/test-database.ts';
import type { CompiledLesson } from './compiled-lesson.ts';
import { publish } from './publish.ts';
import { summariseNotes } from './summarise.ts';

const LESSON = 'lessons/hq-dc2/runs/01-the-run.md';
const COURSE = 'lessons/hq-dc2/course.md';
const FEED = 'assessments/bank/drop/vd-feed.md';
const PAPER = 'assessments/papers/try-paper.md';
const SVG = 'lessons/hq-dc2/runs/fig-1.svg';

function fail(reason: string): never {
  throw new Error(reason);
}

const bodyOf = (text: string) => ({ [LESSON]: lessonSheet({ body: `${text}\n` }) });
const withoutFigure = (body: string) => body.replace(/::::figure[^]*?\n::::\n/, '');
/** The body of the fixture begins on this line of its file. */
const BODY_LINE = lessonSheet({ body: '' }).split('\n').length;

describe('a course that is in order', () => {
  it('has no problems', async () => {
    expect(await problemsOf({})).toEqual([]);
  });

  it('may send readers to a heading, and to a sheet that is not issued yet', async () => {
    const reading = (heading: string, lesson: string) =>
      practiceSheet({ id: 'vd-feed', lesson }).replace(
        '\nprofile:',
        `\nread: ${heading}\nprofile:`,
      );
    expect(await problemsOf({ [FEED]: reading('The run', '1.1') })).toEqual([]);
    expect(await problemsOf({ [FEED]: reading('Anything', '1.9') })).toEqual([]);
  });
});

describe('what is refused', () => {
  const figure = (inside: string, attributes = 'src="fig-1.svg" short="A run"') =>
    bodyOf(`First.\n\n::::figure{${attributes}}\n${inside}\n::::`);
  const description = ':::description\nA line.\n:::';

  it.each<[string, Files, string]>([
    [
      'a figure without a description',
      figure('The run.'),
      `01-the-run.md:${BODY_LINE + 2}: missing description`,
    ],
    [
      'a figure file that is not there',
      figure(`The run.\n\n${description}`, 'src="fig-9.svg" short="A run"'),
      `01-the-run.md:${BODY_LINE + 2}: missing figure file fig-9.svg`,
    ],
    [
      'a broken link',
      bodyOf('One.\n\nSee [there](/sheets/9.9).'),
      `01-the-run.md:${BODY_LINE + 2}: broken link "/sheets/9.9"`,
    ],
    [
      'a link that runs a script',
      bodyOf('See [there](javascript:alert(1)).'),
      `01-the-run.md:${BODY_LINE}: broken link "javascript:alert(1)"`,
    ],
    [
      'a link to a data address by reference',
      bodyOf('See [there][x].\n\n[x]: data:text/html,hello'),
      `01-the-run.md:${BODY_LINE + 2}: broken link "data:text/html,hello"`,
    ],
    [
      'a heading that skips a level',
      bodyOf('## One\n\n#### Two'),
      `01-the-run.md:${BODY_LINE + 2}: heading order: #### skips a level; use ###`,
    ],
    ['a heading of the first level', bodyOf('# One'), `01-the-run.md:${BODY_LINE}: heading order`],
    ['raw HTML', bodyOf('One <b>bold</b> word.'), `01-the-run.md:${BODY_LINE}: raw HTML`],
    ['an HTML comment', bodyOf('<!-- note -->'), `01-the-run.md:${BODY_LINE}: raw HTML`],
    [
      'a picture outside a figure',
      bodyOf('![run](fig-1.svg)'),
      `01-the-run.md:${BODY_LINE}: pictures stand in a figure block`,
    ],
    [
      'an unknown question',
      bodyOf('::try{question="vd-nothing"}'),
      `01-the-run.md:${BODY_LINE}: unknown question "vd-nothing"`,
    ],
    [
      'a paper question in a try block',
      bodyOf('::try{question="vd-one"}'),
      `01-the-run.md:${BODY_LINE}: question "vd-one" is of the paper pool`,
    ],
    [
      'a paper question in a worked block',
      bodyOf('::worked{question="vd-one" seed="1"}'),
      `01-the-run.md:${BODY_LINE}: question "vd-one" is of the paper pool`,
    ],
    [
      'an unknown block',
      bodyOf(':::shout\nHey\n:::'),
      `01-the-run.md:${BODY_LINE}: there is no block "shout"`,
    ],
    [
      'a hazard of an unknown level',
      bodyOf(':::hazard{level="mild" title="Hot"}\nHot.\n:::'),
      `01-the-run.md:${BODY_LINE}: level "mild" is not one of`,
    ],
    [
      'a formula that cannot be read',
      bodyOf('One.\n\nHere $\\frac{1}$ it is.'),
      `01-the-run.md:${BODY_LINE + 2}: formula cannot be read`,
    ],
    [
      'a formula that reaches outside',
      bodyOf('$\\href{javascript:alert(1)}{x}$'),
      `01-the-run.md:${BODY_LINE}: formula cannot be read`,
    ],
    [
      'too few recall questions',
      { [LESSON]: lessonSheet().replace('  - { ask: Three?, answer: Third. }\n', '') },
      '01-the-run.md:19: front matter, recall: too few recall questions: at least 3',
    ],
    [
      'raw HTML in a recall question',
      { [LESSON]: lessonSheet().replace('answer: Second.', 'answer: <b>Second</b>.') },
      '01-the-run.md:21: raw HTML',
    ],
    [
      'a formula in a description',
      figure(`The run.\n\n:::description\nIt is $L$ long.\n:::`),
      `01-the-run.md:${BODY_LINE + 6}: write a description in words`,
    ],
    [
      'a front matter key that is not known',
      { [LESSON]: lessonSheet({ front: 'colour: red\n' }) },
      '01-the-run.md:23: front matter: there is no key "colour"',
    ],
    [
      'front matter of the wrong kind',
      { [LESSON]: lessonSheet().replace('minutes: 12', 'minutes: soon') },
      '01-the-run.md:14: front matter, minutes',
    ],
    [
      'front matter that is no YAML',
      { [LESSON]: lessonSheet().replace('title: The run', 'title: [The') },
      '01-the-run.md:5: front matter',
    ],
    ['no front matter', { [LESSON]: 'Text.\n' }, '01-the-run.md:1: front matter is missing'],
    [
      'a lesson of a unit that does not list it',
      { [LESSON]: lessonSheet().replace('unit: 1', 'unit: 2') },
      '01-the-run.md:8: unit 2 does not agree with',
    ],
    [
      'a sheet the course lists but that is not there',
      { [COURSE]: courseSheet().replace('"1.2"]', '"1.7"]') },
      'course.md:12: there is no lesson 1.7',
    ],
    [
      'a paper question on a worksheet',
      { [COURSE]: courseSheet().replace('vd-lamp', 'vd-two') },
      'course.md:13: question "vd-two" is of the paper pool',
    ],
    [
      'raw HTML in the course sheet',
      { [COURSE]: courseSheet({ body: '<i>Hm</i>' }) },
      'course.md:20: raw HTML',
    ],
    [
      'a question sheet that is not sound',
      { [FEED]: practiceSheet({ id: 'vd-feed' }).replace('subject: VD', 'subject: XX') },
      'vd-feed.md:5: ',
    ],
    [
      'a question that sends its reader to a heading that is not there',
      {
        [FEED]: practiceSheet({ id: 'vd-feed' }).replace('\nprofile:', '\nread: Joints\nprofile:'),
      },
      'vd-feed.md:9: read: sheet 1.1 has no heading "Joints": write The run',
    ],
    [
      'a part that does, in a sheet without headings',
      {
        [FEED]: practiceSheet({ id: 'vd-feed', lesson: '1.2' }).replace(
          '    carry: never',
          '    read: Joints\n    carry: never',
        ),
      },
      'vd-feed.md:33: read: sheet 1.2 has no heading "Joints": it has no headings',
    ],
    [
      'a paper that asks more than the pool holds',
      { [PAPER]: blueprintSheet().replace('RD, count: 1', 'RD, count: 5') },
      'try-paper.md:1: Paper cannot be assembled (RD: 5 wanted, 1 in the pool)',
    ],
  ])('%s', async (_what, changed, problem) => {
    expect(await problemsOf(changed)).toContainEqual(expect.stringContaining(problem));
  });

  it.each<[string, string, string]>([
    ['a script', '<script>alert(1)</script>', 'element <script> is not allowed'],
    ['a picture', '<image href="a.png"/>', 'element <image> is not allowed'],
    ['a foreign object', '<foreignObject><b>x</b></foreignObject>', 'element <foreignObject>'],
    ['a style', '<style>a{}</style>', 'element <style> is not allowed'],
    ['a link', '<a href="x"><path d="M0 0"/></a>', 'element <a> is not allowed'],
    ['an event', '<path d="M0 0" onclick="x()"/>', 'attribute onClick is not allowed on <path>'],
    ['a colour of its own', '<path d="M0 0" fill="red"/>', 'attribute fill is not allowed'],
    ['a style attribute', '<path d="M0 0" style="x:y"/>', 'attribute style is not allowed'],
    ['a class we do not have', '<path class="glow" d="M0 0"/>', 'class "glow" is not one of'],
    [
      'a reference outside',
      '<path d="M0 0" marker-end="url(http://a/#b)"/>',
      'attribute markerEnd on <path> points outside the drawing',
    ],
  ])('a drawing with %s', async (_what, element, problem) => {
    const drawing = DRAWING.replace('</svg>', `${element}\n</svg>`);
    expect(await problemsOf({ [SVG]: drawing })).toContainEqual(
      expect.stringContaining(`fig-1.svg:5: ${problem}`),
    );
  });

  it('a drawing without a viewBox, or with something beside it', async () => {
    const bare = DRAWING.replace(' viewBox="0 0 720 100"', '');
    expect(await problemsOf({ [SVG]: bare })).toContainEqual(
      'fig-1.svg:1: the <svg> needs a viewBox of four numbers',
    );
    expect(await problemsOf({ [SVG]: `${DRAWING}<p>x</p>` })).toContainEqual(
      'fig-1.svg:1: the file must hold one <svg> and nothing beside it',
    );
  });

  it('does not blame others for a sheet that cannot be read', async () => {
    const question = practiceSheet({ id: 'vd-feed' }).replace('subject: VD', 'subject: XX');
    const lesson = lessonSheet().replace('minutes: 12', 'minutes: soon');
    const problems = await problemsOf({ [FEED]: question, [LESSON]: lesson });
    expect(problems.map((line) => line.split(':')[0])).toEqual(['vd-feed.md', '01-the-run.md']);
  });

  it('names everything that is wrong at once', async () => {
    const problems = await problemsOf({ ...bodyOf('# One\n\n<b>x</b>'), [SVG]: '<p>x</p>' });
    expect(problems.length).toBeGreaterThanOrEqual(2);
  });
});

describe('publishing', () => {
  let database: TestDatabase;
  let client: pg.Client;
  beforeAll(async () => {
    database = await createTestDatabase();
    client = new pg.Client({ connectionString: database.ownerUrl });
    await client.connect();
  });
  afterAll(async () => {
    await client.end();
    await database.drop();
  });

  const stored = async () => {
    const { rows } = await client.query<{ name: string }>(
      `SELECT kind || ' ' || slug || ' ' || revision || ' ' || state AS name
         FROM content_revisions ORDER BY kind, slug, revision`,
    );
    return rows.map(({ name }) => name);
  };
  const publishChanged = (changed: Files) =>
    publishFiles({ database }, { ...goodFiles(), ...changed });

  beforeEach(async () => {
    await publishChanged({});
  });

  it('stores each thing once with its source, hash and compiled form', async () => {
    const report = await publishChanged({});
    expect(report).toMatchObject({ published: [], unchanged: 9, leftOut: 0 });
    expect(summariseNotes(report.notes)).toBe(
      ' Noted: objectives short of questions: 2; reading times that differ: 2.',
    );
    const { rows } = await client.query<{
      source: string;
      hash: Buffer;
      compiled: { title: string };
      pool: string;
      subject: string;
      lesson: string;
    }>("SELECT * FROM content_revisions WHERE slug = 'vd-feed'");
    const source = practiceSheet({ id: 'vd-feed' });
    expect(rows[0]).toMatchObject({ source, pool: 'practice', subject: 'VD', lesson: '1.1' });
    expect(rows[0]?.hash).toEqual(createHash('sha256').update(source).digest());
  });

  it('compiles a lesson so that nothing is left to look up', async () => {
    const { rows } = await client.query<{ compiled: CompiledLesson }>(
      "SELECT compiled FROM content_revisions WHERE kind = 'lesson' AND slug = 'the-run'",
    );
    const [{ compiled } = fail('the lesson is not stored')] = rows;
    expect(compiled.paragraphs).toBe(2);
    expect(compiled.headings).toEqual([{ text: 'The run', paragraph: 2 }]);
    expect(Object.keys(compiled.formulas)).toEqual(
      expect.arrayContaining(['L', 'R = \\rho \\cdot L']),
    );
    expect(JSON.stringify(compiled.formulas)).not.toContain('annotation');
    expect(compiled.figures['fig-1.svg']).toMatchObject({
      short: 'A run of cable',
      long: 'A line, **5.5 m** long.',
      narrow: null,
    });
    const drawing = JSON.stringify(compiled.figures);
    expect(drawing).toContain('url(#s1-1-fig-1-tip)');
    expect(drawing).toContain('"id":"s1-1-fig-1-tip"');
    expect(compiled.worked['vd-feed#1']?.parts).toHaveLength(3);
    expect(compiled.tries).toEqual(['vd-feed']);
  });

  it('refuses changed text under the same letter, and takes it under the next', async () => {
    const changed = lessonSheet({ title: 'The long run' });
    await expect(publishChanged({ [LESSON]: changed })).rejects.toThrow(
      /01-the-run\.md:1: lesson "the-run" was changed but is still revision A, .* give it the next revision letter/,
    );
    const next = lessonSheet({ title: 'The long run', revision: 'B' });
    const report = await publishChanged({ [LESSON]: next });
    expect(report.published).toEqual(['lesson 1.1 the-run, revision B']);
    expect(await stored()).toEqual(
      expect.arrayContaining(['lesson the-run A superseded', 'lesson the-run B current']),
    );
    await expect(publishChanged({})).rejects.toThrow(/revision A of lesson .* superseded/);
    await client.query(
      "UPDATE content_revisions SET state = 'superseded' WHERE slug = 'the-run' AND revision = 'B'",
    );
    await client.query(
      "UPDATE content_revisions SET state = 'current' WHERE slug = 'the-run' AND revision = 'A'",
    );
  });

  it('counts a changed drawing as a change of its lesson', async () => {
    const drawing = DRAWING.replace('5.5 m', '6.5 m');
    await expect(publishChanged({ [SVG]: drawing })).rejects.toThrow(/01-the-run\.md:1: .*changed/);
  });

  it('asks for a new letter when a question worked in a lesson has one', async () => {
    const question = practiceSheet({ id: 'vd-feed', revision: 'B' });
    await expect(publishChanged({ [FEED]: question })).rejects.toThrow(
      /01-the-run\.md:1: .*changed but is still revision A/,
    );
  });

  it('stores nothing when anything is wrong', async () => {
    const before = await stored();
    const files = {
      [LESSON]: lessonSheet({ revision: 'C', body: withoutFigure(LESSON_BODY) }),
      [COURSE]: courseSheet().replace('title: Runs', 'title: Long runs'),
    };
    await expect(publishChanged(files)).rejects.toThrow(/course\.md:1: course .*changed/);
    expect(await stored()).toEqual(before);
  });

  it('keeps a scheme as it was first published', async () => {
    const changed = blueprintSheet({ revision: 'B' }).replace('valid years: 3', 'valid years: 4');
    await expect(publishChanged({ [PAPER]: changed })).rejects.toThrow(
      /try-paper\.md:1: scheme "dc-installer" was changed but is still revision A/,
    );
    const { rows } = await client.query('SELECT slug, revision, valid_years FROM schemes');
    expect(rows).toEqual([{ slug: 'dc-installer', revision: 'A', valid_years: 3 }]);
  });

  it('says which folder is not there', async () => {
    const folders = { lessons: '/nonexistent/lessons', assessments: '/nonexistent' };
    await expect(publish(database.ownerUrl, { ...folders, withPaperPool: true })).rejects.toThrow(
      '/nonexistent/lessons:1: there is no such folder',
    );
  });

  it('comes to one result when two run at once', async () => {
    const other = await createTestDatabase();
    try {
      const reports = await Promise.all(
        [1, 2].map(() => publishFiles({ database: other }, goodFiles())),
      );
      const counts = reports.map(({ published }) => published.length).sort((a, b) => a - b);
      expect(counts).toEqual([0, 10]);
    } finally {
      await other.drop();
    }
  });
});
