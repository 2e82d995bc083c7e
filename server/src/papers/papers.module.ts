import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { PublishingModule } from '../publishing/publishing.module.ts';
import { QuestionsModule } from '../questions/questions.module.ts';
import { SchemeModel } from './models/scheme.model.ts';
import { PapersRepository } from './papers.repository.ts';
import { PapersService } from './papers.service.ts';

@Module({
  imports: [PublishingModule, QuestionsModule, SequelizeModule.forFeature([SchemeModel])],
  providers: [PapersRepository, PapersService],
  exports: [PapersService],
})
export class PapersModule {}
