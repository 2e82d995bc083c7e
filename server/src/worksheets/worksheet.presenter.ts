import type { CompiledCourse, CourseUnit, CourseWorksheet } from '../publishing/compiled-course.ts';
import type { Answers, MarkedQuestion } from '../questions/question-view.ts';
import { percentOf } from './score.ts';
import type { AttemptSummary, KeptItem, WorksheetAttempt } from './worksheet-attempt.ts';
import type { WorksheetSummary, WorksheetView } from './worksheets.schemas.ts';

export interface PlacedWorksheet {
  readonly unit: CourseUnit;
  readonly worksheet: CourseWorksheet;
}

export function placeWorksheet(course: CompiledCourse, number: string): PlacedWorksheet | null {
  const unit = course.units.find(({ worksheet }) => worksheet?.number === number);
  return unit?.worksheet ? { unit, worksheet: unit.worksheet } : null;
}

const scoreOf = ({ marks, outOf }: AttemptSummary) =>
  marks === null ? null : percentOf(marks, outOf);

export interface SeenBy {
  readonly trainee: { givenName: string; familyName: string };
  readonly mine: boolean;
  /** By the key of the question; empty until it is handed in. */
  readonly marked: Readonly<Record<string, MarkedQuestion>>;
}

/** Before it is handed in there is nothing in it but what was shown and what was typed. */
export function presentWorksheet(
  attempt: WorksheetAttempt,
  { unit, worksheet }: PlacedWorksheet,
  { trainee, mine, marked }: SeenBy,
): WorksheetView {
  const percent = scoreOf(attempt);
  return {
    id: attempt.id,
    number: attempt.worksheet,
    title: worksheet.title,
    unit: { number: unit.number, title: unit.title },
    variant: attempt.variant,
    attempt: attempt.attempt,
    trainee,
    mine,
    startedAt: attempt.startedAt.toISOString(),
    handedInAt: attempt.handedInAt?.toISOString() ?? null,
    passPercent: worksheet.passPercent,
    setBy: [...new Set(attempt.items.map(({ author }) => author))].join(', '),
    items: attempt.items.map((item) =>
      presentItem(item, attempt.answers[item.key] ?? {}, marked[item.key] ?? null),
    ),
    recall: presentRecall(attempt),
    marks: attempt.marks,
    outOf: attempt.outOf,
    percent,
    passed: percent === null ? null : percent >= worksheet.passPercent,
    savedAt: attempt.savedAt?.toISOString() ?? null,
  };
}

const presentRecall = ({ recall, handedInAt }: WorksheetAttempt): WorksheetView['recall'] =>
  recall.map(({ sheet: { number, title }, ask, answer }) => ({
    sheet: { number, title },
    ask,
    answer: handedInAt ? answer : null,
  }));

function presentItem(
  item: KeptItem,
  answers: Answers,
  marked: MarkedQuestion | null,
): WorksheetView['items'][number] {
  const isShort = marked !== null && marked.marks < marked.outOf;
  return {
    key: item.key,
    slug: item.slug,
    question: item.view,
    answers,
    marked,
    readAgain: isShort && item.sheet ? { sheet: item.sheet.number, title: item.sheet.title } : null,
  };
}

export function presentSummary(
  { unit, worksheet }: PlacedWorksheet,
  attempts: readonly AttemptSummary[],
): WorksheetSummary {
  return {
    number: worksheet.number,
    title: worksheet.title,
    unit: { number: unit.number, title: unit.title },
    questions: worksheet.questions.length,
    practise: [...worksheet.questions],
    passPercent: worksheet.passPercent,
    attempts: attempts.map((attempt) => ({
      id: attempt.id,
      attempt: attempt.attempt,
      startedAt: attempt.startedAt.toISOString(),
      handedInAt: attempt.handedInAt?.toISOString() ?? null,
      marks: attempt.marks,
      outOf: attempt.outOf,
      percent: scoreOf(attempt),
    })),
  };
}
