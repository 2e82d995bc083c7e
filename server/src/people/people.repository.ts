import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { Role } from '../accounts/account.ts';
import { IDLE_MS } from '../sessions/session.ts';
import type { PeopleCursor, Person } from './person.ts';

const PERSON = `a.id, a.given_name, a.family_name, a.email, a.email_confirmed_at, a.suspended_at,
  a.suspended_reason, a.created_at, a.last_seen_at,
  ARRAY(SELECT role FROM account_roles r WHERE r.account_id = a.id ORDER BY role) AS roles,
  EXISTS (SELECT 1 FROM second_factors f WHERE f.account_id = a.id AND f.confirmed_at IS NOT NULL)
    AS has_second_factor,
  (SELECT count(*)::int FROM sessions s WHERE s.account_id = a.id AND s.ended_at IS NULL
      AND s.ends_at > $1 AND s.last_seen_at > $2) AS open_sessions`;

interface PersonRow {
  id: string;
  given_name: string;
  family_name: string;
  email: string;
  email_confirmed_at: Date | null;
  suspended_at: Date | null;
  suspended_reason: string | null;
  created_at: Date;
  last_seen_at: Date | null;
  roles: Role[];
  has_second_factor: boolean;
  open_sessions: number;
}

const toPerson = (row: PersonRow): Person =>
  Object.freeze({
    id: row.id,
    givenName: row.given_name,
    familyName: row.family_name,
    email: row.email,
    roles: row.roles,
    emailConfirmedAt: row.email_confirmed_at,
    suspendedAt: row.suspended_at,
    suspendedReason: row.suspended_reason,
    joinedAt: row.created_at,
    lastSeenAt: row.last_seen_at,
    hasSecondFactor: row.has_second_factor,
    openSessions: row.open_sessions,
  });

const idleSince = (now: Date) => new Date(now.getTime() - IDLE_MS);
const escapeLike = (text: string) => text.replaceAll(/[\\%_]/g, '\\$&');

@Injectable()
export class PeopleRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async page(
    wanted: { find: string; after: PeopleCursor | null; most: number },
    now: Date,
  ): Promise<Person[]> {
    const after = wanted.after ?? { familyName: '', givenName: '', id: null };
    const rows = await this.sequelize.query<PersonRow>(
      `SELECT ${PERSON} FROM accounts a
        WHERE (a.given_name || ' ' || a.family_name ILIKE $3 OR a.email ILIKE $3)
          AND ($6::uuid IS NULL OR (a.family_name, a.given_name, a.id) > ($4, $5, $6::uuid))
        ORDER BY a.family_name, a.given_name, a.id LIMIT $7`,
      {
        bind: [
          now,
          idleSince(now),
          `%${escapeLike(wanted.find)}%`,
          after.familyName,
          after.givenName,
          after.id,
          wanted.most,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows.map(toPerson);
  }

  async find(id: string, now: Date): Promise<Person | null> {
    const rows = await this.sequelize.query<PersonRow>(
      `SELECT ${PERSON} FROM accounts a WHERE a.id = $3`,
      { bind: [now, idleSince(now), id], type: QueryTypes.SELECT },
    );
    return rows[0] ? toPerson(rows[0]) : null;
  }

  /** @returns whether the person did not have it before. */
  async addRole(accountId: string, role: Role, by: { id: string; at: Date }): Promise<boolean> {
    const rows = await this.sequelize.query(
      `INSERT INTO account_roles (account_id, role, granted_by, granted_at) VALUES ($1, $2, $3, $4)
       ON CONFLICT DO NOTHING RETURNING role`,
      { bind: [accountId, role, by.id, by.at], type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }

  /** @returns whether the person had it. */
  async removeRole(accountId: string, role: Role): Promise<boolean> {
    const rows = await this.sequelize.query(
      'DELETE FROM account_roles WHERE account_id = $1 AND role = $2 RETURNING role',
      { bind: [accountId, role], type: QueryTypes.SELECT },
    );
    return rows.length > 0;
  }

  async setSuspension(
    accountId: string,
    suspension: { at: Date; reason: string } | null,
  ): Promise<void> {
    await this.sequelize.query(
      'UPDATE accounts SET suspended_at = $2, suspended_reason = $3 WHERE id = $1',
      {
        bind: [accountId, suspension?.at ?? null, suspension?.reason ?? null],
        type: QueryTypes.UPDATE,
      },
    );
  }

  /** Two administrators who remove each other at once go one after the other. */
  async lockAdministrators(): Promise<void> {
    await this.sequelize.query(`SELECT pg_advisory_xact_lock(hashtext('administrators'))`, {
      type: QueryTypes.SELECT,
    });
  }

  /** Administrators who can sign in, besides one. */
  async countOtherAdministrators(accountId: string): Promise<number> {
    const rows = await this.sequelize.query<{ count: number }>(
      `SELECT count(*)::int AS count FROM account_roles r JOIN accounts a ON a.id = r.account_id
        WHERE r.role = 'administrator' AND r.account_id <> $1
          AND a.suspended_at IS NULL AND a.email_confirmed_at IS NOT NULL`,
      { bind: [accountId], type: QueryTypes.SELECT },
    );
    return rows[0]?.count ?? 0;
  }
}
