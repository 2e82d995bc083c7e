import { SUBJECTS, type Answers, type MarkedQuestion } from '@ferrule/assessments';
import type { Rules, SavedAnswer } from './sitting.ts';

/** One question of a paper after marking. */
export interface MarkedItem {
  readonly key: string;
  readonly number: number;
  readonly subject: string;
  /** Number of the sheet that teaches it. */
  readonly lesson: string;
  readonly marked: MarkedQuestion;
}

export interface SubjectMarks {
  readonly subject: string;
  readonly name: string;
  readonly marks: number;
  readonly outOf: number;
  /** Number of the sheet on which most marks of the subject were lost; null when none were. */
  readonly practise: string | null;
}

export interface Marking {
  readonly marks: number;
  readonly outOf: number;
  readonly passed: boolean;
  readonly bySubject: readonly SubjectMarks[];
  readonly marked: readonly MarkedItem[];
  readonly markerVersion: number;
}

/** A marking as it was stored, once and for good. */
export interface Result extends Marking {
  readonly sittingId: string;
  readonly markedAt: Date;
  readonly maySitAgainAt: Date | null;
}

const total = (items: readonly MarkedItem[], of: 'marks' | 'outOf') =>
  items.reduce((sum, { marked }) => sum + marked[of], 0);

function sheetToPractise(items: readonly MarkedItem[]): string | null {
  const lost = new Map<string, number>();
  for (const { lesson, marked } of items) {
    lost.set(lesson, (lost.get(lesson) ?? 0) + marked.outOf - marked.marks);
  }
  const [most] = [...lost].sort(([, a], [, b]) => b - a);
  return most && most[1] > 0 ? most[0] : null;
}

function bySubject(items: readonly MarkedItem[]): SubjectMarks[] {
  const subjects = [...new Set(items.map(({ subject }) => subject))];
  return subjects.map((subject) => {
    const own = items.filter((item) => item.subject === subject);
    return {
      subject,
      name: SUBJECTS[subject] ?? subject,
      marks: total(own, 'marks'),
      outOf: total(own, 'outOf'),
      practise: sheetToPractise(own),
    };
  });
}

/** Adds a paper up by the rules it was sat under. */
export function addUp(items: readonly MarkedItem[], rules: Pick<Rules, 'passMarks'>): Marking {
  const marks = total(items, 'marks');
  return {
    marks,
    outOf: total(items, 'outOf'),
    passed: marks >= rules.passMarks,
    bySubject: bySubject(items),
    marked: items,
    markerVersion: Math.max(0, ...items.map(({ marked }) => marked.markerVersion)),
  };
}

/** The answers of one question as the marker takes them. */
export function toAnswers(parts: ReadonlyMap<string, SavedAnswer> | undefined): Answers {
  return Object.fromEntries([...(parts ?? [])].map(([part, { answer }]) => [part, answer]));
}
