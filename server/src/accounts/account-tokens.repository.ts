import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { OpenToken, TokenPurpose } from './account-token.ts';

export interface NewToken {
  readonly accountId: string | null;
  readonly purpose: TokenPurpose;
  readonly tokenHash: Buffer;
  readonly email: string | null;
  readonly createdAt: Date;
  readonly expiresAt: Date;
}

interface TokenRow {
  id: string;
  account_id: string | null;
  email: string | null;
}

const toToken = (row: TokenRow | undefined): OpenToken | null =>
  row ? Object.freeze({ id: row.id, accountId: row.account_id, email: row.email }) : null;

@Injectable()
export class AccountTokensRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async add(token: NewToken): Promise<void> {
    await this.sequelize.query(
      `INSERT INTO account_tokens (account_id, purpose, token_hash, email, created_at, expires_at)
       VALUES ($1, $2, $3, $4, $5, $6)`,
      {
        bind: [
          token.accountId,
          token.purpose,
          token.tokenHash,
          token.email,
          token.createdAt,
          token.expiresAt,
        ],
        type: QueryTypes.INSERT,
      },
    );
  }

  async cancelOpen(accountId: string | null, purpose: TokenPurpose, at: Date): Promise<void> {
    await this.sequelize.query(
      `UPDATE account_tokens SET cancelled_at = $3
        WHERE account_id IS NOT DISTINCT FROM $1 AND purpose = $2
          AND used_at IS NULL AND cancelled_at IS NULL`,
      { bind: [accountId, purpose, at], type: QueryTypes.UPDATE },
    );
  }

  async findOpen(purpose: TokenPurpose, tokenHash: Buffer, now: Date): Promise<OpenToken | null> {
    const rows = await this.sequelize.query<TokenRow>(
      `SELECT id, account_id, email FROM account_tokens
        WHERE token_hash = $1 AND purpose = $2 AND used_at IS NULL AND cancelled_at IS NULL AND expires_at > $3`,
      { bind: [tokenHash, purpose, now], type: QueryTypes.SELECT },
    );
    return toToken(rows[0]);
  }

  /** Uses a token up; of two that try at once, one gets it. */
  async use(purpose: TokenPurpose, tokenHash: Buffer, now: Date): Promise<OpenToken | null> {
    const rows = await this.sequelize.query<TokenRow>(
      `UPDATE account_tokens SET used_at = $3
        WHERE token_hash = $1 AND purpose = $2 AND used_at IS NULL AND cancelled_at IS NULL AND expires_at > $3
        RETURNING id, account_id, email`,
      { bind: [tokenHash, purpose, now], type: QueryTypes.SELECT },
    );
    return toToken(rows[0]);
  }
}
