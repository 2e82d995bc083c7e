import { Body, Controller, Get, Param, Post, Put } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { ResultsService } from './results.service.ts';
import { SavingService } from './saving.service.ts';
import { sittingIdSchema } from './papers.schemas.ts';
import {
  comeBackSchema,
  emptySchema,
  handedInSchema,
  itemKeySchema,
  partSchema,
  resultViewSchema,
  saveAnswerSchema,
  savedSchema,
  sittingViewSchema,
  startSittingSchema,
  type ComeBack,
  type HandedIn,
  type ResultView,
  type SaveAnswer,
  type Saved,
  type SittingView,
  type StartSitting,
} from './sittings.schemas.ts';
import { SittingsService } from './sittings.service.ts';

@Controller('api/sittings')
export class SittingsController {
  constructor(
    private readonly sittings: SittingsService,
    private readonly saving: SavingService,
    private readonly results: ResultsService,
  ) {}

  @Post()
  @Allow('signed-in')
  @Responds(201, sittingViewSchema)
  start(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: startSittingSchema }) input: StartSitting,
  ): Promise<SittingView> {
    return this.sittings.start(account, input);
  }

  @Get(':id')
  @Allow('signed-in')
  @Responds(200, sittingViewSchema)
  view(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
  ): Promise<SittingView> {
    return this.sittings.view(account, id);
  }

  @Put(':id/items/:key/parts/:part')
  @Allow('signed-in')
  @Responds(200, savedSchema)
  save(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
    @Param('key', { schema: itemKeySchema }) key: string,
    @Param('part', { schema: partSchema }) part: string,
    @Body({ schema: saveAnswerSchema }) input: SaveAnswer,
  ): Promise<Saved> {
    return this.saving.save(account, { id, key, part }, input);
  }

  @Put(':id/items/:key/come-back')
  @Allow('signed-in')
  @Responds(200, comeBackSchema)
  comeBack(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
    @Param('key', { schema: itemKeySchema }) key: string,
    @Body({ schema: comeBackSchema }) input: ComeBack,
  ): Promise<ComeBack> {
    return this.sittings.comeBack(account, { id, key }, input.comeBack);
  }

  @Post(':id/take-over')
  @Allow('signed-in')
  @Responds(200, sittingViewSchema)
  takeOver(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
    @Body({ schema: emptySchema }) _body: object,
  ): Promise<SittingView> {
    return this.sittings.takeOver(account, id);
  }

  @Post(':id/hand-in')
  @Allow('signed-in')
  @Responds(200, handedInSchema)
  handIn(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
    @Body({ schema: emptySchema }) _body: object,
  ): Promise<HandedIn> {
    return this.sittings.handIn(account, id);
  }

  @Get(':id/result')
  @Allow('signed-in')
  @Responds(200, resultViewSchema)
  result(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: sittingIdSchema }) id: string,
  ): Promise<ResultView> {
    return this.results.result(account.id, id);
  }
}
