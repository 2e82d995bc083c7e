import { Injectable } from '@nestjs/common';
import { randomUUID } from 'node:crypto';
import { Clock } from '../clock/clock.ts';
import { MailService } from '../mail/mail.service.ts';
import { fullName, type Account } from './account.ts';
import { AccountLinks } from './account-links.ts';
import { AccountTokensService } from './account-tokens.service.ts';
import { writtenInstant } from './written-instant.ts';

/** The letters about an account, with the keys their links carry. */
@Injectable()
export class AccountLettersService {
  constructor(
    private readonly tokens: AccountTokensService,
    private readonly mail: MailService,
    private readonly links: AccountLinks,
    private readonly clock: Clock,
  ) {}

  wasSent(dedupeKey: string): Promise<boolean> {
    return this.mail.has(dedupeKey);
  }

  /** The name was typed by whoever signed up: it must not carry a stranger's words to this mailbox. */
  async sendConfirmLink(account: Account, dedupeKey: string = randomUUID()): Promise<void> {
    const token = await this.tokens.issue('confirm-email', account.id);
    await this.mail.queue({
      template: 'confirm-email',
      to: { name: '', email: account.email },
      accountId: account.id,
      dedupeKey,
      values: { url: this.links.confirm(token) },
    });
  }

  async sendResetLink(account: Account, dedupeKey: string = randomUUID()): Promise<void> {
    const token = await this.tokens.issue('reset-password', account.id);
    await this.mail.queue({
      template: 'reset-password',
      to: { name: fullName(account), email: account.email },
      accountId: account.id,
      dedupeKey,
      values: { url: this.links.newPassword(token) },
    });
  }

  /** Says nothing of whose account it is: the address may belong to somebody else. */
  async sendAlreadyRegistered(email: string, dedupeKey: string = randomUUID()): Promise<void> {
    await this.mail.queue({
      template: 'already-registered',
      to: { name: '', email },
      accountId: null,
      dedupeKey,
      values: { signInUrl: this.links.signIn(), resetUrl: this.links.reset() },
    });
  }

  async sendPasswordChanged(account: Account): Promise<void> {
    await this.mail.queue({
      template: 'password-changed',
      to: { name: fullName(account), email: account.email },
      accountId: account.id,
      dedupeKey: randomUUID(),
      values: { changedAt: writtenInstant(this.clock.now()), resetUrl: this.links.reset() },
    });
  }

  async sendEmailChangeLink(account: Account, newEmail: string): Promise<void> {
    const token = await this.tokens.issue('change-email', account.id, newEmail);
    await this.mail.queue({
      template: 'email-change-confirm',
      to: { name: '', email: newEmail },
      accountId: account.id,
      dedupeKey: randomUUID(),
      values: { url: this.links.changeEmail(token) },
    });
  }

  /** To the address as it was, with the way back. */
  async sendEmailChanged(account: Account): Promise<void> {
    const token = await this.tokens.issue('undo-email-change', account.id, account.email);
    await this.mail.queue({
      template: 'email-change-notice',
      to: { name: fullName(account), email: account.email },
      accountId: account.id,
      dedupeKey: randomUUID(),
      values: {
        changedAt: writtenInstant(this.clock.now()),
        url: this.links.undoEmailChange(token),
      },
    });
  }
}
