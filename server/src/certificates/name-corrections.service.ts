import { Injectable } from '@nestjs/common';
import { fullName } from '../accounts/account.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import { InvalidRequest, NotFound } from '../problems/common.errors.ts';
import { requireMayEnd, type CertificateAct } from './certificate-act.ts';
import { nameOnCertificate, type CertificateRecord } from './certificate.ts';
import { CertificateRecordsRepository } from './certificate-records.repository.ts';
import { CertificatesRepository } from './certificates.repository.ts';
import { EndedMeanwhile } from './certificates.errors.ts';
import { IssuingService } from './issuing.service.ts';
import { requirePrintableName } from './printable-name.ts';

export interface RightName {
  readonly givenName: string;
  /** Empty for people with one name. */
  readonly familyName: string;
}

/** Corrects names by issuing again: a new decision, a new number, the same dates. */
@Injectable()
export class NameCorrectionsService {
  constructor(
    private readonly records: CertificateRecordsRepository,
    private readonly repository: CertificatesRepository,
    private readonly issuing: IssuingService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  /**
   * @returns the new certificate's id.
   * @throws {InvalidRequest | NotFound | NotOnOneself | CertificateWithdrawn | CertificateReplaced}
   */
  async correct(act: CertificateAct, name: RightName): Promise<string> {
    await requirePrintableName(name.givenName, name.familyName);
    const at = this.clock.now();
    return this.transactions.run(async () => {
      const replaced = await this.records.findById(act.certificateId, at);
      if (!replaced) throw new NotFound();
      requireMayEnd(replaced, act);
      return this.replace(replaced, act, { name, at });
    });
  }

  private async replace(
    replaced: CertificateRecord,
    act: CertificateAct,
    { name, at }: { name: RightName; at: Date },
  ): Promise<string> {
    const { actor, reason } = act;
    const named = nameOnCertificate(name.givenName, name.familyName);
    requireOtherName(replaced, named.holderName);
    const decisionId = await this.repository.addCorrection({
      ...{ replaced, reason, holderName: named.holderName, decidedAt: at },
      decider: { id: actor.id, name: fullName(actor) },
    });
    const replacedBy = await this.issuing.replace(
      { ...named, replacedId: replaced.id, decisionId, issuedAt: at },
      { reason: `Issued again in place of ${replaced.number}.`, actorId: actor.id },
    );
    const end = { certificateId: replaced.id, actorId: actor.id, reason, at, replacedBy };
    if (!(await this.repository.addEnd(end))) throw new EndedMeanwhile();
    await this.note(replaced, act);
    return replacedBy;
  }

  private note(replaced: CertificateRecord, act: CertificateAct): Promise<void> {
    return this.events.record({
      kind: 'certificate-name-corrected',
      accountId: replaced.accountId,
      actorId: act.actor.id,
      address: act.address,
      detail: { number: replaced.number, reason: act.reason },
    });
  }
}

function requireOtherName(replaced: CertificateRecord, holderName: string): void {
  if (holderName !== replaced.holderName) return;
  const detail = `The certificate already says ${holderName}. Type the name as it should stand.`;
  throw new InvalidRequest([{ pointer: '#/givenName', detail }]);
}
