import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { CertificateEvent, CertificateRecord } from './certificate.ts';
import { stateAt } from './state-at.ts';

const RECORD = `
  SELECT c.id, c.account_id AS "accountId", c.number, c.link_code AS "linkCode",
         c.holder_name AS "holderName", c.family_fold AS "familyFold", c.how_sat AS "howSat",
         c.issued_at AS "issuedAt", c.issued_on::text AS "issuedOn", c.expires_on::text AS "expiresOn",
         jsonb_build_object('title', s.title, 'revision', s.revision) AS scheme, s.scope, s.limits,
         ${stateAt('$1')} AS state,
         f.signed_at AS "signedAt",
         (SELECT jsonb_build_object('on', (e.at AT TIME ZONE s.zone)::date::text, 'reason', e.reason)
            FROM certificate_events e WHERE e.certificate_id = c.id AND e.kind = 'withdrawn') AS withdrawn,
         (SELECT n.number FROM certificate_events e JOIN certificates n ON n.id = e.replaced_by
           WHERE e.certificate_id = c.id) AS "replacedBy"
    FROM certificates c JOIN schemes s ON s.id = c.scheme_id
    LEFT JOIN certificate_files f ON f.certificate_id = c.id`;

/** Where a page of the desk's list ends. */
export interface CertificatePlace {
  readonly issuedAt: Date;
  readonly id: string;
}

/** Which certificates are wanted: parts of a number and of a name, each folded. */
export interface WantedCertificates {
  readonly numberPart: string;
  readonly namePart: string;
  readonly nameFold: string;
  readonly after: CertificatePlace | null;
  readonly most: number;
}

const escapeLike = (text: string) => text.replaceAll(/[\\%_]/g, '\\$&');
/** A pattern for what holds the part; an empty part is held by nothing. */
const holding = (part: string) => (part === '' ? null : `%${escapeLike(part)}%`);

/** Reads certificates as they stand at an instant. */
@Injectable()
export class CertificateRecordsRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  findById(id: string, now: Date): Promise<CertificateRecord | null> {
    return this.one('c.id = $2', now, id);
  }

  findByNumber(number: string, now: Date): Promise<CertificateRecord | null> {
    return this.one('c.number = $2', now, number);
  }

  findByLink(linkCode: string, now: Date): Promise<CertificateRecord | null> {
    return this.one('c.link_code = $2', now, linkCode);
  }

  findByHash(sha256: Buffer, now: Date): Promise<CertificateRecord | null> {
    return this.one('f.sha256 = $2', now, sha256);
  }

  ofAccount(accountId: string, now: Date): Promise<CertificateRecord[]> {
    return this.read(
      `${RECORD} WHERE c.account_id = $2 ORDER BY c.issued_at DESC, c.id DESC LIMIT 200`,
      [now, accountId],
    );
  }

  page(wanted: WantedCertificates, now: Date): Promise<CertificateRecord[]> {
    const { numberPart, namePart, nameFold, after, most } = wanted;
    return this.read(
      `${RECORD}
        WHERE ($2::text IS NULL OR c.holder_name ILIKE $2 OR c.family_fold LIKE $3
               OR replace(c.number, '-', '') LIKE $4)
          AND ($5::timestamptz IS NULL OR (c.issued_at, c.id) < ($5::timestamptz, $6::uuid))
        ORDER BY c.issued_at DESC, c.id DESC LIMIT $7`,
      [
        ...[now, holding(namePart), holding(nameFold), holding(numberPart)],
        ...[after?.issuedAt ?? null, after?.id ?? null, most],
      ],
    );
  }

  /** What happened to certificates, the oldest first. */
  async eventsOf(certificateIds: readonly string[]): Promise<CertificateEvent[]> {
    return this.sequelize.query<CertificateEvent>(
      `SELECT e.certificate_id AS "certificateId", e.kind, e.at, e.reason, n.number AS "replacedBy",
              NULLIF(trim(a.given_name || ' ' || a.family_name), '') AS "actorName"
         FROM certificate_events e
         LEFT JOIN certificates n ON n.id = e.replaced_by
         LEFT JOIN accounts a ON a.id = e.actor_id
        WHERE e.certificate_id = ANY ($1::uuid[])
       UNION ALL
       SELECT f.certificate_id, 'signed', f.signed_at, f.key_id, NULL, NULL
         FROM certificate_files f WHERE f.certificate_id = ANY ($1::uuid[])
        ORDER BY at, kind`,
      { bind: [[...certificateIds]], type: QueryTypes.SELECT },
    );
  }

  private async one(
    condition: string,
    now: Date,
    value: string | Buffer,
  ): Promise<CertificateRecord | null> {
    const [record] = await this.read(`${RECORD} WHERE ${condition}`, [now, value]);
    return record ?? null;
  }

  private async read(sql: string, bind: unknown[]): Promise<CertificateRecord[]> {
    const rows = await this.sequelize.query<CertificateRecord>(sql, {
      bind,
      type: QueryTypes.SELECT,
    });
    return rows.map((row) => Object.freeze(row));
  }
}
