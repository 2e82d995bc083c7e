import { readCertificateNumber } from './number.ts';
import { strandsFromDigest } from './strand-mark.ts';
import { toHex } from './verify/der-reader.ts';
import { type FileFault, Refusal } from './verify/fault.ts';
import { claimedNumber, readSignedFile } from './verify/file-structure.ts';
import { checkSignature, readArchive, sha256 } from './verify/signature.ts';

export { readCertificateNumber } from './number.ts';
export { strandCentres, strandKinds } from './strand-mark.ts';
export { type FileFault } from './verify/fault.ts';

/** One of our own certificates, from the register's archive. */
export interface IssuerCertificate {
  keyId: string;
  kind: 'root' | 'leaf';
  pem: string;
}

export type FileFinding =
  | { ok: true; number: string }
  | { ok: false; number: string | null; fault: FileFault; detail: string };

/** Larger than any certificate of ours by a factor of about fifty. */
const largestFileBytes = 5_000_000;

/**
 * Whether a file is a certificate of ours, untouched since it was signed.
 *
 * It says nothing of whether the certificate still holds: ask the register for that. It runs in
 * browsers and in Node alike and sends nothing anywhere.
 *
 * @param options.issuers - every issuer certificate of the register, old ones too.
 * @param options.issuedAt - when the register says it was issued; never a time from the file.
 * @throws {Error} when an issuer certificate cannot be read.
 */
export async function verifyPdf(
  file: Uint8Array,
  options: { issuers: IssuerCertificate[]; issuedAt: Date },
): Promise<FileFinding> {
  if (file.length > largestFileBytes) {
    const detail = `The file is larger than ${largestFileBytes / 1_000_000} MB; certificates are far smaller.`;
    return { ok: false, number: null, fault: 'too-large', detail };
  }
  const archive = readArchive(options.issuers);
  try {
    const { number, signedOctets, signatureOctets } = readSignedFile(file);
    await checkSignature(signatureOctets, signedOctets, { archive, issuedAt: options.issuedAt });
    return { ok: true, number };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return { ok: false, number: numberInPdf(file), fault: error.fault, detail: error.detail };
  }
}

/** The certificate number a file claims, to look it up by; believe it only after `verifyPdf`. */
export function numberInPdf(file: Uint8Array): string | null {
  if (file.length > largestFileBytes) return null;
  const claimed = claimedNumber(file);
  if (claimed === null) return null;
  const reading = readCertificateNumber(claimed);
  return reading.ok ? reading.number : null;
}

/** The SHA-256 of a file, as the register records it at issue. */
export async function sha256Hex(file: Uint8Array): Promise<string> {
  return toHex(await sha256(file));
}

/** As `strandPattern`, where there is no `node:crypto`. */
export async function strandPatternOf(number: string): Promise<number[]> {
  return strandsFromDigest(await sha256(new TextEncoder().encode(number)));
}
