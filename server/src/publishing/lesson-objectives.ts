import type { CompiledObjective } from './compiled-lesson.ts';
import { whyNotPractice, type Pools } from './course-sheet.ts';
import type { Sheet } from './front-matter.ts';
import type { LessonFrontMatter } from './lesson-front-matter.ts';
import type { ProblemList } from './problem-list.ts';

const RECALL = /^recall (\d+)$/;

/** What a reader can do afterwards, with the questions that ask for it. */
export const objectivesOf = ({ can }: LessonFrontMatter): CompiledObjective[] =>
  can.map(({ does, questions }) => ({
    does,
    questions: questions.filter((name) => !RECALL.test(name)),
    recall: questions.flatMap((name) => RECALL.exec(name)?.[1] ?? []).map(Number),
  }));

/** Whether the questions that objectives name are there for practice, each once. */
export function checkObjectives(
  { path, sheet }: { path: string; sheet: Sheet<LessonFrontMatter> },
  pools: Pools,
  problems: ProblemList,
): void {
  const { can, recall } = sheet.front;
  can.forEach(({ questions }, index) => {
    questions.forEach((name, at) => {
      const line = sheet.lineOf('can', index, 'questions', at);
      const [, number] = RECALL.exec(name) ?? [];
      const reason = number
        ? whyNotRecall(Number(number), recall.length)
        : whyNotPractice(name, pools);
      if (reason) problems.add(path, line, reason);
      if (questions.indexOf(name) < at) problems.add(path, line, `${name} is named twice`);
    });
  });
}

const whyNotRecall = (number: number, count: number) =>
  number >= 1 && number <= count
    ? null
    : `there is no recall question ${number}: this sheet has 1 to ${count}`;
