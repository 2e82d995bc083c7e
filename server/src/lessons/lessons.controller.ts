import { Body, Controller, Delete, Get, Param, Put, Req, Res } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  lessonNumberSchema,
  lessonProgressSchema,
  lessonViewSchema,
  markDoneSchema,
  readToSchema,
  type LessonProgressView,
  type MarkDone,
  type ReadTo,
} from './lessons.schemas.ts';
import { holdsTag } from './lesson.presenter.ts';
import { LessonsService } from './lessons.service.ts';

@Controller('api/lessons/:number')
export class LessonsController {
  constructor(private readonly lessons: LessonsService) {}

  /** The sheet alone, the same for everyone: a browser may keep it and ask whether it changed. */
  @Get()
  @Allow('signed-in')
  @Responds(200, lessonViewSchema)
  async read(
    @Param('number', { schema: lessonNumberSchema }) number: string,
    @Req() request: FastifyRequest,
    @Res() reply: FastifyReply,
  ): Promise<void> {
    const { etag, view } = await this.lessons.read(number);
    void reply.header('etag', etag).header('cache-control', 'private, no-cache');
    if (holdsTag(request.headers['if-none-match'], etag)) return void reply.status(304).send();
    void reply.send(lessonViewSchema.parse(view));
  }

  @Get('progress')
  @Allow('signed-in')
  @Responds(200, lessonProgressSchema)
  progress(
    @CurrentAccount() account: SignedInAccount,
    @Param('number', { schema: lessonNumberSchema }) number: string,
  ): Promise<LessonProgressView> {
    return this.lessons.progress(account.id, number);
  }

  @Put('progress')
  @Allow('signed-in')
  @Responds(200, lessonProgressSchema)
  readTo(
    @CurrentAccount() account: SignedInAccount,
    @Param('number', { schema: lessonNumberSchema }) number: string,
    @Body({ schema: readToSchema }) input: ReadTo,
  ): Promise<LessonProgressView> {
    return this.lessons.readTo(account.id, number, input.paragraph);
  }

  @Put('done')
  @Allow('signed-in')
  @Responds(200, lessonProgressSchema)
  markDone(
    @CurrentAccount() account: SignedInAccount,
    @Param('number', { schema: lessonNumberSchema }) number: string,
    @Body({ schema: markDoneSchema }) input: MarkDone,
  ): Promise<LessonProgressView> {
    return this.lessons.markDone(account.id, number, input.revision);
  }

  @Delete('done')
  @Allow('signed-in')
  @Responds(200, lessonProgressSchema)
  undoDone(
    @CurrentAccount() account: SignedInAccount,
    @Param('number', { schema: lessonNumberSchema }) number: string,
  ): Promise<LessonProgressView> {
    return this.lessons.undoDone(account.id, number);
  }
}
