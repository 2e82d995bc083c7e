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

/** A certificate before its number is drawn and its dates are worked out in the scheme's zone. */
export interface NewCertificate {
  readonly accountId: string;
  readonly decisionId: string;
  readonly schemeId: string;
  readonly holderName: string;
  readonly familyFold: string;
  readonly howSat: string;
  readonly issuedAt: Date;
}

/** Where a person's certificate for a sitting stands. */
export interface CertificateOfSitting {
  readonly id: string;
  readonly number: string;
  /** Whether its file has been drawn. */
  readonly ready: boolean;
}

/** The holder's whole name, composed the one way it is printed. */
export function holderName(givenName: string, familyName: string): string {
  return `${givenName} ${familyName}`.trim().normalize('NFC');
}
