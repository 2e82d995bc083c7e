/** What a certificate says: only what was assessed, nothing else. */
export interface CertificateStatement {
  /** `HQ7K-2M4T-9XWD`; see `newCertificateNumber`. */
  number: string;
  /** As the candidate confirmed it, in NFC. */
  holderName: string;
  scheme: { slug: string; revision: string; title: string };
  /** Each entry one kind of work, in job words. */
  scope: string[];
  limits: string[];
  howSat: string;
  /** YYYY-MM-DD */
  issuedOn: string;
  /** YYYY-MM-DD, valid to the end of that day. */
  expiresOn: string;
  issuer: { name: string; address: string };
  /** The long link with the 128-bit code, drawn as the QR code. */
  registerUrl: string;
  /** The short address printed for a typed check. */
  registerPage: string;
}

/** The bytes of the files of `fontFiles`. */
export interface CertificateFonts {
  text: Uint8Array;
  textBold: Uint8Array;
  textItalic: Uint8Array;
  data: Uint8Array;
  dataBold: Uint8Array;
  number: Uint8Array;
}

/** The key in use, as the register keeps it. */
export interface SigningKey {
  keyId: string;
  privateKeyPem: string;
  certificatePem: string;
  /** From the leaf's issuer up to the root. */
  chainPem: string[];
}

/** A root and the leaf it signed. Keep the root key apart from the server. */
export interface Authority {
  keyId: string;
  rootKeyId: string;
  rootCertificatePem: string;
  rootKeyPem: string;
  rootValidTo: string;
  certificatePem: string;
  privateKeyPem: string;
  /** The leaf's, as ISO instants. */
  validFrom: string;
  validTo: string;
}

export interface AuthorityOptions {
  organisation: string;
  now: Date;
  leafYears: number;
  rootYears: number;
}
