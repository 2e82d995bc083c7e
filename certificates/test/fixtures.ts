import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { signDetached } from '../src/cms.ts';
import { der } from '../src/der.ts';
import {
  type Authority,
  type CertificateFonts,
  type CertificateStatement,
  createAuthority,
  fontFiles,
  renderCertificate,
  type SigningKey,
  signPdf,
} from '../src/index.ts';
import {
  dictionaryHead,
  reservedContents,
  reservedDate,
  reservedHead,
} from '../src/signature-place.ts';
import { type IssuerCertificate } from '../src/verify.ts';
import { membersOf, readDer } from '../src/verify/der-reader.ts';

export const fonts = Object.fromEntries(
  Object.entries(fontFiles()).map(([face, file]) => [face, readFileSync(file)]),
) as unknown as CertificateFonts;

export const statement: CertificateStatement = {
  number: 'HQ7K-2M4T-9XWD',
  holderName: 'Priya Vandermeer',
  scheme: { slug: 'HQ-DC2', revision: 'F', title: 'Auxiliary DC systems installer' },
  scope: [
    'Design and installation of auxiliary systems up to 50 V DC',
    'Cable sizing, protection and crimped terminations',
    'Charging from a vehicle, from solar and from DC-DC chargers',
  ],
  limits: ['AC mains, inverters above 50 V and shore supplies', 'Traction batteries'],
  howSat: 'Unsupervised, at a place of the candidate’s choosing.',
  issuedOn: '2026-11-03',
  expiresOn: '2029-11-03',
  issuer: {
    name: 'Harrow Quay Technical School',
    address: 'Unit 4, The Old Ropewalk, Harrow Quay, HQ1 4RW',
  },
  registerUrl: 'https://register.example/c/Zk3vQx8mT1yR5uWbN0aLhQ',
  registerPage: 'register.example',
};

/** Outside programs check against today's date, so the test authority is a day old. */
export const signedAt = new Date();
const aDayAgo = new Date(signedAt.getTime() - 86_400_000);

export function newAuthority(organisation = statement.issuer.name): Promise<Authority> {
  return createAuthority({ organisation, now: aDayAgo, leafYears: 5, rootYears: 20 });
}

export function keyOf(authority: Authority): SigningKey {
  return {
    keyId: authority.keyId,
    privateKeyPem: authority.privateKeyPem,
    certificatePem: authority.certificatePem,
    chainPem: [authority.rootCertificatePem],
  };
}

export function issuersOf(authority: Authority): IssuerCertificate[] {
  return [
    { keyId: authority.rootKeyId, kind: 'root', pem: authority.rootCertificatePem },
    { keyId: authority.keyId, kind: 'leaf', pem: authority.certificatePem },
  ];
}

// Drawn once for all tests of a file; drawing takes far longer than signing.
let drawing: Promise<Uint8Array> | undefined;

/** The statement above, drawn and not signed. */
export function drawnCertificate(): Promise<Uint8Array> {
  drawing ??= renderCertificate(statement, fonts);
  return drawing;
}

export async function signedCertificate(authority: Authority, at = signedAt): Promise<Buffer> {
  return Buffer.from(await signPdf(await drawnCertificate(), keyOf(authority), at));
}

/** Where the signature stands in a signed file: from its `<` to after its `>`. */
export function signaturePlace(file: Buffer): { gapStart: number; gapEnd: number } {
  const [, gapStart, gapEnd] = /\/ByteRange \[0 (\d+) (\d+)/.exec(file.toString('latin1')) ?? [];
  return { gapStart: Number(gapStart), gapEnd: Number(gapEnd) };
}

/** The signature of a signed file in hexadecimal, without the zeros that fill its place. */
export function messageOf(file: Buffer): string {
  const { gapStart } = signaturePlace(file);
  const length = Number.parseInt(file.toString('latin1', gapStart + 5, gapStart + 9), 16);
  return file.toString('latin1', gapStart + 1, gapStart + 1 + (length + 4) * 2);
}

/** The file with another message in the place of its signature. */
export function withMessage(file: Buffer, message: Buffer): Buffer {
  const { gapStart, gapEnd } = signaturePlace(file);
  const changed = Buffer.from(file);
  changed.write(message.toString('hex').padEnd(gapEnd - gapStart - 2, '0'), gapStart + 1, 'latin1');
  return changed;
}

/** A DER value with the member at a path replaced, and every length around it made right. */
export function edited(value: Buffer, path: number[], edit: (member: Buffer) => Buffer): Buffer {
  const [place, ...deeper] = path;
  if (place === undefined) return edit(value);
  const { tag } = readDer(value);
  const members = membersOf(readDer(value), tag).map(({ octets }) => Buffer.from(octets));
  const rebuilt = members.map((member, index) =>
    index === place ? edited(member, deeper, edit) : member,
  );
  return der(tag, ...rebuilt);
}

/** A certificate signed by hand: the place of its signature, or its end, is not as we make them. */
export async function signedByHand(
  signer: SigningKey,
  shape: { gap?: (contents: string) => string; end?: (tail: string) => string },
): Promise<Buffer> {
  const { gap: shapeGap = (contents) => contents, end: shapeEnd = (tail) => tail } = shape;
  const [before = '', tail = ''] = Buffer.from(await drawnCertificate())
    .toString('latin1')
    .replace(reservedDate, '/M (D:20261103100000Z)')
    .split(reservedHead + reservedContents);
  const after = shapeEnd(tail);
  const gap = shapeGap(reservedContents);
  const gapStart = before.length + reservedHead.length;
  const range = `[0 ${gapStart} ${gapStart + gap.length} ${after.length}]`;
  const head = before + dictionaryHead(range);
  const digest = createHash('sha256')
    .update(Buffer.from(head + after, 'latin1'))
    .digest();
  const message = signDetached(digest, signer, signedAt).toString('hex');
  const filled = shapeGap(`<${message.padEnd(reservedContents.length - 2, '0')}>`);
  return Buffer.from(head + filled + after, 'latin1');
}
