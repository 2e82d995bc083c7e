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
import { SessionsService } from './sessions.service.ts';
import { SignInService } from './sign-in.service.ts';

@Controller('api')
export class SessionsController {
  constructor(
    private readonly signing: SignInService,
    private readonly sessions: SessionsService,
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
    const { opened, device, view } = await this.signing.signIn(input, source, {
      knownDevice,
      replaced,
    });
    this.cookies.set(reply, opened);
    this.cookies.setDevice(reply, device);
    return view;
  }

  @Get('session')
  @Allow('signed-in')
  @Responds(200, sessionViewSchema)
  current(@CurrentAccount() account: SignedInAccount): Promise<SessionView> {
    return this.sessions.view(account);
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
  @Allow('signed-in')
  @Responds(200, sessionViewSchema)
  giveCode(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: secondFactorCodeSchema }) { code }: SecondFactorCode,
    @CurrentSource() source: RequestSource,
  ): Promise<SessionView> {
    return this.signing.giveCode(account, code, source);
  }

  @Post('session/confirmation')
  @Allow('signed-in')
  @Responds(200, sessionViewSchema)
  confirmPassword(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: confirmPasswordSchema }) { password }: ConfirmPassword,
    @CurrentSource() source: RequestSource,
  ): Promise<SessionView> {
    return this.signing.confirmPassword(account, password, source);
  }

  @Get('me/sessions')
  @Allow('signed-in')
  @Responds(200, ownSessionsSchema)
  list(@CurrentAccount() account: SignedInAccount): Promise<OwnSessions> {
    return this.sessions.listOwn(account);
  }

  @Delete('me/sessions')
  @Allow('signed-in')
  @Responds(204)
  endOthers(@CurrentAccount() account: SignedInAccount): Promise<void> {
    return this.sessions.endOthers(account);
  }

  @Delete('me/sessions/:id')
  @Allow('signed-in')
  @Responds(204)
  endOne(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: z.uuid() }) id: string,
  ): Promise<void> {
    return this.sessions.endOwn(account, id);
  }
}
