import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import { localDay } from '../clock/local-day.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { bySlug, type AnsweredQuestion } from './answered-question.ts';
import { nextPractice } from './next-practice.ts';
import { presentAdvice, presentSubjects } from './record.presenter.ts';
import { RecordRepository } from './record.repository.ts';
import type { SubjectRecords } from './record.schemas.ts';

/** What a person has shown, from worksheets and practice alike. */
@Injectable()
export class RecordService {
  constructor(
    private readonly content: PublishedContentService,
    private readonly questions: QuestionsService,
    private readonly repository: RecordRepository,
    private readonly clock: Clock,
  ) {}

  async subjects(accountId: string): Promise<SubjectRecords> {
    const zone = await this.zone();
    const [bank, answers] = await Promise.all([
      this.questions.practiceBank(),
      this.repository.answeredBy(accountId, zone),
    ]);
    const grouped = bySlug(answers);
    const advice = nextPractice(bank, grouped, localDay(this.clock.now(), zone));
    return { subjects: presentSubjects(bank, grouped), next: presentAdvice(advice, bank) };
  }

  /** Every question a person answered, by question, oldest first. */
  async answeredBy(accountId: string): Promise<Map<string, AnsweredQuestion[]>> {
    return bySlug(await this.repository.answeredBy(accountId, await this.zone()));
  }

  /** Where days begin and end: as for the certificate the course leads to. */
  private async zone(): Promise<string> {
    const [course] = await this.content.all('course');
    if (!course) return 'UTC';
    const paper = await this.content.current('blueprint', course.content.paper);
    return paper?.content.scheme.zone ?? course.content.zone;
  }
}
