import { Injectable } from '@nestjs/common';
import { InjectConnection, InjectModel } from '@nestjs/sequelize';
import { Op, QueryTypes, Sequelize } from 'sequelize';
import { MailMessageModel } from './models/mail-message.model.ts';
import type { TemplateName } from './letter.ts';

export interface NewMail {
  readonly dedupeKey: string;
  readonly accountId: string | null;
  readonly recipient: string;
  readonly recipientName: string;
  readonly template: TemplateName;
  readonly subject: string;
  readonly bodyText: string;
  readonly bodyHtml: string;
  readonly attachmentCertificateId: string | null;
  readonly createdAt: Date;
}

export interface WaitingMail extends NewMail {
  readonly id: string;
  readonly tries: number;
}

export interface Attachment {
  readonly number: string;
  readonly pdf: Buffer;
}

@Injectable()
export class MailRepository {
  constructor(
    @InjectModel(MailMessageModel) private readonly messages: typeof MailMessageModel,
    @InjectConnection() private readonly sequelize: Sequelize,
  ) {}

  /** The id of the new row, or null when there is one under this key already. */
  async add(mail: NewMail): Promise<string | null> {
    const rows = await this.sequelize.query<{ id: string }>(
      `INSERT INTO mail_messages (dedupe_key, account_id, recipient, recipient_name, template, subject,
                                  body_text, body_html, attachment_certificate_id, created_at)
       VALUES ($1, $2, $3, $4, $5, $6, $7, $8, $9, $10)
       ON CONFLICT (dedupe_key) DO NOTHING RETURNING id`,
      {
        bind: [
          mail.dedupeKey,
          mail.accountId,
          mail.recipient,
          mail.recipientName,
          mail.template,
          mail.subject,
          mail.bodyText,
          mail.bodyHtml,
          mail.attachmentCertificateId,
          mail.createdAt,
        ],
        type: QueryTypes.SELECT,
      },
    );
    return rows[0]?.id ?? null;
  }

  async has(dedupeKey: string): Promise<boolean> {
    return (await this.messages.count({ where: { dedupeKey } })) > 0;
  }

  async findWaiting(id: string): Promise<WaitingMail | null> {
    const row = await this.messages.findOne({ where: { id, state: 'queued' } });
    return row ? Object.freeze(row.get({ plain: true }) as WaitingMail) : null;
  }

  /** Once sent, a mail never waits again. A text that opens something is not kept. */
  async markSent(id: string, at: Date, forgetText: boolean): Promise<void> {
    await this.messages.update(
      { state: 'sent', sentAt: at, lastError: null, ...(forgetText ? forgotten : {}) },
      { where: { id, state: { [Op.ne]: 'sent' } } },
    );
  }

  async markTried(
    id: string,
    outcome: { state: 'queued' | 'failed'; tries: number; lastError: string; forgetText: boolean },
  ): Promise<void> {
    const { state, tries, lastError, forgetText } = outcome;
    await this.messages.update(
      { state, tries, lastError, ...(state === 'failed' && forgetText ? forgotten : {}) },
      { where: { id, state: 'queued' } },
    );
  }

  async findAttachment(certificateId: string): Promise<Attachment | null> {
    const rows = await this.sequelize.query<Attachment>(
      `SELECT c.number, f.pdf FROM certificate_files f JOIN certificates c ON c.id = f.certificate_id
        WHERE f.certificate_id = $1`,
      { bind: [certificateId], type: QueryTypes.SELECT },
    );
    return rows[0] ?? null;
  }

  /** The school in whose name mail is written; empty before there is one. */
  async schoolName(): Promise<string> {
    const rows = await this.sequelize.query<{ name: string }>(
      `SELECT name FROM organisations WHERE kind = 'school' ORDER BY created_at, id LIMIT 1`,
      { type: QueryTypes.SELECT },
    );
    return rows[0]?.name ?? '';
  }
}

const forgotten = {
  bodyText: 'Not kept: the text held a link that opens something.',
  bodyHtml: '',
};
