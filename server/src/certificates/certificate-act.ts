import { NotOnOneself } from '../people/people.errors.ts';
import type { CertificateRecord } from './certificate.ts';
import { CertificateReplaced, CertificateWithdrawn } from './certificates.errors.ts';

/** An administrator who acts on a certificate, and why. */
export interface CertificateAct {
  readonly certificateId: string;
  readonly actor: { readonly id: string; readonly givenName: string; readonly familyName: string };
  readonly address: string;
  readonly reason: string;
}

/**
 * Whether this certificate may be withdrawn or replaced by this person. Either ends it for good.
 *
 * @throws {NotOnOneself | CertificateWithdrawn | CertificateReplaced}
 */
export function requireMayEnd(certificate: CertificateRecord, { actor }: CertificateAct): void {
  if (certificate.accountId === actor.id) {
    throw new NotOnOneself('Nobody decides about a certificate of their own.');
  }
  requireNotEnded(certificate);
}

/** @throws {CertificateWithdrawn | CertificateReplaced} */
function requireNotEnded({ state, replacedBy }: CertificateRecord): void {
  if (state === 'withdrawn') throw new CertificateWithdrawn();
  if (state === 'superseded') throw new CertificateReplaced(replacedBy);
}
