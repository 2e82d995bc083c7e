import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { IssuerCertificateModel } from './models/issuer-certificate.model.ts';

export interface Issuer {
  readonly keyId: string;
  readonly kind: 'root' | 'leaf';
  readonly pem: string;
  readonly validFrom: Date;
  readonly validTo: Date;
}

/** Every certificate ever signed with is kept here for good. */
@Injectable()
export class IssuersRepository {
  constructor(
    @InjectModel(IssuerCertificateModel) private readonly issuers: typeof IssuerCertificateModel,
  ) {}

  async addMissing(issuers: readonly Issuer[]): Promise<void> {
    await this.issuers.bulkCreate(
      issuers.map((issuer) => ({ ...issuer })),
      { ignoreDuplicates: true },
    );
  }

  async all(): Promise<Issuer[]> {
    const rows = await this.issuers.findAll({
      order: [
        ['validFrom', 'DESC'],
        ['keyId', 'ASC'],
      ],
    });
    return rows.map(({ keyId, kind, pem, validFrom, validTo }) =>
      Object.freeze({ keyId, kind, pem, validFrom, validTo }),
    );
  }
}
