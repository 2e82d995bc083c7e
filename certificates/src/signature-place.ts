/**
 * The signature dictionary as it is written, byte for byte: drawing reserves it, signing fills it
 * in, checking demands exactly this form. Nothing else in a certificate may look like it.
 */
const reservedByteRange = '[0 0000000000 0000000000 0000000000]';
const reservedSignatureBytes = 4096;

/** What stands between the head of the dictionary's object and the signature itself. */
export function dictionaryHead(byteRange: string): string {
  return [
    '<<',
    '/Type /Sig',
    '/Filter /Adobe.PPKLite',
    '/SubFilter /ETSI.CAdES.detached',
    `/ByteRange ${byteRange.padEnd(reservedByteRange.length)}`,
    '/Contents ',
  ].join('\n');
}

export const reservedHead = dictionaryHead(reservedByteRange);
export const reservedContents = `<${'0'.repeat(reservedSignatureBytes * 2)}>`;
export const reservedDate = '/M (D:00000000000000Z)';
