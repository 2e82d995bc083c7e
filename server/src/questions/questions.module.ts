import { Module } from '@nestjs/common';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { QuestionsService } from './questions.service.ts';

@Module({
  imports: [PublishingModule],
  providers: [QuestionsService],
  exports: [QuestionsService],
})
export class QuestionsModule {}
