import type { MarkedQuestion as LibraryMarkedQuestion } from '@ferrule/assessments';
import { Injectable } from '@nestjs/common';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import type { MarkedQuestion } from './question-view.ts';
import { QuestionsService } from './questions.service.ts';
import { showMarked } from './read-again.ts';

export interface StoredMarking {
  readonly revisionId: string;
  readonly marked: LibraryMarkedQuestion;
}

/** Lays markings out for people: what to read is looked up in the lessons as they are now. */
@Injectable()
export class MarkedViewsService {
  constructor(
    private readonly content: PublishedContentService,
    private readonly questions: QuestionsService,
  ) {}

  async show(markings: readonly StoredMarking[]): Promise<MarkedQuestion[]> {
    if (markings.length === 0) return [];
    const published = await this.content.all('lesson');
    const lessons = new Map(published.map(({ content }) => [content.number, content]));
    return Promise.all(
      markings.map(async ({ revisionId, marked }) => {
        const { question } = await this.questions.byRevision(revisionId);
        const { lesson } = question.meta;
        return showMarked(marked, lesson, lessons.get(lesson));
      }),
    );
  }
}
