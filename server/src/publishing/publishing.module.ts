import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { ContentRevisionModel } from './models/content-revision.model.ts';
import { PublishedContentRepository } from './published-content.repository.ts';
import { PublishedContentService } from './published-content.service.ts';

@Module({
  imports: [SequelizeModule.forFeature([ContentRevisionModel])],
  providers: [PublishedContentRepository, PublishedContentService],
  exports: [PublishedContentService],
})
export class PublishingModule {}
