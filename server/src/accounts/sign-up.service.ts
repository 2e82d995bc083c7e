import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { LinkNotValid } from './accounts.errors.ts';
import { AccountsRepository } from './accounts.repository.ts';
import type { Accepted, AddressNow, SignUp } from './accounts.schemas.ts';
import { AddressAsksService } from './address-asks.service.ts';
import { requireGoodPassword } from './password-choice.ts';
import { hashPassword } from './passwords/password-hash.ts';

@Injectable()
export class SignUpService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly tokens: AccountTokensService,
    private readonly asks: AddressAsksService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  /** Does the same work and gives the same answer whether or not the address has an account. */
  async signUp(input: SignUp, source: RequestSource): Promise<Accepted> {
    requireGoodPassword(input.password, input);
    await this.asks.count(source);
    const passwordHash = await hashPassword(input.password);
    const { givenName, familyName, email } = input;
    await this.transactions.run(async () => {
      const account = { givenName, familyName, email, passwordHash };
      const accountId = await this.accounts.addUnconfirmed(account, this.clock.now());
      await this.events.record({
        kind: accountId === null ? 'sign-up-at-known-address' : 'account-opened',
        accountId,
        actorId: null,
        address: source.address,
      });
      await this.asks.ask('sign-up', email);
    });
    return {};
  }

  /** @throws {LinkNotValid} */
  async confirm(token: string, source: RequestSource): Promise<AddressNow> {
    return this.transactions.run(async () => {
      const { accountId } = await this.tokens.useOf('confirm-email', token);
      await this.accounts.confirm(accountId, this.clock.now());
      await this.events.record({
        kind: 'email-confirmed',
        accountId,
        actorId: accountId,
        address: source.address,
      });
      const account = await this.accounts.find(accountId);
      if (!account) throw new LinkNotValid();
      return { email: account.email };
    });
  }

  async sendAgain(email: string, source: RequestSource): Promise<Accepted> {
    await this.asks.askCounted('confirm-again', email, source);
    return {};
  }
}
