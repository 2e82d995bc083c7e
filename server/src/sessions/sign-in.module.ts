import { Module } from '@nestjs/common';
import { AccountsModule } from '../accounts/accounts.module.ts';
import { SecondFactorsModule } from '../second-factors/second-factors.module.ts';
import { ThrottlesModule } from '../throttles/throttles.module.ts';
import { SessionCookies } from './session-cookies.ts';
import { SessionStepsService } from './session-steps.service.ts';
import { SessionViewsService } from './session-views.service.ts';
import { SessionsController } from './sessions.controller.ts';
import { SessionsModule } from './sessions.module.ts';
import { SignInService } from './sign-in.service.ts';

@Module({
  imports: [AccountsModule, SecondFactorsModule, SessionsModule, ThrottlesModule],
  controllers: [SessionsController],
  providers: [SessionCookies, SessionStepsService, SessionViewsService, SignInService],
})
export class SignInModule {}
