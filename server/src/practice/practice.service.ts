import {
  fadeQuestion,
  fadingLevels,
  hintFor,
  markFaded,
  markQuestion,
  type CompiledQuestion,
} from '@ferrule/assessments';
import { Injectable } from '@nestjs/common';
import { randomUUID } from 'node:crypto';
import { Clock } from '../clock/clock.ts';
import { InvalidRequest, NotFound } from '../problems/common.errors.ts';
import { AnswerUnclear } from '../questions/answers.errors.ts';
import { MarkedViewsService } from '../questions/marked-views.service.ts';
import type { Answers } from '../questions/question-view.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { requireKnownPart, requireKnownParts, unclearParts } from '../questions/read-answers.ts';
import { askedOf, type KeptDraw, type PracticeAttempt } from './practice-attempt.ts';
import { PracticeAnswered } from './practice.errors.ts';
import { PracticeRepository } from './practice.repository.ts';
import type { Hint, PracticeMarked, PracticeView, StartPractice } from './practice.schemas.ts';

/** One question in the middle of a sheet, to be tried as often as one likes. */
@Injectable()
export class PracticeService {
  constructor(
    private readonly questions: QuestionsService,
    private readonly views: MarkedViewsService,
    private readonly repository: PracticeRepository,
    private readonly clock: Clock,
  ) {}

  /** @throws {NotFound} for a question of the paper pool too: it must look as if there were none. */
  async start(accountId: string, { question: slug, left }: StartPractice): Promise<PracticeView> {
    const published = await this.questions.practice(slug);
    const levels = fadingLevels(published.question);
    const whole = Math.max(...levels);
    if (left !== undefined) requireLevel(left, whole);
    const id = randomUUID();
    const { revisionId, drawn, view } = this.questions.drawFor(`practice:${id}`, published);
    const faded = fadeQuestion(published.question, drawn, left ?? whole);
    await this.repository.add({
      id,
      accountId,
      questionRevisionId: revisionId,
      kept: { slug, drawn, view, ...(faded.left < whole ? { faded } : {}) },
      startedAt: this.clock.now(),
      handedInAt: null,
      hints: [],
    });
    return { id, question: view, levels, ...faded };
  }

  /** What the person was shown of late, question by question. */
  shownTo(accountId: string): Promise<Pick<KeptDraw, 'slug' | 'view'>[]> {
    return this.repository.latest(accountId);
  }

  /**
   * Marks the answers, once.
   *
   * @throws {AnswerUnclear} when an answer must be asked back; it may then be given again.
   */
  async answer(accountId: string, id: string, answers: Answers): Promise<PracticeMarked> {
    const attempt = await this.unmarked(accountId, id);
    const asked = askedOf(attempt.kept);
    requireKnownParts(asked, answers);
    const unclear = unclearParts(asked, answers);
    if (unclear.length > 0) throw new AnswerUnclear(unclear);
    const { question } = await this.questions.byRevision(attempt.questionRevisionId);
    const marked = markAttempt(question, attempt.kept, answers);
    const handedInAt = this.clock.now();
    const isKept = await this.repository.keepMarked(id, { answers, marked, handedInAt });
    if (!isKept) throw new PracticeAnswered();
    const revisionId = attempt.questionRevisionId;
    const [shown] = await this.views.show([{ revisionId, marked }]);
    if (!shown) throw new NotFound();
    return { marked: shown, hints: [...attempt.hints] };
  }

  /** The formula a part begins with; that it was asked for is kept with the attempt. */
  async hint(accountId: string, id: string, part: string): Promise<Hint> {
    const { kept, questionRevisionId } = await this.unmarked(accountId, id);
    requireKnownPart(askedOf(kept), part);
    const { question } = await this.questions.byRevision(questionRevisionId);
    const line = hintFor(question, kept.drawn, part);
    if (line && !(await this.repository.keepHint(id, part))) throw new PracticeAnswered();
    return { line };
  }

  private async unmarked(accountId: string, id: string): Promise<PracticeAttempt> {
    const attempt = await this.repository.findOwned(id, accountId);
    if (!attempt) throw new NotFound();
    if (attempt.handedInAt) throw new PracticeAnswered();
    return attempt;
  }
}

/** Of a question with steps worked beforehand only the parts that were left are marked. */
const markAttempt = (question: CompiledQuestion, { drawn, faded }: KeptDraw, answers: Answers) =>
  faded
    ? markFaded(question, drawn, { left: faded.left, answers })
    : markQuestion(question, drawn, answers);

function requireLevel(left: number, most: number): void {
  if (left <= most) return;
  const detail = `${left} steps cannot be left: this question has ${most}. Leave 0 to ${most}.`;
  throw new InvalidRequest([{ pointer: '#/left', detail }]);
}
