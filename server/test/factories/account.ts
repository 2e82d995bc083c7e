import type { INestApplication } from '@nestjs/common';
import { getConnectionToken } from '@nestjs/sequelize';
import { randomUUID } from 'node:crypto';
import { QueryTypes, type Sequelize } from 'sequelize';
import type { Role } from '../../src/accounts/account.ts';

export interface TestAccount {
  readonly id: string;
  readonly email: string;
  readonly givenName: string;
  readonly familyName: string;
}

/** A confirmed account straight in the database. */
export async function createAccount(
  app: INestApplication,
  options: { roles?: Role[]; givenName?: string; familyName?: string } = {},
): Promise<TestAccount> {
  const sequelize = app.get<Sequelize>(getConnectionToken());
  const account = {
    id: randomUUID(),
    email: `${randomUUID()}@people.example`,
    givenName: options.givenName ?? 'Ifeoma',
    familyName: options.familyName ?? 'Castellan',
  };
  await sequelize.query(
    `INSERT INTO accounts (id, email, given_name, family_name, email_confirmed_at, created_at)
     VALUES ($1, $2, $3, $4, '2026-09-14T08:00:00Z', '2026-09-14T08:00:00Z')`,
    {
      bind: [account.id, account.email, account.givenName, account.familyName],
      type: QueryTypes.INSERT,
    },
  );
  for (const role of options.roles ?? ['trainee']) {
    await sequelize.query('INSERT INTO account_roles (account_id, role) VALUES ($1, $2)', {
      bind: [account.id, role],
      type: QueryTypes.INSERT,
    });
  }
  return account;
}
