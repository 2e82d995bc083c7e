import { Module } from '@nestjs/common';
import { AccountsModule } from '../accounts/accounts.module.ts';
import { SessionsModule } from '../sessions/sessions.module.ts';
import { AdministrationService } from './administration.service.ts';
import { PeopleController } from './people.controller.ts';
import { PeopleRepository } from './people.repository.ts';
import { PeopleService } from './people.service.ts';

@Module({
  imports: [AccountsModule, SessionsModule],
  controllers: [PeopleController],
  providers: [AdministrationService, PeopleRepository, PeopleService],
})
export class PeopleModule {}
