import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { SecurityEvent } from './security-event.ts';

export interface RecordedEvent {
  readonly at: Date;
  readonly kind: string;
  readonly actorName: string | null;
  readonly detail: Readonly<Record<string, string | number | boolean>>;
}

interface EventRow {
  at: Date;
  kind: string;
  actor_name: string | null;
  detail: Record<string, string | number | boolean>;
}

@Injectable()
export class SecurityEventsRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async add(event: SecurityEvent, at: Date): Promise<void> {
    await this.sequelize.query(
      `INSERT INTO security_events (at, kind, account_id, actor_id, address, detail)
       VALUES ($1, $2, $3, $4, $5, $6)`,
      {
        bind: [
          at,
          event.kind,
          event.accountId,
          event.actorId,
          event.address ?? '',
          JSON.stringify(event.detail ?? {}),
        ],
        type: QueryTypes.INSERT,
      },
    );
  }

  async latelyOf(accountId: string, most: number): Promise<RecordedEvent[]> {
    const rows = await this.sequelize.query<EventRow>(
      `SELECT e.at, e.kind, e.detail,
              CASE WHEN e.actor_id <> e.account_id THEN trim(a.given_name || ' ' || a.family_name) END AS actor_name
         FROM security_events e LEFT JOIN accounts a ON a.id = e.actor_id
        WHERE e.account_id = $1 ORDER BY e.at DESC, e.id DESC LIMIT $2`,
      { bind: [accountId, most], type: QueryTypes.SELECT },
    );
    return rows.map(({ at, kind, actor_name, detail }) =>
      Object.freeze({ at, kind, actorName: actor_name, detail }),
    );
  }
}
