import { fileURLToPath } from 'node:url';
import { compileContent } from '../publishing/compile-content.ts';
import { ContentNotInOrder, ProblemList, type ContentProblem } from '../publishing/problem-list.ts';
import { readSources } from '../publishing/read-sources.ts';
import { summariseNotes } from '../publishing/summarise.ts';

const checkout = (folder: string) => fileURLToPath(new URL(`../../../${folder}`, import.meta.url));
const write = ({ path, line, message }: ContentProblem) => `${path}:${line}: ${message}`;

const problems = new ProblemList();
const folders = { lessons: checkout('lessons'), assessments: checkout('assessments') };
compileContent(await readSources(folders), problems);
for (const note of problems.notes()) console.log(`note: ${write(note)}`);
if (problems.isEmpty) console.log(`The course is in order.${summariseNotes(problems.notes())}`);
else {
  console.error(new ContentNotInOrder(problems.sorted()).message);
  process.exitCode = 1;
}
