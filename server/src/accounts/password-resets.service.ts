import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { SessionsService } from '../sessions/sessions.service.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { LinkNotValid } from './accounts.errors.ts';
import { AccountsRepository } from './accounts.repository.ts';
import type { ResetPassword } from './accounts.schemas.ts';
import { requireGoodPassword } from './password-choice.ts';
import { PasswordReplacementService } from './password-replacement.service.ts';
import { hashPassword } from './passwords/password-hash.ts';

/** A new passphrase by the link of a mail. It ends every session and opens none. */
@Injectable()
export class PasswordResetsService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly tokens: AccountTokensService,
    private readonly replacement: PasswordReplacementService,
    private readonly sessions: SessionsService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  /** @throws {LinkNotValid | InvalidRequest} */
  async reset({ token, password }: ResetPassword, source: RequestSource): Promise<void> {
    const { accountId } = await this.tokens.look('reset-password', token);
    const account = accountId === null ? null : await this.accounts.find(accountId);
    if (!account) throw new LinkNotValid();
    requireGoodPassword(password, account);
    const passwordHash = await hashPassword(password);
    await this.transactions.run(async () => {
      await this.tokens.use('reset-password', token);
      await this.replacement.replaceFromMailbox(account, passwordHash);
      await this.sessions.endAll(account.id);
      await this.events.record({
        kind: 'password-reset',
        accountId: account.id,
        actorId: account.id,
        address: source.address,
      });
    });
  }
}
