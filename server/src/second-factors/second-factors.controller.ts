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
import { EnrolmentsService } from './enrolments.service.ts';

@Controller('api/me/second-factor')
export class SecondFactorsController {
  constructor(private readonly enrolments: EnrolmentsService) {}

  @Post()
  @Allow('administrator')
  @BeforeSecondFactor()
  @FreshSignIn()
  @Responds(201, enrolmentSchema)
  begin(@CurrentAccount() account: SignedInAccount): Promise<Enrolment> {
    return this.enrolments.begin(account);
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
    return this.enrolments.confirm(account, code, source);
  }
}
