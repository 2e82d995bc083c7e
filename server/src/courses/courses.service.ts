import { Injectable } from '@nestjs/common';
import { ClassesService } from '../classes/classes.service.ts';
import { localDay } from '../clock/local-day.ts';
import { LessonsService } from '../lessons/lessons.service.ts';
import { NotFound } from '../problems/common.errors.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { SittingsService } from '../sittings/sittings.service.ts';
import { WorksheetsService } from '../worksheets/worksheets.service.ts';
import { carryOnOf, unitsOf, type MapRecords } from './course-map.ts';
import type { CourseMap } from './courses.schemas.ts';

@Injectable()
export class CoursesService {
  constructor(
    private readonly content: PublishedContentService,
    private readonly lessons: LessonsService,
    private readonly worksheets: WorksheetsService,
    private readonly classes: ClassesService,
    private readonly sittings: SittingsService,
  ) {}

  /** The course with one person's own way through it. */
  async mapFor(accountId: string): Promise<CourseMap> {
    const records = await this.records(accountId);
    const { course } = records;
    const enrolment = await this.classes.enrolment(accountId, course.slug);
    const { number, slug, title, revision, issued, owner, intro } = course;
    return {
      ...{ number, slug, title, revision, issued, owner, intro },
      trainer: enrolment?.trainers.join(', ') || null,
      class: enrolment && { id: enrolment.classId, name: enrolment.className },
      enrolledOn: enrolment && localDay(enrolment.joinedAt, course.zone),
      carryOn: carryOnOf(records),
      units: unitsOf(records),
      paper: await this.paperFor(accountId, course.paper),
    };
  }

  private async records(accountId: string): Promise<MapRecords> {
    const [courses, lessons, progress, attempts] = await Promise.all([
      this.content.all('course'),
      this.content.all('lesson'),
      this.lessons.progressOf([accountId]),
      this.worksheets.attemptsOf([accountId]),
    ]);
    const [course] = courses;
    if (!course) throw new NotFound('No course has been published here yet.');
    return {
      course: course.content,
      lessons: new Map(lessons.map(({ content }) => [content.number, content])),
      progress: new Map(progress.map((item) => [item.lesson, item])),
      attempts,
    };
  }

  private async paperFor(accountId: string, slug: string): Promise<CourseMap['paper']> {
    const blueprint = await this.content.current('blueprint', slug);
    if (!blueprint) return null;
    const { number, title } = blueprint.content;
    const standing = await this.sittings.standing(accountId, slug);
    const { state, mayStartAt, sittingId, certificateId } = standing;
    return { slug, number, title, state, mayStartAt, sittingId, certificateId };
  }
}
