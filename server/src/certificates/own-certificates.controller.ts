import { Controller, Get } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import { CertificateViewsService } from './certificate-views.service.ts';
import { ownCertificatesSchema, type OwnCertificates } from './certificates.schemas.ts';

@Controller('api/me/certificates')
export class OwnCertificatesController {
  constructor(private readonly views: CertificateViewsService) {}

  @Get()
  @Allow('signed-in')
  @Responds(200, ownCertificatesSchema)
  list(@CurrentAccount() account: SignedInAccount): Promise<OwnCertificates> {
    return this.views.ofAccount(account.id);
  }
}
