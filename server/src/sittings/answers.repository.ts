import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import { SittingAnswerModel } from './models/sitting-answer.model.ts';
import { SittingPennantModel } from './models/sitting-pennant.model.ts';
import type { SavedAnswer } from './sitting.ts';

/** An answer about to be kept. */
export interface NewAnswer extends SavedAnswer {
  readonly sittingId: string;
  readonly idempotencyKey: string;
}

@Injectable()
export class AnswersRepository {
  constructor(
    @InjectModel(SittingAnswerModel) private readonly answers: typeof SittingAnswerModel,
    @InjectModel(SittingPennantModel) private readonly pennants: typeof SittingPennantModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  /** False when its idempotency key or its sequence has been used before. */
  async addOnce(answer: NewAnswer): Promise<boolean> {
    const rows = await this.sequelize.query<{ id: string }>(
      `INSERT INTO sitting_answers
         (sitting_id, item_key, part, sequence, idempotency_key, answer, receipt, saved_at)
       VALUES ($1, $2, $3, $4, $5, $6, $7, $8) ON CONFLICT DO NOTHING RETURNING id`,
      {
        bind: [
          answer.sittingId,
          answer.itemKey,
          answer.part,
          answer.sequence,
          answer.idempotencyKey,
          JSON.stringify(answer.answer),
          answer.receipt,
          answer.savedAt,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows.length === 1;
  }

  async findByKey(sittingId: string, idempotencyKey: string): Promise<SavedAnswer | null> {
    const row = await this.answers.findOne({ where: { sittingId, idempotencyKey } });
    return row ? toSavedAnswer(row) : null;
  }

  async highestSequence(sittingId: string): Promise<number> {
    return Number((await this.answers.max('sequence', { where: { sittingId } })) ?? 0);
  }

  /** Everything that was kept, in the order it arrived. */
  async allOf(sittingId: string): Promise<SavedAnswer[]> {
    const rows = await this.answers.findAll({ where: { sittingId }, order: [['id', 'ASC']] });
    return rows.map(toSavedAnswer);
  }

  async pennantsOf(sittingId: string): Promise<Set<string>> {
    const rows = await this.pennants.findAll({ where: { sittingId } });
    return new Set(rows.map(({ itemKey }) => itemKey));
  }

  async setPennant(sittingId: string, itemKey: string, isSet: boolean): Promise<void> {
    if (isSet) await this.pennants.bulkCreate([{ sittingId, itemKey }], { ignoreDuplicates: true });
    else await this.pennants.destroy({ where: { sittingId, itemKey } });
  }
}

function toSavedAnswer(row: SittingAnswerModel): SavedAnswer {
  const { itemKey, part, answer, receipt, savedAt } = row;
  return Object.freeze({ itemKey, part, sequence: Number(row.sequence), answer, receipt, savedAt });
}
