import { Body, Controller, Post } from '@nestjs/common';
import { Allow } from '../http/allow.decorator.ts';
import { CurrentSource, type RequestSource } from '../http/request-source.decorator.ts';
import { Responds } from '../http/responds.decorator.ts';
import {
  acceptedSchema,
  claimAdministratorSchema,
  type Accepted,
  type ClaimAdministrator,
} from './accounts.schemas.ts';
import { AdministratorClaimsService } from './administrator-claims.service.ts';

@Controller('api/administrator-claims')
export class AdministratorClaimsController {
  constructor(private readonly claims: AdministratorClaimsService) {}

  @Post()
  @Allow('anyone')
  @Responds(201, acceptedSchema)
  claim(
    @Body({ schema: claimAdministratorSchema }) input: ClaimAdministrator,
    @CurrentSource() source: RequestSource,
  ): Promise<Accepted> {
    return this.claims.claim(input, source);
  }
}
