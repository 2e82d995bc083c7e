import { Injectable } from '@nestjs/common';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { SignedInAccount } from './account.ts';
import type { Accepted, AddressNow, ChangeEmail } from './accounts.schemas.ts';

@Injectable()
export class EmailChangesService {
  async ask(_a: SignedInAccount, _i: ChangeEmail, _s: RequestSource): Promise<Accepted> {
    throw new Error('not ready');
  }
  async confirm(_token: string, _source: RequestSource): Promise<AddressNow> {
    throw new Error('not ready');
  }
  async undo(_token: string, _source: RequestSource): Promise<AddressNow> {
    throw new Error('not ready');
  }
}
