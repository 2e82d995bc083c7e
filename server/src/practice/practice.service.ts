import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import type { Answers } from '../questions/question-view.ts';
import type { PracticeMarked, PracticeView } from './practice.schemas.ts';

@Injectable()
export class PracticeService {
  async start(_accountId: string, _slug: string): Promise<PracticeView> {
    throw new NotFound();
  }
  async answer(_accountId: string, _id: string, _answers: Answers): Promise<PracticeMarked> {
    throw new NotFound();
  }
}
