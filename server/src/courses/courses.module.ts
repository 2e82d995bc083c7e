import { Module } from '@nestjs/common';
import { ClassesModule } from '../classes/classes.module.ts';
import { LessonsModule } from '../lessons/lessons.module.ts';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { QuestionsModule } from '../questions/questions.module.ts';
import { SittingsModule } from '../sittings/sittings.module.ts';
import { WorksheetsModule } from '../worksheets/worksheets.module.ts';
import { CoursesController } from './courses.controller.ts';
import { CoursesService } from './courses.service.ts';
import { FrontService } from './front.service.ts';

@Module({
  imports: [
    ClassesModule,
    LessonsModule,
    PublishingModule,
    QuestionsModule,
    SittingsModule,
    WorksheetsModule,
  ],
  controllers: [CoursesController],
  providers: [CoursesService, FrontService],
})
export class CoursesModule {}
