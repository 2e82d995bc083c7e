import { Injectable } from '@nestjs/common';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { SignedInAccount } from './account.ts';
import type { Accepted, ChangePassword, ResetPassword } from './accounts.schemas.ts';

@Injectable()
export class PasswordsService {
  async change(_a: SignedInAccount, _i: ChangePassword, _s: RequestSource): Promise<void> {
    throw new Error('not ready');
  }
  async askForReset(_email: string, _source: RequestSource): Promise<Accepted> {
    throw new Error('not ready');
  }
  async reset(_input: ResetPassword, _source: RequestSource): Promise<void> {
    throw new Error('not ready');
  }
}
