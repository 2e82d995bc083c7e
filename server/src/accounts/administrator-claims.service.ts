import { Injectable } from '@nestjs/common';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { Accepted, ClaimAdministrator } from './accounts.schemas.ts';

@Injectable()
export class AdministratorClaimsService {
  async claim(_input: ClaimAdministrator, _source: RequestSource): Promise<Accepted> {
    throw new Error('not ready');
  }
}
