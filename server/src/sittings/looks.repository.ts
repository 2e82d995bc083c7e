import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import { ItemLookModel } from './models/item-look.model.ts';

export interface RecordedLook {
  readonly at: Date;
  readonly by: string;
  readonly reason: string;
}

@Injectable()
export class LooksRepository {
  constructor(
    @InjectModel(ItemLookModel) private readonly looks: typeof ItemLookModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async add(look: {
    sittingId: string;
    accountId: string;
    reason: string;
    at: Date;
  }): Promise<void> {
    await this.looks.create(look);
  }

  /** The newest first. */
  async allOf(sittingId: string): Promise<RecordedLook[]> {
    return this.sequelize.query<RecordedLook>(
      `SELECT l.at, trim(a.given_name || ' ' || a.family_name) AS by, l.reason
         FROM item_looks l JOIN accounts a ON a.id = l.account_id
        WHERE l.sitting_id = $1 ORDER BY l.id DESC`,
      { bind: [sittingId], type: QueryTypes.SELECT },
    );
  }
}
