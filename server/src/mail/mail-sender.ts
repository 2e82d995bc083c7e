import { Inject, Injectable, type OnModuleInit } from '@nestjs/common';
import type { SendMailOptions } from 'nodemailer';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { log } from '../http/log.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import { MARK_ID } from './lay-out-html.ts';
import { MailRepository, type WaitingMail } from './mail.repository.ts';
import { MailTransport } from './mail-transport.ts';
import { markPng } from './mark.ts';
import { templates } from './templates/index.ts';

/** As many tries as the queue gives a job: the first and eight more. */
const MOST_TRIES = 9;

class AttachmentMissing extends Error {
  constructor() {
    super('The certificate to attach has no file yet.');
  }
}

/**
 * Takes mails out of the outbox. A crash between sending and marking sends one twice;
 * nothing is ever lost, and what is marked as sent is not sent again.
 */
@Injectable()
export class MailSender implements OnModuleInit {
  private readonly domain: string;

  constructor(
    private readonly repository: MailRepository,
    private readonly transport: MailTransport,
    private readonly jobs: JobsService,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {
    this.domain = /@([^\s<>@]+)>?\s*$/.exec(config.MAIL_FROM)?.[1] ?? 'localhost';
  }

  onModuleInit(): void {
    this.jobs.handle('send-mail', ({ messageId }) => this.send(messageId));
  }

  private async send(messageId: string): Promise<void> {
    const mail = await this.repository.findWaiting(messageId);
    if (!mail) return;
    const forgetText = templates[mail.template].holdsKey;
    try {
      await this.transport.send(await this.compose(mail));
    } catch (error) {
      return this.noteFailure(mail, error);
    }
    await this.repository.markSent(mail.id, this.clock.now(), forgetText);
  }

  private async compose(mail: WaitingMail): Promise<SendMailOptions> {
    return {
      from: this.config.MAIL_FROM,
      to: { name: mail.recipientName, address: mail.recipient },
      subject: mail.subject,
      text: mail.bodyText,
      html: mail.bodyHtml,
      date: mail.createdAt,
      messageId: `<${mail.id}@${this.domain}>`,
      headers: { 'Auto-Submitted': 'auto-generated' },
      attachments: [
        { filename: 'ferrule.png', content: markPng, cid: MARK_ID, contentDisposition: 'inline' },
        ...(await this.certificate(mail)),
      ],
    };
  }

  private async certificate(mail: WaitingMail): Promise<SendMailOptions['attachments'] & object> {
    if (mail.attachmentCertificateId === null) return [];
    const file = await this.repository.findAttachment(mail.attachmentCertificateId);
    if (!file) throw new AttachmentMissing();
    return [
      {
        filename: `certificate-${file.number}.pdf`,
        content: file.pdf,
        contentType: 'application/pdf',
      },
    ];
  }

  /** Tries again later, unless the mail server refused for good or the tries are used up. */
  private async noteFailure(mail: WaitingMail, error: unknown): Promise<void> {
    const tries = mail.tries + 1;
    const isFinal = isRefusedForGood(error) || tries >= MOST_TRIES;
    const lastError = error instanceof Error ? error.message.slice(0, 500) : 'unknown';
    await this.repository.markTried(mail.id, {
      state: isFinal ? 'failed' : 'queued',
      tries,
      lastError,
      forgetText: templates[mail.template].holdsKey,
    });
    log.warn({ messageId: mail.id, tries, isFinal, reason: lastError }, 'mail not sent');
    if (!isFinal) throw error;
  }
}

function isRefusedForGood(error: unknown): boolean {
  const code: unknown = (error as { responseCode?: unknown } | null)?.responseCode;
  return typeof code === 'number' && code >= 500 && code < 600;
}
