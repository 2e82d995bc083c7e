import { generateKeyPairSync, X509Certificate } from 'node:crypto';
import { Certificate, ContentInfo, SignedData } from 'pkijs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  drawnCertificate,
  fonts,
  keyOf,
  newAuthority,
  signaturePlace,
  signedAt,
  signedCertificate,
  statement,
} from '../test/fixtures.ts';
import { Bench } from '../test/outside.ts';
import { createAuthority, keyIdOf } from './authority.ts';
import { type Authority } from './certificate.ts';
import { renderCertificate } from './pdf/render.ts';
import { signPdf } from './sign.ts';

const bench = new Bench();
let authority: Authority;
let signed: Buffer;

beforeAll(async () => {
  authority = await newAuthority();
  signed = await signedCertificate(authority);
  bench.write('signed.pdf', signed);
  bench.write('root.pem', authority.rootCertificatePem);
});
afterAll(() => bench.remove());

/** What was signed and the signature, apart. */
function takenApart(): { content: Buffer; signature: Buffer } {
  const { gapStart, gapEnd } = signaturePlace(signed);
  const hex = signed.subarray(gapStart + 1, gapEnd - 1).toString('latin1');
  return {
    content: Buffer.concat([signed.subarray(0, gapStart), signed.subarray(gapEnd)]),
    signature: Buffer.from(hex, 'hex'),
  };
}

describe('a signed certificate, to programs of other people', () => {
  it('is signed as a whole, validly and by an authority that is trusted', () => {
    bench.run('certutil', '-N', '-d', 'sql:.', '--empty-password');
    bench.run(
      'certutil',
      '-A',
      '-d',
      'sql:.',
      '-n',
      'root',
      '-t',
      'CT,C,C',
      '-a',
      '-i',
      'root.pem',
    );
    const { said } = bench.run('pdfsig', '-nssdir', 'sql:.', 'signed.pdf');
    expect(said).toContain('Total document signed');
    expect(said).toContain('Signature is Valid.');
    expect(said).toContain('Certificate is Trusted.');
    expect(said).toContain('ETSI.CAdES.detached');
  });

  it('has a CAdES signature', () => {
    const { content, signature } = takenApart();
    bench.write('content', content);
    bench.write('signature', signature);
    const verify = ['cms', '-verify', '-binary', '-cades', '-inform', 'DER', '-in', 'signature'];
    const against = ['-content', 'content', '-CAfile', 'root.pem', '-out', 'verified'];
    expect(bench.run('openssl', ...verify, ...against)).toMatchObject({
      status: 0,
      said: expect.stringContaining('CAdES Verification successful') as string,
    });
    bench.write('content', Buffer.concat([content, Buffer.from(' ')]));
    expect(bench.run('openssl', ...verify, ...against).status).not.toBe(0);
  });

  it('verifies in another implementation of CMS, and not when its content differs', async () => {
    const { content, signature } = takenApart();
    const message = ContentInfo.fromBER(new Uint8Array(signature));
    const signedData = new SignedData({ schema: message.content });
    const root = Certificate.fromBER(
      new Uint8Array(new X509Certificate(authority.rootCertificatePem).raw),
    );
    const check = (data: Buffer): Promise<boolean> =>
      signedData.verify({
        signer: 0,
        data: new Uint8Array(data).buffer,
        trustedCerts: [root],
        checkChain: true,
        checkDate: signedAt,
      });
    expect(await check(content)).toBe(true);
    const changed = Buffer.concat([content, Buffer.from(' ')]);
    await expect(check(changed)).rejects.toThrow('Message digest doesn');
  });

  it('is a sound PDF that keeps the text it was drawn with', () => {
    expect(bench.run('qpdf', '--check', 'signed.pdf')).toMatchObject({ status: 0 });
    expect(bench.run('pdftotext', 'signed.pdf', '-').result).toContain('Priya Vandermeer');
  });
});

describe('signing', () => {
  it('makes no place in the signature for what stands in a name', async () => {
    const name = 'Quay) /Contents <00> /Reason (Certificate HQ22-2222-222H) School';
    const pdf = await renderCertificate(
      { ...statement, issuer: { ...statement.issuer, name } },
      fonts,
    );
    bench.write('named.pdf', await signPdf(pdf, keyOf(authority), signedAt));
    const { said } = bench.run('pdfsig', '-nocert', 'named.pdf');
    expect(said).toContain('Signature is Valid.');
    expect(said).toContain('Total document signed');
  });

  it('refuses to sign twice, and what was not drawn here', async () => {
    const key = keyOf(authority);
    await expect(signPdf(signed, key, signedAt)).rejects.toThrow('is signed already');
    await expect(signPdf(Buffer.from('%PDF-1.7'), key, signedAt)).rejects.toThrow('no place');
  });

  it('refuses a key that is not its certificate’s, is of another kind, or is out of date', async () => {
    const pdf = await drawnCertificate();
    const other = await newAuthority();
    const rsa = generateKeyPairSync('rsa', { modulusLength: 2048 }).privateKey;
    const attempts = [
      { key: { ...keyOf(authority), privateKeyPem: other.privateKeyPem }, at: signedAt },
      {
        key: {
          ...keyOf(authority),
          privateKeyPem: String(rsa.export({ type: 'pkcs8', format: 'pem' })),
        },
        at: signedAt,
      },
      { key: keyOf(authority), at: new Date(signedAt.getTime() + 6 * 366 * 86_400_000) },
    ];
    const words = ['does not belong to its certificate', 'is rsa', 'is valid from'];
    for (const [index, { key, at }] of attempts.entries()) {
      await expect(signPdf(pdf, key, at)).rejects.toThrow(words[index]);
    }
  });
});

describe('an authority', () => {
  it('has a root for ever so long and a leaf within it, each with its key id', async () => {
    expect(authority.keyId).toBe(keyIdOf(authority.certificatePem));
    expect(authority.rootKeyId).toBe(keyIdOf(authority.rootCertificatePem));
    expect(authority.keyId).not.toBe(authority.rootKeyId);
    const leaf = new X509Certificate(authority.certificatePem);
    const root = new X509Certificate(authority.rootCertificatePem);
    expect(leaf.checkIssued(root)).toBe(true);
    expect(leaf.verify(root.publicKey)).toBe(true);
    expect(leaf.ca).toBe(false);
    expect(new Date(leaf.validTo).toISOString()).toBe(authority.validTo);
    expect(new Date(root.validTo).toISOString()).toBe(authority.rootValidTo);
  });

  it('takes a name in any writing, and never lets a leaf outlive its root', async () => {
    const name = 'Āwhina, “Bolts” + Söhne = 1/2 \\ #Ω';
    const now = new Date('2026-02-28T12:00:00Z');
    const made = await createAuthority({
      organisation: name,
      now,
      leafYears: 9,
      rootYears: 4,
    });
    expect(new X509Certificate(made.certificatePem).subject).toContain('Āwhina');
    expect(made.validTo).toBe(made.rootValidTo);
  });
});
