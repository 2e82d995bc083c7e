import { Module } from '@nestjs/common';
import { SessionsModule } from '../sessions/sessions.module.ts';
import { ThrottlesModule } from '../throttles/throttles.module.ts';
import { EnrolmentsService } from './enrolments.service.ts';
import { SecondFactorsController } from './second-factors.controller.ts';
import { SecondFactorsRepository } from './second-factors.repository.ts';
import { SecondFactorsService } from './second-factors.service.ts';

@Module({
  imports: [SessionsModule, ThrottlesModule],
  controllers: [SecondFactorsController],
  providers: [EnrolmentsService, SecondFactorsRepository, SecondFactorsService],
  exports: [SecondFactorsService],
})
export class SecondFactorsModule {}
