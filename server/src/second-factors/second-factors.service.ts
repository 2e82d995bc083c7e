import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { Enrolment, RecoveryCodes } from './second-factors.schemas.ts';

@Injectable()
export class SecondFactorsService {
  async enrol(_account: SignedInAccount): Promise<Enrolment> {
    throw new Error('not ready');
  }
  async confirm(_a: SignedInAccount, _code: string, _s: RequestSource): Promise<RecoveryCodes> {
    throw new Error('not ready');
  }
}
