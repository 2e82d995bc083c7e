import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { QuestionsModule } from '../questions/questions.module.ts';
import { PracticeAttemptModel } from './models/practice-attempt.model.ts';
import { RecordModule } from '../record/record.module.ts';
import { SchoolModule } from '../school/school.module.ts';
import { PracticeListService } from './practice-list.service.ts';
import { PracticeController } from './practice.controller.ts';
import { PracticeRepository } from './practice.repository.ts';
import { PracticeService } from './practice.service.ts';

@Module({
  imports: [
    QuestionsModule,
    RecordModule,
    SchoolModule,
    SequelizeModule.forFeature([PracticeAttemptModel]),
  ],
  controllers: [PracticeController],
  providers: [PracticeListService, PracticeService, PracticeRepository],
  exports: [PracticeService],
})
export class PracticeModule {}
