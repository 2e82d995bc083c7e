import { readCertificateNumber } from '@ferrule/certificates';
import { Injectable } from '@nestjs/common';
import { isFamilyName } from '../certificates/certificate.ts';
import { CertificateRecordsService } from '../certificates/certificate-records.service.ts';
import { Clock } from '../clock/clock.ts';
import { subscriberOf } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import { missedForNumber, missedFromAddress } from './register-throttles.ts';
import { notOnRegister, presentAnswer } from './register.presenter.ts';
import type { Check, FileRecord, Issuers, RegisterAnswer } from './register.schemas.ts';

/** Answers whoever asks about one certificate they hold; it never lists any. */
@Injectable()
export class RegisterService {
  constructor(
    private readonly records: CertificateRecordsService,
    private readonly throttles: ThrottlesService,
    private readonly clock: Clock,
  ) {}

  /** By number and family name. @throws {TooManyAttempts} */
  async check({ number, familyName }: Check, address: string): Promise<RegisterAnswer> {
    const reading = readCertificateNumber(number);
    const miss = await this.throttles.count(
      { rule: missedFromAddress, subject: subscriberOf(address) },
      ...(reading.ok ? [{ rule: missedForNumber, subject: reading.number }] : []),
    );
    const record = reading.ok ? await this.records.byNumber(reading.number) : null;
    if (!record || !isFamilyName(familyName, record)) return notOnRegister(this.clock.now());
    await miss.forgive();
    return presentAnswer(record, this.clock.now());
  }

  /** By the code behind the link on the certificate, which needs no name. */
  async followLink(linkCode: string): Promise<RegisterAnswer> {
    return presentAnswer(await this.records.byLink(linkCode), this.clock.now());
  }

  /** By the SHA-256 of a file that never left the visitor's device. */
  async findFile(sha256: string): Promise<FileRecord> {
    const record = await this.records.byHash(Buffer.from(sha256, 'hex'));
    return {
      ...presentAnswer(record, this.clock.now()),
      signedAt: record?.signedAt?.toISOString() ?? null,
    };
  }

  async issuers(): Promise<Issuers> {
    const issuers = await this.records.issuers();
    return {
      issuers: issuers.map(({ keyId, kind, pem, validFrom, validTo }) => ({
        ...{ keyId, kind, pem },
        validFrom: validFrom.toISOString(),
        validTo: validTo.toISOString(),
      })),
    };
  }
}
