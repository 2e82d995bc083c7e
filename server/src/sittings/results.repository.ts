import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import { SittingResultModel } from './models/sitting-result.model.ts';
import type { Marking, Result } from './result.ts';
import type { HandedInHow } from './sitting.ts';
import type { EarlierSitting } from './standing.ts';

/** One line of a certification manager's list. */
export interface ListedSitting {
  readonly id: string;
  readonly name: string;
  readonly satOn: string;
  readonly startedAt: Date;
  readonly handedInHow: HandedInHow;
  readonly marks: number | null;
  readonly outOf: number | null;
  readonly passed: boolean | null;
  readonly looks: number;
}

export interface Place {
  readonly startedAt: Date;
  readonly id: string;
}

@Injectable()
export class ResultsRepository {
  constructor(
    @InjectModel(SittingResultModel) private readonly results: typeof SittingResultModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  /**
   * Stores a marking; false when the sitting has a result already. Who did not pass may sit
   * again from the beginning of a day in the scheme's zone.
   */
  async addOnce(sittingId: string, marking: Marking, markedAt: Date): Promise<boolean> {
    const rows = await this.sequelize.query<{ sitting_id: string }>(
      `INSERT INTO sitting_results (sitting_id, marks, out_of, passed, by_subject, marked,
                                    marker_version, marked_at, may_sit_again_at)
       SELECT s.id, $2, $3, $4, $5, $6, $7, $8,
              CASE WHEN $4 THEN NULL ELSE
                ((s.handed_in_at AT TIME ZONE (s.rules->'scheme'->>'zone'))::date
                 + (s.rules->>'waitDays')::int)::timestamp AT TIME ZONE (s.rules->'scheme'->>'zone')
              END
         FROM sittings s WHERE s.id = $1
       ON CONFLICT (sitting_id) DO NOTHING RETURNING sitting_id`,
      {
        bind: [
          sittingId,
          marking.marks,
          marking.outOf,
          marking.passed,
          JSON.stringify(marking.bySubject),
          JSON.stringify(marking.marked),
          marking.markerVersion,
          markedAt,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows.length === 1;
  }

  async find(sittingId: string): Promise<Result | null> {
    const row = await this.results.findByPk(sittingId);
    if (!row) return null;
    const { marks, outOf, passed, bySubject, marked, markerVersion, markedAt } = row;
    const { maySitAgainAt } = row;
    return Object.freeze({
      ...{ sittingId, marks, outOf, passed, bySubject, marked, markerVersion, markedAt },
      maySitAgainAt,
    });
  }

  async exists(sittingId: string): Promise<boolean> {
    return (await this.results.count({ where: { sittingId } })) === 1;
  }

  /** A person's sittings of a paper, the newest first. */
  async earlier(accountId: string, paperSlug: string): Promise<EarlierSitting[]> {
    return this.sequelize.query<EarlierSitting>(
      `SELECT s.id, s.started_at AS "startedAt", s.handed_in_at AS "handedInAt", r.passed,
              r.may_sit_again_at AS "maySitAgainAt"
         FROM sittings s LEFT JOIN sitting_results r ON r.sitting_id = s.id
        WHERE s.account_id = $1 AND s.paper_slug = $2 ORDER BY s.started_at DESC, s.id`,
      { bind: [accountId, paperSlug], type: QueryTypes.SELECT },
    );
  }

  /** How far each of several people has come with a paper; who never sat it is left out. */
  async progressOf(
    accountIds: readonly string[],
    paperSlug: string,
    now: Date,
  ): Promise<{ accountId: string; isOpen: boolean; passed: boolean }[]> {
    return this.sequelize.query(
      `SELECT s.account_id AS "accountId", coalesce(bool_or(r.passed), false) AS passed,
              bool_or(s.handed_in_at IS NULL AND s.closes_at > $3) AS "isOpen"
         FROM sittings s LEFT JOIN sitting_results r ON r.sitting_id = s.id
        WHERE s.account_id = ANY($1::uuid[]) AND s.paper_slug = $2 GROUP BY s.account_id`,
      { bind: [[...accountIds], paperSlug, now], type: QueryTypes.SELECT },
    );
  }

  /** Papers handed in, the newest start first. */
  async list(paperSlug: string, after: Place | null, limit: number): Promise<ListedSitting[]> {
    return this.sequelize.query<ListedSitting>(
      `SELECT s.id, trim(s.given_name || ' ' || s.family_name) AS name, s.started_at AS "startedAt",
              ((s.started_at AT TIME ZONE (s.rules->'scheme'->>'zone'))::date)::text AS "satOn",
              s.handed_in_how AS "handedInHow", r.marks, r.out_of AS "outOf", r.passed,
              (SELECT count(*)::int FROM item_looks l WHERE l.sitting_id = s.id) AS looks
         FROM sittings s LEFT JOIN sitting_results r ON r.sitting_id = s.id
        WHERE s.paper_slug = $1 AND s.handed_in_at IS NOT NULL
          AND ($2::timestamptz IS NULL OR (s.started_at, s.id) < ($2::timestamptz, $3::uuid))
        ORDER BY s.started_at DESC, s.id DESC LIMIT $4`,
      {
        bind: [paperSlug, after?.startedAt ?? null, after?.id ?? null, limit],
        type: QueryTypes.SELECT,
      },
    );
  }
}
