import { Injectable } from '@nestjs/common';
import { QuestionsService } from '../questions/questions.service.ts';
import { RecordService } from '../record/record.service.ts';
import { SchoolService } from '../school/school.service.ts';
import { listPractice } from './practice-list.ts';
import type { FindPractice, PracticeList } from './practice.schemas.ts';

/** The questions anyone may practise, with what a person has shown of them. */
@Injectable()
export class PracticeListService {
  constructor(
    private readonly questions: QuestionsService,
    private readonly record: RecordService,
    private readonly school: SchoolService,
  ) {}

  async list(accountId: string, wanted: FindPractice): Promise<PracticeList> {
    const [bank, answers, profile] = await Promise.all([
      this.questions.practiceBank(),
      this.record.answeredBy(accountId),
      this.school.profileFor(accountId),
    ]);
    return listPractice(bank, { wanted, profile }, answers);
  }
}
