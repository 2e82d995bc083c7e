import { Injectable } from '@nestjs/common';
import { markQuestion } from '@ferrule/assessments';
import { AnswersRepository } from './answers.repository.ts';
import { addUp, toAnswers, type Marking } from './result.ts';
import { answersThatCount, type Sitting } from './sitting.ts';
import { SittingsRepository } from './sittings.repository.ts';
import { SittingSheets } from './sitting-sheets.ts';

/** Marks a paper from what is stored, and from nothing else: again gives the same marks. */
@Injectable()
export class Marker {
  constructor(
    private readonly repository: SittingsRepository,
    private readonly answers: AnswersRepository,
    private readonly sheets: SittingSheets,
  ) {}

  async mark(sitting: Sitting): Promise<Marking> {
    const items = await this.sheets.withQuestions(await this.repository.itemsOf(sitting.id));
    const counted = answersThatCount(await this.answers.allOf(sitting.id));
    const marked = items.map(({ item, question }) => ({
      key: item.key,
      number: item.number,
      subject: item.subject,
      lesson: question.meta.lesson,
      marked: markQuestion(question, item.drawn, toAnswers(counted.get(item.key))),
    }));
    return addUp(marked, sitting.rules);
  }
}
