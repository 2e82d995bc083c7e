import { Injectable } from '@nestjs/common';
import { presentQuestion, readAnswer, type PartView } from '@ferrule/assessments';
import { randomBytes } from 'node:crypto';
import { isDeepStrictEqual } from 'node:util';
import type { SignedInAccount } from '../accounts/account.ts';
import { Transactions } from '../database/transactions.ts';
import { InvalidRequest, NotFound } from '../problems/common.errors.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { AnswersRepository } from './answers.repository.ts';
import { ClosingService } from './closing.service.ts';
import {
  isPastItsTime,
  isWritableBy,
  newReceipt,
  requireWritable,
  type SavedAnswer,
} from './sitting.ts';
import { SequenceUsed, SittingClosed } from './sittings.errors.ts';
import { SittingsRepository, type SittingItem, type SittingNow } from './sittings.repository.ts';
import type { SaveAnswer, Saved } from './sittings.schemas.ts';

export interface AnswerPlace {
  readonly id: string;
  readonly key: string;
  readonly part: string;
}

/** What came of one attempt to keep an answer. */
interface Outcome {
  readonly found: SittingNow;
  readonly part: PartView;
  /** Null when the time was over; then the paper has been handed in. */
  readonly saved: SavedAnswer | null;
}

const usedForAnother = () =>
  new InvalidRequest([
    {
      pointer: '#/idempotencyKey',
      detail: 'This key was used for another answer; give each answer a key of its own.',
    },
  ]);

/** Keeps answers as they are given. Nothing is marked here. */
@Injectable()
export class SavingService {
  constructor(
    private readonly repository: SittingsRepository,
    private readonly answers: AnswersRepository,
    private readonly questions: QuestionsService,
    private readonly closing: ClosingService,
    private readonly transactions: Transactions,
  ) {}

  /** Returns only once the answer is committed. */
  async save(account: SignedInAccount, place: AnswerPlace, input: SaveAnswer): Promise<Saved> {
    const { found, part, saved } = await this.transactions.run(() =>
      this.keep(account, place, input),
    );
    if (!saved) throw new SittingClosed(found.sitting.closesAt);
    return {
      savedAt: saved.savedAt.toISOString(),
      receipt: saved.receipt,
      sequence: saved.sequence,
      reading: readAnswer(part, input.answer),
      now: found.now.toISOString(),
      closesAt: found.sitting.closesAt.toISOString(),
    };
  }

  private async keep(
    account: SignedInAccount,
    place: AnswerPlace,
    input: SaveAnswer,
  ): Promise<Outcome> {
    const found = await this.repository.lockOwned(place.id, account.id);
    const item = found && (await this.repository.findItem(place.id, place.key));
    if (!found || !item) throw new NotFound();
    const part = await this.part(item, place.part);
    const isOver = isPastItsTime(found.sitting, found.now);
    const isWritable = !isOver && isWritableBy(found.sitting, account.sessionId);
    const saved = isWritable ? await this.add(found, place, input) : null;
    if (saved) return { found, part, saved };
    // A repeated save gets its receipt again, even after the end: it had been accepted.
    const before = await this.findBefore(place, input);
    if (before) return { found, part, saved: before };
    if (!isOver) {
      requireWritable(found.sitting, account.sessionId);
      throw new SequenceUsed(await this.answers.highestSequence(place.id));
    }
    await this.closing.handIn(found);
    return { found, part, saved: null };
  }

  /** Null when the idempotency key or the sequence was used before. */
  private async add(
    { sitting, now }: SittingNow,
    place: AnswerPlace,
    { answer, sequence, idempotencyKey }: SaveAnswer,
  ): Promise<SavedAnswer | null> {
    const saved: SavedAnswer = {
      ...{ itemKey: place.key, part: place.part, sequence, answer, savedAt: now },
      receipt: newReceipt(sitting.rules.paper.number, sequence, randomBytes(8)),
    };
    const isNew = await this.answers.addOnce({ ...saved, sittingId: sitting.id, idempotencyKey });
    return isNew ? saved : null;
  }

  private async findBefore(place: AnswerPlace, input: SaveAnswer): Promise<SavedAnswer | null> {
    const before = await this.answers.findByKey(place.id, input.idempotencyKey);
    if (!before) return null;
    const isSame =
      before.itemKey === place.key &&
      before.part === place.part &&
      before.sequence === input.sequence &&
      isDeepStrictEqual(before.answer, input.answer);
    if (!isSame) throw usedForAnother();
    return before;
  }

  private async part(item: SittingItem, partId: string): Promise<PartView> {
    const { question } = await this.questions.byRevision(item.questionRevisionId);
    const part = presentQuestion(question, item.drawn).parts.find(({ id }) => id === partId);
    if (!part) throw new NotFound();
    return part;
  }
}
