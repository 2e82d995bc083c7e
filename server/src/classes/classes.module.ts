import { Module } from '@nestjs/common';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { ThrottlesModule } from '../throttles/throttles.module.ts';
import { ClassesController } from './classes.controller.ts';
import { ClassesRepository } from './classes.repository.ts';
import { ClassesService } from './classes.service.ts';
import { OpeningRepository } from './opening.repository.ts';
import { OpeningService } from './opening.service.ts';

@Module({
  imports: [PublishingModule, ThrottlesModule],
  controllers: [ClassesController],
  providers: [ClassesService, ClassesRepository, OpeningService, OpeningRepository],
  exports: [ClassesService],
})
export class ClassesModule {}
