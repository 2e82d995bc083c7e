import { Body, Controller, Get, Param, Post, Query } from '@nestjs/common';
import { z } from 'zod';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { PracticeListService } from './practice-list.service.ts';
import {
  answerPracticeSchema,
  askHintSchema,
  findPracticeSchema,
  hintSchema,
  practiceListSchema,
  practiceMarkedSchema,
  practiceViewSchema,
  startPracticeSchema,
  type AnswerPractice,
  type AskHint,
  type FindPractice,
  type Hint,
  type PracticeList,
  type PracticeMarked,
  type PracticeView,
  type StartPractice,
} from './practice.schemas.ts';
import { PracticeService } from './practice.service.ts';

@Controller('api/practice')
export class PracticeController {
  constructor(
    private readonly practice: PracticeService,
    private readonly lists: PracticeListService,
  ) {}

  @Get('questions')
  @Allow('signed-in')
  @Responds(200, practiceListSchema)
  list(
    @CurrentAccount() account: SignedInAccount,
    @Query({ schema: findPracticeSchema }) wanted: FindPractice,
  ): Promise<PracticeList> {
    return this.lists.list(account.id, wanted);
  }

  @Post()
  @Allow('signed-in')
  @Responds(201, practiceViewSchema)
  start(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: startPracticeSchema }) input: StartPractice,
  ): Promise<PracticeView> {
    return this.practice.start(account.id, input);
  }

  @Post(':id/hints')
  @Allow('signed-in')
  @Responds(200, hintSchema)
  hint(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
    @Body({ schema: askHintSchema }) input: AskHint,
  ): Promise<Hint> {
    return this.practice.hint(account.id, id, input.part);
  }

  @Post(':id/answers')
  @Allow('signed-in')
  @Responds(200, practiceMarkedSchema)
  answer(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
    @Body({ schema: answerPracticeSchema }) input: AnswerPractice,
  ): Promise<PracticeMarked> {
    return this.practice.answer(account.id, id, input.answers);
  }
}
