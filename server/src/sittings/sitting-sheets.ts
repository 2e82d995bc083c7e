import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import { MarkedViewsService } from '../questions/marked-views.service.ts';
import type { MarkedQuestion } from '../questions/question-view.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { AnswersRepository } from './answers.repository.ts';
import type { Result } from './result.ts';
import { ResultsRepository } from './results.repository.ts';
import { presentSitting, type ShownItem } from './sitting.presenter.ts';
import { SittingsRepository, type SittingItem, type SittingNow } from './sittings.repository.ts';
import type { SittingView } from './sittings.schemas.ts';

/** Gathers what a candidate's view of a sitting is made of. */
@Injectable()
export class SittingSheets {
  constructor(
    private readonly repository: SittingsRepository,
    private readonly answers: AnswersRepository,
    private readonly results: ResultsRepository,
    private readonly questions: QuestionsService,
    private readonly views: MarkedViewsService,
  ) {}

  async show(found: SittingNow, sessionId: string): Promise<SittingView> {
    const { id, handedInAt } = found.sitting;
    const [items, saved, pennants, resultReady] = await Promise.all([
      this.repository.itemsOf(id),
      this.answers.allOf(id),
      this.answers.pennantsOf(id),
      this.results.exists(id),
    ]);
    return presentSitting(found, {
      ...{ saved, pennants, resultReady, sessionId },
      items: handedInAt ? [] : await this.withQuestions(items),
      numbers: new Map(items.map(({ key, number }) => [key, number])),
    });
  }

  /** @throws {NotFound} when the paper has no such question. */
  async setPennant(sittingId: string, key: string, isSet: boolean): Promise<void> {
    if (!(await this.repository.findItem(sittingId, key))) throw new NotFound();
    await this.answers.setPennant(sittingId, key, isSet);
  }

  /** The questions as they were when the paper was drawn, whatever is current now. */
  async withQuestions(items: readonly SittingItem[]): Promise<ShownItem[]> {
    const published = await Promise.all(
      items.map(({ questionRevisionId }) => this.questions.byRevision(questionRevisionId)),
    );
    return items.flatMap((item, index) => {
      const question = published[index]?.question;
      return question ? [{ item, question }] : [];
    });
  }

  /** The marking of each question, with what to read, by the question's key. */
  async withReading(
    items: readonly ShownItem[],
    { marked }: Pick<Result, 'marked'>,
  ): Promise<Map<string, MarkedQuestion>> {
    const revisions = new Map(items.map(({ item }) => [item.key, item.questionRevisionId]));
    const found = marked.flatMap((one) => {
      const revisionId = revisions.get(one.key);
      return revisionId === undefined ? [] : [{ key: one.key, revisionId, marked: one.marked }];
    });
    const shown = await this.views.show(found);
    return new Map(shown.map((view, at) => [found[at]?.key ?? '', view]));
  }
}
