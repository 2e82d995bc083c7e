import { Module } from '@nestjs/common';
import { AdministratorClaimsController } from './administrator-claims.controller.ts';
import { AdministratorClaimsService } from './administrator-claims.service.ts';
import { EmailChangesController } from './email-changes.controller.ts';
import { EmailChangesService } from './email-changes.service.ts';
import { PasswordsController } from './passwords.controller.ts';
import { PasswordsService } from './passwords.service.ts';
import { SignUpController } from './sign-up.controller.ts';
import { SignUpService } from './sign-up.service.ts';

@Module({
  controllers: [
    AdministratorClaimsController,
    EmailChangesController,
    PasswordsController,
    SignUpController,
  ],
  providers: [AdministratorClaimsService, EmailChangesService, PasswordsService, SignUpService],
})
export class AccountsModule {}
