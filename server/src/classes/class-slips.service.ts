import { slipWords } from '@ferrule/assessments';
import { Injectable } from '@nestjs/common';
import { QuestionsService } from '../questions/questions.service.ts';
import type { WorksheetAttempt } from '../worksheets/worksheet-attempt.ts';
import { WorksheetsService } from '../worksheets/worksheets.service.ts';
import { commonSlips, type PartAnswered, type SlipMade } from './common-slips.ts';

type Item = WorksheetAttempt['items'][number];

/** Which predicted slips a class makes in its first attempts. */
@Injectable()
export class ClassSlipsService {
  constructor(
    private readonly worksheets: WorksheetsService,
    private readonly questions: QuestionsService,
  ) {}

  async of(accountIds: readonly string[]): Promise<ReturnType<typeof commonSlips>> {
    const attempts = await this.worksheets.firstMarkedOf(accountIds);
    const made: SlipMade[] = [];
    const answered: PartAnswered[] = [];
    for (const attempt of attempts) {
      for (const item of attempt.items) {
        answered.push(...answeredParts(attempt, item));
        made.push(...(await this.slipsMade(attempt, item)));
      }
    }
    return commonSlips(made, answered);
  }

  private async slipsMade(attempt: WorksheetAttempt, item: Item): Promise<SlipMade[]> {
    const marked = attempt.marked?.[item.key];
    const entries = marked?.trace.filter(({ rule }) => rule === 'slip') ?? [];
    if (entries.length === 0) return [];
    const { question } = await this.questions.byRevision(item.revisionId);
    return entries.flatMap((entry) => {
      const says = slipWords(question, entry);
      const { accountId } = attempt;
      return says ? [{ accountId, question: item.view.title, part: entry.part, says }] : [];
    });
  }
}

const answeredParts = ({ accountId, marked }: WorksheetAttempt, item: Item): PartAnswered[] =>
  (marked?.[item.key]?.parts ?? [])
    .filter(({ verdict }) => verdict !== 'blank')
    .map(({ id }) => ({ accountId, question: item.view.title, part: id }));
