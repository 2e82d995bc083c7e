import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { Answers } from '../questions/question-view.ts';
import { readAnswers, requireKnownParts } from '../questions/read-answers.ts';
import { marksOf, type AttemptSummary, type WorksheetAttempt } from './worksheet-attempt.ts';
import { WorksheetDrawing } from './worksheet-drawing.ts';
import { WorksheetMarker } from './worksheet-marker.ts';
import { presentSummary } from './worksheet.presenter.ts';
import { WorksheetSheets } from './worksheet-sheets.ts';
import { WorksheetHandedIn } from './worksheets.errors.ts';
import { WorksheetsRepository } from './worksheets.repository.ts';
import type { SavedAnswers, WorksheetSummary, WorksheetView } from './worksheets.schemas.ts';

@Injectable()
export class WorksheetsService {
  constructor(
    private readonly repository: WorksheetsRepository,
    private readonly sheets: WorksheetSheets,
    private readonly drawing: WorksheetDrawing,
    private readonly marker: WorksheetMarker,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  async summary(accountId: string, number: string): Promise<WorksheetSummary> {
    const { placed } = await this.sheets.current(number);
    return presentSummary(placed, await this.repository.ofAccounts([accountId], number));
  }

  /** Goes on with the open attempt; otherwise starts one with fresh figures. */
  async start(accountId: string, number: string): Promise<WorksheetView> {
    const wanted = await this.sheets.current(number);
    const open =
      (await this.repository.findOpen(accountId, number)) ??
      (await this.addAttempt(accountId, number, wanted));
    return this.sheets.show(open, accountId);
  }

  async open(account: SignedInAccount, id: string): Promise<WorksheetView> {
    return this.sheets.show(await this.sheets.find(account, id), account.id);
  }

  /** Keeps answers as they are typed and says how each is understood; nothing is marked. */
  async save(
    at: { accountId: string; id: string; key: string },
    answers: Answers,
  ): Promise<SavedAnswers> {
    const attempt = await this.repository.findOwned(at);
    const item = attempt?.items.find(({ key }) => key === at.key);
    if (!attempt || !item) throw new NotFound();
    requireKnownParts(item.view, answers);
    const now = this.clock.now();
    const isSaved = await this.repository.saveAnswers(at, answers, now);
    if (!isSaved) throw new WorksheetHandedIn();
    const all = { ...attempt.answers[at.key], ...answers };
    return { savedAt: now.toISOString(), readings: readAnswers(item.view, all) };
  }

  /**
   * Marks the attempt, once; handing in again shows the same paper.
   *
   * @throws {AnswerUnclear} when answers must be asked back: the attempt stays open.
   */
  async handIn(accountId: string, id: string): Promise<WorksheetView> {
    await this.transactions.run(async () => {
      const attempt = await this.repository.lockOwned({ id, accountId });
      if (!attempt) throw new NotFound();
      if (!attempt.handedInAt) await this.mark(attempt);
    });
    const marked = await this.repository.findOwned({ id, accountId });
    if (!marked) throw new NotFound();
    return this.sheets.show(marked, accountId);
  }

  /** Attempts of several people at once, oldest first. */
  attemptsOf(accountIds: readonly string[]): Promise<AttemptSummary[]> {
    return this.repository.ofAccounts(accountIds);
  }

  /** First attempts of several people, with their marking. */
  firstMarkedOf(accountIds: readonly string[]): Promise<WorksheetAttempt[]> {
    return this.repository.firstMarked(accountIds);
  }

  private async mark(attempt: WorksheetAttempt): Promise<void> {
    const marked = await this.marker.mark(attempt);
    await this.repository.keepMarked(attempt.id, {
      marked,
      marks: marksOf(marked),
      markerVersion: Math.max(...Object.values(marked).map(({ markerVersion }) => markerVersion)),
      handedInAt: this.clock.now(),
    });
  }

  /** Two starts at once come to the same attempt: the database lets only one be open. */
  private async addAttempt(
    accountId: string,
    number: string,
    wanted: Awaited<ReturnType<WorksheetSheets['current']>>,
  ): Promise<WorksheetAttempt> {
    await this.repository.add(await this.drawing.draw({ accountId, ...wanted }));
    const open = await this.repository.findOpen(accountId, number);
    if (!open) throw new NotFound();
    return open;
  }
}
