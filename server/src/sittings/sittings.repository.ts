import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import type { DrawnQuestion } from '@ferrule/assessments';
import { literal, QueryTypes, Sequelize } from 'sequelize';
import { Clock } from '../clock/clock.ts';
import { SittingItemModel } from './models/sitting-item.model.ts';
import { SittingModel } from './models/sitting.model.ts';
import type { HandedInHow, Sitting } from './sitting.ts';

/** One question of a paper, with what was drawn for it. */
export interface SittingItem {
  readonly key: string;
  readonly number: number;
  readonly questionRevisionId: string;
  readonly subject: string;
  readonly marks: number;
  readonly drawn: DrawnQuestion;
}

/** A sitting with the database's time at the moment it was read. */
export interface SittingNow {
  readonly sitting: Sitting;
  readonly now: Date;
}

const withTime = {
  include: [[literal('clock_timestamp()'), 'readAt']] as [ReturnType<typeof literal>, string][],
};

@Injectable()
export class SittingsRepository {
  constructor(
    @InjectModel(SittingModel) private readonly sittings: typeof SittingModel,
    @InjectModel(SittingItemModel) private readonly items: typeof SittingItemModel,
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly clock: Clock,
  ) {}

  /** The time that decides: the database's. */
  async now(): Promise<Date> {
    const [row] = await this.sequelize.query<{ read_at: Date }>(
      'SELECT clock_timestamp() AS read_at',
      {
        type: QueryTypes.SELECT,
      },
    );
    return this.clock.agreed(row?.read_at ?? this.clock.now());
  }

  /** False when the person has a paper open: the index `sittings_one_open_per_person` decides. */
  async addUnlessOneIsOpen(sitting: Sitting): Promise<boolean> {
    const rows = await this.sequelize.query<{ id: string }>(
      `INSERT INTO sittings (id, account_id, paper_slug, blueprint_revision_id, scheme_id, rules,
                             agreement_hash, given_name, family_name, writing_session_id,
                             started_at, closes_at)
       VALUES ($1, $2, $3, $4, $5, $6, decode($7, 'hex'), $8, $9, $10, $11, $12)
       ON CONFLICT (account_id) WHERE handed_in_at IS NULL DO NOTHING RETURNING id`,
      {
        bind: [
          sitting.id,
          sitting.accountId,
          sitting.paperSlug,
          sitting.blueprintRevisionId,
          sitting.schemeId,
          JSON.stringify(sitting.rules),
          sitting.agreementHash,
          sitting.givenName,
          sitting.familyName,
          sitting.writingSessionId,
          sitting.startedAt,
          sitting.closesAt,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows.length === 1;
  }

  async addItems(sittingId: string, items: readonly SittingItem[]): Promise<void> {
    await this.items.bulkCreate(items.map((item) => ({ ...item, sittingId })));
  }

  async findOwned(id: string, accountId: string): Promise<SittingNow | null> {
    return this.read(
      await this.sittings.findOne({ attributes: withTime, where: { id, accountId } }),
    );
  }

  async find(id: string): Promise<SittingNow | null> {
    return this.read(await this.sittings.findOne({ attributes: withTime, where: { id } }));
  }

  async findOpenOf(accountId: string): Promise<SittingNow | null> {
    const where = { accountId, handedInAt: null };
    return this.read(await this.sittings.findOne({ attributes: withTime, where }));
  }

  /** Holds the sitting until the open transaction ends. */
  async lock(id: string): Promise<SittingNow | null> {
    const where = { id };
    return this.read(await this.sittings.findOne({ attributes: withTime, where, lock: true }));
  }

  async lockOwned(id: string, accountId: string): Promise<SittingNow | null> {
    const where = { id, accountId };
    return this.read(await this.sittings.findOne({ attributes: withTime, where, lock: true }));
  }

  /** True when this call closed it: only one ever does. */
  async close(id: string, at: Date, how: HandedInHow): Promise<boolean> {
    const [closed] = await this.sittings.update(
      { handedInAt: at, handedInHow: how },
      { where: { id, handedInAt: null } },
    );
    return closed === 1;
  }

  async setWriter(id: string, sessionId: string): Promise<void> {
    await this.sittings.update({ writingSessionId: sessionId }, { where: { id } });
  }

  async itemsOf(sittingId: string): Promise<SittingItem[]> {
    const rows = await this.items.findAll({ where: { sittingId }, order: [['number', 'ASC']] });
    return rows.map(toItem);
  }

  async findItem(sittingId: string, key: string): Promise<SittingItem | null> {
    const row = await this.items.findOne({ where: { sittingId, key } });
    return row ? toItem(row) : null;
  }

  /** Whom to write to. */
  async findCandidate(accountId: string): Promise<{ name: string; email: string } | null> {
    const [row] = await this.sequelize.query<{ name: string; email: string }>(
      'SELECT given_name AS name, email FROM accounts WHERE id = $1',
      { bind: [accountId], type: QueryTypes.SELECT },
    );
    return row ?? null;
  }

  private read(row: SittingModel | null): SittingNow | null {
    if (!row) return null;
    return { sitting: toSitting(row), now: this.clock.agreed(row.get('readAt') as Date) };
  }
}

function toItem(row: SittingItemModel): SittingItem {
  const { key, number, questionRevisionId, subject, marks, drawn } = row;
  return Object.freeze({ key, number, questionRevisionId, subject, marks, drawn });
}

function toSitting(row: SittingModel): Sitting {
  return Object.freeze({
    id: row.id,
    accountId: row.accountId,
    paperSlug: row.paperSlug,
    blueprintRevisionId: row.blueprintRevisionId,
    schemeId: row.schemeId,
    rules: row.rules,
    agreementHash: row.agreementHash.toString('hex'),
    givenName: row.givenName,
    familyName: row.familyName,
    writingSessionId: row.writingSessionId,
    startedAt: row.startedAt,
    closesAt: row.closesAt,
    handedInAt: row.handedInAt,
    handedInHow: row.handedInHow,
  });
}
