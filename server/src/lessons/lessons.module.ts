import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { GlossaryModule } from '../glossary/glossary.module.ts';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { LessonProgressRepository } from './lesson-progress.repository.ts';
import { LessonsController } from './lessons.controller.ts';
import { LessonsService } from './lessons.service.ts';
import { LessonProgressModel } from './models/lesson-progress.model.ts';

@Module({
  imports: [GlossaryModule, PublishingModule, SequelizeModule.forFeature([LessonProgressModel])],
  controllers: [LessonsController],
  providers: [LessonsService, LessonProgressRepository],
  exports: [LessonsService],
})
export class LessonsModule {}
