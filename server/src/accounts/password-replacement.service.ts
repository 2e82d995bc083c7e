import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import { signInAtAccount } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import type { Account } from './account.ts';
import { AccountLettersService } from './account-letters.service.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { AccountsRepository } from './accounts.repository.ts';

/** What goes with every new passphrase, however it came to be. */
@Injectable()
export class PasswordReplacementService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly tokens: AccountTokensService,
    private readonly letters: AccountLettersService,
    private readonly throttles: ThrottlesService,
    private readonly clock: Clock,
  ) {}

  /** Links asked for before stop working, failed tries are forgotten, and the person is told. */
  async replace(account: Account, passwordHash: string): Promise<void> {
    await this.accounts.setPassword(account.id, passwordHash);
    await this.tokens.cancel('reset-password', account.id);
    await this.tokens.cancel('change-email', account.id);
    await this.throttles.clear({ rule: signInAtAccount, subject: account.email });
    await this.letters.sendPasswordChanged(account);
  }

  /** As `replace`, by somebody who showed with it that the mailbox is theirs. */
  async replaceFromMailbox(account: Account, passwordHash: string): Promise<void> {
    await this.replace(account, passwordHash);
    await this.accounts.confirm(account.id, this.clock.now());
  }
}
