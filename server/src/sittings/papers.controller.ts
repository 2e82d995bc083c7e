import { Body, Controller, Get, Param, Post, Query } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  grantedTimesSchema,
  timeAllowanceSchema,
  type GrantedTimes,
  type TimeAllowance,
  lookSchema,
  openedItemsSchema,
  paperSlugSchema,
  paperViewSchema,
  resultsPageSchema,
  resultsQuerySchema,
  sittingIdSchema,
  type Look,
  type OpenedItems,
  type PaperView,
  type ResultsPage,
  type ResultsQuery,
} from './papers.schemas.ts';
import { AllowancesService } from './allowances.service.ts';
import { LooksService } from './looks.service.ts';
import { ResultsListService } from './results-list.service.ts';
import { StandingService } from './standing.service.ts';

/** What a paper asks for, and what came of it. */
@Controller('api')
export class PapersController {
  constructor(
    private readonly standings: StandingService,
    private readonly results: ResultsListService,
    private readonly looks: LooksService,
    private readonly allowances: AllowancesService,
  ) {}

  @Get('papers/:slug')
  @Allow('signed-in')
  @Responds(200, paperViewSchema)
  paper(
    @CurrentAccount() account: SignedInAccount,
    @Param('slug', { schema: paperSlugSchema }) slug: string,
  ): Promise<PaperView> {
    return this.standings.paper(account.id, slug);
  }

  @Get('papers/:slug/results')
  @Allow('certification-manager')
  @Responds(200, resultsPageSchema)
  list(
    @Param('slug', { schema: paperSlugSchema }) slug: string,
    @Query({ schema: resultsQuerySchema }) query: ResultsQuery,
  ): Promise<ResultsPage> {
    return this.results.list(slug, query.cursor ?? null);
  }

  @Get('time-allowances')
  @Allow('certification-manager')
  @Responds(200, grantedTimesSchema)
  allowedTimes(): Promise<GrantedTimes> {
    return this.allowances.list();
  }

  @Post('time-allowances')
  @Allow('certification-manager')
  @Responds(201, grantedTimesSchema)
  allowTime(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: timeAllowanceSchema }) input: TimeAllowance,
  ): Promise<GrantedTimes> {
    return this.allowances.grant(account.id, input);
  }

  @Post('sittings/:id/looks')
  @Allow('certification-manager')
  @Responds(200, openedItemsSchema)
  look(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
    @Body({ schema: lookSchema }) input: Look,
  ): Promise<OpenedItems> {
    return this.looks.open(account.id, id, input.reason);
  }
}
