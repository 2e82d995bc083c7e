import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import type { Answers } from '../questions/question-view.ts';
import type { SavedAnswers, WorksheetSummary, WorksheetView } from './worksheets.schemas.ts';

@Injectable()
export class WorksheetsService {
  async summary(_accountId: string, _number: string): Promise<WorksheetSummary> {
    throw new NotFound();
  }
  async start(_accountId: string, _number: string): Promise<WorksheetView> {
    throw new NotFound();
  }
  async open(_accountId: string, _id: string): Promise<WorksheetView> {
    throw new NotFound();
  }
  async save(
    _at: { accountId: string; id: string; key: string },
    _answers: Answers,
  ): Promise<SavedAnswers> {
    throw new NotFound();
  }
  async handIn(_accountId: string, _id: string): Promise<WorksheetView> {
    throw new NotFound();
  }
}
