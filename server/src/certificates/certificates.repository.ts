import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type {
  CertificateOfSitting,
  CertificateRecord,
  Certification,
  Marks,
  NewCertificate,
  Replacement,
} from './certificate.ts';
import { CertificateEventModel } from './models/certificate-event.model.ts';
import { DecisionModel } from './models/decision.model.ts';
import { stateAt } from './state-at.ts';

/** Who ended a certificate, when and why. */
export interface CertificateEnd {
  readonly certificateId: string;
  readonly actorId: string;
  readonly reason: string;
  readonly at: Date;
  /** The certificate that takes its place; null when it is withdrawn. */
  readonly replacedBy: string | null;
}

/** The decision that a name is to be corrected. */
export interface Correction {
  readonly replaced: CertificateRecord;
  readonly holderName: string;
  readonly decider: { readonly id: string; readonly name: string };
  readonly reason: string;
  readonly decidedAt: Date;
}

/** Writes decisions, certificates and what happens to them. Nothing here is ever changed. */
const STATE_NOW = stateAt('$3');

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

  async addCorrection(correction: Correction): Promise<string> {
    const { replaced, holderName, decider, reason, decidedAt } = correction;
    const rows = await this.sequelize.query<{ id: string }>(
      `INSERT INTO decisions (account_id, scheme_id, outcome, decided_by, decider_id, evidence, rules, decided_at)
       SELECT account_id, scheme_id, 'correct-name', $2, $3, $4, $5, $6 FROM certificates WHERE id = $1
       RETURNING id`,
      {
        bind: [
          ...[replaced.id, decider.name, decider.id],
          JSON.stringify({ replaces: replaced.number, from: replaced.holderName, to: holderName }),
          JSON.stringify({ reason, kept: ['person', 'scheme', 'way of sitting', 'dates'] }),
          decidedAt,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.id ?? '';
  }

  /**
   * Adds a certificate; null when its number or link code is already taken. The day of issue is
   * the day in the scheme's zone, and the expiry is counted by the database.
   */
  async add(certificate: NewCertificate, { number, linkCode }: Marks): Promise<string | null> {
    const { accountId, decisionId, schemeId, holderName, familyFold, howSat } = certificate;
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
          ...[number, linkCode, accountId, decisionId, schemeId],
          ...[holderName, familyFold, howSat, certificate.issuedAt],
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.id ?? null;
  }

  /** As `add`, for a certificate that keeps the dates of the one it replaces. */
  async addReplacement(
    replacement: Replacement,
    { number, linkCode }: Marks,
  ): Promise<string | null> {
    const { replacedId, decisionId, holderName, familyFold, issuedAt } = replacement;
    const rows = await this.sequelize.query<{ id: string }>(
      `INSERT INTO certificates (number, link_code, account_id, decision_id, scheme_id, holder_name,
                                 family_fold, how_sat, issued_at, issued_on, expires_on)
       SELECT $1, $2, account_id, $4, scheme_id, $5, $6, how_sat, $7, issued_on, expires_on
         FROM certificates WHERE id = $3
       ON CONFLICT DO NOTHING RETURNING id`,
      {
        bind: [number, linkCode, replacedId, decisionId, holderName, familyFold, issuedAt],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.id ?? null;
  }

  async addIssued(
    certificateId: string,
    issued: { reason: string; actorId: string | null; at: Date },
  ): Promise<void> {
    await this.events.create({ certificateId, kind: 'issued', ...issued });
  }

  /** False when the certificate has been withdrawn or replaced already: it ends once. */
  async addEnd(end: CertificateEnd): Promise<boolean> {
    const { certificateId, actorId, reason, at, replacedBy } = end;
    const rows = await this.sequelize.query(
      `INSERT INTO certificate_events (certificate_id, kind, reason, actor_id, replaced_by, at)
       VALUES ($1, $2, $3, $4, $5, $6) ON CONFLICT DO NOTHING RETURNING id`,
      {
        bind: [
          ...[certificateId, replacedBy === null ? 'withdrawn' : 'superseded', reason],
          ...[actorId, replacedBy, at],
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows.length > 0;
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

  /** A certificate of the scheme, of any revision, that is valid at this instant. */
  async findHeld(accountId: string, schemeSlug: string, now: Date): Promise<string | null> {
    const rows = await this.sequelize.query<{ id: string }>(
      `SELECT c.id FROM certificates c JOIN schemes s ON s.id = c.scheme_id
        WHERE c.account_id = $1 AND s.slug = $2 AND ${STATE_NOW} = 'valid'
        ORDER BY c.expires_on DESC, c.issued_at DESC LIMIT 1`,
      { bind: [accountId, schemeSlug, now], type: QueryTypes.SELECT },
    );
    return rows[0]?.id ?? null;
  }
}
