import { QueryTypes, type Sequelize } from 'sequelize';
import { hashPassword } from '../accounts/passwords/password-hash.ts';
import {
  demonstrationClass,
  demonstrationPeople,
  demonstrationSchool,
  otherPeople,
  type SeededPerson,
} from './people.ts';

const FILLED = 'demonstration-filled';
const JOINED_AT = '2023-09-01T08:00:00Z';

/** Statements the services have no use for: a school and its class come with the database. */
export class SchoolBooks {
  constructor(private readonly sequelize: Sequelize) {}

  /** @throws {Error} when an earlier filling was interrupted. */
  async isFilled(): Promise<boolean> {
    const [found] = await this.rows<{ begun: boolean; filled: boolean }>(
      `SELECT EXISTS (SELECT 1 FROM organisations) AS begun,
              EXISTS (SELECT 1 FROM security_events WHERE kind = $1) AS filled`,
      [FILLED],
    );
    if (found?.begun && !found.filled) {
      throw new Error(
        'Filling the demonstration school was interrupted. Begin again with: npm start -- --fresh',
      );
    }
    return found?.filled ?? false;
  }

  async noteFilled(): Promise<void> {
    await this.rows('INSERT INTO security_events (kind) VALUES ($1) RETURNING id', [FILLED]);
  }

  async enterPeople(passphrases: Record<string, string>): Promise<void> {
    for (const person of demonstrationPeople) {
      const passphrase = passphrases[person.email];
      if (!passphrase) throw new Error(`The passphrases file has none for ${person.email}.`);
      await this.enter(person, await hashPassword(passphrase));
    }
    for (const person of otherPeople) await this.enter(person, null);
  }

  async openSchool(): Promise<void> {
    const { name, address } = demonstrationSchool;
    const { courseSlug, joinCode, startsOn, endsOn, trainers } = demonstrationClass;
    await this.rows(
      `WITH school AS (
         INSERT INTO organisations (kind, name, address) VALUES ('school', $1, $2) RETURNING id)
       INSERT INTO classes (organisation_id, course_slug, name, join_code, starts_on, ends_on)
       SELECT id, $3, $4, $5, $6, $7 FROM school RETURNING id`,
      [name, address, courseSlug, demonstrationClass.name, joinCode, startsOn, endsOn],
    );
    await this.rows(
      `INSERT INTO class_trainers (class_id, account_id)
       SELECT c.id, a.id FROM classes c, accounts a
        WHERE c.join_code = $1 AND a.email = ANY ($2) RETURNING class_id`,
      [joinCode, trainers],
    );
  }

  async accountId(email: string): Promise<string> {
    const [row] = await this.rows<{ id: string }>('SELECT id FROM accounts WHERE email = $1', [
      email,
    ]);
    if (!row) throw new Error(`Nobody has the address ${email}.`);
    return row.id;
  }

  async noteSeen(accountId: string, at: string): Promise<void> {
    await this.rows('UPDATE accounts SET last_seen_at = $2 WHERE id = $1 RETURNING id', [
      accountId,
      at,
    ]);
  }

  private async enter(person: SeededPerson, passwordHash: string | null): Promise<void> {
    const { email, givenName, familyName, roles } = person;
    await this.rows(
      `WITH entered AS (
         INSERT INTO accounts (email, given_name, family_name, password_hash, email_confirmed_at, created_at)
         VALUES ($1, $2, $3, $4, $5, $5) RETURNING id)
       INSERT INTO account_roles (account_id, role) SELECT id, unnest($6::text[]) FROM entered
       RETURNING account_id`,
      [email, givenName, familyName, passwordHash, JOINED_AT, roles],
    );
  }

  private rows<T extends object>(sql: string, bind: unknown[]): Promise<T[]> {
    return this.sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT });
  }
}
