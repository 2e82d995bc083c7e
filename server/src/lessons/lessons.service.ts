import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import { GlossaryService } from '../glossary/glossary.service.ts';
import { NotFound } from '../problems/common.errors.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { etagOf, placeLesson, presentLesson, type PlacedLesson } from './lesson.presenter.ts';
import { stateOf, type LessonProgress } from './lesson-progress.ts';
import { LessonProgressRepository } from './lesson-progress.repository.ts';
import { LessonRevised } from './lessons.errors.ts';
import type { LessonProgressView, LessonView } from './lessons.schemas.ts';

@Injectable()
export class LessonsService {
  constructor(
    private readonly content: PublishedContentService,
    private readonly repository: LessonProgressRepository,
    private readonly clock: Clock,
    private readonly glossary: GlossaryService,
  ) {}

  /** The sheet as anyone sees it, with a tag that changes when it does. */
  async read(number: string): Promise<{ etag: string; view: LessonView }> {
    const placed = await this.placed(number);
    const terms = await this.glossary.termsOf(placed.lesson.content);
    return { etag: etagOf(placed, terms), view: presentLesson(placed, terms) };
  }

  async progress(accountId: string, number: string): Promise<LessonProgressView> {
    const { lesson } = await this.placed(number);
    const progress = await this.repository.find(accountId, number);
    return {
      state: stateOf(progress),
      paragraph: progress?.paragraph ?? 1,
      revisionRead: progress?.doneRevision ?? null,
      current: lesson.revision,
    };
  }

  async readTo(accountId: string, number: string, paragraph: number): Promise<LessonProgressView> {
    const { lesson } = await this.placed(number);
    const reached = Math.min(paragraph, Math.max(1, lesson.content.paragraphs));
    await this.repository.readTo({ accountId, lesson: number, now: this.clock.now() }, reached);
    return this.progress(accountId, number);
  }

  /** @throws {LessonRevised} when a newer revision is out than the one that was read. */
  async markDone(accountId: string, number: string, revision: string): Promise<LessonProgressView> {
    const { lesson } = await this.placed(number);
    if (revision !== lesson.revision) throw new LessonRevised(revision, lesson.revision);
    const paragraph = Math.max(1, lesson.content.paragraphs);
    const at = { accountId, lesson: number, now: this.clock.now() };
    await this.repository.markDone(at, { revision, paragraph });
    return this.progress(accountId, number);
  }

  async undoDone(accountId: string, number: string): Promise<LessonProgressView> {
    await this.placed(number);
    await this.repository.undoDone(accountId, number);
    return this.progress(accountId, number);
  }

  /** Progress of several people at once. */
  progressOf(accountIds: readonly string[]): Promise<LessonProgress[]> {
    return this.repository.ofAccounts(accountIds);
  }

  private async placed(number: string): Promise<PlacedLesson> {
    const [course] = await this.content.all('course');
    const placed = course && placeLesson(number, await this.content.all('lesson'), course);
    if (!placed) throw new NotFound(`There is no sheet ${number} in the course.`);
    return placed;
  }
}
