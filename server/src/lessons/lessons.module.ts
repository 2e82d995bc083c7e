import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { LessonProgressRepository } from './lesson-progress.repository.ts';
import { LessonsController } from './lessons.controller.ts';
import { LessonsService } from './lessons.service.ts';
import { LessonProgressModel } from './models/lesson-progress.model.ts';

@Module({
  imports: [PublishingModule, SequelizeModule.forFeature([LessonProgressModel])],
  controllers: [LessonsController],
  providers: [LessonsService, LessonProgressRepository],
  exports: [LessonsService],
})
export class LessonsModule {}
