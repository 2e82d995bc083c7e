import { Injectable } from '@nestjs/common';
import type { PaperView } from './papers.schemas.ts';

@Injectable()
export class StandingService {
  async paper(_accountId: string, _slug: string): Promise<PaperView> {
    throw new Error('not built');
  }
}
