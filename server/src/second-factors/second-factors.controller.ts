import { Body, Controller, Post } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Allow, BeforeSecondFactor, FreshSignIn } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  confirmEnrolmentSchema,
  enrolmentSchema,
  recoveryCodesSchema,
  type ConfirmEnrolment,
  type Enrolment,
  type RecoveryCodes,
} from './second-factors.schemas.ts';
import { SecondFactorsService } from './second-factors.service.ts';

@Controller('api/me/second-factor')
export class SecondFactorsController {
  constructor(private readonly factors: SecondFactorsService) {}

  @Post()
  @Allow('administrator')
  @BeforeSecondFactor()
  @FreshSignIn()
  @Responds(201, enrolmentSchema)
  enrol(@CurrentAccount() account: SignedInAccount): Promise<Enrolment> {
    return this.factors.enrol(account);
  }

  @Post('confirmation')
  @Allow('administrator')
  @BeforeSecondFactor()
  @FreshSignIn()
  @Responds(200, recoveryCodesSchema)
  confirm(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: confirmEnrolmentSchema }) { code }: ConfirmEnrolment,
    @CurrentSource() source: RequestSource,
  ): Promise<RecoveryCodes> {
    return this.factors.confirm(account, code, source);
  }
}
