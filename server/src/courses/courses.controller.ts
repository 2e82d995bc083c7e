import { Controller, Get } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { courseMapSchema, frontSchema, type CourseMap, type Front } from './courses.schemas.ts';
import { CoursesService } from './courses.service.ts';
import { FrontService } from './front.service.ts';

@Controller('api')
export class CoursesController {
  constructor(
    private readonly courses: CoursesService,
    private readonly fronts: FrontService,
  ) {}

  @Get('front')
  @Allow('anyone')
  @Responds(200, frontSchema)
  front(): Promise<Front> {
    return this.fronts.front();
  }

  @Get('course')
  @Allow('signed-in')
  @Responds(200, courseMapSchema)
  course(@CurrentAccount() account: SignedInAccount): Promise<CourseMap> {
    return this.courses.mapFor(account.id);
  }
}
