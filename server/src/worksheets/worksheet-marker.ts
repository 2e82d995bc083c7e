import { markQuestion } from '@ferrule/assessments';
import { Injectable } from '@nestjs/common';
import { AnswerUnclear } from '../questions/answers.errors.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { unclearParts } from '../questions/read-answers.ts';
import type { MarkedByItem, WorksheetAttempt } from './worksheet-attempt.ts';

/** Marks an attempt against the values it was given, question by question. */
@Injectable()
export class WorksheetMarker {
  constructor(private readonly questions: QuestionsService) {}

  /** @throws {AnswerUnclear} when an answer must be asked back first. */
  async mark({ items, answers }: WorksheetAttempt): Promise<MarkedByItem> {
    const unclear = items.flatMap(({ key, view }) =>
      unclearParts(view, answers[key] ?? {}).map((part) => ({ key, ...part })),
    );
    if (unclear.length > 0) throw new AnswerUnclear(unclear);
    const marked: MarkedByItem = {};
    for (const { key, revisionId, drawn } of items) {
      const { question } = await this.questions.byRevision(revisionId);
      marked[key] = markQuestion(question, drawn, answers[key] ?? {});
    }
    return marked;
  }
}
