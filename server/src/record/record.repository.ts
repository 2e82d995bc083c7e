import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { AnsweredQuestion } from './answered-question.ts';

/** Something was answered: a question left blank was not tried. */
const TRIED = `jsonb_path_exists(marked, '$.parts[*] ? (@.verdict != "blank")')`;

@Injectable()
export class RecordRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Every question a person answered, oldest first. */
  async answeredBy(accountId: string, zone: string): Promise<AnsweredQuestion[]> {
    const rows = await this.sequelize.query<AnsweredQuestion>(
      `SELECT slug, at, (at AT TIME ZONE $2)::date::text AS day,
              (marked ->> 'marks')::int * 100 / (marked ->> 'outOf')::int AS percent,
              "isWhole", "isHinted"
         FROM (
           SELECT drawn ->> 'slug' AS slug, handed_in_at AS at, marked,
                  steps_left IS NULL AS "isWhole", cardinality(hints) > 0 AS "isHinted"
             FROM practice_attempts WHERE account_id = $1 AND handed_in_at IS NOT NULL
           UNION ALL
           SELECT item ->> 'slug', handed_in_at, marked -> (item ->> 'key'), true, false
             FROM worksheet_attempts, jsonb_array_elements(items) AS item
            WHERE account_id = $1 AND handed_in_at IS NOT NULL
         ) AS answered
        WHERE (marked ->> 'outOf')::int > 0 AND ${TRIED}
        ORDER BY at, slug`,
      { bind: [accountId, zone], type: QueryTypes.SELECT },
    );
    return rows.map((row) => Object.freeze(row));
  }
}
