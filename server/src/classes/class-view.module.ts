import { Module } from '@nestjs/common';
import { LessonsModule } from '../lessons/lessons.module.ts';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { QuestionsModule } from '../questions/questions.module.ts';
import { SittingsModule } from '../sittings/sittings.module.ts';
import { WorksheetsModule } from '../worksheets/worksheets.module.ts';
import { ClassProgressService } from './class-progress.service.ts';
import { ClassSlipsService } from './class-slips.service.ts';
import { ClassViewController } from './class-view.controller.ts';
import { ClassViewService } from './class-view.service.ts';
import { ClassesModule } from './classes.module.ts';

@Module({
  imports: [
    ClassesModule,
    LessonsModule,
    PublishingModule,
    QuestionsModule,
    SittingsModule,
    WorksheetsModule,
  ],
  controllers: [ClassViewController],
  providers: [ClassProgressService, ClassSlipsService, ClassViewService],
})
export class ClassViewModule {}
