import { Inject, Injectable } from '@nestjs/common';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { MailService } from '../mail/mail.service.ts';
import type { StatedCertificate } from './certificate-files.repository.ts';

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });
const sayDate = (date: string) => day.format(new Date(`${date}T00:00:00Z`));

/** Tells a holder by mail what became of a certificate. Each joins the open transaction. */
@Injectable()
export class CertificateLetters {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly mail: MailService,
  ) {}

  async issued(certificate: StatedCertificate): Promise<void> {
    const { id, replaces } = certificate;
    await this.mail.queue({
      ...this.addressed(certificate),
      template: replaces ? 'certificate-corrected' : 'certificate-issued',
      dedupeKey: `certificate-issued:${id}`,
      attachCertificateId: id,
      values: {
        ...this.facts(certificate),
        expiresOn: sayDate(certificate.expiresOn),
        registerUrl: `${this.config.PUBLIC_URL}/check`,
        ...(replaces ? { replaces: replaces.number, reason: replaces.reason } : {}),
      },
    });
  }

  /** @param withdrawnOn - YYYY-MM-DD. */
  async withdrawn(
    certificate: StatedCertificate,
    { reason, withdrawnOn }: { reason: string; withdrawnOn: string },
  ): Promise<void> {
    await this.mail.queue({
      ...this.addressed(certificate),
      template: 'certificate-withdrawn',
      dedupeKey: `certificate-withdrawn:${certificate.id}`,
      values: { ...this.facts(certificate), reason, withdrawnOn: sayDate(withdrawnOn) },
    });
  }

  private addressed({ accountId, email, holderName: name }: StatedCertificate) {
    return { accountId, to: { name, email } };
  }

  private facts({ id, holderName, number, scheme, issuedOn }: StatedCertificate) {
    return {
      ...{ holderName, number },
      schemeTitle: scheme.title,
      issuedOn: sayDate(issuedOn),
      url: `${this.config.PUBLIC_URL}/certificates/${id}`,
    };
  }
}
