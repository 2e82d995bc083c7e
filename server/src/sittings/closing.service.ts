import { Injectable } from '@nestjs/common';
import { Transactions } from '../database/transactions.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import { NotFound } from '../problems/common.errors.ts';
import { handingIn, isPastItsTime, takesAnswersUntil, type Sitting } from './sitting.ts';
import { SittingsRepository, type SittingNow } from './sittings.repository.ts';

/** The job starts a moment after the last answer could be taken. */
const AFTER_MS = 1_000;

/** Ends sittings, each exactly once, and has them marked. */
@Injectable()
export class ClosingService {
  constructor(
    private readonly repository: SittingsRepository,
    private readonly transactions: Transactions,
    private readonly jobs: JobsService,
  ) {}

  /** Sees to it that the sitting ends even if its candidate never returns. */
  async schedule(sitting: Sitting): Promise<void> {
    const at = new Date(takesAnswersUntil(sitting).getTime() + AFTER_MS);
    await this.jobs.enqueue('close-sitting', { sittingId: sitting.id }, at);
  }

  /** Hands in a sitting that the open transaction has locked; returns when it was handed in. */
  async handIn({ sitting, now }: SittingNow): Promise<Date> {
    const { at, how } = handingIn(sitting, now);
    if (await this.repository.close(sitting.id, at, how)) {
      await this.jobs.enqueue('mark-sitting', { sittingId: sitting.id });
    }
    return at;
  }

  /** Hands in whatever was saved, if the time is up. */
  async closeIfDue(sittingId: string): Promise<void> {
    await this.transactions.run(async () => {
      const locked = await this.repository.lock(sittingId);
      if (locked && isPastItsTime(locked.sitting, locked.now)) await this.handIn(locked);
    });
  }

  /** The same for the paper a person may have left open. */
  async closeDueOf(accountId: string): Promise<void> {
    const open = await this.repository.findOpenOf(accountId);
    if (open && isPastItsTime(open.sitting, open.now)) await this.closeIfDue(open.sitting.id);
  }

  /**
   * The candidate's own sitting as it stands now.
   *
   * @throws {NotFound} for anyone else.
   */
  async findOwned(id: string, accountId: string): Promise<SittingNow> {
    const found = await this.repository.findOwned(id, accountId);
    if (!found) throw new NotFound();
    if (!isPastItsTime(found.sitting, found.now)) return found;
    await this.closeIfDue(id);
    return (await this.repository.findOwned(id, accountId)) ?? found;
  }
}
