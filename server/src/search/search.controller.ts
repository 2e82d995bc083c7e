import { Controller, Get, Query } from '@nestjs/common';
import { Allow } from '../http/allow.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { foundSchema, searchQuerySchema, type Found, type SearchQuery } from './search.schemas.ts';
import { SearchService } from './search.service.ts';

@Controller('api/search')
export class SearchController {
  constructor(private readonly searching: SearchService) {}

  @Get()
  @Allow('signed-in')
  @Responds(200, foundSchema)
  search(@Query({ schema: searchQuerySchema }) { q }: SearchQuery): Promise<Found> {
    return this.searching.search(q);
  }
}
