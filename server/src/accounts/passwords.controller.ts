import { Body, Controller, Post, Put } from '@nestjs/common';
import type { SignedInAccount } from './account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  acceptedSchema,
  addressSchema,
  changePasswordSchema,
  resetPasswordSchema,
  type Accepted,
  type Address,
  type ChangePassword,
  type ResetPassword,
} from './accounts.schemas.ts';
import { AddressAsksService } from './address-asks.service.ts';
import { PasswordChangesService } from './password-changes.service.ts';
import { PasswordResetsService } from './password-resets.service.ts';

@Controller('api')
export class PasswordsController {
  constructor(
    private readonly changes: PasswordChangesService,
    private readonly asks: AddressAsksService,
    private readonly resets: PasswordResetsService,
  ) {}

  @Put('me/password')
  @Allow('signed-in')
  @Responds(204)
  change(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: changePasswordSchema }) input: ChangePassword,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.changes.change(account, input, source);
  }

  @Post('password-resets')
  @Allow('anyone')
  @Responds(202, acceptedSchema)
  async askForReset(
    @Body({ schema: addressSchema }) { email }: Address,
    @CurrentSource() source: RequestSource,
  ): Promise<Accepted> {
    await this.asks.askCounted('reset-password', email, source);
    return {};
  }

  @Post('password-resets/confirmations')
  @Allow('anyone')
  @Responds(204)
  reset(
    @Body({ schema: resetPasswordSchema }) input: ResetPassword,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.resets.reset(input, source);
  }
}
