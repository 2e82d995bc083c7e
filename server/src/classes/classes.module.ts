import { Module } from '@nestjs/common';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { ClassesController } from './classes.controller.ts';
import { ClassesRepository } from './classes.repository.ts';
import { ClassesService } from './classes.service.ts';
import { WrongCodes } from './wrong-codes.ts';

@Module({
  imports: [PublishingModule],
  controllers: [ClassesController],
  providers: [ClassesService, ClassesRepository, WrongCodes],
  exports: [ClassesService],
})
export class ClassesModule {}
