import { Inject, Injectable } from '@nestjs/common';
import {
  describeQuestion,
  drawQuestion,
  presentQuestion,
  type CompiledQuestion,
  type DrawnQuestion,
} from '@ferrule/assessments';
import { createHmac } from 'node:crypto';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { Published } from '../publishing/content.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import type { PracticeQuestion } from './practice-question.ts';
import type { QuestionView } from './question-view.ts';

export interface PublishedQuestion {
  readonly revisionId: string;
  readonly question: CompiledQuestion;
}

/** A question with figures of its own: what to keep, and what may be shown. */
export interface Draw extends PublishedQuestion {
  readonly drawn: DrawnQuestion;
  readonly view: QuestionView;
}

const publishedQuestion = ({ id, content }: Published<'question'>): PublishedQuestion => ({
  revisionId: id,
  question: content,
});

/** Reads questions and draws their figures. */
@Injectable()
export class QuestionsService {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly content: PublishedContentService,
  ) {}

  /** @throws {NotFound} when no such question is published. */
  async current(slug: string): Promise<PublishedQuestion> {
    const found = await this.content.current('question', slug);
    if (!found) throw new NotFound(`There is no question "${slug}".`);
    return publishedQuestion(found);
  }

  /** @throws {NotFound} when no such question is published for practice. */
  async practice(slug: string): Promise<PublishedQuestion> {
    const found = await this.current(slug);
    if (found.question.meta.pool !== 'practice')
      throw new NotFound(`There is no question "${slug}".`);
    return found;
  }

  /** A revision that was handed out once, current or not. */
  async byRevision(revisionId: string): Promise<PublishedQuestion> {
    const found = await this.content.byId('question', revisionId);
    if (!found) throw new NotFound('There is no such revision of a question.');
    return publishedQuestion(found);
  }

  /** What a paper may be assembled from. */
  async paperPool(): Promise<{ slug: string; subject: string; revisionId: string }[]> {
    const listings = await this.content.list('question');
    return listings
      .filter(({ pool }) => pool === 'paper')
      .map(({ id, slug, subject }) => ({ slug, subject: subject ?? '', revisionId: id }));
  }

  /** Every question that may be practised, as lists show it. */
  async practiceBank(): Promise<PracticeQuestion[]> {
    const published = await this.content.all('question');
    return published
      .filter(({ pool }) => pool === 'practice')
      .map(({ content }) => {
        const { slug, title, subject, level, lesson, marks } = content.meta;
        return { slug, title, subject, level, lesson, marks, ...describeQuestion(content) };
      });
  }

  async countPractice(): Promise<number> {
    const listings = await this.content.list('question');
    return listings.filter(({ pool }) => pool === 'practice').length;
  }

  /** Draws a question's figures; the same purpose and revision give the same figures. */
  drawFor(purpose: string, { revisionId, question }: PublishedQuestion): Draw {
    const { slug, revision } = question.meta;
    const drawn = drawQuestion(question, this.seed(purpose, slug, revision));
    return { revisionId, question, drawn, view: presentQuestion(question, drawn) };
  }

  /** A number from chance, as hex: the same for the same purpose, name and revision. */
  seed(purpose: string, slug: string, revision: string): string {
    return createHmac('sha256', Buffer.from(this.config.DRAW_SECRET, 'hex'))
      .update([purpose, slug, revision].join('|'))
      .digest('hex');
  }
}
