import { numberInPdf, verifyPdf } from '@ferrule/certificates/verify';
import { Injectable } from '@nestjs/common';
import { createHash } from 'node:crypto';
import type { CertificateRecord } from '../certificates/certificate.ts';
import { CertificateRecordsService } from '../certificates/certificate-records.service.ts';
import { Clock } from '../clock/clock.ts';
import { subscriberOf } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import { fileFromAddress } from './register-throttles.ts';
import { notOnRegister, presentAnswer } from './register.presenter.ts';
import type { FileAnswer } from './register.schemas.ts';

const unknownFile =
  'It is signed with the school’s key, but it is not the file that was issued under this number.';

/** Looks at files that visitors send in. Nothing of a file is kept. */
@Injectable()
export class FileChecksService {
  constructor(
    private readonly records: CertificateRecordsService,
    private readonly throttles: ThrottlesService,
    private readonly clock: Clock,
  ) {}

  /** Asked before a file is taken in. @throws {TooManyAttempts} */
  async admit(address: string): Promise<void> {
    await this.throttles.count({ rule: fileFromAddress, subject: subscriberOf(address) });
  }

  async check(file: Buffer): Promise<FileAnswer> {
    const record = await this.records.byHash(createHash('sha256').update(file).digest());
    const issuers = await this.records.issuers();
    const issuedAt = await this.timeOfIssue(file, record);
    const finding = await verifyPdf(file, { issuers, issuedAt });
    const now = this.clock.now();
    const answer = { number: finding.number, register: notOnRegister(now) };
    if (!finding.ok) return { ...answer, file: finding.fault, detail: finding.detail };
    if (!record) return { ...answer, file: 'not-on-register', detail: unknownFile };
    return { ...answer, file: 'the-very-file', detail: '', register: presentAnswer(record, now) };
  }

  /** The register's own record of the certificate the file is, or claims to be; never the file's. */
  private async timeOfIssue(file: Buffer, record: CertificateRecord | null): Promise<Date> {
    if (record?.signedAt) return record.signedAt;
    const number = numberInPdf(file);
    const claimed = number === null ? null : await this.records.byNumber(number);
    return claimed?.signedAt ?? this.clock.now();
  }
}
