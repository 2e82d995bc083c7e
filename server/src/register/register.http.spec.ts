import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { createAuthority, renderCertificate, signPdf } from '@ferrule/certificates';
import { randomBytes } from 'node:crypto';
import { certificateFonts } from '../certificates/certificate-fonts.ts';
import { readKey } from '../certificates/keys/key-folder.ts';
import {
  checkByNumber,
  checkFile,
  createCertified,
  fileOf,
  sendFile,
  type Certified,
} from '../../test/factories/certificate.ts';
import { publishPaper } from '../../test/factories/paper.ts';
import { stranger } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { Issuers } from './register.schemas.ts';

let test: TestApp;
let zoe: Certified;
let file: Buffer;
beforeAll(async () => {
  test = await createTestApp();
  await publishPaper(test);
  zoe = await createCertified(test, { givenName: 'Zoë', familyName: 'Nguyễn-Łukasiewicz' });
  file = await fileOf(zoe);
});
afterAll(() => test?.close());

/** The day after, when nobody has to wait any more. */
const later = () => test.clock.advance(26 * 60);
const check = (number: string, familyName: string, address?: string) =>
  checkByNumber(test, { number, familyName }, address);
const codeOf = ({ certificate }: Certified) => certificate.registerUrl.split('/').at(-1) ?? '';

describe('a check by number and family name', () => {
  it('answers with what is printed on the certificate and its state, and nothing else', async () => {
    test.clock.set('2026-12-01T12:43:37Z');
    const { status, body, headers } = await check(zoe.certificate.number, 'Nguyễn-Łukasiewicz');
    expect(status).toBe(200);
    expect(body).toEqual({
      answer: 'valid',
      checkedAt: '2026-12-01T12:43:00.000Z',
      certificate: {
        number: zoe.certificate.number,
        holderName: 'Zoë Nguyễn-Łukasiewicz',
        scheme: { title: 'Auxiliary DC systems installer', revision: 'A' },
        scope: ['Sizes two-wire runs'],
        limits: ['Nothing above 50 V'],
        howSat: "unsupervised, on the candidate's own device",
        issuedOn: '2026-12-01',
        expiresOn: '2029-12-01',
        withdrawnOn: null,
      },
    });
    expect(headers).toMatchObject({
      'x-robots-tag': 'noindex, nofollow',
      'cache-control': 'no-store',
    });
  });

  it.each([
    [
      'small letters and spaces',
      (number: string) => number.toLowerCase().replaceAll('-', ' '),
      'NGUYEN LUKASIEWICZ',
    ],
    [
      'neither dashes nor accents',
      (number: string) => number.replaceAll('-', ''),
      'nguyenlukasiewicz',
    ],
  ])('takes %s', async (_, write, name) => {
    expect((await check(write(zoe.certificate.number), name)).body.answer).toBe('valid');
  });

  it('knows people with one name, and names with and without their particle', async () => {
    const one = await createCertified(test, { givenName: 'Sukarno', familyName: '' });
    expect((await check(one.certificate.number, 'sukarno')).body).toMatchObject({
      answer: 'valid',
      certificate: { holderName: 'Sukarno' },
    });
    const meer = await createCertified(test, { givenName: 'Priya', familyName: 'van der Meer' });
    expect((await check(meer.certificate.number, 'Meer')).body.answer).toBe('valid');
  });

  it('answers an unknown number, a wrong name and a misread number with the same bytes', async () => {
    const { number } = zoe.certificate;
    const tries = [
      await check(number, 'Castellan'),
      await check(number, ''),
      await check(number, 'Zoë'),
      await check('HQ7K-2M4T-9XWD', 'Nguyễn-Łukasiewicz'),
      await check(`${number.slice(0, -1)}O`, 'Nguyễn-Łukasiewicz'),
      await check('', ''),
    ];
    const headersOf = (one: (typeof tries)[number]) => ({ ...one.headers, date: '' });
    for (const one of tries) {
      expect([one.status, one.text]).toEqual([200, tries[0]?.text]);
      expect(headersOf(one)).toEqual(tries[0] && headersOf(tries[0]));
    }
    expect(tries[0]?.body).toMatchObject({ answer: 'not-on-register', certificate: null });
  });

  it('says that a certificate has expired from the day after its last', async () => {
    const { number } = zoe.certificate;
    const startedAt = test.clock.now();
    test.clock.set('2029-12-01T23:59:00Z');
    expect((await check(number, 'Nguyễn-Łukasiewicz')).body.answer).toBe('valid');
    test.clock.set('2029-12-02T00:00:00Z');
    expect((await check(number, 'Nguyễn-Łukasiewicz')).body.answer).toBe('expired');
    test.clock.set(startedAt);
  });

  it.each([
    {},
    { number: 'HQ7K-2M4T-9XWD' },
    { number: 1, familyName: 'x' },
    { number: 'x'.repeat(201), familyName: '' },
  ])('is refused when it is not in order: %j', async (body) => {
    expect((await stranger(test.app).call('POST', '/api/register/checks', body)).status).toBe(422);
  });
});

describe('trying names and numbers out', () => {
  it('is slowed down at one address, while others are answered', async () => {
    later();
    const from = '203.0.113.9';
    for (let index = 0; index < 30; index += 1) {
      expect((await check('HQ7K-2M4T-9XWO', 'x', from)).status).toBe(200);
    }
    const refused = await check(zoe.certificate.number, 'Nguyễn-Łukasiewicz', from);
    expect([refused.status, refused.headers['retry-after']]).toEqual([429, '10']);
    expect((await check(zoe.certificate.number, 'Nguyễn-Łukasiewicz')).status).toBe(200);
    test.clock.advance(1);
    expect((await check(zoe.certificate.number, 'Nguyễn-Łukasiewicz', from)).status).toBe(200);
  });

  it.each([
    ['a number on the register', () => zoe.certificate.number],
    ['a number that is not', () => 'HQ7K-2M4T-9XWD'],
  ])('is slowed down for %s, wherever it comes from', async (_, number) => {
    later();
    for (let index = 0; index < 10; index += 1) {
      expect((await check(number(), `name ${index}`, `198.51.100.${index}`)).status).toBe(200);
    }
    expect((await check(number(), 'Nguyễn-Łukasiewicz', '198.51.100.99')).status).toBe(429);
    const linked = await stranger(test.app).call('GET', `/api/register/links/${codeOf(zoe)}`);
    expect(linked.body.answer).toBe('valid');
  });

  it('does not count a check that found its certificate', async () => {
    later();
    for (let index = 0; index < 35; index += 1) {
      expect((await check(zoe.certificate.number, 'Nguyễn-Łukasiewicz')).body.answer).toBe('valid');
    }
  });
});

describe('the code behind the link', () => {
  it('is of 128 random bits, and any other says what every miss says', async () => {
    expect(Buffer.from(codeOf(zoe), 'base64url')).toHaveLength(16);
    const anyone = stranger(test.app);
    const found = await anyone.call('GET', `/api/register/links/${codeOf(zoe)}`);
    expect(found.body.certificate.holderName).toBe('Zoë Nguyễn-Łukasiewicz');
    const missed = await check('HQ7K-2M4T-9XWD', 'x', '192.0.2.1');
    for (const code of [
      randomBytes(16).toString('base64url'),
      zoe.certificate.number,
      zoe.certificate.id,
    ]) {
      const reply = await anyone.call('GET', `/api/register/links/${code}`);
      expect([reply.status, reply.raw.toString()]).toEqual([200, missed.text]);
    }
  });
});

describe('the addresses that are only read', () => {
  it('answer one visitor no more than so often in a minute', async () => {
    const follow = async (remoteAddress: string) =>
      test.app.inject({ url: `/api/register/links/${codeOf(zoe)}`, remoteAddress });
    for (let index = 0; index < 120; index += 1) {
      expect((await follow('203.0.113.77')).statusCode).toBe(200);
    }
    const refused = await follow('203.0.113.77');
    expect([refused.statusCode, refused.json<{ type: string }>().type]).toEqual([
      429,
      '/problems/too-many-attempts',
    ]);
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
    expect((await follow('203.0.113.78')).statusCode).toBe(200);
  });
});

describe('the list of issuers', () => {
  it('holds public certificates and no private key', async () => {
    const { body } = await stranger(test.app).call('GET', '/api/register/issuers');
    const { issuers } = body as Issuers;
    expect(issuers.map(({ kind }) => kind).sort()).toEqual(['leaf', 'root']);
    expect(JSON.stringify(issuers)).not.toContain('PRIVATE');
  });
});

describe('a file sent to be looked at', () => {
  const changed = (at: number) => {
    const copy = Buffer.from(file);
    copy.writeUInt8(copy.readUInt8(at) ^ 1, at);
    return copy;
  };
  const append = (text: string) => Buffer.concat([file, Buffer.from(text)]);

  /** What the certificate says, for somebody who wants to sign it himself. */
  async function unsigned(number = zoe.certificate.number) {
    const { registerUrl, scope, limits, howSat, issuedOn, expiresOn } = zoe.certificate;
    return renderCertificate(
      {
        ...{ number, registerUrl, scope, limits, howSat, issuedOn, expiresOn },
        ...{ holderName: 'Mallory Quick', registerPage: '127.0.0.1:4780/check' },
        scheme: { slug: 'dc-installer', revision: 'A', title: 'Auxiliary DC systems installer' },
        issuer: { name: 'Harrow Quay Technical School', address: 'The Old Ropewalk' },
      },
      await certificateFonts(),
    );
  }

  /** Refused, for this reason, with nothing said about anybody. */
  async function refused(content: Buffer, fault: string) {
    const answer = await checkFile(test, content);
    expect(answer.file).toBe(fault);
    expect(answer.detail).not.toBe('');
    expect(answer.register).toMatchObject({ answer: 'not-on-register', certificate: null });
    expect(JSON.stringify(answer)).not.toContain('Zoë');
    return answer;
  }

  beforeAll(later);

  it('is known when it is the very file that was issued', async () => {
    const answer = await checkFile(test, file);
    expect(answer).toMatchObject({
      ...{ file: 'the-very-file', number: zoe.certificate.number },
      register: { answer: 'valid', certificate: { holderName: 'Zoë Nguyễn-Łukasiewicz' } },
    });
  });

  it('is refused when one byte of what was signed is changed', async () => {
    const at = file.indexOf('/Title');
    expect(await refused(changed(at + 8), 'changed-after-signing')).toMatchObject({
      number: zoe.certificate.number,
    });
    await refused(changed(file.length - 40), 'changed-after-signing');
  });

  it('is refused when something is appended', async () => {
    await refused(append('\n'), 'added-to');
    await refused(append('\n%%EOF\n'), 'added-to');
  });

  it('is refused when it was saved again on top of the signed file', async () => {
    const start = /startxref\s+(\d+)/.exec(file.toString('latin1'))?.[1] ?? '0';
    const update = `\n9 0 obj\n<< /Type /Page >>\nendobj\nxref\n0 0\ntrailer\n<< /Prev ${start} >>\nstartxref\n${file.length + 1}\n%%EOF\n`;
    await refused(append(update), 'added-to');
  });

  it('is refused when it was signed by another authority of the same name', async () => {
    const foreign = await createAuthority({
      ...{ organisation: 'Harrow Quay Technical School', now: new Date('2026-01-01T00:00:00Z') },
      ...{ leafYears: 5, rootYears: 20 },
    });
    const key = { ...foreign, chainPem: [foreign.rootCertificatePem] };
    const forged = await signPdf(await unsigned(), key, test.clock.now());
    await refused(Buffer.from(forged), 'wrong-issuer');
  });

  it('is not taken for the file of the register even when our own key signed it', async () => {
    const key = await readKey(test.keysFolder);
    for (const number of [zoe.certificate.number, 'HQ7K-2M4T-9XWD']) {
      const forged = await signPdf(await unsigned(number), key, test.clock.now());
      await refused(Buffer.from(forged), 'not-on-register');
    }
  });

  it.each([
    ['a picture', Buffer.from('\u0089PNG'), 'not-a-pdf'],
    ['nothing', Buffer.alloc(0), 'not-a-pdf'],
    ['a PDF without a signature', Buffer.from('%PDF-1.7\n%%EOF\n'), 'not-signed'],
  ])('is refused when it is %s', async (_, content, fault) => {
    await refused(content, fault);
  });

  it('must be one file of at most 5 MB in its field', async () => {
    const large = await sendFile(test, { content: Buffer.alloc(5_000_001, 'x') });
    expect([large.status, large.body]).toMatchObject([
      413,
      { type: '/problems/payload-too-large' },
    ]);
    const elsewhere = await sendFile(test, { content: file, field: 'photo' });
    expect(elsewhere.status).toBe(422);
    const json = await stranger(test.app).call('POST', '/api/register/files', { file: 'x' });
    expect([json.status, json.body.errors[0].pointer]).toEqual([422, '#/file']);
    const torn = await test.app.inject({
      ...{
        method: 'POST',
        url: '/api/register/files',
        payload: '--seam\r\nContent-Disposition: fo',
      },
      headers: {
        'sec-fetch-site': 'same-origin',
        'content-type': 'multipart/form-data; boundary=seam',
      },
    });
    expect(torn.statusCode).toBe(422);
  });

  it('is no longer taken from an address that sends many', async () => {
    later();
    const content = Buffer.from('x');
    const address = '203.0.113.50';
    for (let index = 0; index < 30; index += 1) {
      expect((await sendFile(test, { content, address })).status).toBe(200);
    }
    expect((await sendFile(test, { content, address })).status).toBe(429);
    expect((await sendFile(test, { content })).status).toBe(200);
  });
});

describe('the hash of a file that stays with the visitor', () => {
  it('is answered with the time the file was signed at, or as every miss', async () => {
    const { sha256Hex } = await import('@ferrule/certificates/verify');
    const anyone = stranger(test.app);
    const hash = await sha256Hex(file);
    for (const sha256 of [hash, hash.toUpperCase()]) {
      const { body } = await anyone.call('GET', `/api/register/files/${sha256}`);
      expect(body).toMatchObject({ answer: 'valid', signedAt: '2026-12-01T10:00:00.000Z' });
    }
    const missed = await anyone.call('GET', `/api/register/files/${'0'.repeat(64)}`);
    expect(missed.body).toMatchObject({
      ...{ answer: 'not-on-register', certificate: null, signedAt: null },
    });
    expect((await anyone.call('GET', '/api/register/files/abc')).status).toBe(422);
  });
});
