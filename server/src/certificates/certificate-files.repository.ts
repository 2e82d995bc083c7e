import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import { CertificateFileModel } from './models/certificate-file.model.ts';

/** A certificate with everything its file says. */
export interface StatedCertificate {
  readonly id: string;
  readonly accountId: string;
  readonly number: string;
  readonly linkCode: string;
  readonly holderName: string;
  readonly howSat: string;
  /** YYYY-MM-DD */
  readonly issuedOn: string;
  readonly expiresOn: string;
  readonly scheme: {
    readonly slug: string;
    readonly revision: string;
    readonly title: string;
    readonly scope: string[];
    readonly limits: string[];
  };
  readonly issuer: { readonly name: string; readonly address: string };
  readonly hasFile: boolean;
  /** The certificate it replaces, if it corrects one, and why. */
  readonly replaces: { readonly number: string; readonly reason: string } | null;
  readonly email: string;
  readonly givenName: string;
}

export interface CertificateFile {
  readonly certificateId: string;
  readonly keyId: string;
  readonly pdf: Buffer;
  readonly sha256: Buffer;
  readonly signedAt: Date;
}

/** Before a school is on the books. */
const noSchool = { name: 'Ferrule', address: 'No address on record' };

@Injectable()
export class CertificateFilesRepository {
  constructor(
    @InjectModel(CertificateFileModel) private readonly files: typeof CertificateFileModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  async findStated(certificateId: string): Promise<StatedCertificate | null> {
    const rows = await this.sequelize.query<StatedCertificate>(
      `SELECT c.id, c.account_id AS "accountId", c.number, c.link_code AS "linkCode",
              c.holder_name AS "holderName", c.how_sat AS "howSat",
              c.issued_on::text AS "issuedOn", c.expires_on::text AS "expiresOn",
              jsonb_build_object('slug', s.slug, 'revision', s.revision, 'title', s.title,
                                 'scope', s.scope, 'limits', s.limits) AS scheme,
              (SELECT jsonb_build_object('name', o.name, 'address', o.address)
                 FROM organisations o WHERE o.kind = 'school' ORDER BY o.created_at LIMIT 1) AS issuer,
              EXISTS (SELECT 1 FROM certificate_files f WHERE f.certificate_id = c.id) AS "hasFile",
              (SELECT jsonb_build_object('number', r.number, 'reason', e.reason)
                 FROM certificate_events e JOIN certificates r ON r.id = e.certificate_id
                WHERE e.replaced_by = c.id) AS replaces,
              a.email, a.given_name AS "givenName"
         FROM certificates c
         JOIN schemes s ON s.id = c.scheme_id
         JOIN accounts a ON a.id = c.account_id
        WHERE c.id = $1`,
      { bind: [certificateId], type: QueryTypes.SELECT },
    );
    const [row] = rows;
    return row ? Object.freeze({ ...row, issuer: row.issuer ?? noSchool }) : null;
  }

  /** False when the certificate has its file already: it keeps the first. */
  async addOnce(file: CertificateFile): Promise<boolean> {
    const rows = await this.sequelize.query<{ certificate_id: string }>(
      `INSERT INTO certificate_files (certificate_id, key_id, pdf, sha256, signed_at)
       VALUES ($1, $2, $3, $4, $5) ON CONFLICT (certificate_id) DO NOTHING RETURNING certificate_id`,
      {
        bind: [file.certificateId, file.keyId, file.pdf, file.sha256, file.signedAt],
        type: QueryTypes.SELECT,
      },
    );
    return rows.length > 0;
  }

  async find(certificateId: string): Promise<Buffer | null> {
    const row = await this.files.findByPk(certificateId, { attributes: ['pdf'] });
    return row?.pdf ?? null;
  }
}
