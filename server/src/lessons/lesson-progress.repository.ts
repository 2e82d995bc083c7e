import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { LessonProgress } from './lesson-progress.ts';
import { LessonProgressModel } from './models/lesson-progress.model.ts';

interface At {
  readonly accountId: string;
  readonly lesson: string;
  readonly now: Date;
}

function toProgress(row: LessonProgressModel): LessonProgress {
  const { accountId, lesson, paragraph, begunAt, lastReadAt, doneAt, doneRevision } = row;
  return Object.freeze({
    ...{ accountId, lesson, paragraph, begunAt, lastReadAt, doneAt, doneRevision },
  });
}

@Injectable()
export class LessonProgressRepository {
  constructor(
    @InjectModel(LessonProgressModel) private readonly progress: typeof LessonProgressModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async find(accountId: string, lesson: string): Promise<LessonProgress | undefined> {
    const row = await this.progress.findOne({ where: { accountId, lesson } });
    return row ? toProgress(row) : undefined;
  }

  async ofAccounts(accountIds: readonly string[]): Promise<LessonProgress[]> {
    const rows = await this.progress.findAll({ where: { accountId: [...accountIds] } });
    return rows.map(toProgress);
  }

  async readTo({ accountId, lesson, now }: At, paragraph: number): Promise<void> {
    await this.sequelize.query(
      `INSERT INTO lesson_progress (account_id, lesson, paragraph, begun_at, last_read_at)
       VALUES ($1, $2, $3, $4, $4)
       ON CONFLICT (account_id, lesson) DO UPDATE SET paragraph = $3, last_read_at = $4`,
      { bind: [accountId, lesson, paragraph, now], type: QueryTypes.INSERT },
    );
  }

  /** Marking the same revision done again keeps the first date. */
  async markDone(
    { accountId, lesson, now }: At,
    { revision, paragraph }: { revision: string; paragraph: number },
  ): Promise<void> {
    await this.sequelize.query(
      `INSERT INTO lesson_progress AS p
         (account_id, lesson, paragraph, begun_at, last_read_at, done_at, done_revision)
       VALUES ($1, $2, $3, $4, $4, $4, $5)
       ON CONFLICT (account_id, lesson) DO UPDATE SET paragraph = $3, last_read_at = $4,
         done_at = CASE WHEN p.done_revision = $5 THEN p.done_at ELSE $4 END, done_revision = $5`,
      { bind: [accountId, lesson, paragraph, now, revision], type: QueryTypes.INSERT },
    );
  }

  async undoDone(accountId: string, lesson: string): Promise<void> {
    await this.progress.update(
      { doneAt: null, doneRevision: null },
      { where: { accountId, lesson } },
    );
  }
}
