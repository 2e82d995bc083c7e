import { Body, Controller, Get, Param, Post, Query, Res } from '@nestjs/common';
import { RouteConfig } from '@nestjs/platform-fastify';
import { ApiProduces } from '@nestjs/swagger';
import type { FastifyReply } from 'fastify';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow, FreshSignIn } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { CertificateViewsService } from './certificate-views.service.ts';
import {
  certificateIdSchema,
  certificatesPageSchema,
  certificateViewSchema,
  correctNameSchema,
  findCertificatesSchema,
  withdrawSchema,
  type CertificatesPage,
  type CertificateView,
  type CorrectName,
  type FindCertificates,
  type Withdraw,
} from './certificates.schemas.ts';
import { NameCorrectionsService } from './name-corrections.service.ts';
import { WithdrawalsService } from './withdrawals.service.ts';

@Controller('api/certificates')
export class CertificatesController {
  constructor(
    private readonly views: CertificateViewsService,
    private readonly withdrawals: WithdrawalsService,
    private readonly corrections: NameCorrectionsService,
  ) {}

  @Get()
  @Allow('administrator', 'certification-manager')
  @Responds(200, certificatesPageSchema)
  list(
    @Query({ schema: findCertificatesSchema }) query: FindCertificates,
  ): Promise<CertificatesPage> {
    return this.views.page(query);
  }

  @Get(':id')
  @Allow('signed-in')
  @Responds(200, certificateViewSchema)
  get(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: certificateIdSchema }) id: string,
  ): Promise<CertificateView> {
    return this.views.find(account, id);
  }

  @Get(':id/file')
  @Allow('signed-in')
  @RouteConfig({ rateLimit: { max: 60, timeWindow: '1 minute' } })
  @ApiProduces('application/pdf')
  @Responds(200)
  async file(
    @CurrentAccount() account: SignedInAccount,
    @Param('id', { schema: certificateIdSchema }) id: string,
    @Res() reply: FastifyReply,
  ): Promise<void> {
    const { number, pdf } = await this.views.file(account, id);
    void reply
      .header('content-type', 'application/pdf')
      .header('content-disposition', `attachment; filename="certificate-${number}.pdf"`)
      .send(pdf);
  }

  @Post(':id/withdrawal')
  @Allow('administrator')
  @FreshSignIn()
  @Responds(200, certificateViewSchema)
  async withdraw(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: certificateIdSchema }) certificateId: string,
    @Body({ schema: withdrawSchema }) { reason }: Withdraw,
    @CurrentSource() { address }: RequestSource,
  ): Promise<CertificateView> {
    await this.withdrawals.withdraw({ certificateId, actor, address, reason });
    return this.views.find(actor, certificateId);
  }

  @Post(':id/name-correction')
  @Allow('administrator')
  @FreshSignIn()
  @Responds(201, certificateViewSchema)
  async correctName(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: certificateIdSchema }) certificateId: string,
    @Body({ schema: correctNameSchema }) { givenName, familyName, reason }: CorrectName,
    @CurrentSource() { address }: RequestSource,
  ): Promise<CertificateView> {
    const act = { certificateId, actor, address, reason };
    const id = await this.corrections.correct(act, { givenName, familyName });
    return this.views.find(actor, id);
  }
}
