import { Body, Controller, Post } from '@nestjs/common';
import { RouteConfig } from '@nestjs/platform-fastify';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  acceptedSchema,
  addressNowSchema,
  addressSchema,
  checkPasswordSchema,
  passwordJudgementSchema,
  signUpSchema,
  useTokenSchema,
  type Accepted,
  type Address,
  type AddressNow,
  type CheckPassword,
  type SignUp,
  type UseToken,
} from './accounts.schemas.ts';
import { judgePassword, type PasswordJudgement } from './passwords/judge-password.ts';
import { SignUpService } from './sign-up.service.ts';

@Controller('api')
export class SignUpController {
  constructor(private readonly signUps: SignUpService) {}

  @Post('accounts')
  @Allow('anyone')
  @Responds(202, acceptedSchema)
  signUp(
    @Body({ schema: signUpSchema }) input: SignUp,
    @CurrentSource() source: RequestSource,
  ): Promise<Accepted> {
    return this.signUps.signUp(input, source);
  }

  @Post('password-checks')
  @Allow('anyone')
  @RouteConfig({ rateLimit: { max: 120, timeWindow: '1 minute' } })
  @Responds(200, passwordJudgementSchema)
  check(@Body({ schema: checkPasswordSchema }) { password }: CheckPassword): PasswordJudgement {
    return judgePassword(password);
  }

  @Post('email-confirmations')
  @Allow('anyone')
  @Responds(200, addressNowSchema)
  confirm(
    @Body({ schema: useTokenSchema }) { token }: UseToken,
    @CurrentSource() source: RequestSource,
  ): Promise<AddressNow> {
    return this.signUps.confirm(token, source);
  }

  @Post('email-confirmations/again')
  @Allow('anyone')
  @Responds(202, acceptedSchema)
  confirmAgain(
    @Body({ schema: addressSchema }) { email }: Address,
    @CurrentSource() source: RequestSource,
  ): Promise<Accepted> {
    return this.signUps.sendAgain(email, source);
  }
}
