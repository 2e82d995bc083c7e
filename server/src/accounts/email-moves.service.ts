import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { SessionsService } from '../sessions/sessions.service.ts';
import type { Account } from './account.ts';
import { AccountLettersService } from './account-letters.service.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { LinkNotValid } from './accounts.errors.ts';
import { AccountsRepository } from './accounts.repository.ts';
import type { AddressNow } from './accounts.schemas.ts';

/** Moves an account to another address and back, by the links of mails. */
@Injectable()
export class EmailMovesService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly tokens: AccountTokensService,
    private readonly letters: AccountLettersService,
    private readonly sessions: SessionsService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  /** @throws {LinkNotValid} also when the address went to another account in the meantime. */
  async confirm(token: string, source: RequestSource): Promise<AddressNow> {
    return this.transactions.run(async () => {
      const { account, email } = await this.move('change-email', token);
      await this.tokens.cancel('reset-password', account.id);
      await this.letters.sendEmailChanged(account);
      await this.record('email-changed', account.id, source);
      return { email };
    });
  }

  /**
   * Whoever changed the address knew the passphrase: it stops working with this, every session
   * ends, and a link to choose a new one goes to the address that returns.
   *
   * @throws {LinkNotValid}
   */
  async undo(token: string, source: RequestSource): Promise<AddressNow> {
    return this.transactions.run(async () => {
      const { account, email } = await this.move('undo-email-change', token);
      await this.accounts.setPassword(account.id, null);
      await this.tokens.cancel('change-email', account.id);
      await this.sessions.endAll(account.id);
      await this.letters.sendResetLink({ ...account, email });
      await this.record('email-change-undone', account.id, source);
      return { email };
    });
  }

  /** @returns the account as it was, and the address it has now. */
  private async move(
    purpose: 'change-email' | 'undo-email-change',
    token: string,
  ): Promise<{ account: Account; email: string }> {
    const { accountId, email } = await this.tokens.useOf(purpose, token);
    const account = await this.accounts.find(accountId);
    const isMoved =
      account !== null && email !== null && (await this.accounts.setEmail(account.id, email));
    if (!isMoved) throw new LinkNotValid();
    return { account, email };
  }

  private record(kind: string, accountId: string, source: RequestSource): Promise<void> {
    const { address } = source;
    return this.events.record({ kind, accountId, actorId: accountId, address });
  }
}
