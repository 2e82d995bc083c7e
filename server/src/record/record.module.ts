import { Module } from '@nestjs/common';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { QuestionsModule } from '../questions/questions.module.ts';
import { RecordController } from './record.controller.ts';
import { RecordRepository } from './record.repository.ts';
import { RecordService } from './record.service.ts';

@Module({
  imports: [PublishingModule, QuestionsModule],
  controllers: [RecordController],
  providers: [RecordRepository, RecordService],
  exports: [RecordService],
})
export class RecordModule {}
