import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';

export interface SecondFactor {
  readonly secretSealed: Buffer | null;
  readonly pendingSealed: Buffer | null;
}

interface FactorRow {
  secret_sealed: Buffer | null;
  pending_sealed: Buffer | null;
}

@Injectable()
export class SecondFactorsRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async find(accountId: string): Promise<SecondFactor | null> {
    const rows = await this.sequelize.query<FactorRow>(
      'SELECT secret_sealed, pending_sealed FROM second_factors WHERE account_id = $1',
      { bind: [accountId], type: QueryTypes.SELECT },
    );
    const row = rows[0];
    return row
      ? Object.freeze({ secretSealed: row.secret_sealed, pendingSealed: row.pending_sealed })
      : null;
  }

  /** Keeps a secret that waits for its first code; one in use stays in use until then. */
  async keepPending(accountId: string, pendingSealed: Buffer, at: Date): Promise<void> {
    await this.sequelize.query(
      `INSERT INTO second_factors (account_id, pending_sealed, created_at) VALUES ($1, $2, $3)
       ON CONFLICT (account_id) DO UPDATE SET pending_sealed = EXCLUDED.pending_sealed`,
      { bind: [accountId, pendingSealed, at], type: QueryTypes.INSERT },
    );
  }

  /** @returns whether the secret that was confirmed is still the one that waits. */
  async confirmPending(
    accountId: string,
    confirmed: { pendingSealed: Buffer; step: number; at: Date },
  ): Promise<boolean> {
    const { pendingSealed, step, at } = confirmed;
    const rows = await this.sequelize.query(
      `UPDATE second_factors
          SET secret_sealed = pending_sealed, pending_sealed = NULL, confirmed_at = $4, last_step = $3
        WHERE account_id = $1 AND pending_sealed = $2 RETURNING account_id`,
      { bind: [accountId, pendingSealed, step, at], type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }

  /** Uses up a time step; of two codes of one step, one is taken. */
  async useStep(accountId: string, step: number): Promise<boolean> {
    const rows = await this.sequelize.query(
      `UPDATE second_factors SET last_step = $2
        WHERE account_id = $1 AND (last_step IS NULL OR last_step < $2) RETURNING account_id`,
      { bind: [accountId, step], type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }

  async replaceRecoveryCodes(accountId: string, hashes: readonly Buffer[]): Promise<void> {
    await this.sequelize.query('DELETE FROM recovery_codes WHERE account_id = $1', {
      bind: [accountId],
      type: QueryTypes.DELETE,
    });
    for (const hash of hashes) {
      await this.sequelize.query(
        'INSERT INTO recovery_codes (account_id, code_hash) VALUES ($1, $2)',
        { bind: [accountId, hash], type: QueryTypes.INSERT },
      );
    }
  }

  async useRecoveryCode(accountId: string, hash: Buffer, at: Date): Promise<boolean> {
    const rows = await this.sequelize.query(
      `UPDATE recovery_codes SET used_at = $3
        WHERE account_id = $1 AND code_hash = $2 AND used_at IS NULL RETURNING id`,
      { bind: [accountId, hash, at], type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }
}
