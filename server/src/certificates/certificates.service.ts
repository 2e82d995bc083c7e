import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import { nameOnCertificate, type CertificateOfSitting, type Certification } from './certificate.ts';
import { CertificatesRepository } from './certificates.repository.ts';
import { IssuingService } from './issuing.service.ts';

/** What papers and sittings ask about certificates. */
@Injectable()
export class CertificatesService {
  constructor(
    private readonly repository: CertificatesRepository,
    private readonly issuing: IssuingService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  /** Records the decision and issues the certificate it leads to; its file is drawn by a job. */
  async certify(certification: Certification): Promise<string> {
    return this.transactions.run(async () => {
      const { accountId, schemeId, givenName, familyName, howSat, decidedAt } = certification;
      const decisionId = await this.repository.addDecision(certification);
      const certificateId = await this.issuing.issue(
        {
          ...{ accountId, decisionId, schemeId, howSat, issuedAt: decidedAt },
          ...nameOnCertificate(givenName, familyName),
        },
        { reason: 'Passed the paper.', actorId: null },
      );
      await this.events.record({ kind: 'certificate-issued', accountId, actorId: null });
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
}
