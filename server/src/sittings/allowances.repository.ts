import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { TimeAllowanceModel } from './models/time-allowance.model.ts';

@Injectable()
export class AllowancesRepository {
  constructor(
    @InjectModel(TimeAllowanceModel) private readonly allowances: typeof TimeAllowanceModel,
  ) {}

  /** Approved extra time of a person, in per cent; 0 for most. */
  async percentFor(accountId: string): Promise<number> {
    const row = await this.allowances.findOne({ where: { accountId }, order: [['id', 'DESC']] });
    return row?.percent ?? 0;
  }
}
