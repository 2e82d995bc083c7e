import { Injectable } from '@nestjs/common';
import { NotAllowed, NotFound } from '../problems/common.errors.ts';
import { AnswersRepository } from './answers.repository.ts';
import { LooksRepository } from './looks.repository.ts';
import { presentOpenedItems } from './opened-items.presenter.ts';
import type { OpenedItems } from './papers.schemas.ts';
import { ResultsRepository } from './results.repository.ts';
import { ResultNotReady } from './sittings.errors.ts';
import { SittingsRepository } from './sittings.repository.ts';
import { SittingSheets } from './sitting-sheets.ts';

/** Opens the items of a marked paper to a certification manager, and records each look. */
@Injectable()
export class LooksService {
  constructor(
    private readonly sittings: SittingsRepository,
    private readonly results: ResultsRepository,
    private readonly looks: LooksRepository,
    private readonly answers: AnswersRepository,
    private readonly sheets: SittingSheets,
  ) {}

  /** @throws {NotAllowed} on one's own paper. */
  async open(managerId: string, sittingId: string, reason: string): Promise<OpenedItems> {
    const found = await this.sittings.find(sittingId);
    if (!found) throw new NotFound();
    if (found.sitting.accountId === managerId) {
      throw new NotAllowed('Nobody opens the items of a paper of their own.');
    }
    const result = await this.results.find(sittingId);
    if (!result) throw new ResultNotReady();
    await this.looks.add({ sittingId, accountId: managerId, reason, at: found.now });
    const items = await this.sheets.withQuestions(await this.sittings.itemsOf(sittingId));
    return presentOpenedItems(found.sitting, result, {
      items,
      marked: await this.sheets.withReading(items, result),
      saved: await this.answers.allOf(sittingId),
      looks: await this.looks.allOf(sittingId),
    });
  }
}
