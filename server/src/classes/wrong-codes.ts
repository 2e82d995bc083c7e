import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { createHash } from 'node:crypto';
import { QueryTypes, Sequelize } from 'sequelize';

const KIND = 'join-code';
const subjectOf = (accountId: string) =>
  createHash('sha256').update(`${KIND}|${accountId}`).digest();

/** Counts wrong join codes, so that nobody can try them one after the other. */
@Injectable()
export class WrongCodes {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async add(accountId: string, at: Date): Promise<void> {
    await this.sequelize.query(
      'INSERT INTO failed_tries (kind, subject_hash, at) VALUES ($1, $2, $3)',
      { bind: [KIND, subjectOf(accountId), at], type: QueryTypes.INSERT },
    );
  }

  /** How many there were since, and when the first of them was. */
  async since(accountId: string, from: Date): Promise<{ count: number; firstAt: Date | null }> {
    const [row] = await this.sequelize.query<{ count: number; firstAt: Date | null }>(
      `SELECT count(*)::int AS count, min(at) AS "firstAt" FROM failed_tries
        WHERE kind = $1 AND subject_hash = $2 AND at > $3`,
      { bind: [KIND, subjectOf(accountId), from], type: QueryTypes.SELECT },
    );
    return row ?? { count: 0, firstAt: null };
  }
}
