import { Injectable } from '@nestjs/common';
import type { MapRecords } from '../courses/course-map.ts';
import { LessonsService } from '../lessons/lessons.service.ts';
import type { CompiledCourse } from '../publishing/compiled-course.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { SittingsService } from '../sittings/sittings.service.ts';
import { WorksheetsService } from '../worksheets/worksheets.service.ts';

export interface MemberProgress {
  readonly records: MapRecords;
  readonly paper: 'not-sat' | 'sitting' | 'passed' | 'not-passed';
}

function grouped<T extends { accountId: string }>(items: readonly T[]): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const item of items)
    groups.set(item.accountId, [...(groups.get(item.accountId) ?? []), item]);
  return groups;
}

/** What several people have done on a course: a handful of queries, however many they are. */
@Injectable()
export class ClassProgressService {
  constructor(
    private readonly content: PublishedContentService,
    private readonly lessons: LessonsService,
    private readonly worksheets: WorksheetsService,
    private readonly sittings: SittingsService,
  ) {}

  async course(slug: string): Promise<CompiledCourse | null> {
    return (await this.content.current('course', slug))?.content ?? null;
  }

  async of(
    accountIds: readonly string[],
    course: CompiledCourse,
  ): Promise<(accountId: string) => MemberProgress> {
    const [published, progress, attempts, papers] = await Promise.all([
      this.content.all('lesson'),
      this.lessons.progressOf(accountIds),
      this.worksheets.attemptsOf(accountIds),
      this.sittings.progressOf(accountIds, course.paper),
    ]);
    const lessons = new Map(published.map(({ content }) => [content.number, content]));
    const [progressBy, attemptsBy] = [grouped(progress), grouped(attempts)];
    return (accountId) => ({
      paper: papers.get(accountId) ?? 'not-sat',
      records: {
        course,
        lessons,
        progress: new Map((progressBy.get(accountId) ?? []).map((item) => [item.lesson, item])),
        attempts: attemptsBy.get(accountId) ?? [],
      },
    });
  }
}
