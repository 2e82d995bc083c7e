import { Injectable, type OnModuleInit } from '@nestjs/common';
import { randomUUID } from 'node:crypto';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import type { AddressAsk, JobPayloads } from '../jobs/queues.ts';
import { NotFound } from '../problems/common.errors.ts';
import { askFromAddress, mailToMailbox, subscriberOf } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import { AccountLettersService } from './account-letters.service.ts';
import { AccountsRepository } from './accounts.repository.ts';

/**
 * Answers by mail what was asked at an address. It does so after the request has been
 * answered, so that neither words nor time tell whether the address has an account.
 */
@Injectable()
export class AddressAsksService implements OnModuleInit {
  constructor(
    private readonly accounts: AccountsRepository,
    private readonly letters: AccountLettersService,
    private readonly throttles: ThrottlesService,
    private readonly jobs: JobsService,
    private readonly transactions: Transactions,
  ) {}

  onModuleInit(): void {
    this.jobs.handle('answer-address', (payload) => this.answer(payload));
  }

  /** @throws {TooManyAttempts} when too much was asked from where the request came from. */
  async count(source: RequestSource): Promise<void> {
    await this.throttles.count({ rule: askFromAddress, subject: subscriberOf(source.address) });
  }

  ask(ask: AddressAsk, email: string): Promise<void> {
    return this.jobs.enqueue('answer-address', { requestId: randomUUID(), ask, email });
  }

  /** @throws {TooManyAttempts} */
  async askCounted(ask: AddressAsk, email: string, source: RequestSource): Promise<void> {
    await this.count(source);
    await this.ask(ask, email);
  }

  /** An administrator starts it, and neither sets nor sees the passphrase. */
  async sendResetLink(accountId: string): Promise<void> {
    const account = await this.accounts.find(accountId);
    if (!account) throw new NotFound();
    await this.letters.sendResetLink(account);
  }

  private async answer({ requestId, ask, email }: JobPayloads['answer-address']): Promise<void> {
    await this.transactions.run(async () => {
      const account = await this.accounts.findByEmail(email);
      if (!account || account.isSuspended || (await this.letters.wasSent(requestId))) return;
      if (account.isConfirmed && ask === 'confirm-again') return;
      if (!(await this.throttles.hasRoom({ rule: mailToMailbox, subject: email }))) return;
      if (!account.isConfirmed) await this.letters.sendConfirmLink(account, requestId);
      else if (ask === 'reset-password') await this.letters.sendResetLink(account, requestId);
      else await this.letters.sendAlreadyRegistered(email, requestId);
    });
  }
}
