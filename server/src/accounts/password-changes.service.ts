import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { SessionsService } from '../sessions/sessions.service.ts';
import type { SignedInAccount } from './account.ts';
import type { ChangePassword } from './accounts.schemas.ts';
import { CredentialsService } from './credentials.service.ts';
import { requireGoodPassword } from './password-choice.ts';
import { PasswordReplacementService } from './password-replacement.service.ts';
import { hashPassword } from './passwords/password-hash.ts';

/** A new passphrase by the person signed in, who gives the old one first. */
@Injectable()
export class PasswordChangesService {
  constructor(
    private readonly credentials: CredentialsService,
    private readonly replacement: PasswordReplacementService,
    private readonly sessions: SessionsService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  async change(
    signedIn: SignedInAccount,
    input: ChangePassword,
    source: RequestSource,
  ): Promise<void> {
    const given = { password: input.currentPassword, pointer: '#/currentPassword' };
    const account = await this.credentials.confirm(signedIn, given, source);
    requireGoodPassword(input.newPassword, account, '#/newPassword');
    const passwordHash = await hashPassword(input.newPassword);
    await this.transactions.run(async () => {
      await this.replacement.replace(account, passwordHash);
      if (input.endOtherSessions) await this.sessions.endAll(account.id, signedIn.sessionId);
      await this.events.record({
        kind: 'password-changed',
        accountId: account.id,
        actorId: account.id,
        address: source.address,
        detail: { endedOtherSessions: input.endOtherSessions },
      });
    });
  }
}
