import { Module } from '@nestjs/common';
import { RemarkingJobs } from './remarking.jobs.ts';
import { RemarkingRepository } from './remarking.repository.ts';
import { RemarkingService } from './remarking.service.ts';

@Module({ providers: [RemarkingJobs, RemarkingRepository, RemarkingService] })
export class RemarkingModule {}
