import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import type { SessionView, SignIn } from './sessions.schemas.ts';
import type { OpenedSession } from './sessions.service.ts';

export interface SignedIn {
  readonly opened: OpenedSession;
  readonly device: string;
  readonly view: SessionView;
}

@Injectable()
export class SignInService {
  async signIn(
    _input: SignIn,
    _source: RequestSource,
    _before: { knownDevice: string | null; replaced: string | undefined },
  ): Promise<SignedIn> {
    throw new Error('not ready');
  }
  async signOut(_account: SignedInAccount, _source: RequestSource): Promise<void> {
    throw new Error('not ready');
  }
  async giveCode(_a: SignedInAccount, _code: string, _s: RequestSource): Promise<SessionView> {
    throw new Error('not ready');
  }
  async confirmPassword(_a: SignedInAccount, _p: string, _s: RequestSource): Promise<SessionView> {
    throw new Error('not ready');
  }
}
