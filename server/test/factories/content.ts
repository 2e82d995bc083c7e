import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { compileContent } from '../../src/publishing/compile-content.ts';
import { ProblemList } from '../../src/publishing/problem-list.ts';
import { publish, type PublishingOutcome } from '../../src/publishing/publish.ts';
import { readSources } from '../../src/publishing/read-sources.ts';
import { blueprintSheet, questionSheet } from './paper.ts';

/** Files by path, as they lie under `lessons/` and `assessments/`. */
export type Files = Record<string, string>;

/** Words and figures of the practice sheets that nobody may see before marking. */
export const PRACTICE_CANARIES = [
  'canarysecret',
  'canaryrule',
  'canaryerror',
  'canarylesson',
  'canarykept',
  'canarywhy',
  'canarywrong',
  '1.0731',
  '13.77',
];

/** A practice question with something planted in everything that must stay behind. */
export function practiceSheet(options: { id: string; revision?: string; lesson?: string }): string {
  const { id, revision = 'A', lesson = '1.1' } = options;
  return `---
id: ${id}
title: Drop on the feed ${id}
revision: ${revision}
subject: VD
level: apply
pool: practice
lesson: "${lesson}"
profile: metric
language: en
author: Odile Marchetti
checked by: Ruaridh Nakamura
sources: ["Ohm's law: definition"]
aids: [Calculator]
given:
  current: { is: Load, symbol: I, from: 5 A, to: 19.5 A, step: 0.5 A }
  resistance: { is: Resistance of the core, symbol: R, one of: [17 mΩ, 23 mΩ, 41 mΩ] }
  canarysecret: { is: canarysecret factor, value: 1.0731, shown: false }
steps:
  canaryrule: { symbol: U_d, unit: V, is: current * resistance * canarysecret }
  double: { symbol: U_p, unit: V, is: canaryrule * 2 }
ask:
  a: { find: canaryrule, units: [V, mV], within: 13.77 %, marks: 2 }
  b: { find: double, units: [V, mV], within: 13.77 %, marks: 2, carry: own }
  c:
    choose:
      - is: Thicker cable
        right: true
      - is: Thinner cable
        say: canarywrong
      - is: Longer cable
        say: canarywrong too
    carry: never
    because: canarywhy
    marks: 1
slips:
  - is: You made the canaryerror.
    say: canarylesson
    credit: canarykept
    makes: { canaryrule: current * resistance * 2.2 }
    keep: { canaryrule: 1 }
---

One core and a lamp.

## a

Find the drop.

## b

Find it there and back.

## c

What makes it less?
`;
}

export const DRAWING = `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 720 100">
<defs><marker id="tip" viewBox="0 0 8 8" refX="8" refY="4"><path class="fillink" d="M0 0L8 4L0 8"/></marker></defs>
<path class="ln" d="M10 50L700 50" marker-end="url(#tip)"/>
<text class="tx" x="360" y="40" text-anchor="middle">5.5 m <tspan class="tx-i">L</tspan></text>
</svg>
`;

interface LessonOptions {
  readonly number?: string;
  readonly slug?: string;
  readonly title?: string;
  readonly revision?: string;
  readonly front?: string;
  readonly body?: string;
}

const FIGURE = `::::figure{src="fig-1.svg" short="A run of cable"}
The run.

:::description
A line, **5.5 m** long.
:::
::::`;

export const LESSON_BODY = `A cable has a length $L$.

$$R = \\rho \\cdot L$$

## The run

${FIGURE}

Longer is more. See [the other sheet](/sheets/1.2).

:::margin{title="Both ways"}
Count it twice.
:::

::worked{question="vd-feed" seed="1"}

::try{question="vd-feed"}
`;

export function lessonSheet(options: LessonOptions = {}): string {
  const number = options.number ?? '1.1';
  const { slug = 'the-run', title = 'The run', revision = 'A', front = '' } = options;
  const { body = LESSON_BODY } = options;
  return `---
number: "${number}"
slug: ${slug}
title: ${title}
revision: ${revision}
issued: 2026-09-14
language: en
unit: ${number.split('.')[0] ?? '1'}
subject: VD
level: apply
pool: practice
author: O. Marchetti
checkedBy: R. Nakamura
minutes: 12
lead: A cable costs volts.
can: [size a run]
words: { run: the distance one way }
sources: ["Ohm's law: definition"]
recall:
  - { ask: One?, answer: First. }
  - { ask: Two?, answer: Second. }
  - { ask: Three?, answer: Third. }
${front}---

${body}`;
}

export function courseSheet(options: { revision?: string; body?: string } = {}): string {
  return `---
number: HQ-DC2
slug: hq-dc2
title: Direct current
revision: ${options.revision ?? 'A'}
issued: 2026-09-14
language: en
owner: Harrow Quay Technical School
units:
  - number: 1
    title: Runs
    sheets: ["1.1", "1.2"]
    worksheet: { number: W1, title: Runs, questions: [vd-feed, vd-lamp], passPercent: 80 }
  - number: 2
    title: Terminations
    sheets: []
paper: try-paper
---

${options.body ?? 'What the course is.'}
`;
}

/** A small course that is in order: two sheets, a worksheet of two questions, and a paper. */
export function goodFiles(): Files {
  const paperQuestion = (id: string, subject: string) =>
    questionSheet({ id, subject, lesson: '1.1' });
  return {
    'lessons/hq-dc2/course.md': courseSheet(),
    'lessons/hq-dc2/runs/01-the-run.md': lessonSheet(),
    'lessons/hq-dc2/runs/fig-1.svg': DRAWING,
    'lessons/hq-dc2/runs/02-the-pair.md': lessonSheet({
      number: '1.2',
      slug: 'the-pair',
      title: 'The pair',
      body: 'Two cores.\n\nOut and back.\n',
    }),
    'assessments/bank/drop/vd-feed.md': practiceSheet({ id: 'vd-feed' }),
    'assessments/bank/drop/vd-lamp.md': practiceSheet({ id: 'vd-lamp', lesson: '1.2' }),
    'assessments/bank/drop/vd-one.md': paperQuestion('vd-one', 'VD'),
    'assessments/bank/drop/vd-two.md': paperQuestion('vd-two', 'VD'),
    'assessments/bank/rating/rd-one.md': paperQuestion('rd-one', 'RD'),
    'assessments/papers/try-paper.md': blueprintSheet(),
  };
}

/** Writes the files to a folder of their own and gives it to the work. */
export async function inFolder<T>(files: Files, work: (folder: string) => Promise<T>): Promise<T> {
  const folder = await mkdtemp(join(tmpdir(), 'ferrule-content-'));
  try {
    for (const [path, text] of Object.entries(files)) {
      await mkdir(dirname(join(folder, path)), { recursive: true });
      await writeFile(join(folder, path), text);
    }
    return await work(folder);
  } finally {
    await rm(folder, { recursive: true, force: true });
  }
}

/** Compiles a course that is in order but for the given files; each problem as `path:line: message`. */
export async function problemsOf(changed: Files): Promise<string[]> {
  return inFolder({ ...goodFiles(), ...changed }, async (folder) => {
    const problems = new ProblemList();
    const folders = { lessons: join(folder, 'lessons'), assessments: join(folder, 'assessments') };
    compileContent(await readSources(folders), problems);
    return problems
      .sorted()
      .map(({ path, line, message }) => `${path.split('/').at(-1) ?? ''}:${line}: ${message}`);
  });
}

/** Publishes the files into a test's database. */
export const publishFiles = (
  { database }: { database: { ownerUrl: string } },
  files: Files,
  withPaperPool = true,
): Promise<PublishingOutcome> =>
  inFolder(files, (folder) =>
    publish(database.ownerUrl, {
      lessons: join(folder, 'lessons'),
      assessments: join(folder, 'assessments'),
      withPaperPool,
    }),
  );
