import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { InvalidRequest } from '../problems/common.errors.ts';
import { mailToMailbox } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import type { SignedInAccount } from './account.ts';
import { AccountLettersService } from './account-letters.service.ts';
import { AccountsRepository } from './accounts.repository.ts';
import type { Accepted, ChangeEmail } from './accounts.schemas.ts';
import { CredentialsService } from './credentials.service.ts';

/** Asking for another address. Nothing changes until it is confirmed. */
@Injectable()
export class EmailChangesService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly credentials: CredentialsService,
    private readonly letters: AccountLettersService,
    private readonly throttles: ThrottlesService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  /** Whether the address is taken is told to its owner by mail, and to nobody here. */
  async ask(
    signedIn: SignedInAccount,
    { email, password }: ChangeEmail,
    source: RequestSource,
  ): Promise<Accepted> {
    const given = { password, pointer: '#/password' };
    const account = await this.credentials.confirm(signedIn, given, source);
    if (email === account.email) {
      throw new InvalidRequest([{ pointer: '#/email', detail: 'That is your email already.' }]);
    }
    await this.throttles.count({ rule: mailToMailbox, subject: email });
    await this.transactions.run(async () => {
      const { id } = account;
      const { address } = source;
      await this.events.record({ kind: 'email-change-asked', accountId: id, actorId: id, address });
      const isTaken = (await this.accounts.findByEmail(email)) !== null;
      if (isTaken) await this.letters.sendAlreadyRegistered(email);
      else await this.letters.sendEmailChangeLink(account, email);
    });
    return {};
  }
}
