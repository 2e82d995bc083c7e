import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { CredentialsService } from '../accounts/credentials.service.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { SecondFactorsService } from '../second-factors/second-factors.service.ts';
import { SessionsService } from './sessions.service.ts';

/** What somebody signed in gives on top: the second factor, or the password once more. */
@Injectable()
export class SessionStepsService {
  constructor(
    private readonly credentials: CredentialsService,
    private readonly factors: SecondFactorsService,
    private readonly sessions: SessionsService,
    private readonly events: SecurityEventsService,
  ) {}

  /** @throws {InvalidRequest} when the code is wrong or was used. */
  async giveCode(account: SignedInAccount, code: string, source: RequestSource): Promise<void> {
    await this.factors.check(account, code, source);
    await this.sessions.markSecondFactor(account.sessionId);
  }

  /** @throws {InvalidRequest} when it is wrong. */
  async confirmPassword(
    account: SignedInAccount,
    password: string,
    source: RequestSource,
  ): Promise<void> {
    await this.credentials.confirm(account, { password, pointer: '#/password' }, source);
    await this.sessions.markFresh(account.sessionId);
    await this.events.record({
      kind: 'password-confirmed',
      accountId: account.id,
      actorId: account.id,
      address: source.address,
    });
  }
}
