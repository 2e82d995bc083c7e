/**
 * The signature dictionary as it is written, byte for byte: drawing reserves it, signing fills it
 * in, checking demands exactly this form. Nothing else in a certificate may look like it.
 */
const reservedByteRange = '[0 0000000000 0000000000 0000000000]';
const reservedSignatureBytes = 4096;

/** What stands between the start of the dictionary's object and the signature itself. */
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

/** Certified, no changes allowed: DocMDP level 1 (ISO 32000-1, 12.8.2.2). */
const reference = [
  '/Reference [<< /Type /SigRef /TransformMethod /DocMDP',
  '/TransformParams << /Type /TransformParams /P 1 /V /1.2 >> >>]',
].join('\n');

/** What follows the signature, up to the end of the dictionary. */
export function dictionaryTail(signer: { nameHex: string; number: string }): string {
  return [
    '',
    reservedDate,
    `/Name <${signer.nameHex}>`,
    `/Reason (Certificate ${signer.number})`,
    reference,
    '>>',
  ].join('\n');
}

const tailForm = new RegExp(
  [
    '^',
    String.raw`/M \(D:\d{14}Z\)`,
    '/Name <FEFF[0-9A-F]*>',
    String.raw`/Reason \(Certificate ([0-9A-Z-]{14})\)`,
    reference.replace(/[[\].]/g, String.raw`\$&`),
    '>>',
    'endobj',
    '',
  ].join('\n'),
);

/** The number in a text that begins with such a tail, or null when it is not ours to the byte. */
export function numberInTail(text: string): string | null {
  return tailForm.exec(text)?.[1] ?? null;
}
