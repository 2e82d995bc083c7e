import { Injectable } from '@nestjs/common';
import { randomUUID } from 'node:crypto';
import { Clock } from '../clock/clock.ts';
import { PracticeService } from '../practice/practice.service.ts';
import type { Published } from '../publishing/content.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { QuestionsService, type Draw } from '../questions/questions.service.ts';
import { chooseRecall, recallPool } from './choose-recall.ts';
import {
  figuresOf,
  hasFigures,
  variantOf,
  type KeptItem,
  type KeptRecall,
  type NewAttempt,
} from './worksheet-attempt.ts';
import type { PlacedWorksheet } from './worksheet.presenter.ts';
import { WorksheetsRepository } from './worksheets.repository.ts';

/** How often figures are drawn anew when the person has seen them before. */
const MOST_DRAWS = 60;

interface Wanted {
  readonly accountId: string;
  readonly course: Published<'course'>;
  readonly placed: PlacedWorksheet;
}

/** Draws the figures of a new attempt. */
@Injectable()
export class WorksheetDrawing {
  constructor(
    private readonly questions: QuestionsService,
    private readonly content: PublishedContentService,
    private readonly practice: PracticeService,
    private readonly repository: WorksheetsRepository,
    private readonly clock: Clock,
  ) {}

  async draw({ accountId, course, placed }: Wanted): Promise<NewAttempt> {
    const { worksheet } = placed;
    const id = randomUUID();
    const lessons = await this.content.all('lesson');
    const titles = new Map(lessons.map(({ content }) => [content.number, content.title]));
    const seen = await this.figuresSeen(accountId, worksheet.number);
    for (const lesson of lessons) for (const figures of workedIn(lesson)) seen.add(figures);
    const items: KeptItem[] = [];
    for (const [at, slug] of worksheet.questions.entries()) {
      const draw = await this.drawUnseen(`worksheet:${id}`, slug, seen);
      items.push(keptItem(String(at + 1), draw, titles));
    }
    return {
      id,
      accountId,
      worksheet: worksheet.number,
      courseRevisionId: course.id,
      variant: variantOf(id),
      items,
      recall: await this.drawRecall(id, { accountId, course, placed }, lessons),
      outOf: items.reduce((sum, { view }) => sum + view.marks, 0),
      startedAt: this.clock.now(),
    };
  }

  /** Questions of earlier sheets, other ones than the person was asked before as far as there are. */
  private async drawRecall(
    id: string,
    { accountId, course, placed }: Wanted,
    lessons: readonly Published<'lesson'>[],
  ): Promise<KeptRecall[]> {
    const sheets = lessons.map(({ content }) => content);
    const pool = recallPool(course.content.units, placed.unit.number, sheets);
    return chooseRecall(pool, {
      asked: await this.repository.recallAsked(accountId),
      rank: ({ sheet, ask, revision }) =>
        this.questions.seed(`worksheet-recall:${id}`, `${sheet.number} ${ask}`, revision),
    });
  }

  /** What the person had before, on this worksheet and in try blocks. */
  private async figuresSeen(accountId: string, worksheet: string): Promise<Set<string>> {
    const earlier = await this.repository.earlierItems(accountId, worksheet);
    const tried = await this.practice.shownTo(accountId);
    return new Set([...earlier, ...tried].map(({ slug, view }) => figuresOf(slug, view)));
  }

  /** Figures not seen before, as long as chance finds any. */
  private async drawUnseen(
    purpose: string,
    slug: string,
    seen: ReadonlySet<string>,
  ): Promise<Draw> {
    const published = await this.questions.practice(slug);
    const isSeen = ({ view }: Draw) => hasFigures(view) && seen.has(figuresOf(slug, view));
    let draw = this.questions.drawFor(purpose, published);
    for (let again = 1; again < MOST_DRAWS && isSeen(draw); again += 1) {
      draw = this.questions.drawFor(`${purpose}:${again}`, published);
    }
    return draw;
  }
}

/** Figures whose worked answer stands in a lesson. */
const workedIn = ({ content }: Published<'lesson'>) =>
  Object.entries(content.worked).map(([key, worked]) => figuresOf(key.split('#')[0] ?? '', worked));

function keptItem(
  key: string,
  { revisionId, question, drawn, view }: Draw,
  titles: ReadonlyMap<string, string>,
): KeptItem {
  const { slug, author, lesson } = question.meta;
  const title = titles.get(lesson);
  const sheet = title === undefined ? null : { number: lesson, title };
  return { key, slug, revisionId, author, sheet, drawn, view };
}
