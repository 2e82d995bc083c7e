import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { MarkedQuestion } from '@ferrule/assessments';
import type { Answers } from '../questions/question-view.ts';
import { PracticeAttemptModel } from './models/practice-attempt.model.ts';
import type { KeptDraw, PracticeAttempt } from './practice-attempt.ts';

const MOST_LATEST = 200;

@Injectable()
export class PracticeRepository {
  constructor(
    @InjectModel(PracticeAttemptModel) private readonly attempts: typeof PracticeAttemptModel,
  ) {}

  async add(attempt: PracticeAttempt & { startedAt: Date }): Promise<void> {
    const { kept, ...rest } = attempt;
    await this.attempts.create({ ...rest, drawn: kept });
  }

  async findOwned(id: string, accountId: string): Promise<PracticeAttempt | null> {
    const row = await this.attempts.findOne({ where: { id, accountId } });
    if (!row) return null;
    const { questionRevisionId, drawn: kept, handedInAt } = row;
    return Object.freeze({ id, accountId, questionRevisionId, kept, handedInAt });
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

  /** False when it was marked in the meantime. */
  async keepMarked(
    id: string,
    marking: { answers: Answers; marked: MarkedQuestion; handedInAt: Date },
  ): Promise<boolean> {
    const [changed] = await this.attempts.update(marking, { where: { id, handedInAt: null } });
    return changed === 1;
  }
}
