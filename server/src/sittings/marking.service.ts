import { Injectable } from '@nestjs/common';
import { CertificatesService } from '../certificates/certificates.service.ts';
import { Transactions } from '../database/transactions.ts';
import { Marker } from './marker.ts';
import type { Marking } from './result.ts';
import { ResultLetters } from './result-letters.ts';
import { ResultsRepository } from './results.repository.ts';
import type { Sitting } from './sitting.ts';
import { SittingsRepository } from './sittings.repository.ts';

/** Turns a paper that was handed in into its one result, and a pass into a certificate. */
@Injectable()
export class MarkingService {
  constructor(
    private readonly repository: SittingsRepository,
    private readonly results: ResultsRepository,
    private readonly marker: Marker,
    private readonly certificates: CertificatesService,
    private readonly letters: ResultLetters,
    private readonly transactions: Transactions,
  ) {}

  /** May run any number of times: result, certificate and mail come into being once, together. */
  async markOnce(sittingId: string): Promise<void> {
    const found = await this.repository.find(sittingId);
    if (!found?.sitting.handedInAt || (await this.results.exists(sittingId))) return;
    const { sitting } = found;
    const marking = await this.marker.mark(sitting);
    await this.transactions.run(async () => {
      const markedAt = await this.repository.now();
      if (!(await this.results.addOnce(sittingId, marking, markedAt))) return;
      if (marking.passed) await this.certify(sitting, marking, markedAt);
      const result = await this.results.find(sittingId);
      if (result) await this.letters.write(sitting, result);
    });
  }

  private async certify(sitting: Sitting, marking: Marking, decidedAt: Date): Promise<void> {
    const { accountId, schemeId, givenName, familyName, rules } = sitting;
    const { marks, outOf, bySubject, markerVersion } = marking;
    await this.certificates.certify({
      ...{ accountId, schemeId, givenName, familyName, decidedAt },
      sittingId: sitting.id,
      howSat: rules.sat,
      evidence: { sittingId: sitting.id, marks, outOf, bySubject, markerVersion },
      rules: {
        paper: rules.paper,
        passPercent: rules.passPercent,
        passMarks: rules.passMarks,
        scheme: { slug: rules.scheme.slug, revision: rules.scheme.revision },
        blueprintRevisionId: sitting.blueprintRevisionId,
      },
    });
  }
}
