import { Module } from '@nestjs/common';
import { SearchController } from './search.controller.ts';
import { SearchRepository } from './search.repository.ts';
import { SearchService } from './search.service.ts';

@Module({
  controllers: [SearchController],
  providers: [SearchService, SearchRepository],
})
export class SearchModule {}
