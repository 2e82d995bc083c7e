export interface IssuerCertificate {
  keyId: string;
  kind: 'root' | 'leaf';
  pem: string;
}

export type FileFault =
  | 'not-a-pdf'
  | 'not-signed'
  | 'changed-after-signing'
  | 'added-to'
  | 'wrong-issuer'
  | 'unknown-key'
  | 'malformed-signature'
  | 'expired-key-at-issue'
  | 'too-large';

export type FileFinding =
  | { ok: true; number: string }
  | { ok: false; number: string | null; fault: FileFault; detail: string };

export async function verifyPdf(
  _file: Uint8Array,
  _options: { issuers: IssuerCertificate[]; issuedAt: Date },
): Promise<FileFinding> {
  throw new Error('verifyPdf is not finished');
}

/** The certificate number a file claims, read without believing it. */
export function numberInPdf(_file: Uint8Array): string | null {
  throw new Error('numberInPdf is not finished');
}

export async function sha256Hex(_file: Uint8Array): Promise<string> {
  throw new Error('sha256Hex is not finished');
}

/** The strands of a certificate's mark: 37 of 0 (ring), 1 (ring with dot) or 2 (solid). */
export async function strandPatternOf(_number: string): Promise<number[]> {
  throw new Error('strandPatternOf is not finished');
}
