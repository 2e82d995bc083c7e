import { Injectable } from '@nestjs/common';
import { CertificatesService } from '../certificates/certificates.service.ts';
import type { Paper } from '../papers/paper.ts';
import { PapersService } from '../papers/papers.service.ts';
import { AllowancesRepository } from './allowances.repository.ts';
import { ClosingService } from './closing.service.ts';
import { presentPaper } from './paper.presenter.ts';
import type { PaperView } from './papers.schemas.ts';
import { ResultsRepository } from './results.repository.ts';
import { SittingsRepository } from './sittings.repository.ts';
import { decideStanding, type Standing } from './standing.ts';

/** How far someone has come with a paper. */
export type Progress = 'sitting' | 'passed' | 'not-passed';

/** Whether a person may start a paper now. */
@Injectable()
export class StandingService {
  constructor(
    private readonly papers: PapersService,
    private readonly certificates: CertificatesService,
    private readonly closing: ClosingService,
    private readonly sittings: SittingsRepository,
    private readonly results: ResultsRepository,
    private readonly allowances: AllowancesRepository,
  ) {}

  async standing(accountId: string, paperSlug: string): Promise<Standing> {
    const paper = await this.papers.current(paperSlug);
    await this.closing.closeDueOf(accountId);
    return this.decide(accountId, paper);
  }

  /** Where the person stands, leaving out a sitting that is only being started. */
  async decide(accountId: string, paper: Paper, startingId?: string): Promise<Standing> {
    const { slug, scheme } = paper.blueprint;
    const now = await this.sittings.now();
    const certificateId = await this.certificates.heldBy(accountId, scheme.slug, now);
    const earlier = await this.results.earlier(accountId, slug);
    const sittings = earlier.filter(({ id }) => id !== startingId);
    return decideStanding({ sittings, certificateId, now, zone: scheme.zone });
  }

  /** How far each of several people has come; who never sat the paper is left out. */
  async progressOf(accountIds: readonly string[], slug: string): Promise<Map<string, Progress>> {
    const now = await this.sittings.now();
    const rows = await this.results.progressOf(accountIds, slug, now);
    return new Map(
      rows.map(({ accountId, isOpen, passed }) => [
        accountId,
        isOpen ? 'sitting' : passed ? 'passed' : 'not-passed',
      ]),
    );
  }

  async paper(accountId: string, slug: string): Promise<PaperView> {
    const paper = await this.papers.current(slug);
    await this.closing.closeDueOf(accountId);
    const standing = await this.decide(accountId, paper);
    // Who sat it before still sees what became of it.
    if (standing.sittings.length === 0) await this.papers.requirePool(paper);
    return presentPaper(paper, {
      standing,
      marks: await this.papers.marks(paper),
      extraTimePercent: await this.allowances.percentFor(accountId),
    });
  }
}
