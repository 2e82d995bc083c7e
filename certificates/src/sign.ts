import { createHash } from 'node:crypto';
import { type SigningKey } from './certificate.ts';
import { signDetached } from './cms.ts';
import { KeyUnsuitable, NoPlaceToSign } from './errors.ts';
import { dictionaryHead, reservedContents, reservedDate, reservedHead } from './signature-place.ts';

/**
 * Signs a rendered certificate in the place drawing reserved for it: PAdES baseline B-B
 * (ETSI EN 319 142-1), certified so that no later change is allowed.
 *
 * @param signedAt - written as the time the signer claims; the register's time is the one that counts.
 * @throws {NoPlaceToSign} when `pdf` did not come from `renderCertificate` or is signed already.
 * @throws {KeyUnsuitable} when the key cannot sign or its chain does not fit.
 */
export async function signPdf(
  pdf: Uint8Array,
  key: SigningKey,
  signedAt: Date,
): Promise<Uint8Array> {
  const signed = Buffer.from(pdf);
  const headAt = onlyPlace(signed, reservedHead);
  const gapStart = headAt + reservedHead.length;
  const gapEnd = gapStart + reservedContents.length;
  if (!signed.subarray(gapStart, gapEnd).equals(Buffer.from(reservedContents))) {
    throw new NoPlaceToSign(
      'The place for the signature is not empty: render the certificate anew.',
    );
  }
  signed.write(`/M (D:${pdfDate(signedAt)})`, onlyPlace(signed, reservedDate), 'latin1');
  signed.write(
    dictionaryHead(`[0 ${gapStart} ${gapEnd} ${signed.length - gapEnd}]`),
    headAt,
    'latin1',
  );

  const digest = createHash('sha256')
    .update(signed.subarray(0, gapStart))
    .update(signed.subarray(gapEnd))
    .digest();
  const signature = signDetached(digest, key, signedAt).toString('hex');
  if (signature.length > reservedContents.length - 2) {
    throw new KeyUnsuitable(
      `The certificates of key ${key.keyId} make a signature of ${signature.length / 2} bytes; ` +
        `${reservedContents.length / 2 - 1} are reserved. Use a shorter chain.`,
    );
  }
  signed.write(signature, gapStart + 1, 'latin1');
  return signed;
}

function onlyPlace(pdf: Buffer, text: string): number {
  const at = pdf.indexOf(text, 0, 'latin1');
  if (at < 0 || pdf.indexOf(text, at + 1, 'latin1') >= 0) {
    throw new NoPlaceToSign(
      'This PDF has no place reserved for a signature, or is signed already: sign what renderCertificate returns, once.',
    );
  }
  return at;
}

function pdfDate(instant: Date): string {
  return `${instant.toISOString().slice(0, 19).replace(/[-T:]/g, '')}Z`;
}
