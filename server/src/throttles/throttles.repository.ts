import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { PastTries } from './throttle.ts';

interface TriesRow {
  count: string;
  last_at: Date | null;
}

@Injectable()
export class ThrottlesRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Makes others who count the same subject wait until this transaction ends. */
  async lock(kind: string, subjectHash: Buffer): Promise<void> {
    await this.sequelize.query(
      `SELECT pg_advisory_xact_lock(hashtextextended($1 || encode($2::bytea, 'hex'), 0))`,
      { bind: [kind, subjectHash], type: QueryTypes.SELECT },
    );
  }

  async past(kind: string, subjectHash: Buffer, since: Date): Promise<PastTries> {
    const rows = await this.sequelize.query<TriesRow>(
      `SELECT count(*) AS count, max(at) AS last_at FROM failed_tries
        WHERE kind = $1 AND subject_hash = $2 AND at > $3`,
      { bind: [kind, subjectHash, since], type: QueryTypes.SELECT },
    );
    return { count: Number(rows[0]?.count ?? 0), lastAt: rows[0]?.last_at ?? null };
  }

  async add(kind: string, subjectHash: Buffer, at: Date): Promise<string> {
    const rows = await this.sequelize.query<{ id: string }>(
      'INSERT INTO failed_tries (kind, subject_hash, at) VALUES ($1, $2, $3) RETURNING id',
      { bind: [kind, subjectHash, at], type: QueryTypes.SELECT },
    );
    return rows[0]?.id ?? '';
  }

  async remove(id: string): Promise<void> {
    await this.sequelize.query('DELETE FROM failed_tries WHERE id = $1', {
      bind: [id],
      type: QueryTypes.DELETE,
    });
  }

  async removeAll(kind: string, subjectHash: Buffer): Promise<void> {
    await this.sequelize.query('DELETE FROM failed_tries WHERE kind = $1 AND subject_hash = $2', {
      bind: [kind, subjectHash],
      type: QueryTypes.DELETE,
    });
  }

  async removeOlder(before: Date): Promise<void> {
    await this.sequelize.query('DELETE FROM failed_tries WHERE at < $1', {
      bind: [before],
      type: QueryTypes.DELETE,
    });
  }
}
