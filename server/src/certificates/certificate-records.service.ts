import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import type { CertificateRecord } from './certificate.ts';
import { CertificateRecordsRepository } from './certificate-records.repository.ts';
import { IssuersRepository, type Issuer } from './issuers.repository.ts';

/** What the register asks: a certificate as it stands now, and who may have signed its file. */
@Injectable()
export class CertificateRecordsService {
  constructor(
    private readonly records: CertificateRecordsRepository,
    private readonly archive: IssuersRepository,
    private readonly clock: Clock,
  ) {}

  byNumber(number: string): Promise<CertificateRecord | null> {
    return this.records.findByNumber(number, this.clock.now());
  }

  byLink(linkCode: string): Promise<CertificateRecord | null> {
    return this.records.findByLink(linkCode, this.clock.now());
  }

  /** @param sha256 - of the whole file, 32 bytes. */
  byHash(sha256: Buffer): Promise<CertificateRecord | null> {
    return this.records.findByHash(sha256, this.clock.now());
  }

  /** Every certificate of our own authority, old ones too. */
  issuers(): Promise<Issuer[]> {
    return this.archive.all();
  }
}
