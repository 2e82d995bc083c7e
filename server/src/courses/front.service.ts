import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import type { Front } from './courses.schemas.ts';

@Injectable()
export class FrontService {
  async front(): Promise<Front> {
    throw new NotFound();
  }
}
