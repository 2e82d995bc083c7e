import { Body, Controller, Get, Param, Post, Req } from '@nestjs/common';
import { RouteConfig } from '@nestjs/platform-fastify';
import { ApiBody, ApiConsumes } from '@nestjs/swagger';
import type { FastifyRequest } from 'fastify';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { FileChecksService } from './file-checks.service.ts';
import { readUpload } from './read-upload.ts';
import {
  checkSchema,
  fileAnswerSchema,
  fileRecordSchema,
  issuersSchema,
  linkCodeSchema,
  registerAnswerSchema,
  sha256Schema,
  type Check,
  type FileAnswer,
  type FileRecord,
  type Issuers,
  type RegisterAnswer,
} from './register.schemas.ts';
import { RegisterService } from './register.service.ts';

const perAddress = { rateLimit: { max: 120, timeWindow: '1 minute' } };

/** The public register: one certificate at a time, to whoever holds its number, code or file. */
@Controller('api/register')
export class RegisterController {
  constructor(
    private readonly register: RegisterService,
    private readonly files: FileChecksService,
  ) {}

  /** A POST, so that no name stands in an address or a log. */
  @Post('checks')
  @Allow('anyone')
  @Responds(200, registerAnswerSchema)
  check(
    @Body({ schema: checkSchema }) check: Check,
    @CurrentSource() { address }: RequestSource,
  ): Promise<RegisterAnswer> {
    return this.register.check(check, address);
  }

  @Get('links/:code')
  @Allow('anyone')
  @RouteConfig(perAddress)
  @Responds(200, registerAnswerSchema)
  followLink(@Param('code', { schema: linkCodeSchema }) code: string): Promise<RegisterAnswer> {
    return this.register.followLink(code);
  }

  @Get('files/:sha256')
  @Allow('anyone')
  @RouteConfig(perAddress)
  @Responds(200, fileRecordSchema)
  findFile(@Param('sha256', { schema: sha256Schema }) sha256: string): Promise<FileRecord> {
    return this.register.findFile(sha256);
  }

  @Get('issuers')
  @Allow('anyone')
  @RouteConfig(perAddress)
  @Responds(200, issuersSchema)
  issuers(): Promise<Issuers> {
    return this.register.issuers();
  }

  @Post('files')
  @Allow('anyone')
  @ApiConsumes('multipart/form-data')
  @ApiBody({
    schema: {
      type: 'object',
      required: ['file'],
      properties: { file: { type: 'string', format: 'binary' } },
    },
  })
  @Responds(200, fileAnswerSchema)
  async checkFile(
    @Req() request: FastifyRequest,
    @CurrentSource() { address }: RequestSource,
  ): Promise<FileAnswer> {
    await this.files.admit(address);
    return this.files.check(await readUpload(request));
  }
}
