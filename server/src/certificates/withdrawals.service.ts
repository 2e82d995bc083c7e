import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import { NotFound } from '../problems/common.errors.ts';
import { requireMayEnd, type CertificateAct } from './certificate-act.ts';
import { CertificateLetters } from './certificate-letters.ts';
import { CertificateRecordsRepository } from './certificate-records.repository.ts';
import { CertificatesRepository } from './certificates.repository.ts';
import { EndedMeanwhile } from './certificates.errors.ts';

/** Withdraws certificates. The register says so from the moment it is done. */
@Injectable()
export class WithdrawalsService {
  constructor(
    private readonly records: CertificateRecordsRepository,
    private readonly repository: CertificatesRepository,
    private readonly letters: CertificateLetters,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  /** @throws {NotFound | NotOnOneself | CertificateWithdrawn | CertificateReplaced} */
  async withdraw(act: CertificateAct): Promise<void> {
    const { certificateId, actor, reason, address } = act;
    const at = this.clock.now();
    await this.transactions.run(async () => {
      const certificate = await this.records.findById(certificateId, at);
      if (!certificate) throw new NotFound();
      requireMayEnd(certificate, act);
      const end = { certificateId, actorId: actor.id, reason, at, replacedBy: null };
      if (!(await this.repository.addEnd(end))) throw new EndedMeanwhile();
      await this.letters.withdrawn(certificateId, at);
      await this.events.record({
        kind: 'certificate-withdrawn',
        accountId: certificate.accountId,
        actorId: actor.id,
        address,
        detail: { number: certificate.number, reason },
      });
    });
  }
}
