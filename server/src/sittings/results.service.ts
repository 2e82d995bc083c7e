import { Injectable } from '@nestjs/common';
import { CertificatesService } from '../certificates/certificates.service.ts';
import { PapersService } from '../papers/papers.service.ts';
import { ClosingService } from './closing.service.ts';
import { presentResult } from './result.presenter.ts';
import { ResultsRepository } from './results.repository.ts';
import { ResultNotReady } from './sittings.errors.ts';
import type { ResultView } from './sittings.schemas.ts';

/** What a candidate learns of a marked paper: the result by subject, never the items. */
@Injectable()
export class ResultsService {
  constructor(
    private readonly closing: ClosingService,
    private readonly results: ResultsRepository,
    private readonly papers: PapersService,
    private readonly certificates: CertificatesService,
  ) {}

  /** @throws {ResultNotReady} until the paper is handed in and marked. */
  async result(accountId: string, id: string): Promise<ResultView> {
    const { sitting } = await this.closing.findOwned(id, accountId);
    const result = await this.results.find(id);
    if (!result) throw new ResultNotReady();
    return presentResult(sitting, result, {
      practice: await this.papers.practice(sitting.rules.paper.course),
      certificate: await this.certificates.ofSitting(id),
    });
  }
}
