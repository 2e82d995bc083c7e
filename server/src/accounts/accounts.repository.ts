import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { Account } from './account.ts';
import { AccountModel } from './models/account.model.ts';

export interface NewAccount {
  readonly givenName: string;
  readonly familyName: string;
  readonly email: string;
  readonly passwordHash: string;
}

const toAccount = (row: AccountModel | null): Account | null =>
  row
    ? Object.freeze({
        id: row.id,
        email: row.email,
        givenName: row.givenName,
        familyName: row.familyName,
        passwordHash: row.passwordHash,
        isConfirmed: row.emailConfirmedAt !== null,
        isSuspended: row.suspendedAt !== null,
      })
    : null;

@Injectable()
export class AccountsRepository {
  constructor(
    @InjectModel(AccountModel) private readonly accounts: typeof AccountModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async find(id: string): Promise<Account | null> {
    return toAccount(await this.accounts.findByPk(id));
  }

  async findByEmail(email: string): Promise<Account | null> {
    return toAccount(await this.accounts.findOne({ where: { email } }));
  }

  /**
   * Opens an account that waits for its email to be confirmed, or renews one that still waits:
   * whoever signed up last gets the link, and older links are cancelled with it.
   *
   * @returns its id, or null when the address has a confirmed account, which stays as it is.
   */
  async addUnconfirmed(account: NewAccount, at: Date): Promise<string | null> {
    const rows = await this.sequelize.query<{ account_id: string }>(
      `WITH opened AS (
         INSERT INTO accounts (email, given_name, family_name, password_hash, created_at)
         VALUES ($1, $2, $3, $4, $5)
         ON CONFLICT (email) DO UPDATE
           SET given_name = EXCLUDED.given_name, family_name = EXCLUDED.family_name,
               password_hash = EXCLUDED.password_hash
           WHERE accounts.email_confirmed_at IS NULL
         RETURNING id),
       role AS (
         INSERT INTO account_roles (account_id, role, granted_at) SELECT id, 'trainee', $5 FROM opened
         ON CONFLICT DO NOTHING)
       SELECT id AS account_id FROM opened`,
      {
        bind: [account.email, account.givenName, account.familyName, account.passwordHash, at],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.account_id ?? null;
  }

  /** @returns the id, or null when the address has an account. */
  async addAdministrator(account: NewAccount, at: Date): Promise<string | null> {
    const rows = await this.sequelize.query<{ id: string }>(
      `WITH opened AS (
         INSERT INTO accounts (email, given_name, family_name, password_hash, email_confirmed_at, created_at)
         VALUES ($1, $2, $3, $4, $5, $5) ON CONFLICT (email) DO NOTHING RETURNING id),
       role AS (
         INSERT INTO account_roles (account_id, role, granted_at) SELECT id, 'administrator', $5 FROM opened)
       SELECT id FROM opened`,
      {
        bind: [account.email, account.givenName, account.familyName, account.passwordHash, at],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.id ?? null;
  }

  async confirm(id: string, at: Date): Promise<void> {
    await this.accounts.update({ emailConfirmedAt: at }, { where: { id, emailConfirmedAt: null } });
  }

  /** Null closes the account to every passphrase until a new one is chosen. */
  async setPassword(id: string, passwordHash: string | null): Promise<void> {
    await this.accounts.update({ passwordHash }, { where: { id } });
  }

  /** @returns false when another account has the address. */
  async setEmail(id: string, email: string): Promise<boolean> {
    const rows = await this.sequelize.query<{ id: string }>(
      `UPDATE accounts SET email = $2
        WHERE id = $1 AND NOT EXISTS (SELECT 1 FROM accounts WHERE email = $2 AND id <> $1) RETURNING id`,
      { bind: [id, email], type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }

  /** Whoever takes the lock second sees what the first did. */
  async lockAdministrators(): Promise<void> {
    await this.sequelize.query(`SELECT pg_advisory_xact_lock(hashtext('administrators'))`, {
      type: QueryTypes.SELECT,
    });
  }

  async hasAdministrator(): Promise<boolean> {
    const rows = await this.sequelize.query(
      `SELECT 1 FROM account_roles WHERE role = 'administrator' LIMIT 1`,
      { type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }
}
