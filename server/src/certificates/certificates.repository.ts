import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { CertificateOfSitting, Certification, NewCertificate } from './certificate.ts';
import { CertificateEventModel } from './models/certificate-event.model.ts';
import { DecisionModel } from './models/decision.model.ts';

@Injectable()
export class CertificatesRepository {
  constructor(
    @InjectModel(DecisionModel) private readonly decisions: typeof DecisionModel,
    @InjectModel(CertificateEventModel) private readonly events: typeof CertificateEventModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async addDecision(certification: Certification): Promise<string> {
    const { accountId, schemeId, sittingId, evidence, rules, decidedAt } = certification;
    const row = await this.decisions.create({
      ...{ accountId, schemeId, sittingId, evidence, rules, decidedAt },
      outcome: 'certify',
      decidedBy: 'by the rules frozen with the sitting',
    });
    return row.id;
  }

  /**
   * Adds a certificate; null when its number or link code is already taken. The day of issue is
   * the day in the scheme's zone, and the expiry is counted by the database.
   */
  async add(
    certificate: NewCertificate,
    marks: { number: string; linkCode: string },
  ): Promise<string | null> {
    const rows = await this.sequelize.query<{ id: string }>(
      `INSERT INTO certificates (number, link_code, account_id, decision_id, scheme_id, holder_name,
                                 family_fold, how_sat, issued_at, issued_on, expires_on)
       SELECT $1, $2, $3, $4, s.id, $6, $7, $8, $9, issued.day,
              (issued.day + make_interval(years => s.valid_years))::date
         FROM schemes s, LATERAL (SELECT ($9::timestamptz AT TIME ZONE s.zone)::date AS day) issued
        WHERE s.id = $5
       ON CONFLICT DO NOTHING RETURNING id`,
      {
        bind: [
          marks.number,
          marks.linkCode,
          certificate.accountId,
          certificate.decisionId,
          certificate.schemeId,
          certificate.holderName,
          certificate.familyFold,
          certificate.howSat,
          certificate.issuedAt,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.id ?? null;
  }

  async addIssued(certificateId: string, at: Date): Promise<void> {
    await this.events.create({ certificateId, kind: 'issued', reason: 'Passed the paper.', at });
  }

  /** The certificate a sitting led to; after a corrected name, the one that replaced it. */
  async findBySitting(sittingId: string): Promise<CertificateOfSitting | null> {
    const rows = await this.sequelize.query<CertificateOfSitting>(
      `WITH RECURSIVE line AS (
         SELECT c.id, c.number FROM certificates c JOIN decisions d ON d.id = c.decision_id
          WHERE d.sitting_id = $1
         UNION ALL
         SELECT n.id, n.number FROM line
           JOIN certificate_events e ON e.certificate_id = line.id AND e.kind = 'superseded'
           JOIN certificates n ON n.id = e.replaced_by)
       SELECT id, number,
              EXISTS (SELECT 1 FROM certificate_files f WHERE f.certificate_id = line.id) AS ready
         FROM line
        WHERE NOT EXISTS (SELECT 1 FROM certificate_events e
                           WHERE e.certificate_id = line.id AND e.kind = 'superseded')`,
      { bind: [sittingId], type: QueryTypes.SELECT },
    );
    return rows[0] ?? null;
  }

  /** A certificate of the scheme, of any revision, that counts on this day in the scheme's zone. */
  async findHeld(accountId: string, schemeSlug: string, now: Date): Promise<string | null> {
    const rows = await this.sequelize.query<{ id: string }>(
      `SELECT c.id FROM certificates c JOIN schemes s ON s.id = c.scheme_id
        WHERE c.account_id = $1 AND s.slug = $2
          AND c.expires_on >= ($3::timestamptz AT TIME ZONE s.zone)::date
          AND NOT EXISTS (SELECT 1 FROM certificate_events e
                           WHERE e.certificate_id = c.id AND e.kind IN ('withdrawn', 'superseded'))
        ORDER BY c.expires_on DESC, c.issued_at DESC LIMIT 1`,
      { bind: [accountId, schemeSlug, now], type: QueryTypes.SELECT },
    );
    return rows[0]?.id ?? null;
  }
}
