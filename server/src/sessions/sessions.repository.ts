import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { Op, QueryTypes, Sequelize } from 'sequelize';
import type { Role, SignedInAccount } from '../accounts/account.ts';
import { SessionModel } from './models/session.model.ts';
import type { NewSession, OpenSession, SessionStanding } from './session.ts';

const SIGNED_IN = `a.id, s.id AS session_id, a.given_name, a.family_name, a.email, s.authenticated_at,
  s.second_factor_at, s.last_seen_at,
  ARRAY(SELECT role FROM account_roles r WHERE r.account_id = a.id ORDER BY role) AS roles`;

/** A session is open when it has not ended and somebody used it lately. */
export interface OpenAt {
  readonly now: Date;
  readonly idleSince: Date;
}

interface StandingRow extends SignedInRow {
  ends_at: Date;
  has_second_factor: boolean;
}

interface SignedInRow {
  id: string;
  session_id: string;
  given_name: string;
  family_name: string;
  email: string;
  roles: Role[];
  authenticated_at: Date;
  second_factor_at: Date | null;
  last_seen_at: Date;
}

export interface FoundSession {
  readonly account: SignedInAccount;
  readonly lastSeenAt: Date;
}

@Injectable()
export class SessionsRepository {
  constructor(
    @InjectModel(SessionModel) private readonly sessions: typeof SessionModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async add(session: NewSession): Promise<string> {
    const row = await this.sessions.create({
      ...session,
      lastSeenAt: session.startedAt,
      authenticatedAt: session.startedAt,
    });
    return row.id;
  }

  /** The account of a session that is open now, with its roles; one query a request. */
  async findOpen(
    sessionId: string,
    tokenHash: Buffer,
    limits: OpenAt,
  ): Promise<FoundSession | null> {
    const rows = await this.sequelize.query<SignedInRow>(
      `SELECT ${SIGNED_IN}
         FROM sessions s JOIN accounts a ON a.id = s.account_id
        WHERE s.id = $1 AND s.token_hash = $2 AND s.ended_at IS NULL AND s.ends_at > $3
          AND s.last_seen_at > $4 AND a.suspended_at IS NULL AND a.email_confirmed_at IS NOT NULL`,
      { bind: [sessionId, tokenHash, limits.now, limits.idleSince], type: QueryTypes.SELECT },
    );
    const row = rows[0];
    return row ? { account: toAccount(row), lastSeenAt: row.last_seen_at } : null;
  }

  async findStanding(sessionId: string, limits: OpenAt): Promise<SessionStanding | null> {
    const rows = await this.sequelize.query<StandingRow>(
      `SELECT ${SIGNED_IN}, s.ends_at,
              EXISTS (SELECT 1 FROM second_factors f
                       WHERE f.account_id = a.id AND f.confirmed_at IS NOT NULL) AS has_second_factor
         FROM sessions s JOIN accounts a ON a.id = s.account_id
        WHERE s.id = $1 AND s.ended_at IS NULL AND s.ends_at > $2 AND s.last_seen_at > $3`,
      { bind: [sessionId, limits.now, limits.idleSince], type: QueryTypes.SELECT },
    );
    const row = rows[0];
    return row
      ? Object.freeze({
          account: toAccount(row),
          lastSeenAt: row.last_seen_at,
          endsAt: row.ends_at,
          hasSecondFactor: row.has_second_factor,
        })
      : null;
  }

  async listOpen(accountId: string, limits: OpenAt): Promise<OpenSession[]> {
    const rows = await this.sessions.findAll({
      attributes: ['id', 'startedAt', 'lastSeenAt', 'device', 'address'],
      where: {
        accountId,
        endedAt: null,
        endsAt: { [Op.gt]: limits.now },
        lastSeenAt: { [Op.gt]: limits.idleSince },
      },
      order: [['lastSeenAt', 'DESC']],
      limit: 100,
    });
    return rows.map(({ id, startedAt, lastSeenAt, device, address }) =>
      Object.freeze({ id, startedAt, lastSeenAt, device, address }),
    );
  }

  async end(id: string, at: Date): Promise<void> {
    await this.sessions.update({ endedAt: at }, { where: { id, endedAt: null } });
  }

  /** @returns whether there was such a session. */
  async endOwn(accountId: string, id: string, at: Date): Promise<boolean> {
    const [ended] = await this.sessions.update(
      { endedAt: at },
      { where: { id, accountId, endedAt: null } },
    );
    return ended > 0;
  }

  async endAll(accountId: string, exceptId: string | null, at: Date): Promise<void> {
    await this.sessions.update(
      { endedAt: at },
      {
        where: {
          accountId,
          endedAt: null,
          ...(exceptId === null ? {} : { id: { [Op.ne]: exceptId } }),
        },
      },
    );
  }

  async mark(
    id: string,
    given: { secondFactorAt: Date } | { authenticatedAt: Date },
  ): Promise<void> {
    await this.sessions.update(given, { where: { id } });
  }

  async touch(sessionId: string, now: Date): Promise<void> {
    await this.sequelize.query(
      `WITH seen AS (UPDATE sessions SET last_seen_at = $2 WHERE id = $1 RETURNING account_id)
       UPDATE accounts SET last_seen_at = $2 WHERE id = (SELECT account_id FROM seen)`,
      { bind: [sessionId, now], type: QueryTypes.UPDATE },
    );
  }
}

function toAccount(row: SignedInRow): SignedInAccount {
  return Object.freeze({
    id: row.id,
    sessionId: row.session_id,
    givenName: row.given_name,
    familyName: row.family_name,
    email: row.email,
    roles: row.roles,
    authenticatedAt: row.authenticated_at,
    secondFactorAt: row.second_factor_at,
  });
}
