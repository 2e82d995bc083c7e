import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { QuestionsModule } from '../questions/questions.module.ts';
import { PracticeAttemptModel } from './models/practice-attempt.model.ts';
import { PracticeController } from './practice.controller.ts';
import { PracticeRepository } from './practice.repository.ts';
import { PracticeService } from './practice.service.ts';

@Module({
  imports: [QuestionsModule, SequelizeModule.forFeature([PracticeAttemptModel])],
  controllers: [PracticeController],
  providers: [PracticeService, PracticeRepository],
  exports: [PracticeService],
})
export class PracticeModule {}
