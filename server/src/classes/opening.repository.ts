import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { ClassRecord } from './class-records.ts';

type NewClass = Omit<ClassRecord, 'id' | 'school'>;

@Injectable()
export class OpeningRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Those of the addresses whose people are trainers. */
  findTrainers(emails: readonly string[]): Promise<{ id: string; email: string }[]> {
    return this.select(
      `SELECT a.id, a.email FROM accounts a JOIN account_roles r ON r.account_id = a.id
        WHERE r.role = 'trainer' AND a.email = ANY ($1)`,
      [emails],
    );
  }

  /** @returns the id, or null when no school is entered. */
  async add(record: NewClass, trainerIds: readonly string[]): Promise<string | null> {
    const { courseSlug, name, joinCode, startsOn, endsOn } = record;
    const [row] = await this.select<{ id: string }>(
      `INSERT INTO classes (organisation_id, course_slug, name, join_code, starts_on, ends_on)
       SELECT id, $1, $2, $3, $4, $5 FROM organisations
        WHERE kind = 'school' ORDER BY created_at, id LIMIT 1 RETURNING id`,
      [courseSlug, name, joinCode, startsOn, endsOn],
    );
    if (!row) return null;
    await this.select(
      `INSERT INTO class_trainers (class_id, account_id) SELECT $1, unnest($2::uuid[])
       RETURNING class_id`,
      [row.id, trainerIds],
    );
    return row.id;
  }

  private select<T extends object>(sql: string, bind: unknown[]): Promise<T[]> {
    return this.sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT });
  }
}
