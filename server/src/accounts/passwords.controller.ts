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
import { PasswordsService } from './passwords.service.ts';

@Controller('api')
export class PasswordsController {
  constructor(private readonly passwords: PasswordsService) {}

  @Put('me/password')
  @Allow('signed-in')
  @Responds(204)
  change(
    @CurrentAccount() account: SignedInAccount,
    @Body({ schema: changePasswordSchema }) input: ChangePassword,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.passwords.change(account, input, source);
  }

  @Post('password-resets')
  @Allow('anyone')
  @Responds(202, acceptedSchema)
  askForReset(
    @Body({ schema: addressSchema }) { email }: Address,
    @CurrentSource() source: RequestSource,
  ): Promise<Accepted> {
    return this.passwords.askForReset(email, source);
  }

  @Post('password-resets/confirmations')
  @Allow('anyone')
  @Responds(204)
  reset(
    @Body({ schema: resetPasswordSchema }) input: ResetPassword,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.passwords.reset(input, source);
  }
}
