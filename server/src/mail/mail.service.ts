import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import { layOutHtml } from './lay-out-html.ts';
import { layOutText } from './lay-out-text.ts';
import type { Letter } from './letter.ts';
import { MailRepository } from './mail.repository.ts';
import { templates } from './templates/index.ts';
import { oneLine, writeLetter } from './write-letter.ts';

@Injectable()
export class MailService {
  constructor(
    private readonly repository: MailRepository,
    private readonly jobs: JobsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  /** Writes the mail into the outbox; it leaves after the open transaction commits. */
  async queue(letter: Letter): Promise<void> {
    await this.transactions.run(async () => {
      const school = await this.repository.schoolName();
      const written = writeLetter(templates[letter.template], letter.values, school);
      const messageId = await this.repository.add({
        dedupeKey: letter.dedupeKey,
        accountId: letter.accountId,
        recipient: oneLine(letter.to.email),
        recipientName: oneLine(letter.to.name),
        template: letter.template,
        subject: written.subject,
        bodyText: layOutText(written),
        bodyHtml: layOutHtml(written),
        attachmentCertificateId: letter.attachCertificateId ?? null,
        createdAt: this.clock.now(),
      });
      if (messageId !== null) await this.jobs.enqueue('send-mail', { messageId });
    });
  }

  /** Whether a mail was written under this key before. */
  has(dedupeKey: string): Promise<boolean> {
    return this.repository.has(dedupeKey);
  }
}
