import { Injectable } from '@nestjs/common';

export const TEMPLATE_NAMES = [
  'administrator-link',
  'already-registered',
  'certificate-corrected',
  'certificate-issued',
  'certificate-withdrawn',
  'confirm-email',
  'email-change-confirm',
  'email-change-notice',
  'password-changed',
  'reset-password',
  'result-not-passed',
  'result-passed',
] as const;
export type TemplateName = (typeof TEMPLATE_NAMES)[number];

/** A mail to be written: which letter, to whom, and the values it speaks of. */
export interface Letter {
  readonly template: TemplateName;
  readonly to: { readonly name: string; readonly email: string };
  readonly accountId: string | null;
  /** The same key never makes a second mail. */
  readonly dedupeKey: string;
  readonly values: Readonly<Record<string, string>>;
  readonly attachCertificateId?: string;
}

@Injectable()
export class MailService {
  /** Writes the mail into the outbox; it leaves after the open transaction commits. */
  async queue(_letter: Letter): Promise<void> {
    throw new Error('not ready');
  }
}
