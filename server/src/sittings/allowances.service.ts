import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import { AllowancesRepository } from './allowances.repository.ts';
import type { GrantedTime, TimeAllowance } from './papers.schemas.ts';
import { SittingsRepository } from './sittings.repository.ts';

/** Extra time that was approved for a person. A sitting already open keeps its time. */
@Injectable()
export class AllowancesService {
  constructor(
    private readonly repository: AllowancesRepository,
    private readonly sittings: SittingsRepository,
  ) {}

  async list(): Promise<{ allowances: GrantedTime[] }> {
    const rows = await this.repository.current();
    return {
      allowances: rows.map((row) => ({ ...row, grantedAt: row.grantedAt.toISOString() })),
    };
  }

  /** Nought per cent ends an allowance; what was granted before stays on record. */
  async grant(managerId: string, input: TimeAllowance): Promise<{ allowances: GrantedTime[] }> {
    const accountId = await this.repository.findAccount(input.email);
    if (!accountId) throw new NotFound('There is no account with this e-mail address.');
    await this.repository.add({
      ...{ accountId, percent: input.percent, reason: input.reason },
      grantedBy: managerId,
      grantedAt: await this.sittings.now(),
    });
    return this.list();
  }
}
