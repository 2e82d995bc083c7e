import { Module } from '@nestjs/common';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { MarkedViewsService } from './marked-views.service.ts';
import { QuestionsService } from './questions.service.ts';

@Module({
  imports: [PublishingModule],
  providers: [MarkedViewsService, QuestionsService],
  exports: [MarkedViewsService, QuestionsService],
})
export class QuestionsModule {}
