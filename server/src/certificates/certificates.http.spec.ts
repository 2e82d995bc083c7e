import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { randomUUID } from 'node:crypto';
import type { Role } from '../accounts/account.ts';
import { createAccount } from '../../test/factories/account.ts';
import {
  askEverywhere,
  certify,
  createCertified,
  fileOf,
  type Certified,
} from '../../test/factories/certificate.ts';
import { PAPER, publishPaper } from '../../test/factories/paper.ts';
import {
  answerAll,
  createCandidate,
  handIn,
  startPaper,
  type Candidate,
} from '../../test/factories/sitting.ts';
import { Bench } from '../../test/outside.ts';
import { signIn, stranger, type Caller } from '../../test/sign-in.ts';
import { createTestApp, type TestApp } from '../../test/test-app.ts';
import type { CertificatesPage, CertificateView } from './certificates.schemas.ts';

let test: TestApp;
const bench = new Bench();
beforeAll(async () => {
  test = await createTestApp();
  await publishPaper(test);
});
afterAll(async () => {
  bench.remove();
  await test?.close();
});

const desk = async (...roles: Role[]): Promise<Caller> =>
  signIn(test.app, (await createAccount(test.app, { roles })).id);
const pathOf = ({ certificate }: Certified) => `/api/certificates/${certificate.id}`;
/** The newest mail to somebody about certificates. */
const newestMail = ({ email }: { email: string }) => {
  const mail = test.mails.sent.findLast(
    ({ to, subject }) =>
      (to as { address: string }).address === email && subject?.includes('certificate'),
  );
  const pdf = mail?.attachments?.find(({ filename }) => String(filename).endsWith('.pdf'));
  return { subject: mail?.subject, text: mail?.text as string, pdf: pdf?.content as Buffer };
};

describe('a passed paper', () => {
  let candidate: Candidate;
  let certified: Certified;
  let file: Buffer;
  beforeAll(async () => {
    candidate = await createCandidate(test);
    const sitting = await startPaper(candidate);
    await answerAll(candidate.caller, sitting);
    await handIn(candidate.caller, sitting);
    await test.runJobs();
    const { body } = await candidate.caller.call('GET', '/api/me/certificates');
    certified = { ...candidate, certificate: body.certificates[0] };
    file = await fileOf(certified);
  });

  it('leads to a certificate that says what was assessed and how', async () => {
    const { body } = await candidate.caller.call('GET', pathOf(certified));
    expect(body).toEqual({
      ...certified.certificate,
      ...{ holderName: 'Ifeoma Castellan', state: 'valid', ready: true },
      ...{ issuedOn: '2026-12-01', expiresOn: '2029-12-01' },
      scheme: { title: 'Auxiliary DC systems installer', revision: 'A' },
      scope: ['Sizes two-wire runs'],
      limits: ['Nothing above 50 V'],
      howSat: "unsupervised, on the candidate's own device",
      ...{ replacedBy: null, withdrawn: null },
    });
    const { history } = body as CertificateView;
    expect(history.map(({ what }) => what)).toEqual([
      'Issued. Passed the paper.',
      expect.stringMatching(/^Drawn and signed with key [0-9a-f]{16}\.$/),
    ]);
    const paper = await candidate.caller.call('GET', `/api/papers/${PAPER}`);
    expect(paper.body.standing.certificateId).toBe(certified.certificate.id);
  });

  it('sends the very file by mail that the holder downloads', async () => {
    const reply = await candidate.caller.call('GET', `${pathOf(certified)}/file`);
    const { number } = certified.certificate;
    expect(reply.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-disposition': `attachment; filename="certificate-${number}.pdf"`,
      'cache-control': 'no-store',
      'x-robots-tag': 'noindex, nofollow',
    });
    const mail = newestMail(candidate.account);
    expect(mail.subject).toBe(`Your certificate ${number}`);
    expect(mail.pdf.equals(reply.raw)).toBe(true);
  });

  it('makes a file that other programs find signed, whole and trusted', async () => {
    const [root] = await test.query<{ pem: string }>(
      "SELECT pem FROM issuer_certificates WHERE kind = 'root'",
    );
    bench.write('root.pem', root?.pem ?? '');
    bench.write('signed.pdf', file);
    const here = ['-d', 'sql:.'];
    bench.run('certutil', '-N', ...here, '--empty-password');
    bench.run('certutil', '-A', ...here, '-n', 'root', '-t', 'CT,C,C', '-a', '-i', 'root.pem');
    const { said } = bench.run('pdfsig', '-nssdir', 'sql:.', 'signed.pdf');
    expect(said).toContain('Total document signed');
    expect(said).toContain('Signature is Valid.');
    expect(said).toContain('Certificate is Trusted.');
    expect(bench.run('qpdf', '--check', 'signed.pdf').status).toBe(0);
  });

  it('makes a file with a CAdES signature', () => {
    const [, start = '', end = ''] =
      /\/ByteRange \[0 (\d+) (\d+)/.exec(file.toString('latin1')) ?? [];
    const hex = file.toString('latin1', Number(start) + 1, Number(end) - 1);
    bench.write(
      'content',
      Buffer.concat([file.subarray(0, Number(start)), file.subarray(Number(end))]),
    );
    bench.write('signature', Buffer.from(hex, 'hex'));
    const verified = bench.run(
      ...['openssl', 'cms', '-verify', '-binary', '-cades', '-inform', 'DER', '-in', 'signature'],
      ...['-content', 'content', '-CAfile', 'root.pem', '-out', 'verified'],
    );
    expect(verified.said).toContain('CAdES Verification successful');
  });

  it('prints what the record says, and the code that leads to it', async () => {
    const { said } = bench.run('pdftotext', '-layout', 'signed.pdf', '-');
    const { number, scheme, scope, limits, registerUrl } = certified.certificate;
    for (const printed of [
      ...[number, 'Ifeoma Castellan', scheme.title, ...scope, ...limits],
      ...['1 December 2026', '1 December 2029', '127.0.0.1:4780/check'],
    ]) {
      expect(said).toContain(printed);
    }
    bench.run('pdftoppm', '-r', '150', '-png', '-singlefile', 'signed.pdf', 'page');
    expect(bench.run('zbarimg', '-q', '--raw', 'page.png').result.trim()).toBe(registerUrl);
    const code = registerUrl.split('/').at(-1) ?? '';
    const { body } = await stranger(test.app).call('GET', `/api/register/links/${code}`);
    expect(body).toMatchObject({ answer: 'valid', certificate: { number } });
  });
});

describe('a certificate', () => {
  let certified: Certified;
  beforeAll(async () => {
    certified = await createCertified(test, { givenName: 'Zoë', familyName: 'Nguyễn-Łukasiewicz' });
  });

  it('is shown to its holder and to the desk alone', async () => {
    for (const path of [pathOf(certified), `${pathOf(certified)}/file`]) {
      const seenBy = async (caller: Caller) => (await caller.call('GET', path)).status;
      expect(await seenBy(stranger(test.app))).toBe(401);
      expect(await seenBy(await desk('trainee'))).toBe(404);
      expect(await seenBy(await desk('trainer'))).toBe(404);
      expect(await seenBy(certified.caller)).toBe(200);
      expect(await seenBy(await desk('certification-manager'))).toBe(200);
      expect(await seenBy(await desk('administrator'))).toBe(200);
    }
  });

  it('is not shown to an administrator who has not given the second factor', async () => {
    const caller = await desk('administrator');
    await test.query('UPDATE sessions SET second_factor_at = NULL WHERE id = $1 RETURNING id', [
      caller.sessionId,
    ]);
    expect((await caller.call('GET', pathOf(certified))).status).toBe(404);
    expect((await caller.call('GET', '/api/certificates')).body.type).toBe(
      '/problems/second-factor-needed',
    );
  });

  it.each([
    ['part of its number', () => certified.certificate.number.slice(0, 11).toLowerCase()],
    ['its number with spaces', () => certified.certificate.number.replaceAll('-', ' ')],
    ['part of the name as written', () => 'zoë ng'],
    ['the family name without its accents', () => 'nguyen lukasiewicz'],
  ])('is found at the desk by %s', async (_, typed) => {
    const caller = await desk('certification-manager');
    const { body } = await caller.call(
      'GET',
      `/api/certificates?find=${encodeURIComponent(typed())}`,
    );
    const { certificates } = body as CertificatesPage;
    expect(certificates.map(({ id }) => id)).toContain(certified.certificate.id);
    const none = await caller.call('GET', '/api/certificates?find=%25');
    expect(none.body).toEqual({ certificates: [], nextCursor: null });
  });

  it('is listed to nobody else', async () => {
    expect((await certified.caller.call('GET', '/api/certificates')).status).toBe(403);
    const other = await desk('trainee');
    expect((await other.call('GET', '/api/me/certificates')).body).toEqual({ certificates: [] });
  });

  it('has no file until it is drawn', async () => {
    const { account, certificateId } = await certify(test);
    const caller = await signIn(test.app, account.id);
    const reply = await caller.call('GET', `/api/certificates/${certificateId}/file`);
    expect([reply.status, reply.body.type]).toEqual([409, '/problems/certificate-not-drawn']);
    const { body } = await caller.call('GET', `/api/certificates/${certificateId}`);
    expect([body.ready, body.state]).toEqual([false, 'valid']);
    await test.runJobs();
  });

  it.each([
    [`/api/certificates/${randomUUID()}`, 404],
    ['/api/certificates/1', 422],
    ['/api/certificates?cursor=bm8', 422],
    [`/api/certificates?find=${'x'.repeat(101)}`, 422],
  ])('asked for at %s is %i', async (path, status) => {
    expect((await (await desk('certification-manager')).call('GET', path)).status).toBe(status);
  });
});

describe('a withdrawal', () => {
  it('needs an administrator, a reason and a fresh sign-in', async () => {
    const certified = await createCertified(test);
    const path = `${pathOf(certified)}/withdrawal`;
    const reason = 'Sat by somebody else';
    const manager = await desk('certification-manager');
    expect((await manager.call('POST', path, { reason })).status).toBe(403);
    const administrator = await desk('administrator');
    for (const body of [{}, { reason: ' ' }, { reason: 'a\nb' }, { reason, more: 1 }]) {
      expect((await administrator.call('POST', path, body)).status).toBe(422);
    }
    const elsewhere = `/api/certificates/${randomUUID()}/withdrawal`;
    expect((await administrator.call('POST', elsewhere, { reason })).status).toBe(404);
    test.clock.advance(16);
    const stale = await administrator.call('POST', path, { reason });
    expect([stale.status, stale.body.type]).toEqual([403, '/problems/fresh-sign-in-needed']);
    expect((await certified.caller.call('GET', pathOf(certified))).body.state).toBe('valid');
  });

  it('shows at once wherever one looks, and is told to the holder', async () => {
    const certified = await createCertified(test);
    const file = await fileOf(certified);
    const asked = { ...certified, familyName: 'Castellan', file };
    const before = await askEverywhere(test, asked);
    expect(before.map(({ answer }) => answer)).toEqual(Array(4).fill('valid'));

    const administrator = await desk('administrator');
    const reason = 'Sat by somebody else';
    const reply = await administrator.call('POST', `${pathOf(certified)}/withdrawal`, { reason });
    expect(reply.status).toBe(200);
    expect(reply.body).toMatchObject({
      state: 'withdrawn',
      withdrawn: { on: '2026-12-01', reason },
    });
    expect((reply.body as CertificateView).history.at(-1)).toMatchObject({
      what: `Withdrawn: ${reason}`,
      by: 'Ifeoma Castellan',
    });
    for (const { answer, certificate } of await askEverywhere(test, asked)) {
      expect(answer).toBe('withdrawn');
      expect(certificate).toMatchObject({ holderName: null, withdrawnOn: '2026-12-01' });
      expect(JSON.stringify(certificate)).not.toContain(reason);
    }
    await test.runJobs();
    const { subject, text } = newestMail(certified.account);
    expect(subject).toBe(`Your certificate ${certified.certificate.number} was withdrawn`);
    expect(text).toContain(reason);
    expect(
      (await certified.caller.call('GET', `/api/papers/${PAPER}`)).body.standing.state,
    ).not.toBe('passed');
  });

  it('is for good', async () => {
    const certified = await createCertified(test);
    const administrator = await desk('administrator');
    const act = (what: string, body: object) =>
      administrator.call('POST', `${pathOf(certified)}/${what}`, body);
    const reason = 'Sat by somebody else';
    await act('withdrawal', { reason });
    const again = await act('withdrawal', { reason });
    expect([again.status, again.body.type]).toEqual([409, '/problems/certificate-withdrawn']);
    const name = { givenName: 'Ifeoma', familyName: 'Castellane', reason };
    expect((await act('name-correction', name)).status).toBe(409);
  });

  it("is nobody's to decide about a certificate of their own", async () => {
    const certified = await createCertified(test);
    await test.query(
      "INSERT INTO account_roles (account_id, role) VALUES ($1, 'administrator') RETURNING role",
      [certified.account.id],
    );
    const reply = await certified.caller.call('POST', `${pathOf(certified)}/name-correction`, {
      ...{ givenName: 'Somebody', familyName: 'Else', reason: 'Sold' },
    });
    expect([reply.status, reply.body.type]).toEqual([409, '/problems/not-on-oneself']);
  });
});

describe('a corrected name', () => {
  let misspelt: Certified;
  beforeAll(async () => {
    misspelt = await createCertified(test);
  });

  it('is a new certificate with the same dates, and the old one says so everywhere', async () => {
    test.clock.set('2027-02-03T12:00:00Z');
    const certified = await createCertified(test, { givenName: 'Pria', familyName: 'Vandermeer' });
    const file = await fileOf(certified);
    test.clock.set('2027-03-01T10:00:00Z');
    const administrator = await desk('administrator');
    const { status, body } = await administrator.call(
      'POST',
      `${pathOf(certified)}/name-correction`,
      {
        ...{ givenName: 'Priya', familyName: 'van der Meer', reason: 'Misspelt by the office' },
      },
    );
    expect(status).toBe(201);
    expect(body).toMatchObject({
      ...{ holderName: 'Priya van der Meer', state: 'valid', ready: false },
      ...{ issuedOn: '2027-02-03', expiresOn: '2030-02-03' },
    });
    await test.runJobs();

    const caller = await signIn(test.app, certified.account.id);
    const corrected: Certified = { ...certified, caller, certificate: body };
    const newFile = await fileOf(corrected);
    const oldOnes = { ...certified, familyName: 'Vandermeer', file };
    const newOnes = { ...corrected, familyName: 'Meer', file: newFile };
    for (const { answer } of await askEverywhere(test, oldOnes)) expect(answer).toBe('superseded');
    for (const { answer, certificate } of await askEverywhere(test, newOnes)) {
      expect([answer, certificate?.holderName]).toEqual(['valid', 'Priya van der Meer']);
    }
    const { body: old } = await caller.call('GET', pathOf(certified));
    expect([old.state, old.replacedBy]).toEqual(['superseded', body.number]);
    const mail = newestMail(certified.account);
    expect(mail.subject).toBe(`Your corrected certificate ${body.number}`);
    expect(mail.text).toContain(certified.certificate.number);
    expect(mail.pdf.equals(newFile)).toBe(true);

    const again = await (
      await desk('administrator')
    ).call('POST', `${pathOf(certified)}/withdrawal`, {
      reason: 'Sold',
    });
    expect(again.body).toMatchObject({
      type: '/problems/certificate-replaced',
      replacedBy: body.number,
    });
  });

  it.each([
    [{ givenName: 'Ifeoma', familyName: 'Castellan' }, '#/givenName', 'already says'],
    [{ givenName: '王', familyName: 'Castellan' }, '#/givenName', 'no letter for “王”'],
    [{ givenName: 'Ada', familyName: '王' }, '#/familyName', 'no letter for “王”'],
    [{ givenName: '-', familyName: '' }, '#/givenName', 'at least one letter'],
    [{ givenName: ' ', familyName: 'Castellan' }, '#/givenName', 'Type the name'],
    [{ givenName: 'A'.repeat(101), familyName: '' }, '#/givenName', ''],
  ])('is refused when it is %j', async (name, pointer, says) => {
    const { status, body } = await (
      await desk('administrator')
    ).call('POST', `${pathOf(misspelt)}/name-correction`, { ...name, reason: 'Misspelt' });
    expect([status, body.errors[0].pointer]).toEqual([422, pointer]);
    expect(body.errors[0].detail).toContain(says);
    const { body: after } = await (await desk('administrator')).call('GET', pathOf(misspelt));
    expect(after.state).toBe('valid');
  });
});
