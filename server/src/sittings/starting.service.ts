import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Transactions } from '../database/transactions.ts';
import { PapersService } from '../papers/papers.service.ts';
import { ClosingService } from './closing.service.ts';
import { PaperDrawing } from './paper-drawing.ts';
import {
  AgreementChanged,
  AlreadyCertified,
  ResultNotReady,
  SittingAlreadyOpen,
  WaitNotOver,
} from './sittings.errors.ts';
import { SittingsRepository } from './sittings.repository.ts';
import type { StartSitting } from './sittings.schemas.ts';
import type { Standing } from './standing.ts';
import { StandingService } from './standing.service.ts';

function refuseUnlessFree({ certificateId, isMarking, mayStartAt }: Standing): void {
  if (certificateId) throw new AlreadyCertified(certificateId);
  if (isMarking) throw new ResultNotReady();
  if (mayStartAt) throw new WaitNotOver(mayStartAt);
}

/** Starts sittings: tests every condition again and freezes the terms. */
@Injectable()
export class StartingService {
  constructor(
    private readonly papers: PapersService,
    private readonly drawing: PaperDrawing,
    private readonly standings: StandingService,
    private readonly closing: ClosingService,
    private readonly repository: SittingsRepository,
    private readonly transactions: Transactions,
  ) {}

  async start(account: SignedInAccount, input: StartSitting): Promise<string> {
    const paper = await this.papers.current(input.paper);
    if (paper.agreementHash !== input.agreementHash) throw new AgreementChanged();
    await this.closing.closeDueOf(account.id);
    const { sitting, items } = await this.drawing.draw(paper, account, input);
    const isOpened = await this.transactions.run(async () => {
      if (!(await this.repository.addUnlessOneIsOpen(sitting))) return false;
      // Tested while this sitting holds the person's only place: no other start can slip by.
      refuseUnlessFree(await this.standings.decide(account.id, paper, sitting.id));
      await this.repository.addItems(sitting.id, items);
      await this.closing.schedule(sitting);
      return true;
    });
    if (isOpened) return sitting.id;
    const open = await this.repository.findOpenOf(account.id);
    throw new SittingAlreadyOpen(open?.sitting.id ?? null);
  }
}
