import { Module } from '@nestjs/common';
import { WorksheetsController } from './worksheets.controller.ts';
import { WorksheetsService } from './worksheets.service.ts';

@Module({
  controllers: [WorksheetsController],
  providers: [WorksheetsService],
  exports: [WorksheetsService],
})
export class WorksheetsModule {}
