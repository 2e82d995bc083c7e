import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { MailModule } from '../mail/mail.module.ts';
import { SessionsModule } from '../sessions/sessions.module.ts';
import { ThrottlesModule } from '../throttles/throttles.module.ts';
import { AccountLettersService } from './account-letters.service.ts';
import { AccountLinks } from './account-links.ts';
import { AccountTokensRepository } from './account-tokens.repository.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { AccountsRepository } from './accounts.repository.ts';
import { AddressAsksService } from './address-asks.service.ts';
import { AdministratorClaimsController } from './administrator-claims.controller.ts';
import { AdministratorClaimsService } from './administrator-claims.service.ts';
import { CredentialsService } from './credentials.service.ts';
import { EmailChangesController } from './email-changes.controller.ts';
import { EmailChangesService } from './email-changes.service.ts';
import { EmailMovesService } from './email-moves.service.ts';
import { AccountModel } from './models/account.model.ts';
import { PasswordChangesService } from './password-changes.service.ts';
import { PasswordReplacementService } from './password-replacement.service.ts';
import { PasswordResetsService } from './password-resets.service.ts';
import { PasswordsController } from './passwords.controller.ts';

import { SchoolsRepository } from './schools.repository.ts';
import { SignUpController } from './sign-up.controller.ts';
import { SignUpService } from './sign-up.service.ts';

@Module({
  imports: [
    SequelizeModule.forFeature([AccountModel]),
    MailModule,
    SessionsModule,
    ThrottlesModule,
  ],
  controllers: [
    AdministratorClaimsController,
    EmailChangesController,
    PasswordsController,
    SignUpController,
  ],
  providers: [
    AccountLettersService,
    AccountLinks,
    AccountTokensRepository,
    AccountTokensService,
    AccountsRepository,
    SchoolsRepository,
    AddressAsksService,
    AdministratorClaimsService,
    CredentialsService,
    EmailChangesService,
    EmailMovesService,
    PasswordChangesService,
    PasswordReplacementService,
    PasswordResetsService,
    SignUpService,
  ],
  exports: [AddressAsksService, CredentialsService],
})
export class AccountsModule {}
