import { DomainError } from '../problems/domain-error.ts';

/** A withdrawn certificate stays withdrawn. */
export class CertificateWithdrawn extends DomainError {
  readonly code = 'certificate-withdrawn';
  constructor() {
    super('This certificate has been withdrawn, for good. Nothing more can be done to it.');
  }
}

export class CertificateReplaced extends DomainError {
  readonly code = 'certificate-replaced';
  override readonly extensions: { replacedBy: string | null };
  constructor(replacedBy: string | null) {
    super(`This certificate was replaced by ${replacedBy ?? 'another'}. Use that one.`);
    this.extensions = { replacedBy };
  }
}

export class CertificateNotDrawn extends DomainError {
  readonly code = 'certificate-not-drawn';
  constructor() {
    super('The PDF is being drawn and signed. Try again in a moment; it is also mailed.');
  }
}

/** Somebody else ended it between the look and the act. */
export class EndedMeanwhile extends DomainError {
  readonly code = 'certificate-ended-meanwhile';
  constructor() {
    super('Somebody else withdrew or corrected this certificate just now. Look at it again.');
  }
}
