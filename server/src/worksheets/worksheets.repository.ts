import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { Op, QueryTypes, Sequelize } from 'sequelize';
import type { Answers } from '../questions/question-view.ts';
import { WorksheetAttemptModel } from './models/worksheet-attempt.model.ts';
import type {
  AttemptSummary,
  KeptItem,
  KeptRecall,
  MarkedByItem,
  NewAttempt,
  WorksheetAttempt,
} from './worksheet-attempt.ts';

const SUMMARY = [
  ...['id', 'accountId', 'worksheet', 'attempt', 'startedAt', 'handedInAt', 'marks', 'outOf'],
];

interface At {
  readonly id: string;
  readonly accountId: string;
}

function toSummary(row: WorksheetAttemptModel): AttemptSummary {
  const { id, accountId, worksheet, attempt, startedAt, handedInAt, marks, outOf } = row;
  return Object.freeze({
    ...{ id, accountId, worksheet, attempt, startedAt, handedInAt, marks, outOf },
  });
}

function toAttempt(row: WorksheetAttemptModel): WorksheetAttempt {
  const { courseRevisionId, variant, items, recall, answers, savedAt, marked } = row;
  return Object.freeze({
    ...toSummary(row),
    ...{ courseRevisionId, variant, items, recall, answers, savedAt, marked },
  });
}

@Injectable()
export class WorksheetsRepository {
  constructor(
    @InjectModel(WorksheetAttemptModel) private readonly attempts: typeof WorksheetAttemptModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  /** False when the person has an open attempt of this worksheet already. */
  async add(attempt: NewAttempt): Promise<boolean> {
    const rows = await this.sequelize.query(
      `INSERT INTO worksheet_attempts
         (id, account_id, worksheet, course_revision_id, variant, items, out_of, started_at, recall,
          attempt)
       SELECT $1, $2, $3, $4, $5, $6::jsonb, $7, $8, $9::jsonb, coalesce(max(attempt), 0) + 1
         FROM worksheet_attempts WHERE account_id = $2 AND worksheet = $3
       ON CONFLICT DO NOTHING RETURNING id`,
      {
        bind: [
          ...[attempt.id, attempt.accountId, attempt.worksheet, attempt.courseRevisionId],
          ...[attempt.variant, JSON.stringify(attempt.items), attempt.outOf, attempt.startedAt],
          JSON.stringify(attempt.recall),
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows.length === 1;
  }

  async findOpen(accountId: string, worksheet: string): Promise<WorksheetAttempt | null> {
    const row = await this.attempts.findOne({ where: { accountId, worksheet, handedInAt: null } });
    return row ? toAttempt(row) : null;
  }

  async findOwned({ id, accountId }: At): Promise<WorksheetAttempt | null> {
    const row = await this.attempts.findOne({ where: { id, accountId } });
    return row ? toAttempt(row) : null;
  }

  /** Holds the attempt until the transaction ends. */
  async lockOwned({ id, accountId }: At): Promise<WorksheetAttempt | null> {
    const row = await this.attempts.findOne({ where: { id, accountId }, lock: true });
    return row ? toAttempt(row) : null;
  }

  async findHandedIn(id: string): Promise<WorksheetAttempt | null> {
    const row = await this.attempts.findOne({ where: { id, handedInAt: { [Op.ne]: null } } });
    return row ? toAttempt(row) : null;
  }

  async ofAccounts(accountIds: readonly string[], worksheet?: string): Promise<AttemptSummary[]> {
    const rows = await this.attempts.findAll({
      attributes: SUMMARY,
      where: { accountId: [...accountIds], ...(worksheet ? { worksheet } : {}) },
      order: [['startedAt', 'ASC']],
    });
    return rows.map(toSummary);
  }

  /** Every item the person was ever given on a worksheet. */
  async earlierItems(accountId: string, worksheet: string): Promise<KeptItem[]> {
    const rows = await this.attempts.findAll({
      attributes: ['items'],
      where: { accountId, worksheet },
    });
    return rows.flatMap(({ items }) => items);
  }

  /** Every recall question the person was ever asked, once for each time. */
  async recallAsked(accountId: string): Promise<KeptRecall[]> {
    const rows = await this.attempts.findAll({ attributes: ['recall'], where: { accountId } });
    return rows.flatMap(({ recall }) => recall);
  }

  /** First attempts, handed in, with their marking. */
  async firstMarked(accountIds: readonly string[]): Promise<WorksheetAttempt[]> {
    const rows = await this.attempts.findAll({
      where: { accountId: [...accountIds], attempt: 1, handedInAt: { [Op.ne]: null } },
    });
    return rows.map(toAttempt);
  }

  /** Adds to the answers of one item; false when the attempt is not open. */
  async saveAnswers(
    { id, accountId, key }: At & { key: string },
    answers: Answers,
    now: Date,
  ): Promise<boolean> {
    const rows = await this.sequelize.query(
      `UPDATE worksheet_attempts SET saved_at = $5, answers =
         jsonb_set(answers, ARRAY[$3::text], coalesce(answers -> $3::text, '{}') || $4::jsonb)
       WHERE id = $1 AND account_id = $2 AND handed_in_at IS NULL RETURNING id`,
      { bind: [id, accountId, key, JSON.stringify(answers), now], type: QueryTypes.SELECT },
    );
    return rows.length === 1;
  }

  async keepMarked(
    id: string,
    marking: { marked: MarkedByItem; marks: number; markerVersion: number; handedInAt: Date },
  ): Promise<void> {
    await this.attempts.update(marking, { where: { id } });
  }

  async nameOf(accountId: string): Promise<{ givenName: string; familyName: string }> {
    const rows = await this.sequelize.query<{ givenName: string; familyName: string }>(
      'SELECT given_name AS "givenName", family_name AS "familyName" FROM accounts WHERE id = $1',
      { bind: [accountId], type: QueryTypes.SELECT },
    );
    return rows[0] ?? { givenName: '', familyName: '' };
  }
}
