import { Injectable } from '@nestjs/common';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { Accepted, AddressNow, SignUp } from './accounts.schemas.ts';

@Injectable()
export class SignUpService {
  async signUp(_input: SignUp, _source: RequestSource): Promise<Accepted> {
    throw new Error('not ready');
  }
  async confirm(_token: string, _source: RequestSource): Promise<AddressNow> {
    throw new Error('not ready');
  }
  async sendAgain(_email: string, _source: RequestSource): Promise<Accepted> {
    throw new Error('not ready');
  }
}
