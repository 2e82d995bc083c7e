import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { MarkedQuestion } from '@ferrule/assessments';
import type { Answers } from '../questions/question-view.ts';
import { PracticeAttemptModel } from './models/practice-attempt.model.ts';
import type { PracticeAttempt } from './practice-attempt.ts';

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

  /** False when it was marked in the meantime. */
  async keepMarked(
    id: string,
    marking: { answers: Answers; marked: MarkedQuestion; handedInAt: Date },
  ): Promise<boolean> {
    const [changed] = await this.attempts.update(marking, { where: { id, handedInAt: null } });
    return changed === 1;
  }
}
