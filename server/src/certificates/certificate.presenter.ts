import type { CertificateEvent, CertificateRecord } from './certificate.ts';
import type { CertificateView } from './certificates.schemas.ts';

const BY_ITSELF = 'the register';

function tell({ kind, reason, replacedBy }: CertificateEvent): string {
  switch (kind) {
    case 'issued':
      return `Issued. ${reason}`;
    case 'signed':
      return `Drawn and signed with key ${reason}.`;
    case 'withdrawn':
      return `Withdrawn: ${reason}`;
    case 'superseded':
      return `Replaced by ${replacedBy ?? 'another'}: ${reason}`;
  }
}

export function presentCertificate(
  record: CertificateRecord,
  events: readonly CertificateEvent[],
  publicUrl: string,
): CertificateView {
  const { id, number, holderName, scheme, howSat, issuedOn, expiresOn, state } = record;
  return {
    ...{ id, number, holderName, scheme, howSat, issuedOn, expiresOn, state },
    ready: record.signedAt !== null,
    scope: [...record.scope],
    limits: [...record.limits],
    registerUrl: `${publicUrl}/check/${record.linkCode}`,
    replacedBy: record.replacedBy,
    withdrawn: record.withdrawn,
    history: events
      .filter(({ certificateId }) => certificateId === id)
      .map((event) => ({
        at: event.at.toISOString(),
        what: tell(event),
        by: event.actorName ?? BY_ITSELF,
      })),
  };
}
