import { Injectable } from '@nestjs/common';
import type { Role, SignedInAccount } from '../accounts/account.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { FindPeople, PeoplePage, PersonPage, PersonView } from './people.schemas.ts';

/** Who acts, and from where. */
export interface Act {
  readonly actor: SignedInAccount;
  readonly source: RequestSource;
}

@Injectable()
export class PeopleService {
  async find(_query: FindPeople): Promise<PeoplePage> {
    throw new Error('not ready');
  }
  async get(_id: string): Promise<PersonPage> {
    throw new Error('not ready');
  }
  async giveRole(_act: Act, _id: string, _role: Role): Promise<PersonView> {
    throw new Error('not ready');
  }
  async takeRole(_act: Act, _id: string, _role: Role): Promise<PersonView> {
    throw new Error('not ready');
  }
  async suspend(_act: Act, _id: string, _reason: string): Promise<PersonView> {
    throw new Error('not ready');
  }
  async reinstate(_act: Act, _id: string): Promise<PersonView> {
    throw new Error('not ready');
  }
  async startReset(_act: Act, _id: string): Promise<Record<string, never>> {
    throw new Error('not ready');
  }
  async endSessions(_act: Act, _id: string): Promise<void> {
    throw new Error('not ready');
  }
}
