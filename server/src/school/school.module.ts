import { Module } from '@nestjs/common';
import { SchoolController } from './school.controller.ts';
import { SchoolRepository } from './school.repository.ts';
import { SchoolService } from './school.service.ts';

@Module({
  controllers: [SchoolController],
  providers: [SchoolRepository, SchoolService],
  exports: [SchoolService],
})
export class SchoolModule {}
