import { Injectable } from '@nestjs/common';
import { NotFound } from '../problems/common.errors.ts';
import type { CourseMap } from './courses.schemas.ts';

@Injectable()
export class CoursesService {
  async mapFor(_accountId: string): Promise<CourseMap> {
    throw new NotFound();
  }
}
