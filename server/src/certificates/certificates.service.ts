import { Injectable } from '@nestjs/common';
import { foldName, newCertificateNumber } from '@ferrule/certificates';
import { randomBytes } from 'node:crypto';
import { Transactions } from '../database/transactions.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import {
  holderName,
  type CertificateOfSitting,
  type Certification,
  type NewCertificate,
} from './certificate.ts';
import { CertificatesRepository } from './certificates.repository.ts';

const LINK_CODE_BYTES = 16;
const MOST_DRAWS = 5;

@Injectable()
export class CertificatesService {
  constructor(
    private readonly repository: CertificatesRepository,
    private readonly transactions: Transactions,
    private readonly jobs: JobsService,
  ) {}

  /** Records the decision and issues the certificate it leads to; its file is drawn by a job. */
  async certify(certification: Certification): Promise<string> {
    return this.transactions.run(async () => {
      const { accountId, schemeId, givenName, familyName, howSat, decidedAt } = certification;
      const decisionId = await this.repository.addDecision(certification);
      const certificateId = await this.issue({
        ...{ accountId, decisionId, schemeId, howSat },
        holderName: holderName(givenName, familyName),
        familyFold: foldName(familyName === '' ? givenName : familyName),
        issuedAt: decidedAt,
      });
      await this.repository.addIssued(certificateId, decidedAt);
      await this.jobs.enqueue('draw-certificate', { certificateId });
      return certificateId;
    });
  }

  /** The certificate a sitting led to, or null. */
  ofSitting(sittingId: string): Promise<CertificateOfSitting | null> {
    return this.repository.findBySitting(sittingId);
  }

  /** The id of a certificate of this scheme that the person holds now, or null. */
  heldBy(accountId: string, schemeSlug: string, now: Date): Promise<string | null> {
    return this.repository.findHeld(accountId, schemeSlug, now);
  }

  private async issue(certificate: NewCertificate): Promise<string> {
    for (let draw = 0; draw < MOST_DRAWS; draw += 1) {
      const id = await this.repository.add(certificate, {
        number: newCertificateNumber(randomBytes(16)),
        linkCode: randomBytes(LINK_CODE_BYTES).toString('base64url'),
      });
      if (id) return id;
    }
    throw new Error('No free certificate number was found.');
  }
}
