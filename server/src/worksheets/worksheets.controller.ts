import { Body, Controller, Get, Param, Post, Put } from '@nestjs/common';
import { z } from 'zod';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  handInSchema,
  itemKeySchema,
  saveAnswersSchema,
  savedAnswersSchema,
  worksheetNumberSchema,
  worksheetSchema,
  worksheetSummarySchema,
  type SaveAnswers,
  type SavedAnswers,
  type WorksheetSummary,
  type WorksheetView,
} from './worksheets.schemas.ts';
import { WorksheetsService } from './worksheets.service.ts';

@Controller('api')
export class WorksheetsController {
  constructor(private readonly worksheets: WorksheetsService) {}

  @Get('worksheets/:number')
  @Allow('signed-in')
  @Responds(200, worksheetSummarySchema)
  summary(
    @CurrentAccount() account: SignedInAccount,
    @Param('number', { schema: worksheetNumberSchema }) number: string,
  ): Promise<WorksheetSummary> {
    return this.worksheets.summary(account.id, number);
  }

  /** Starts an attempt with fresh figures, or goes on with the one that is open. */
  @Post('worksheets/:number/attempts')
  @Allow('signed-in')
  @Responds(201, worksheetSchema)
  start(
    @CurrentAccount() account: SignedInAccount,
    @Param('number', { schema: worksheetNumberSchema }) number: string,
  ): Promise<WorksheetView> {
    return this.worksheets.start(account.id, number);
  }

  @Get('worksheet-attempts/:id')
  @Allow('signed-in')
  @Responds(200, worksheetSchema)
  open(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
  ): Promise<WorksheetView> {
    return this.worksheets.open(account, id);
  }

  @Put('worksheet-attempts/:id/items/:key/answers')
  @Allow('signed-in')
  @Responds(200, savedAnswersSchema)
  save(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
    @Param('key', { schema: itemKeySchema }) key: string,
    @Body({ schema: saveAnswersSchema }) input: SaveAnswers,
  ): Promise<SavedAnswers> {
    return this.worksheets.save({ accountId: account.id, id, key }, input.answers);
  }

  @Post('worksheet-attempts/:id/hand-in')
  @Allow('signed-in')
  @Responds(200, worksheetSchema)
  handIn(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
    @Body({ schema: handInSchema }) _input: Record<string, never>,
  ): Promise<WorksheetView> {
    return this.worksheets.handIn(account.id, id);
  }
}
