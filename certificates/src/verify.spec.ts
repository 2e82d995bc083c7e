import { createHash, X509Certificate } from 'node:crypto';
import fc from 'fast-check';
import { beforeAll, describe, expect, it } from 'vitest';
import {
  edited,
  issuersOf,
  keyOf,
  messageOf,
  newAuthority,
  signaturePlace,
  signedAt,
  signedCertificate,
  signedByHand,
  withMessage,
} from '../test/fixtures.ts';
import { type Authority } from './certificate.ts';
import { der, positiveInteger } from './der.ts';
import { readDer } from './verify/der-reader.ts';
import {
  type FileFinding,
  type IssuerCertificate,
  numberInPdf,
  sha256Hex,
  verifyPdf,
} from './verify.ts';

let authority: Authority;
let stranger: Authority;
let issuers: IssuerCertificate[];
let signed: Buffer;

beforeAll(async () => {
  authority = await newAuthority();
  stranger = await newAuthority();
  issuers = issuersOf(authority);
  signed = await signedCertificate(authority);
});

function check(file: Uint8Array, archive = issuers, issuedAt = signedAt): Promise<FileFinding> {
  return verifyPdf(file, { issuers: archive, issuedAt });
}

/** The file with one stretch of it written over. */
function overwritten(at: number, text: string, file = signed): Buffer {
  const changed = Buffer.from(file);
  changed.write(text, at, 'latin1');
  return changed;
}

function replaced(from: string, to: string): Buffer {
  const text = signed.toString('latin1');
  expect(text).toContain(from);
  return Buffer.from(text.replace(from, to), 'latin1');
}

/** A later version of the page hung onto the file, as PDF editors save their changes. */
function updated(extra = ''): Buffer {
  const text = signed.toString('latin1');
  const previous = /startxref\n(\d+)/.exec(text)?.[1] ?? '';
  const page = `3 0 obj\n<< /Type /Page /Parent 1 0 R /MediaBox [0 0 595 842] ${extra}>>\nendobj\n`;
  const table = `xref\n3 1\n${String(signed.length + 1).padStart(10, '0')} 00000 n \n`;
  const trailer = `trailer\n<< /Size 65 /Root 2 0 R /Prev ${previous} >>\n`;
  const end = `startxref\n${signed.length + 1 + page.length}\n%%EOF\n`;
  return Buffer.concat([signed, Buffer.from(`\n${page}${table}${trailer}${end}`)]);
}

describe('a certificate as it was issued', () => {
  it('is found untouched, with the number that stands in it', async () => {
    expect(await check(signed)).toEqual({ ok: true, number: 'HQ7K-2M4T-9XWD' });
    expect(numberInPdf(signed)).toBe('HQ7K-2M4T-9XWD');
  });

  it('is found untouched among the keys of years, after its own key has gone out of use', async () => {
    const archive = [...issuersOf(stranger), ...issuers];
    expect(await check(signed, archive)).toMatchObject({ ok: true });
  });

  it('has the fingerprint every other program gives it', async () => {
    // FIPS 180-4, example "abc".
    expect(await sha256Hex(Buffer.from('abc'))).toBe(
      'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad',
    );
    expect(await sha256Hex(signed)).toBe(createHash('sha256').update(signed).digest('hex'));
  });
});

describe('a changed file', () => {
  it('is refused whichever byte was changed, and to whatever', async () => {
    const { gapStart, gapEnd } = signaturePlace(signed);
    const anywhere = fc.nat(signed.length - 1);
    const inTheSignature = fc.integer({ min: gapStart, max: gapEnd - 1 });
    const inItsDictionary = fc.integer({ min: gapStart - 170, max: gapEnd + 400 });
    await fc.assert(
      fc.asyncProperty(
        fc.oneof(anywhere, inTheSignature, inItsDictionary),
        fc.integer({ min: 1, max: 255 }),
        async (at, difference) => {
          const changed = Buffer.from(signed);
          changed[at] = (changed[at] ?? 0) ^ difference;
          expect((await check(changed)).ok).toBe(false);
        },
      ),
      { numRuns: 300 },
    );
  });

  it('is told from others by what was done to it', async () => {
    const content = signed.indexOf('stream\n') + 200;
    expect(await check(overwritten(content, 'X'))).toEqual({
      ok: false,
      number: 'HQ7K-2M4T-9XWD',
      fault: 'changed-after-signing',
      detail:
        'The file was changed after it was signed: its contents no longer match the signature.',
    });
    const renumbered = replaced('(Certificate HQ7K-2M4T-9XWD)', '(Certificate HQ6R-4WNC-8TDK)');
    expect(await check(renumbered)).toMatchObject({
      number: 'HQ6R-4WNC-8TDK',
      fault: 'changed-after-signing',
    });
  });

  it('is refused when the same signature is spelt otherwise', async () => {
    const { gapStart } = signaturePlace(signed);
    const letter = gapStart + signed.subarray(gapStart).toString('latin1').search(/[a-f]/);
    const upper = signed.toString('latin1', letter, letter + 1).toUpperCase();
    expect(await check(overwritten(letter, upper))).toMatchObject({ fault: 'added-to' });
  });
});

describe('a file with something added', () => {
  it('is refused with one byte or a whole version of the page after its end', async () => {
    expect(await check(Buffer.concat([signed, Buffer.from('\n')]))).toMatchObject({
      fault: 'added-to',
      detail: expect.stringContaining('one byte is added') as string,
    });
    expect(await check(updated())).toMatchObject({ fault: 'added-to' });
  });

  it('is refused when it was signed a second time', async () => {
    const again = updated('/Annots [<< /V << /Type /Sig /ByteRange [0 1 2 3] >> >>] ');
    expect(await check(again)).toMatchObject({
      fault: 'added-to',
      detail: 'This PDF was signed again after it was issued.',
    });
  });

  it('is refused when bytes are hidden behind the signature, even one', async () => {
    const { gapEnd } = signaturePlace(signed);
    for (const [at, hidden] of [
      [gapEnd - 3, '01'],
      [gapEnd - 201, 'deadbeef'],
    ] as const) {
      expect(await check(overwritten(at, hidden))).toMatchObject({
        fault: 'added-to',
        detail: expect.stringContaining('hidden') as string,
      });
    }
  });

  it('is refused when the gap was enlarged, though our own key signed what is around it', async () => {
    const key = keyOf(authority);
    for (const gap of [
      (contents: string): string => `${contents.slice(0, -1)}${'00'.repeat(50)}>`,
      (contents: string): string => `${contents} /Note (not signed)`,
      (contents: string): string => ` ${contents}`,
    ]) {
      expect(await check(await signedByHand(key, { gap }))).toMatchObject({ fault: 'added-to' });
    }
    expect(await check(await signedByHand(key, {}))).toMatchObject({ ok: true });
  });

  it('is refused when it holds two versions, though our own key signed both', async () => {
    const key = keyOf(authority);
    for (const end of [
      (tail: string): string => `${tail}\n%%EOF\n`,
      (tail: string): string => tail.replace('startxref', '%%EOF\nstartxref'),
      (tail: string): string => tail.replace('startxref', 'startxref\n0\nstartxref'),
      (tail: string): string => tail.replace('trailer\n<<', 'trailer\n<< /Prev 99'),
      (tail: string): string => tail.replace('trailer\n<<', 'trailer\n<< /XRefStm 99'),
      (tail: string): string => `${tail}\nand more`,
    ]) {
      expect(await check(await signedByHand(key, { end }))).toMatchObject({ fault: 'added-to' });
    }
  });

  it('is refused when the range in it is made to fit', async () => {
    const longer = Buffer.concat([signed, Buffer.from('%%EOF\n')]);
    const [range = '', start, end] = /\/ByteRange \[0 (\d+) (\d+) \d+\]/.exec(
      longer.toString('latin1'),
    ) ?? [''];
    const fitting = `/ByteRange [0 ${start} ${end} ${longer.length - Number(end)}]`;
    expect(fitting).toHaveLength(range.length);
    const changed = overwritten(longer.indexOf(range), fitting, longer);
    expect((await check(changed)).ok).toBe(false);
  });
});

describe('a signature that other programs would take', () => {
  const signedData = [1, 0];
  const signerInfo = [...signedData, 4, 0];
  const addMember =
    (member: Buffer) =>
    (value: Buffer): Buffer => {
      const { tag, content } = readDer(value);
      return der(tag, content, member);
    };
  /** The same signature with the other of the two values of s that verify. */
  const twin = (value: Buffer): Buffer =>
    edited(value, [1], (s) => {
      const order = 0xffffffff00000000ffffffffffffffffbce6faada7179e84f3b9cac2fc632551n;
      const other = order - BigInt(`0x${s.subarray(2).toString('hex')}`);
      return positiveInteger(Buffer.from(other.toString(16).padStart(64, '0'), 'hex'));
    });
  const attribute = Buffer.from('3009060355040331021300', 'hex');
  const strangersRoot = (): Buffer => new X509Certificate(stranger.rootCertificatePem).raw;

  it.each<[string, number[], (value: Buffer) => Buffer]>([
    ['turned into its twin', [...signerInfo, 5, 0], twin],
    ['given an unsigned attribute', signerInfo, addMember(der(0xa1, attribute))],
    ['made by two', [...signedData, 4], (set) => addMember(Buffer.from(readDer(set).content))(set)],
    ['wrapped around content', [...signedData, 2], addMember(der(0xa0, der(0x04)))],
    ['given another certificate', [...signedData, 3], (set) => addMember(strangersRoot())(set)],
    ['without its certificate', [...signedData, 3], () => der(0xa0, strangersRoot())],
    [
      'with the same certificate twice',
      [...signedData, 3],
      (set) => addMember(set.subarray(4))(set),
    ],
    ['of another version', [...signedData, 0], () => Buffer.from('020103', 'hex')],
    ['made with parameters', [...signerInfo, 2], addMember(Buffer.from('0500', 'hex'))],
    ['made another way', [...signerInfo, 4], () => Buffer.from('300a06082a8648ce3d040301', 'hex')],
    ['with another attribute', [...signerInfo, 3], addMember(attribute)],
    ['followed by something', [], addMember(Buffer.from('0500', 'hex'))],
  ])('is refused when it was %s', async (_, path, edit) => {
    const message = Buffer.from(messageOf(signed), 'hex');
    expect(
      await check(
        withMessage(
          signed,
          edited(message, path, (value) => value),
        ),
      ),
    ).toEqual({
      ok: true,
      number: 'HQ7K-2M4T-9XWD',
    });
    expect(await check(withMessage(signed, edited(message, path, edit)))).toMatchObject({
      fault: 'malformed-signature',
    });
  });

  it('is refused when it carries another certificate for the same key than the one it names', async () => {
    const leaf = new X509Certificate(authority.certificatePem).raw;
    const other = edited(leaf, [2], (bits) => {
      const signature = Buffer.from(readDer(bits).content.subarray(1));
      return der(0x03, Buffer.of(0), twin(signature));
    });
    const root = new X509Certificate(authority.rootCertificatePem).raw;
    const message = edited(Buffer.from(messageOf(signed), 'hex'), [...signedData, 3], () =>
      der(0xa0, other, root),
    );
    const pem = new X509Certificate(other).toString();
    const archive: IssuerCertificate[] = [...issuers, { keyId: 'other', kind: 'leaf', pem }];
    expect(await check(withMessage(signed, message), archive)).toMatchObject({
      fault: 'malformed-signature',
      detail: expect.stringContaining('names another certificate') as string,
    });
  });
});

describe('a file of someone else', () => {
  it('is refused when another authority signed it, whatever it calls itself', async () => {
    const forged = await signedCertificate(stranger);
    expect(await check(forged)).toMatchObject({
      number: 'HQ7K-2M4T-9XWD',
      fault: 'wrong-issuer',
    });
  });

  it('is refused when it carries our certificates and a signature that is not over it', async () => {
    // The last number of our signature over the same certificate, a second later.
    const later = await signedCertificate(authority, new Date(signedAt.getTime() + 1000));
    const borrowed = messageOf(later).slice(-64);
    const { gapStart } = signaturePlace(signed);
    const forged = overwritten(gapStart + 1 + messageOf(signed).length - 64, borrowed);
    expect(await check(forged)).toMatchObject({
      fault: 'changed-after-signing',
      detail: expect.stringContaining('does not belong to this file and our key') as string,
    });
  });

  it('is refused when our own authority certified the key but the register does not know it', async () => {
    const [root, leaf] = issuers;
    const [, strangersLeaf] = issuersOf(stranger);
    if (!root || !leaf || !strangersLeaf) throw new Error('An authority has a root and a leaf.');
    expect(await check(signed, [root, strangersLeaf])).toMatchObject({ fault: 'unknown-key' });
    expect(await check(signed, [leaf])).toMatchObject({ fault: 'wrong-issuer' });
    expect(await check(signed, [])).toMatchObject({ fault: 'wrong-issuer' });
  });

  it('is refused when the key was not yet or no longer in date at the time of issue', async () => {
    for (const years of [-1, 6]) {
      const issuedAt = new Date(signedAt.getTime() + years * 366 * 86_400_000);
      expect(await check(signed, issuers, issuedAt)).toMatchObject({
        fault: 'expired-key-at-issue',
        detail: expect.stringContaining(issuedAt.toISOString().slice(0, 10)) as string,
      });
    }
  });
});

describe('a file that is no certificate', () => {
  it.each<[string, () => Uint8Array, string]>([
    ['empty', () => new Uint8Array(0), 'not-a-pdf'],
    ['not a PDF', () => Buffer.from('PK\u0003\u0004'), 'not-a-pdf'],
    ['a PDF without a signature', () => Buffer.from('%PDF-1.7\n%%EOF\n'), 'not-signed'],
    ['cut short after the signature', () => signed.subarray(0, -1), 'changed-after-signing'],
    ['cut short before the signature', () => signed.subarray(0, 5000), 'not-signed'],
    ['cut short within', () => signed.subarray(0, 30_000), 'changed-after-signing'],
    ['cut at its start', () => signed.subarray(1), 'not-a-pdf'],
    ['huge', () => new Uint8Array(5_000_001), 'too-large'],
    ['a range that is none', () => Buffer.from('%PDF-/ByteRange [0 9 '), 'malformed-signature'],
    [
      'a range that lies',
      () => Buffer.from('%PDF-/ByteRange [0 9 5 26]     '),
      'malformed-signature',
    ],
  ])('is refused when it is %s', async (_, file, fault) => {
    expect(await check(file())).toMatchObject({ ok: false, fault });
  });

  it('never makes the check itself fail, however hostile', async () => {
    const { gapStart, gapEnd } = signaturePlace(signed);
    const reserved = (gapEnd - gapStart - 2) / 2;
    const messages = [
      '3080'.repeat(2000),
      '30830fffff',
      '3084ffffffff',
      '1f'.repeat(reserved),
      '30820ff6' + '3000'.repeat(2000),
    ];
    for (const message of messages) {
      const changed = overwritten(gapStart + 1, message.slice(0, reserved * 2));
      expect((await check(changed)).ok).toBe(false);
    }
    const repeated = Buffer.alloc(5_000_000, '%PDF-/ByteRange [0 1 2 3] startxref %%EOF ');
    expect((await check(repeated)).ok).toBe(false);
  });

  it('throws only for an archive that cannot be read', async () => {
    await expect(check(signed, [{ keyId: 'a', kind: 'root', pem: 'nothing' }])).rejects.toThrow(
      'An issuer certificate is not PEM',
    );
  });
});
