import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import {
  shortName,
  type ClassMember,
  type ClassRecord,
  type Enrolment,
  type ListedClass,
  type School,
} from './class-records.ts';

const CLASS = `c.id, c.name, c.course_slug AS "courseSlug", o.name AS school, c.join_code AS "joinCode",
  c.starts_on::text AS "startsOn", c.ends_on::text AS "endsOn"`;
const CLASSES = 'classes c JOIN organisations o ON o.id = c.organisation_id';

interface TrainerRow {
  readonly givenName: string;
  readonly familyName: string;
}

@Injectable()
export class ClassesRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Classes the person learns in or trains; every class where `all` is set. */
  listFor(accountId: string, all: boolean): Promise<ListedClass[]> {
    return this.select<ListedClass>(
      `SELECT ${CLASS}, t.account_id IS NOT NULL AS trainer,
              (SELECT count(*)::int FROM class_members m
                WHERE m.class_id = c.id AND m.left_at IS NULL) AS members
         FROM ${CLASSES} LEFT JOIN class_trainers t ON t.class_id = c.id AND t.account_id = $1
        WHERE $2 OR t.account_id IS NOT NULL OR EXISTS (
          SELECT 1 FROM class_members m
           WHERE m.class_id = c.id AND m.account_id = $1 AND m.left_at IS NULL)
        ORDER BY c.starts_on DESC, c.name`,
      [accountId, all],
    );
  }

  /** A class its trainer may see; any class where `all` is set. */
  async findTrained(id: string, accountId: string, all: boolean): Promise<ClassRecord | null> {
    const rows = await this.select<ClassRecord>(
      `SELECT ${CLASS} FROM ${CLASSES}
        WHERE c.id = $1 AND ($3 OR EXISTS (
          SELECT 1 FROM class_trainers t WHERE t.class_id = c.id AND t.account_id = $2))`,
      [id, accountId, all],
    );
    return rows[0] ?? null;
  }

  async findByJoinCode(joinCode: string): Promise<ClassRecord | null> {
    const rows = await this.select<ClassRecord>(
      `SELECT ${CLASS} FROM ${CLASSES} WHERE c.join_code = $1`,
      [joinCode],
    );
    return rows[0] ?? null;
  }

  /** False when the person is a member already. */
  async addMember(classId: string, accountId: string, now: Date): Promise<boolean> {
    const rows = await this.select(
      `INSERT INTO class_members (class_id, account_id, joined_at) VALUES ($1, $2, $3)
       ON CONFLICT (class_id, account_id) DO UPDATE SET joined_at = $3, left_at = NULL
         WHERE class_members.left_at IS NOT NULL
       RETURNING class_id`,
      [classId, accountId, now],
    );
    return rows.length === 1;
  }

  /** The class joined last, for the course. */
  async enrolment(accountId: string, courseSlug: string): Promise<Enrolment | null> {
    const [row] = await this.select<{
      id: string;
      name: string;
      joinedAt: Date;
      trainers: TrainerRow[];
    }>(
      `SELECT c.id, c.name, m.joined_at AS "joinedAt", ${trainersOf('c.id')} AS trainers
         FROM class_members m JOIN classes c ON c.id = m.class_id
        WHERE m.account_id = $1 AND m.left_at IS NULL AND c.course_slug = $2
        ORDER BY m.joined_at DESC LIMIT 1`,
      [accountId, courseSlug],
    );
    if (!row) return null;
    const { id: classId, name: className, joinedAt } = row;
    return Object.freeze({ classId, className, joinedAt, trainers: namesOf(row.trainers) });
  }

  async trainers(classId: string): Promise<string[]> {
    const [row] = await this.select<{ trainers: TrainerRow[] }>(
      `SELECT ${trainersOf('$1')} AS trainers`,
      [classId],
    );
    return namesOf(row?.trainers ?? []);
  }

  members(classId: string): Promise<ClassMember[]> {
    return this.select<ClassMember>(
      `SELECT a.id, a.given_name AS "givenName", a.family_name AS "familyName",
              m.joined_at AS "joinedAt", a.last_seen_at AS "lastSeenAt"
         FROM class_members m JOIN accounts a ON a.id = m.account_id
        WHERE m.class_id = $1 AND m.left_at IS NULL
        ORDER BY a.family_name, a.given_name, a.id`,
      [classId],
    );
  }

  async trains(trainerId: string, traineeId: string): Promise<boolean> {
    const rows = await this.select(
      `SELECT 1 FROM class_trainers t JOIN class_members m ON m.class_id = t.class_id
        WHERE t.account_id = $1 AND m.account_id = $2 AND m.left_at IS NULL LIMIT 1`,
      [trainerId, traineeId],
    );
    return rows.length === 1;
  }

  /** The school of the person's class, or the school this place is run by. */
  async school(accountId: string | null): Promise<School | null> {
    const rows = await this.select<School>(
      `SELECT o.name, o.address FROM organisations o
         LEFT JOIN classes c ON c.organisation_id = o.id
         LEFT JOIN class_members m ON m.class_id = c.id AND m.account_id = $1 AND m.left_at IS NULL
        WHERE o.kind = 'school'
        ORDER BY m.joined_at DESC NULLS LAST, o.created_at, o.id LIMIT 1`,
      [accountId],
    );
    return rows[0] ?? null;
  }

  private select<T extends object>(sql: string, bind: unknown[]): Promise<T[]> {
    return this.sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT });
  }
}

const trainersOf = (classId: string) => `(
  SELECT coalesce(json_agg(json_build_object('givenName', a.given_name, 'familyName', a.family_name)
           ORDER BY a.family_name, a.given_name), '[]')
    FROM class_trainers t JOIN accounts a ON a.id = t.account_id WHERE t.class_id = ${classId})`;

const namesOf = (rows: readonly TrainerRow[]) =>
  rows.map(({ givenName, familyName }) => shortName(givenName, familyName));
