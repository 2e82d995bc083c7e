import { Module } from '@nestjs/common';
import { CoursesController } from './courses.controller.ts';
import { CoursesService } from './courses.service.ts';
import { FrontService } from './front.service.ts';

@Module({
  controllers: [CoursesController],
  providers: [CoursesService, FrontService],
})
export class CoursesModule {}
