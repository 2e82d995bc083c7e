import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { requirePrintableName } from '../certificates/printable-name.ts';
import { Transactions } from '../database/transactions.ts';
import { NotFound } from '../problems/common.errors.ts';
import { ClosingService } from './closing.service.ts';
import { presentStanding } from './paper.presenter.ts';
import type { StandingView } from './papers.schemas.ts';
import { isPastItsTime, requireWritable } from './sitting.ts';
import { SittingClosed } from './sittings.errors.ts';
import { SittingsRepository, type SittingNow } from './sittings.repository.ts';
import type { HandedIn, SittingView, StartSitting } from './sittings.schemas.ts';
import { SittingSheets } from './sitting-sheets.ts';
import { StandingService, type Progress } from './standing.service.ts';
import { StartingService } from './starting.service.ts';

@Injectable()
export class SittingsService {
  constructor(
    private readonly starting: StartingService,
    private readonly standings: StandingService,
    private readonly closing: ClosingService,
    private readonly repository: SittingsRepository,
    private readonly sheets: SittingSheets,
    private readonly transactions: Transactions,
  ) {}

  /** Where a person stands with a paper, for whatever shows it. */
  async standing(accountId: string, paperSlug: string): Promise<StandingView> {
    return presentStanding(await this.standings.standing(accountId, paperSlug));
  }

  /** How far each of several people has come with a paper; who never sat it is left out. */
  progressOf(accountIds: readonly string[], paperSlug: string): Promise<Map<string, Progress>> {
    return this.standings.progressOf(accountIds, paperSlug);
  }

  async start(account: SignedInAccount, input: StartSitting): Promise<SittingView> {
    await requirePrintableName(input.givenName, input.familyName);
    return this.view(account, await this.starting.start(account, input));
  }

  async view(account: SignedInAccount, id: string): Promise<SittingView> {
    const found = await this.closing.findOwned(id, account.id);
    return this.sheets.show(found, account.sessionId);
  }

  /** Makes this session the one that writes. */
  async takeOver(account: SignedInAccount, id: string): Promise<SittingView> {
    await this.write(account, id, async () => this.repository.setWriter(id, account.sessionId));
    return this.view(account, id);
  }

  async comeBack(
    account: SignedInAccount,
    { id, key }: { id: string; key: string },
    comeBack: boolean,
  ): Promise<{ comeBack: boolean }> {
    await this.write(account, id, async ({ sitting }) => {
      requireWritable(sitting, account.sessionId);
      await this.sheets.setPennant(id, key, comeBack);
    });
    return { comeBack };
  }

  async handIn(account: SignedInAccount, id: string): Promise<HandedIn> {
    const at = await this.transactions.run(async () => {
      const locked = await this.lockOwned(account, id);
      const { handedInAt } = locked.sitting;
      if (handedInAt) return handedInAt;
      if (!isPastItsTime(locked.sitting, locked.now)) {
        requireWritable(locked.sitting, account.sessionId);
      }
      return this.closing.handIn(locked);
    });
    return { state: 'handed-in', handedInAt: at.toISOString() };
  }

  /** Changes a sitting that is open now; one whose time is over is handed in instead. */
  private async write(
    account: SignedInAccount,
    id: string,
    change: (locked: SittingNow) => Promise<void>,
  ): Promise<void> {
    const closedAt = await this.transactions.run(async () => {
      const locked = await this.lockOwned(account, id);
      if (locked.sitting.handedInAt) return locked.sitting.handedInAt;
      if (isPastItsTime(locked.sitting, locked.now)) return this.closing.handIn(locked);
      await change(locked);
      return null;
    });
    if (closedAt) throw new SittingClosed(closedAt);
  }

  private async lockOwned(account: SignedInAccount, id: string): Promise<SittingNow> {
    const locked = await this.repository.lockOwned(id, account.id);
    if (!locked) throw new NotFound();
    return locked;
  }
}
