import { describe, expect, it } from '@jest/globals';
import { join } from 'node:path';
import {
  goodFiles,
  inFolder,
  lessonSheet,
  LESSON_BODY,
  problemsOf,
} from '../../test/factories/content.ts';
import { compileContent } from './compile-content.ts';
import type { CompiledLesson } from './compiled-lesson.ts';
import { ProblemList } from './problem-list.ts';
import { readSources } from './read-sources.ts';

const LESSON = 'lessons/hq-dc2/runs/01-the-run.md';

const SUMS = `sums:
  given: { load: 14 A, run: 5.5 m, area: 4 mm² }
  steps:
    pair: { unit: mΩ, is: 2 * run * tableOhms(area), figures: 4 }
    fall: { unit: V, is: load * pair }
`;
/** The front matter of the fixture ends on this line of its file. */
const END = lessonSheet({ body: '' }).split('\n').length - 2;
const SUM_LINES = SUMS.split('\n').length - 1;
const BODY = END + SUM_LINES + 2;

const withSums = (body: string, sums = SUMS) => ({ [LESSON]: lessonSheet({ front: sums, body }) });

/** The compiled lesson 1.1 of a course that is in order but for it. */
async function compiledOf(sheet: string): Promise<CompiledLesson | undefined> {
  return inFolder({ ...goodFiles(), [LESSON]: sheet }, async (folder) => {
    const problems = new ProblemList();
    const folders = { lessons: join(folder, 'lessons'), assessments: join(folder, 'assessments') };
    const { revisions } = compileContent(await readSources(folders), problems);
    expect(problems.sorted()).toEqual([]);
    const found = revisions.find(({ kind, lesson }) => kind === 'lesson' && lesson === '1.1');
    return found?.compiled as CompiledLesson | undefined;
  });
}

const filled = `Fed by :sum[load], it loses :sum[fall], a :sum[fall]{bare} each time.

## Losing :sum[fall]

| Area | Drop |
| ---- | ---- |
| :sum[area] | :sum[fall] |

:::margin{title="About :sum[pair]{bare}"}
A pair of :sum[pair].
:::

::::figure{src="fig-1.svg" short="A run that loses :sum[fall]"}
It loses :sum[fall].

:::description
A line that loses :sum[fall].
:::
::::
`;

describe('sums in a lesson', () => {
  it('are filled in its text, blocks, titles, tables and front matter', async () => {
    const sheet = lessonSheet({ front: SUMS, body: filled })
      .replace('answer: Second.', 'answer: "It is :sum[fall]."')
      .replace('lead: A cable costs volts.', 'lead: A cable costs :sum[fall].');
    const lesson = await compiledOf(sheet);
    expect(lesson?.body).toContain('Fed by 14\u00a0A, it loses 0.762\u00a0V, a 0.762 each time.');
    expect(lesson?.body).toContain('| 4\u00a0mm² | 0.762\u00a0V |');
    expect(lesson?.body).toContain(':::margin{title="About 54.45"}\nA pair of 54.45\u00a0mΩ.');
    expect(lesson?.headings).toEqual([{ text: 'Losing 0.762\u00a0V', paragraph: 1 }]);
    expect(lesson?.figures['fig-1.svg']).toMatchObject({
      short: 'A run that loses 0.762\u00a0V',
      long: 'A line that loses 0.762\u00a0V.',
    });
    expect(lesson?.recall[1]?.answer).toBe('It is 0.762\u00a0V.');
    expect(lesson?.lead).toBe('A cable costs 0.762\u00a0V.');
    expect(JSON.stringify(lesson)).not.toMatch(/:sum|"sums"/);
  });

  it.each<[string, Record<string, string>, string]>([
    [
      'a name that is not there',
      withSums('One.\n\nIt is :sum[drop].'),
      `01-the-run.md:${BODY + 2}: :sum[drop] names no sum of this lesson: use one of load, run, area, pair, fall`,
    ],
    [
      'a sum in a lesson without any',
      { [LESSON]: lessonSheet({ body: 'It is :sum[drop].\n' }) },
      `01-the-run.md:${END + 2}: :sum[drop] names no sum of this lesson: add sums:`,
    ],
    [
      'a name that is not there, in a recall answer',
      { [LESSON]: lessonSheet().replace('answer: Second.', 'answer: "It is :sum[no]."') },
      `01-the-run.md:${END - 2}: :sum[no] names no sum of this lesson`,
    ],
    [
      'a sum that does not balance',
      withSums('It is :sum[fall].', SUMS.replace('load * pair', 'load * run')),
      `01-the-run.md:${END + SUM_LINES - 1}: sums.steps.fall: The sum does not come out in V`,
    ],
    [
      'a key that sums do not have',
      withSums('One.', `${SUMS}  extra: 1\n`),
      `01-the-run.md:${END + SUM_LINES}: sums.extra: there is no such key`,
    ],
    [
      'a sum in a formula',
      withSums('It is $:sum[fall]$.'),
      `01-the-run.md:${BODY}: a sum does not stand in a formula`,
    ],
    [
      'a way of printing we do not have',
      withSums('It is :sum[fall]{round}.'),
      `01-the-run.md:${BODY}: :sum[fall] knows only {bare}, not {round}`,
    ],
    [
      'a sum without its name',
      withSums('It is :sum{fall}.'),
      `01-the-run.md:${BODY}: a sum is written :sum[name]`,
    ],
  ])('are refused: %s', async (_what, files, problem) => {
    expect(await problemsOf(files)).toEqual([expect.stringContaining(problem)]);
  });
});

describe('objectives', () => {
  const can = (entry: string) => lessonSheet().replace('can: [size a run]', `can: [${entry}]`);

  it('keep the questions that ask for them', async () => {
    const lesson = await compiledOf(
      can('size a run, { does: judge a run, questions: [vd-feed, vd-lamp, recall 2] }'),
    );
    expect(lesson?.can).toEqual(['size a run', 'judge a run']);
    expect(lesson?.objectives).toEqual([
      { does: 'size a run', questions: [], recall: [] },
      { does: 'judge a run', questions: ['vd-feed', 'vd-lamp'], recall: [2] },
    ]);
  });

  it.each([
    ['a question that is not there', '[vd-none]', 'unknown question "vd-none"'],
    ['a paper question', '[vd-one]', 'question "vd-one" is of the paper pool'],
    ['a recall question that is not there', '[recall 4]', 'there is no recall question 4'],
    ['one question twice', '[recall 1, recall 1]', 'recall 1 is named twice'],
    ['what is no question', '[Recall]', 'front matter, can.0.questions.0: a question of the bank'],
  ])('refuse %s', async (_what, questions, problem) => {
    const files = { [LESSON]: can(`{ does: size a run, questions: ${questions} }`) };
    expect(await problemsOf(files)).toContainEqual(
      expect.stringMatching(new RegExp(`^01-the-run.md:16: .*${problem}`)),
    );
  });
});

describe('drawings to handle', () => {
  const drawing = (attributes: string) => ({
    [LESSON]: lessonSheet({ body: `${LESSON_BODY}\n::drawing{${attributes}}\n` }),
  });
  const AT = END + 2 + LESSON_BODY.split('\n').length;

  it('stand in the text as a block', async () => {
    expect(await problemsOf(drawing('kind="voltage-run" title="The run"'))).toEqual([]);
  });

  it.each([
    ['of a kind we do not have', 'kind="dial" title="x"', 'drawing "dial" is not one of'],
    ['without a title', 'kind="voltage-run"', 'block "drawing" needs title="…"'],
  ])('are refused %s', async (_what, attributes, problem) => {
    expect(await problemsOf(drawing(attributes))).toEqual([
      expect.stringContaining(`01-the-run.md:${AT}: ${problem}`),
    ]);
  });
});
