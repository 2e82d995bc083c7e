import { knownForms, wordSheetsMissing } from './check-words.ts';
import type { ReadCourse } from './course-sheet.ts';
import { measureReading, type ReadingMeasures } from './measure-reading.ts';
import type { NoteSubject, ProblemList } from './problem-list.ts';
import type { ReadContent, ReadLesson } from './read-content.ts';

const LEAST_QUESTIONS = 3;
/** Words of a sentence, on average: the school's own limit. */
const LONGEST_SENTENCE = 16;
/** Share by which the minutes of a sheet may differ from what its text takes. */
const MINUTES_OFF = 0.25;

interface Place {
  readonly path: string;
  readonly line: number;
}

/** Notes, or refuses once the course is whole. */
type Say = (about: NoteSubject, at: Place, message: string) => void;

const sheetsInOrder = ({ compiled }: ReadCourse) => compiled.units.flatMap(({ sheets }) => sheets);

const isOf = ({ file }: ReadCourse) => {
  const folder = file.path.slice(0, -'course.md'.length);
  return ({ file: { path } }: ReadLesson) => path.startsWith(folder);
};

/** Whether every sheet that is planned is listed: what still lacks is wrong from then on. */
function isWhole(course: ReadCourse): boolean {
  const { planned } = course.compiled;
  return planned !== undefined && sheetsInOrder(course).length >= planned;
}

function checkObjectiveCounts({ file, sheet }: ReadLesson, say: Say): void {
  sheet.front.can.forEach(({ does, questions }, index) => {
    if (questions.length >= LEAST_QUESTIONS) return;
    const line = sheet.lineOf('can', index);
    const has = `objective "${does}" has ${questions.length || 'no'} questions`;
    say(
      'objectives',
      { path: file.path, line },
      `${has}: name at least ${LEAST_QUESTIONS} that ask for it`,
    );
  });
}

/** What a sheet needs stands before it, in the order of the course. */
function checkNeeds(
  { file, sheet }: ReadLesson,
  order: readonly string[],
  { problems, say }: { problems: ProblemList; say: Say },
): void {
  const { number, needs } = sheet.front;
  needs.forEach((need, index) => {
    const line = sheet.lineOf('needs', index);
    const at = { path: file.path, line };
    const place = order.indexOf(need);
    if (place < 0) say('order', at, `needs sheet ${need}, which the course does not list`);
    else if (place >= order.indexOf(number)) {
      problems.add(
        file.path,
        line,
        `needs sheet ${need}, which does not come before ${number}: a sheet may lean on earlier ones only`,
      );
    }
  });
}

function checkReading({ file, sheet }: ReadLesson, read: ReadingMeasures, note: Say): void {
  const { minutes } = sheet.front;
  if (Math.abs(read.minutes - minutes) > MINUTES_OFF * read.minutes) {
    const takes = `its ${read.words} words, figures and questions take about ${read.minutes}`;
    note(
      'minutes',
      { path: file.path, line: sheet.lineOf('minutes') },
      `says ${minutes} minutes; ${takes}`,
    );
  }
  if (read.sentence > LONGEST_SENTENCE) {
    const words = read.sentence.toFixed(1);
    note(
      'sentences',
      { path: file.path, line: sheet.bodyLine },
      `${words} words a sentence, more than ${LONGEST_SENTENCE}`,
    );
  }
}

function checkTerms(
  { file, sheet }: ReadLesson,
  { emphasised }: ReadingMeasures,
  { known, note }: { known: ReadonlySet<string>; note: Say },
): void {
  for (const term of emphasised) {
    if (known.has(term.toLowerCase())) continue;
    note('terms', { path: file.path, line: sheet.bodyLine }, `*${term}* is in no glossary`);
  }
}

/** Questions belong to sheets; until all are written, some are still to come. */
function checkQuestionLessons({ questions, lessons, unread }: ReadContent, say: Say): void {
  if (unread.lessons) return;
  const numbers = new Set(lessons.map(({ sheet }) => sheet.front.number));
  for (const { file, value } of questions) {
    const { slug, lesson } = value.meta;
    if (numbers.has(lesson)) continue;
    say('sheets', { path: file.path, line: 1 }, `question "${slug}": there is no sheet ${lesson}`);
  }
}

const noting =
  (problems: ProblemList): Say =>
  (about, at, message) => {
    problems.note({ about, ...at, message });
  };

const refusing =
  (problems: ProblemList): Say =>
  (_about, { path, line }, message) => {
    problems.add(path, line, message);
  };

function checkLessons(course: ReadCourse, content: ReadContent, problems: ProblemList): void {
  const note = noting(problems);
  const say = isWhole(course) ? refusing(problems) : note;
  const order = sheetsInOrder(course);
  const known = knownForms(content);
  for (const lesson of content.lessons.filter(isOf(course))) {
    const read = measureReading(lesson.sheet.body, lesson.sheet.front.language);
    checkObjectiveCounts(lesson, say);
    checkNeeds(lesson, order, { problems, say });
    checkReading(lesson, read, note);
    checkTerms(lesson, read, { known, note });
  }
}

/**
 * Looks at each course as a whole. What a course may lack while it is being written is noted, and
 * refused once every planned sheet is listed.
 */
export function checkWhole(content: ReadContent, problems: ProblemList): void {
  for (const course of content.courses) checkLessons(course, content, problems);
  const say = content.courses.some(isWhole) ? refusing(problems) : noting(problems);
  checkQuestionLessons(content, say);
  for (const { path, line, sheet } of wordSheetsMissing(content)) {
    say('sheets', { path, line }, `there is no sheet ${sheet}`);
  }
}
