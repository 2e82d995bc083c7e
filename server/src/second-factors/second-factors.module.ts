import { Module } from '@nestjs/common';
import { SecondFactorsController } from './second-factors.controller.ts';
import { SecondFactorsService } from './second-factors.service.ts';

@Module({
  controllers: [SecondFactorsController],
  providers: [SecondFactorsService],
  exports: [SecondFactorsService],
})
export class SecondFactorsModule {}
