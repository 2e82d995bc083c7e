import { Module } from '@nestjs/common';
import { PapersController } from './papers.controller.ts';
import { ResultsService } from './results.service.ts';
import { SittingsController } from './sittings.controller.ts';
import { SittingsService } from './sittings.service.ts';
import { StandingService } from './standing.service.ts';

@Module({
  controllers: [PapersController, SittingsController],
  providers: [ResultsService, SittingsService, StandingService],
  exports: [SittingsService],
})
export class SittingsModule {}
