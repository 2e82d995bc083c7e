import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { ClassesService } from '../classes/classes.service.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { Published } from '../publishing/content.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { MarkedViewsService } from '../questions/marked-views.service.ts';
import type { MarkedQuestion } from '../questions/question-view.ts';
import type { WorksheetAttempt } from './worksheet-attempt.ts';
import { placeWorksheet, presentWorksheet, type PlacedWorksheet } from './worksheet.presenter.ts';
import { WorksheetsRepository } from './worksheets.repository.ts';
import type { WorksheetView } from './worksheets.schemas.ts';

/** Finds worksheets and attempts for those who may see them, and lays them out. */
@Injectable()
export class WorksheetSheets {
  constructor(
    private readonly content: PublishedContentService,
    private readonly repository: WorksheetsRepository,
    private readonly classes: ClassesService,
    private readonly views: MarkedViewsService,
  ) {}

  /** A worksheet of the current course. */
  async current(number: string): Promise<{ course: Published<'course'>; placed: PlacedWorksheet }> {
    const [course] = await this.content.all('course');
    const placed = course && placeWorksheet(course.content, number);
    if (!placed) throw new NotFound(`There is no worksheet ${number} in the course.`);
    return { course, placed };
  }

  /** One's own attempt, or a handed-in one of somebody in a class one trains. */
  async find(account: SignedInAccount, id: string): Promise<WorksheetAttempt> {
    const own = await this.repository.findOwned({ id, accountId: account.id });
    if (own) return own;
    const other = account.roles.includes('trainer') ? await this.repository.findHandedIn(id) : null;
    if (!other || !(await this.classes.trains(account.id, other.accountId))) throw new NotFound();
    return other;
  }

  /** Lays an attempt out with the titles it had when it was started. */
  async show(attempt: WorksheetAttempt, viewerId: string): Promise<WorksheetView> {
    const course = await this.content.byId('course', attempt.courseRevisionId);
    const placed = course && placeWorksheet(course.content, attempt.worksheet);
    if (!placed) throw new NotFound();
    const trainee = await this.repository.nameOf(attempt.accountId);
    const seen = { trainee, mine: attempt.accountId === viewerId };
    return presentWorksheet(attempt, placed, { ...seen, marked: await this.markedOf(attempt) });
  }

  /** The markings of an attempt's questions by their keys; none before it is handed in. */
  private async markedOf({
    items,
    marked,
  }: WorksheetAttempt): Promise<Record<string, MarkedQuestion>> {
    const markings = items.flatMap(({ key, revisionId }) => {
      const found = marked?.[key];
      return found ? [{ key, revisionId, marked: found }] : [];
    });
    const shown = await this.views.show(markings);
    return Object.fromEntries(
      markings.flatMap(({ key }, at) => {
        const view = shown[at];
        return view ? [[key, view]] : [];
      }),
    );
  }
}
