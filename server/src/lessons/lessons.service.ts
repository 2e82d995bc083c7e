import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import type { LessonProgressView, LessonView } from './lessons.schemas.ts';

@Injectable()
export class LessonsService {
  async read(_number: string): Promise<{ etag: string; view: LessonView }> {
    throw new NotFound();
  }
  async progress(_accountId: string, _number: string): Promise<LessonProgressView> {
    throw new NotFound();
  }
  async readTo(_a: string, _number: string, _paragraph: number): Promise<LessonProgressView> {
    throw new NotFound();
  }
  async markDone(_a: string, _number: string, _revision: string): Promise<LessonProgressView> {
    throw new NotFound();
  }
  async undoDone(_a: string, _number: string): Promise<LessonProgressView> {
    throw new NotFound();
  }
}
