import { Body, Controller, Delete, Get, Param, Post, Req, Res } from '@nestjs/common';
import type { FastifyReply } from 'fastify';
import { z } from 'zod';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow, BeforeSecondFactor } from '../http/allow.decorator.ts';
import { CurrentAccount, type RequestWithAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { SessionCookies } from './session-cookies.ts';
import {
  confirmPasswordSchema,
  ownSessionsSchema,
  secondFactorCodeSchema,
  sessionViewSchema,
  signInSchema,
  type ConfirmPassword,
  type OwnSessions,
  type SecondFactorCode,
  type SessionView,
  type SignIn,
} from './sessions.schemas.ts';
import { SessionStepsService } from './session-steps.service.ts';
import { SessionViewsService } from './session-views.service.ts';
import { SignInService } from './sign-in.service.ts';

@Controller('api')
export class SessionsController {
  constructor(
    private readonly signing: SignInService,
    private readonly steps: SessionStepsService,
    private readonly views: SessionViewsService,
    private readonly cookies: SessionCookies,
  ) {}

  @Post('sessions')
  @Allow('anyone')
  @Responds(201, sessionViewSchema)
  async signIn(
    @Body({ schema: signInSchema }) input: SignIn,
    @Req() request: RequestWithAccount,
    @Res({ passthrough: true }) reply: FastifyReply,
    @CurrentSource() source: RequestSource,
  ): Promise<SessionView> {
    const knownDevice = this.cookies.readDevice(request);
    const replaced = request.account?.sessionId;
    const { opened, device } = await this.signing.signIn(input, source, { knownDevice, replaced });
    this.cookies.set(reply, opened);
    this.cookies.setDevice(reply, device);
    return this.views.current(opened.id);
  }

  @Get('session')
  @Allow('signed-in')
  @Responds(200, sessionViewSchema)
  current(@CurrentAccount() { sessionId }: SignedInAccount): Promise<SessionView> {
    return this.views.current(sessionId);
  }

  @Delete('session')
  @Allow('signed-in')
  @Responds(204)
  async signOut(
    @CurrentAccount() account: SignedInAccount,
    @CurrentSource() source: RequestSource,
    @Res({ passthrough: true }) reply: FastifyReply,
  ): Promise<void> {
    await this.signing.signOut(account, source);
    this.cookies.clear(reply);
  }

  @Post('session/second-factor')
  @Allow('administrator')
  @BeforeSecondFactor()
  @Responds(200, sessionViewSchema)
  async giveCode(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: secondFactorCodeSchema }) { code }: SecondFactorCode,
    @CurrentSource() source: RequestSource,
  ): Promise<SessionView> {
    await this.steps.giveCode(account, code, source);
    return this.views.current(account.sessionId);
  }

  @Post('session/confirmation')
  @Allow('signed-in')
  @Responds(200, sessionViewSchema)
  async confirmPassword(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: confirmPasswordSchema }) { password }: ConfirmPassword,
    @CurrentSource() source: RequestSource,
  ): Promise<SessionView> {
    await this.steps.confirmPassword(account, password, source);
    return this.views.current(account.sessionId);
  }

  @Get('me/sessions')
  @Allow('signed-in')
  @Responds(200, ownSessionsSchema)
  list(@CurrentAccount() account: SignedInAccount): Promise<OwnSessions> {
    return this.views.listOwn(account);
  }

  @Delete('me/sessions')
  @Allow('signed-in')
  @Responds(204)
  endOthers(
    @CurrentAccount() account: SignedInAccount,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.views.endOthers(account, source);
  }

  @Delete('me/sessions/:id')
  @Allow('signed-in')
  @Responds(204)
  endOne(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.views.endOne(account, id, source);
  }
}
