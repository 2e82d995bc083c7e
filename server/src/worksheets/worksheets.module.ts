import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { ClassesModule } from '../classes/classes.module.ts';
import { PracticeModule } from '../practice/practice.module.ts';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { QuestionsModule } from '../questions/questions.module.ts';
import { WorksheetAttemptModel } from './models/worksheet-attempt.model.ts';
import { WorksheetDrawing } from './worksheet-drawing.ts';
import { WorksheetMarker } from './worksheet-marker.ts';
import { WorksheetSheets } from './worksheet-sheets.ts';
import { WorksheetsController } from './worksheets.controller.ts';
import { WorksheetsRepository } from './worksheets.repository.ts';
import { WorksheetsService } from './worksheets.service.ts';

@Module({
  imports: [
    ClassesModule,
    PracticeModule,
    PublishingModule,
    QuestionsModule,
    SequelizeModule.forFeature([WorksheetAttemptModel]),
  ],
  controllers: [WorksheetsController],
  providers: [
    WorksheetDrawing,
    WorksheetMarker,
    WorksheetSheets,
    WorksheetsRepository,
    WorksheetsService,
  ],
  exports: [WorksheetsService],
})
export class WorksheetsModule {}
