import { Module } from '@nestjs/common';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { GlossaryController } from './glossary.controller.ts';
import { GlossaryService } from './glossary.service.ts';

@Module({
  imports: [PublishingModule],
  controllers: [GlossaryController],
  providers: [GlossaryService],
  exports: [GlossaryService],
})
export class GlossaryModule {}
