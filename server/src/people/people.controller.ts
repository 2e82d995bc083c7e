import { Body, Controller, Delete, Get, Param, Post, Put, Query } from '@nestjs/common';
import type { Role, SignedInAccount } from '../accounts/account.ts';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentAccount } from '../http/current-account.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  acceptedSchema,
  findPeopleSchema,
  peoplePageSchema,
  personIdSchema,
  personPageSchema,
  personViewSchema,
  roleSchema,
  suspendSchema,
  type FindPeople,
  type PeoplePage,
  type PersonPage,
  type PersonView,
  type Suspend,
} from './people.schemas.ts';
import { AdministrationService } from './administration.service.ts';
import { PeopleService } from './people.service.ts';

/** The administrator's people page. */
@Controller('api/people')
export class PeopleController {
  constructor(
    private readonly people: PeopleService,
    private readonly administration: AdministrationService,
  ) {}

  @Get()
  @Allow('administrator')
  @Responds(200, peoplePageSchema)
  find(@Query({ schema: findPeopleSchema }) query: FindPeople): Promise<PeoplePage> {
    return this.people.find(query);
  }

  @Get(':id')
  @Allow('administrator')
  @Responds(200, personPageSchema)
  get(@Param('id', { schema: personIdSchema }) id: string): Promise<PersonPage> {
    return this.people.get(id);
  }

  @Put(':id/roles/:role')
  @Allow('administrator')
  @Responds(200, personViewSchema)
  giveRole(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: personIdSchema }) personId: string,
    @Param('role', { schema: roleSchema }) role: Role,
    @CurrentSource() source: RequestSource,
  ): Promise<PersonView> {
    return this.administration.giveRole({ actor, source, personId }, role);
  }

  @Delete(':id/roles/:role')
  @Allow('administrator')
  @Responds(200, personViewSchema)
  takeRole(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: personIdSchema }) personId: string,
    @Param('role', { schema: roleSchema }) role: Role,
    @CurrentSource() source: RequestSource,
  ): Promise<PersonView> {
    return this.administration.takeRole({ actor, source, personId }, role);
  }

  @Put(':id/suspension')
  @Allow('administrator')
  @Responds(200, personViewSchema)
  suspend(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: personIdSchema }) personId: string,
    @Body({ schema: suspendSchema }) { reason }: Suspend,
    @CurrentSource() source: RequestSource,
  ): Promise<PersonView> {
    return this.administration.suspend({ actor, source, personId }, reason);
  }

  @Delete(':id/suspension')
  @Allow('administrator')
  @Responds(200, personViewSchema)
  reinstate(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: personIdSchema }) personId: string,
    @CurrentSource() source: RequestSource,
  ): Promise<PersonView> {
    return this.administration.reinstate({ actor, source, personId });
  }

  @Post(':id/password-reset')
  @Allow('administrator')
  @Responds(202, acceptedSchema)
  async startReset(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: personIdSchema }) personId: string,
    @CurrentSource() source: RequestSource,
  ): Promise<Record<string, never>> {
    await this.administration.startReset({ actor, source, personId });
    return {};
  }

  @Delete(':id/sessions')
  @Allow('administrator')
  @Responds(204)
  endSessions(
    @CurrentAccount() actor: SignedInAccount,
    @Param('id', { schema: personIdSchema }) personId: string,
    @CurrentSource() source: RequestSource,
  ): Promise<void> {
    return this.administration.endSessions({ actor, source, personId });
  }
}
