import { Inject, Injectable } from '@nestjs/common';
import { renderCertificate, signPdf, type CertificateStatement } from '@ferrule/certificates';
import { createHash } from 'node:crypto';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { Transactions } from '../database/transactions.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import {
  CertificateFilesRepository,
  type StatedCertificate,
} from './certificate-files.repository.ts';
import { certificateFonts } from './certificate-fonts.ts';
import { CertificateLetters } from './certificate-letters.ts';
import { SigningKeysService } from './keys/signing-keys.service.ts';

/** Draws, signs and sends certificates; a job, since it takes its time. */
@Injectable()
export class DrawingService {
  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly files: CertificateFilesRepository,
    private readonly keys: SigningKeysService,
    private readonly letters: CertificateLetters,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  /** May run any number of times: the file and its mail come into being once, together. */
  async draw(certificateId: string): Promise<void> {
    const certificate = await this.files.findStated(certificateId);
    if (!certificate || certificate.hasFile) return;
    const key = await this.keys.current();
    const unsigned = await renderCertificate(this.statement(certificate), await certificateFonts());
    const signedAt = this.clock.now();
    const pdf = Buffer.from(await signPdf(unsigned, key, signedAt));
    const sha256 = createHash('sha256').update(pdf).digest();
    await this.transactions.run(async () => {
      const isNew = await this.files.addOnce({
        ...{ certificateId, pdf, sha256, signedAt },
        keyId: key.keyId,
      });
      if (isNew) await this.letters.issued(certificate, signedAt);
    });
  }

  private statement(certificate: StatedCertificate): CertificateStatement {
    const { number, holderName, scheme, howSat, issuedOn, expiresOn, issuer } = certificate;
    return {
      ...{ number, holderName, howSat, issuedOn, expiresOn, issuer },
      scheme: { slug: scheme.slug, revision: scheme.revision, title: scheme.title },
      scope: scheme.scope,
      limits: scheme.limits,
      registerUrl: `${this.config.PUBLIC_URL}/check/${certificate.linkCode}`,
      registerPage: `${this.config.PUBLIC_URL}/check`.replace(/^https?:\/\//, ''),
    };
  }
}

/** Puts the drawing into the queue's hands. */
@Injectable()
export class DrawingJobs {
  constructor(jobs: JobsService, drawing: DrawingService) {
    jobs.handle('draw-certificate', ({ certificateId }) => drawing.draw(certificateId));
  }
}
