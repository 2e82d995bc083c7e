import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import { TimeAllowanceModel } from './models/time-allowance.model.ts';

export interface Allowance {
  readonly name: string;
  readonly email: string;
  readonly percent: number;
  readonly reason: string;
  readonly grantedAt: Date;
}

interface Grant {
  readonly accountId: string;
  readonly percent: number;
  readonly reason: string;
  readonly grantedBy: string;
  readonly grantedAt: Date;
}

@Injectable()
export class AllowancesRepository {
  constructor(
    @InjectModel(TimeAllowanceModel) private readonly allowances: typeof TimeAllowanceModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  /** Approved extra time of a person, in per cent; 0 for most. */
  async percentFor(accountId: string): Promise<number> {
    const row = await this.allowances.findOne({ where: { accountId }, order: [['id', 'DESC']] });
    return row?.percent ?? 0;
  }

  async add(grant: Grant): Promise<void> {
    await this.allowances.create({ ...grant });
  }

  async findAccount(email: string): Promise<string | null> {
    const [row] = await this.sequelize.query<{ id: string }>(
      'SELECT id FROM accounts WHERE email = $1',
      { bind: [email], type: QueryTypes.SELECT },
    );
    return row?.id ?? null;
  }

  /** What counts now, one row a person, by name. */
  async current(): Promise<Allowance[]> {
    return this.sequelize.query<Allowance>(
      `SELECT trim(a.given_name || ' ' || a.family_name) AS name, a.email, t.percent, t.reason,
              t.granted_at AS "grantedAt"
         FROM (SELECT DISTINCT ON (account_id) * FROM time_allowances ORDER BY account_id, id DESC) t
         JOIN accounts a ON a.id = t.account_id
        WHERE t.percent > 0 ORDER BY a.family_name, a.given_name, a.id LIMIT 500`,
      { type: QueryTypes.SELECT },
    );
  }
}
