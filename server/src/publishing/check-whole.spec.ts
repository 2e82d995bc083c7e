import { describe, expect, it } from '@jest/globals';
import { join } from 'node:path';
import {
  courseSheet,
  goodFiles,
  inFolder,
  lessonSheet,
  practiceSheet,
  type Files,
} from '../../test/factories/content.ts';
import { compileContent } from './compile-content.ts';
import { measureReading } from './measure-reading.ts';
import { ProblemList, type ContentProblem } from './problem-list.ts';
import { readSources } from './read-sources.ts';

const COURSE = 'lessons/hq-dc2/course.md';
const FIRST = 'lessons/hq-dc2/runs/01-the-run.md';
const SECOND = 'lessons/hq-dc2/runs/02-the-pair.md';
const GLOSSARY = 'lessons/hq-dc2/glossary.md';
const FEED = 'assessments/bank/drop/vd-feed.md';

const say = ({ path, line, message }: ContentProblem) =>
  `${path.split('/').at(-1) ?? ''}:${line}: ${message}`;

/** What is refused and what is noted of a course that is in order but for the given files. */
async function judge(changed: Files): Promise<{ refused: string[]; noted: string[] }> {
  return inFolder({ ...goodFiles(), ...changed }, async (folder) => {
    const problems = new ProblemList();
    const folders = { lessons: join(folder, 'lessons'), assessments: join(folder, 'assessments') };
    compileContent(await readSources(folders), problems);
    return { refused: problems.sorted().map(say), noted: problems.notes().map(say) };
  });
}

const second = { number: '1.2', slug: 'the-pair', title: 'The pair' };
const planned = (sheets: number) => ({
  [COURSE]: courseSheet().replace('\nunits:', `\nplanned: ${sheets}\nunits:`),
});
const glossary = (words: string) => ({
  [GLOSSARY]: `---\nrevision: A\nissued: 2026-09-14\nlanguage: en\nwords:\n${words}---\n`,
});

describe('a course as a whole', () => {
  it('may lack what is still being written, which is noted', async () => {
    const { refused, noted } = await judge({
      ...planned(3),
      [FEED]: practiceSheet({ id: 'vd-feed', lesson: '1.9' }),
      [SECOND]: lessonSheet({ ...second, front: 'needs: ["1.9"]\n', body: 'Two cores.\n' }),
    });
    expect(refused).toEqual([]);
    expect(noted).toEqual(
      expect.arrayContaining([
        'vd-feed.md:1: question "vd-feed": there is no sheet 1.9',
        '02-the-pair.md:23: needs sheet 1.9, which the course does not list',
        '01-the-run.md:16: objective "size a run" has no questions: name at least 3 that ask for it',
      ]),
    );
  });

  it('may lack nothing once every planned sheet is listed', async () => {
    const { refused } = await judge({
      ...planned(2),
      ...glossary("  amp: { means: a rate, sheet: '1.9' }\n"),
      [FEED]: practiceSheet({ id: 'vd-feed', lesson: '1.9' }),
      [SECOND]: lessonSheet({ ...second, body: 'Two cores.\n' }).replace(
        'can: [size a run]',
        'can: [{ does: size a run, questions: [vd-lamp, recall 1, recall 2] }]',
      ),
    });
    expect(refused).toEqual([
      'vd-feed.md:1: question "vd-feed": there is no sheet 1.9',
      'glossary.md:6: there is no sheet 1.9',
      '01-the-run.md:16: objective "size a run" has no questions: name at least 3 that ask for it',
    ]);
  });

  it('leans backwards only', async () => {
    const { refused } = await judge({
      [FIRST]: lessonSheet({ front: 'needs: ["1.2"]\n' }),
      [SECOND]: lessonSheet({ ...second, front: 'needs: ["1.1"]\n', body: 'Two cores.\n' }),
    });
    expect(refused).toEqual([
      '01-the-run.md:23: needs sheet 1.2, which does not come before 1.1: a sheet may lean on earlier ones only',
    ]);
  });

  it('gives one term one meaning', async () => {
    const { refused } = await judge({
      ...glossary('  route: { means: the way a cable takes, also: [Run] }\n'),
    });
    expect(refused).toEqual([
      expect.stringMatching(
        /^01-the-run\.md:17: "run" has another meaning in .*glossary\.md:6 \("the way a cable takes"\): say the same in both$/,
      ),
      expect.stringMatching(/^02-the-pair\.md:17: "run" has another meaning/),
    ]);
    expect((await judge(glossary('  run: { means: the distance one way }\n'))).refused).toEqual([]);
  });

  it('notes terms that no glossary has, long sentences and minutes that are not so', async () => {
    const long = 'A cable of copper that is laid the long way round the engine loses more '.repeat(
      2,
    );
    const { noted } = await judge({
      ...glossary('  bus: { means: a bar, also: [buses] }\n'),
      [FIRST]: lessonSheet({ body: `The *buses* and the *Run* and a *shunt*: ${long}.\n` }),
    });
    expect(noted).toContain('01-the-run.md:24: *shunt* is in no glossary');
    expect(noted.filter((line) => line.includes('glossary'))).toHaveLength(1);
    expect(noted).toContain('01-the-run.md:24: 38.0 words a sentence, more than 16');
    expect(noted).toContain(
      '01-the-run.md:14: says 12 minutes; its 38 words, figures and questions take about 0',
    );
  });
});

describe('a glossary', () => {
  it.each<[string, Files, string]>([
    ['a word without a meaning', glossary('  amp: { also: [amps] }\n'), 'words.amp.means'],
    [
      'text of its own',
      { [GLOSSARY]: `${glossary('  amp: { means: a rate }\n')[GLOSSARY] ?? ''}Hello.\n` },
      'glossary.md:8: a glossary has only its words',
    ],
  ])('refuses %s', async (_what, files, problem) => {
    expect((await judge(files)).refused).toEqual([expect.stringContaining(problem)]);
  });
});

describe('measuring a text', () => {
  const figure = '::::figure{src="a.svg"}\nA line.\n\n:::description\nLong. Words.\n:::\n::::\n';

  it('counts words and sentences of its prose, and what there is to look at and to do', () => {
    const body = `## A run\n\nOne two three. Four 5.5 m.\n\n${figure}\n::try{question="a"}\n`;
    // Heading 2, prose 3 and 3, caption 2; figure 1 minute, try 3.
    expect(measureReading(body, 'en')).toEqual({
      ...{ words: 10, minutes: 4, emphasised: [] },
      sentence: (3 + 3 + 2) / 3,
    });
  });

  it('takes an empty text', () => {
    expect(measureReading('', 'en')).toMatchObject({ words: 0, minutes: 0, sentence: 0 });
  });
});
