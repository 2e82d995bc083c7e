import { foldName } from '@ferrule/certificates';

/** A person to be certified, on the evidence of one sitting. */
export interface Certification {
  readonly accountId: string;
  readonly sittingId: string;
  readonly schemeId: string;
  readonly givenName: string;
  /** Empty for people with one name. */
  readonly familyName: string;
  readonly howSat: string;
  /** What the decision rests on. */
  readonly evidence: object;
  /** The rules it was taken by, with their revision. */
  readonly rules: object;
  readonly decidedAt: Date;
}

/** How a name stands on a certificate, and what a check compares. */
export interface NameOnCertificate {
  readonly holderName: string;
  readonly familyFold: string;
}

/** A certificate before its number is drawn and its dates are worked out in the scheme's zone. */
export interface NewCertificate extends NameOnCertificate {
  readonly accountId: string;
  readonly decisionId: string;
  readonly schemeId: string;
  readonly howSat: string;
  readonly issuedAt: Date;
}

/** A certificate that takes the place of another: same person, scheme and dates. */
export interface Replacement extends NameOnCertificate {
  readonly replacedId: string;
  readonly decisionId: string;
  readonly issuedAt: Date;
}

/** What is drawn at random for each certificate. */
export interface Marks {
  readonly number: string;
  readonly linkCode: string;
}

/** Where a person's certificate for a sitting stands. */
export interface CertificateOfSitting {
  readonly id: string;
  readonly number: string;
  /** Whether its file has been drawn. */
  readonly ready: boolean;
}

export const STATES = ['valid', 'expired', 'withdrawn', 'superseded'] as const;
export type CertificateState = (typeof STATES)[number];

/** A certificate as it stands now. */
export interface CertificateRecord extends NameOnCertificate {
  readonly id: string;
  readonly accountId: string;
  readonly number: string;
  readonly linkCode: string;
  readonly scheme: { readonly title: string; readonly revision: string };
  readonly scope: readonly string[];
  readonly limits: readonly string[];
  readonly howSat: string;
  readonly issuedAt: Date;
  /** YYYY-MM-DD, in the scheme's zone. */
  readonly issuedOn: string;
  /** YYYY-MM-DD, valid to the end of that day in the scheme's zone. */
  readonly expiresOn: string;
  readonly state: CertificateState;
  /** When its file was drawn and signed, by the register's own record; null until then. */
  readonly signedAt: Date | null;
  readonly withdrawn: { readonly on: string; readonly reason: string } | null;
  /** The number of the certificate that took its place. */
  readonly replacedBy: string | null;
}

/** Something that happened to a certificate. */
export interface CertificateEvent {
  readonly certificateId: string;
  readonly kind: 'issued' | 'signed' | 'withdrawn' | 'superseded';
  readonly at: Date;
  readonly reason: string;
  /** Null where the server did it by itself. */
  readonly actorName: string | null;
  /** The number of the certificate that took its place. */
  readonly replacedBy: string | null;
}

/** The holder's whole name, composed the one way it is printed. */
function holderName(givenName: string, familyName: string): string {
  return `${givenName} ${familyName}`.trim().normalize('NFC');
}

/** A person with one name is found by that name. */
export function nameOnCertificate(givenName: string, familyName: string): NameOnCertificate {
  return {
    holderName: holderName(givenName, familyName),
    familyFold: foldName(familyName) || foldName(givenName),
  };
}

/** Whether what somebody typed as the family name is the holder's. */
export function isFamilyName(typed: string, { familyFold }: NameOnCertificate): boolean {
  const folded = foldName(typed);
  return folded !== '' && folded === familyFold;
}
