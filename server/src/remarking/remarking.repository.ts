import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import type { Answers, CompiledQuestion, DrawnQuestion } from '@ferrule/assessments';
import { QueryTypes, Sequelize } from 'sequelize';
import {
  type AttemptKind,
  type QuestionMarks,
  type StoredAttempt,
  subjectTotals,
} from './remark.ts';

interface WorksheetRow {
  id: string;
  marks: number;
  outOf: number;
  items: { key: string; slug: string; revisionId: string; drawn: DrawnQuestion }[];
  answers: Record<string, Answers>;
  marked: Record<string, QuestionMarks>;
}

interface PracticeRow {
  id: string;
  revisionId: string;
  kept: { slug: string; drawn: DrawnQuestion; faded?: { left: number } };
  answers: Answers | null;
  marked: QuestionMarks;
}

interface SittingRow {
  id: string;
  marks: number;
  outOf: number;
  passed: boolean;
  passMarks: number;
  bySubject: { subject: string; marks: number; outOf: number }[];
  marked: { key: string; marked: QuestionMarks }[];
  items: {
    key: string;
    slug: string;
    subject: string;
    revisionId: string;
    drawn: DrawnQuestion;
    answers: Answers;
  }[];
}

/** The smallest id of all: every other comes after it. */
const BEFORE_ALL = '00000000-0000-0000-0000-000000000000';

/** By kind: the next attempts after an id, in the order of their ids. */
const STATEMENTS: Record<AttemptKind, string> = {
  worksheet: `
    SELECT id, marks, out_of AS "outOf", items, answers, marked FROM worksheet_attempts
     WHERE handed_in_at IS NOT NULL AND id > $1 ORDER BY id LIMIT $2`,
  practice: `
    SELECT id, question_revision_id AS "revisionId", drawn AS kept, answers, marked
      FROM practice_attempts
     WHERE handed_in_at IS NOT NULL AND id > $1 ORDER BY id LIMIT $2`,
  sitting: `
    SELECT r.sitting_id AS id, r.marks, r.out_of AS "outOf", r.passed, r.marked,
           (s.rules->>'passMarks')::int AS "passMarks", r.by_subject AS "bySubject",
           (SELECT jsonb_agg(jsonb_build_object(
                     'key', i.key, 'slug', c.slug, 'subject', i.subject, 'drawn', i.drawn,
                     'revisionId', c.id, 'answers', coalesce(
                       (SELECT jsonb_object_agg(a.part, a.answer)
                          FROM (SELECT DISTINCT ON (part) part, answer FROM sitting_answers
                                 WHERE sitting_id = i.sitting_id AND item_key = i.key
                                 ORDER BY part, sequence DESC) a), '{}')) ORDER BY i.number)
              FROM sitting_items i JOIN content_revisions c ON c.id = i.question_revision_id
             WHERE i.sitting_id = r.sitting_id) AS items
      FROM sitting_results r JOIN sittings s ON s.id = r.sitting_id
     WHERE r.sitting_id > $1 ORDER BY r.sitting_id LIMIT $2`,
};

function toWorksheet(row: WorksheetRow): StoredAttempt {
  return {
    kind: 'worksheet',
    id: row.id,
    questions: row.items.map(({ key, slug, revisionId, drawn }) => ({
      ...{ slug, subject: '', revisionId, drawn, left: null },
      answers: row.answers[key] ?? {},
      stored: row.marked[key] ?? null,
    })),
    totals: { 'total marks': row.marks, 'total marks to be had': row.outOf },
    passMarks: null,
  };
}

function toPractice({ id, revisionId, kept, answers, marked }: PracticeRow): StoredAttempt {
  const { slug, drawn, faded } = kept;
  const question = {
    ...{ slug, subject: '', revisionId, drawn, left: faded?.left ?? null },
    ...{ answers: answers ?? {}, stored: marked },
  };
  return { kind: 'practice', id, questions: [question], totals: {}, passMarks: null };
}

function toSitting(row: SittingRow): StoredAttempt {
  return {
    kind: 'sitting',
    id: row.id,
    questions: row.items.map(({ key, ...item }) => ({
      ...item,
      left: null,
      stored: row.marked.find((one) => one.key === key)?.marked ?? null,
    })),
    totals: {
      'total marks': row.marks,
      'total marks to be had': row.outOf,
      passed: row.passed,
      ...subjectTotals(row.bySubject),
    },
    passMarks: row.passMarks,
  };
}

/** Reads what was stored; changes nothing. */
@Injectable()
export class RemarkingRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async count(): Promise<Record<AttemptKind, number>> {
    const [row] = await this.select<Record<AttemptKind, number>>(
      `SELECT (SELECT count(*)::int FROM worksheet_attempts WHERE handed_in_at IS NOT NULL) AS worksheet,
              (SELECT count(*)::int FROM practice_attempts WHERE handed_in_at IS NOT NULL) AS practice,
              (SELECT count(*)::int FROM sitting_results) AS sitting`,
    );
    return row ?? { worksheet: 0, practice: 0, sitting: 0 };
  }

  /** The next marked attempts of a kind. */
  async next(kind: AttemptKind, after: string | null, limit: number): Promise<StoredAttempt[]> {
    const bind = [after ?? BEFORE_ALL, limit];
    const statement = STATEMENTS[kind];
    if (kind === 'worksheet')
      return (await this.select<WorksheetRow>(statement, bind)).map(toWorksheet);
    if (kind === 'practice')
      return (await this.select<PracticeRow>(statement, bind)).map(toPractice);
    return (await this.select<SittingRow>(statement, bind)).map(toSitting);
  }

  /** The questions as they were when they were drawn, by the id of their revision. */
  async questions(revisionIds: readonly string[]): Promise<Map<string, CompiledQuestion>> {
    const rows = await this.select<{ id: string; compiled: CompiledQuestion }>(
      'SELECT id, compiled FROM content_revisions WHERE id = ANY($1::uuid[])',
      [[...revisionIds]],
    );
    return new Map(rows.map(({ id, compiled }) => [id, compiled]));
  }

  private select<Row extends object>(statement: string, bind: unknown[] = []): Promise<Row[]> {
    return this.sequelize.query<Row>(statement, { bind, type: QueryTypes.SELECT });
  }
}
