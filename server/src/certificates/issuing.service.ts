import { newCertificateNumber } from '@ferrule/certificates';
import { Injectable } from '@nestjs/common';
import { randomBytes } from 'node:crypto';
import { JobsService } from '../jobs/jobs.service.ts';
import type { Marks, NewCertificate, Replacement } from './certificate.ts';
import { CertificatesRepository } from './certificates.repository.ts';

const LINK_CODE_BYTES = 16;
const MOST_DRAWS = 5;

/** Who issued a certificate, and why. */
export interface Issue {
  readonly reason: string;
  readonly actorId: string | null;
}

/** Gives certificates their number and hands them on to be drawn. Each joins the open transaction. */
@Injectable()
export class IssuingService {
  constructor(
    private readonly repository: CertificatesRepository,
    private readonly jobs: JobsService,
  ) {}

  issue(certificate: NewCertificate, issue: Issue): Promise<string> {
    return this.enter({ ...issue, at: certificate.issuedAt }, (marks) =>
      this.repository.add(certificate, marks),
    );
  }

  replace(replacement: Replacement, issue: Issue): Promise<string> {
    return this.enter({ ...issue, at: replacement.issuedAt }, (marks) =>
      this.repository.addReplacement(replacement, marks),
    );
  }

  private async enter(
    issue: Issue & { at: Date },
    add: (marks: Marks) => Promise<string | null>,
  ): Promise<string> {
    for (let draw = 0; draw < MOST_DRAWS; draw += 1) {
      const certificateId = await add({
        number: newCertificateNumber(randomBytes(16)),
        linkCode: randomBytes(LINK_CODE_BYTES).toString('base64url'),
      });
      if (certificateId === null) continue;
      await this.repository.addIssued(certificateId, issue);
      await this.jobs.enqueue('draw-certificate', { certificateId });
      return certificateId;
    }
    throw new Error('No free certificate number was found.');
  }
}
