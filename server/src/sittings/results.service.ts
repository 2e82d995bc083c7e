import { Injectable } from '@nestjs/common';
import type { OpenedItems, ResultsPage } from './papers.schemas.ts';
import type { ResultView } from './sittings.schemas.ts';

@Injectable()
export class ResultsService {
  async result(_accountId: string, _id: string): Promise<ResultView> {
    throw new Error('not built');
  }
  async list(_slug: string, _cursor: string | null): Promise<ResultsPage> {
    throw new Error('not built');
  }
  async openItems(_managerId: string, _id: string, _reason: string): Promise<OpenedItems> {
    throw new Error('not built');
  }
}
