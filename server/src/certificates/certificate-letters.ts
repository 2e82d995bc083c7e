import { Inject, Injectable } from '@nestjs/common';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { MailService } from '../mail/mail.service.ts';
import {
  CertificateFilesRepository,
  type StatedCertificate,
} from './certificate-files.repository.ts';
import { CertificateRecordsRepository } from './certificate-records.repository.ts';

const day = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });
const sayDate = (date: string) => day.format(new Date(`${date}T00:00:00Z`));

/** Tells a holder by mail what became of a certificate. Each joins the open transaction. */
@Injectable()
export class CertificateLetters {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly files: CertificateFilesRepository,
    private readonly records: CertificateRecordsRepository,
    private readonly mail: MailService,
  ) {}

  /** Says nothing when the certificate was withdrawn or replaced before its file was drawn. */
  async issued(certificate: StatedCertificate, at: Date): Promise<void> {
    const { id, replaces } = certificate;
    const state = (await this.records.findById(id, at))?.state;
    if (state === 'withdrawn' || state === 'superseded') return;
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

  async withdrawn(certificateId: string, at: Date): Promise<void> {
    const certificate = await this.files.findStated(certificateId);
    const withdrawn = (await this.records.findById(certificateId, at))?.withdrawn;
    if (!certificate || !withdrawn) throw new Error('This certificate has not been withdrawn.');
    await this.mail.queue({
      ...this.addressed(certificate),
      template: 'certificate-withdrawn',
      dedupeKey: `certificate-withdrawn:${certificate.id}`,
      values: {
        ...this.facts(certificate),
        reason: withdrawn.reason,
        withdrawnOn: sayDate(withdrawn.on),
      },
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
