import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import type { MarkedQuestion } from '@ferrule/assessments';
import { QueryTypes, Sequelize } from 'sequelize';
import type { Answers } from '../questions/question-view.ts';
import { PracticeAttemptModel } from './models/practice-attempt.model.ts';
import type { KeptDraw, PracticeAttempt } from './practice-attempt.ts';

const MOST_LATEST = 200;

@Injectable()
export class PracticeRepository {
  constructor(
    @InjectModel(PracticeAttemptModel) private readonly attempts: typeof PracticeAttemptModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async add(attempt: PracticeAttempt & { startedAt: Date }): Promise<void> {
    const { kept, ...rest } = attempt;
    await this.attempts.create({ ...rest, drawn: kept, stepsLeft: kept.faded?.left ?? null });
  }

  async findOwned(id: string, accountId: string): Promise<PracticeAttempt | null> {
    const row = await this.attempts.findOne({ where: { id, accountId } });
    if (!row) return null;
    const { questionRevisionId, drawn: kept, hints, handedInAt } = row;
    return Object.freeze({ id, accountId, questionRevisionId, kept, hints, handedInAt });
  }

  async latest(accountId: string): Promise<KeptDraw[]> {
    const rows = await this.attempts.findAll({
      attributes: ['drawn'],
      where: { accountId },
      order: [['startedAt', 'DESC']],
      limit: MOST_LATEST,
    });
    return rows.map(({ drawn }) => drawn);
  }

  /** False when it was marked in the meantime. A part asked for twice is kept once. */
  async keepHint(id: string, part: string): Promise<boolean> {
    const rows = await this.sequelize.query(
      `UPDATE practice_attempts
          SET hints = CASE WHEN $2 = ANY (hints) THEN hints ELSE array_append(hints, $2) END
        WHERE id = $1 AND handed_in_at IS NULL RETURNING id`,
      { bind: [id, part], type: QueryTypes.SELECT },
    );
    return rows.length === 1;
  }

  /** False when it was marked in the meantime. */
  async keepMarked(
    id: string,
    marking: { answers: Answers; marked: MarkedQuestion; handedInAt: Date },
  ): Promise<boolean> {
    const [changed] = await this.attempts.update(marking, { where: { id, handedInAt: null } });
    return changed === 1;
  }
}
