import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { InvalidRequest, NotSignedIn } from '../problems/common.errors.ts';
import { passwordConfirmation } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import type { Account, SignedInAccount } from './account.ts';
import { AccountsRepository } from './accounts.repository.ts';
import { decoyHash, hashPassword, isOutdated, isPassword } from './passwords/password-hash.ts';

@Injectable()
export class CredentialsService {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly throttles: ThrottlesService,
    private readonly events: SecurityEventsService,
  ) {}

  findByEmail(email: string): Promise<Account | null> {
    return this.accounts.findByEmail(email);
  }

  /** Whether the password opens the account. An unknown account costs the same work. */
  async opens(account: Account | null, password: string): Promise<boolean> {
    const passwordHash = account?.passwordHash ?? null;
    const isRight = await isPassword(passwordHash ?? (await decoyHash()), password);
    return isRight && passwordHash !== null;
  }

  /** Hashes anew what was hashed with less work than is asked for now. */
  async renewHash(account: Account, password: string): Promise<void> {
    if (account.passwordHash === null || !isOutdated(account.passwordHash)) return;
    await this.accounts.setPassword(account.id, await hashPassword(password));
  }

  /**
   * The password of somebody signed in, given once more.
   *
   * @param pointer - the field it was typed into.
   * @throws {InvalidRequest} when it is wrong.
   */
  async confirm(
    signedIn: SignedInAccount,
    given: { password: string; pointer: string },
    source: RequestSource,
  ): Promise<Account> {
    const counted = { rule: passwordConfirmation, subject: signedIn.sessionId };
    await this.throttles.count(counted);
    const account = await this.accounts.find(signedIn.id);
    if (!account) throw new NotSignedIn();
    if (!(await this.opens(account, given.password))) {
      await this.events.record({
        kind: 'password-refused',
        accountId: account.id,
        actorId: account.id,
        address: source.address,
      });
      throw new InvalidRequest([
        { pointer: given.pointer, detail: 'That is not the passphrase of this account.' },
      ]);
    }
    await this.throttles.clear(counted);
    return account;
  }
}
