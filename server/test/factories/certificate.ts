import { createHash } from 'node:crypto';
import { CertificatesService } from '../../src/certificates/certificates.service.ts';
import type { CertificateView } from '../../src/certificates/certificates.schemas.ts';
import type { FileAnswer, RegisterAnswer } from '../../src/register/register.schemas.ts';
import { signIn, stranger, type Caller } from '../sign-in.ts';
import type { TestApp } from '../test-app.ts';
import { createAccount, type TestAccount } from './account.ts';
import { PAPER } from './paper.ts';

export interface Certified {
  readonly account: TestAccount;
  readonly caller: Caller;
  readonly certificate: CertificateView;
}

interface Names {
  readonly givenName?: string;
  readonly familyName?: string;
}

/** A paper that was handed in just now, without its answers. */
async function addSitting(test: TestApp, account: TestAccount) {
  const at = test.clock.now();
  const [row] = await test.query<{ id: string; schemeId: string }>(
    `INSERT INTO sittings (account_id, paper_slug, blueprint_revision_id, scheme_id, rules,
                           agreement_hash, given_name, family_name, started_at, closes_at,
                           handed_in_at, handed_in_how)
     SELECT $1, $2, b.id, s.id, '{}', '', $3, $4, $5, $5::timestamptz + interval '45 minutes', $5, 'by-candidate'
       FROM content_revisions b, schemes s
      WHERE b.kind = 'blueprint' AND b.slug = $2 LIMIT 1 RETURNING id, scheme_id AS "schemeId"`,
    [account.id, PAPER, account.givenName, account.familyName, at],
  );
  if (!row) throw new Error('Publish the paper first.');
  return { ...row, at };
}

/** Decides that a new person passed, and issues the certificate; it is not drawn yet. */
export async function certify(test: TestApp, names: Names = {}) {
  const account = await createAccount(test.app, names);
  const { id: sittingId, schemeId, at } = await addSitting(test, account);
  const { givenName, familyName } = account;
  const certificateId = await test.app.get(CertificatesService, { strict: false }).certify({
    ...{ accountId: account.id, sittingId, schemeId, givenName, familyName },
    howSat: "unsupervised, on the candidate's own device",
    evidence: { sittingId },
    rules: { paper: PAPER },
    decidedAt: at,
  });
  return { account, sittingId, certificateId };
}

/** A person with a certificate, drawn and mailed. */
export async function createCertified(test: TestApp, names: Names = {}): Promise<Certified> {
  const { account } = await certify(test, names);
  await test.runJobs();
  const caller = await signIn(test.app, account.id);
  const { body } = await caller.call('GET', '/api/me/certificates');
  return { account, caller, certificate: body.certificates[0] };
}

/** The bytes of a certificate's file, as its holder downloads it. */
export async function fileOf({ caller, certificate }: Certified): Promise<Buffer> {
  const reply = await caller.call('GET', `/api/certificates/${certificate.id}/file`);
  if (reply.status !== 200) throw new Error(JSON.stringify(reply.body));
  return reply.raw;
}

/** A typed check, from an address of its own where that matters. */
export async function checkByNumber(
  test: TestApp,
  check: { number: string; familyName: string },
  remoteAddress = '127.0.0.1',
) {
  const response = await test.app.inject({
    ...{ method: 'POST', url: '/api/register/checks', remoteAddress, payload: check },
    headers: { 'sec-fetch-site': 'same-origin' },
  });
  return {
    status: response.statusCode,
    headers: response.headers,
    text: response.body,
    body: response.json<RegisterAnswer>(),
  };
}

interface SentFile {
  readonly content: Buffer;
  readonly field?: string;
  readonly address?: string;
}

/** Sends a file to the register as a browser's form does. */
export async function sendFile(test: TestApp, sent: SentFile) {
  const { content, field = 'file', address = '127.0.0.1' } = sent;
  const response = await test.app.inject({
    method: 'POST',
    url: '/api/register/files',
    remoteAddress: address,
    headers: {
      'sec-fetch-site': 'same-origin',
      'content-type': 'multipart/form-data; boundary=seam',
    },
    payload: Buffer.concat([
      Buffer.from(
        `--seam\r\nContent-Disposition: form-data; name="${field}"; filename="certificate.pdf"\r\n` +
          'Content-Type: application/pdf\r\n\r\n',
      ),
      content,
      Buffer.from('\r\n--seam--\r\n'),
    ]),
  });
  return { status: response.statusCode, body: response.json<FileAnswer>() };
}

export async function checkFile(
  test: TestApp,
  content: Buffer,
  address?: string,
): Promise<FileAnswer> {
  const { status, body } = await sendFile(test, { content, ...(address && { address }) });
  if (status !== 200) throw new Error(JSON.stringify(body));
  return body;
}

interface Asked {
  readonly certificate: CertificateView;
  readonly familyName: string;
  readonly file: Buffer;
  readonly address?: string;
}

/** What each of the register's four ways in says of one certificate. */
export async function askEverywhere(test: TestApp, asked: Asked): Promise<RegisterAnswer[]> {
  const { certificate, familyName, file, address } = asked;
  const sha256 = createHash('sha256').update(file).digest('hex');
  const code = certificate.registerUrl.split('/').at(-1) ?? '';
  const anyone = stranger(test.app);
  const typed = await checkByNumber(test, { number: certificate.number, familyName }, address);
  const linked = await anyone.call('GET', `/api/register/links/${code}`);
  const hashed = await anyone.call('GET', `/api/register/files/${sha256}`);
  const uploaded = await checkFile(test, file, address);
  const { answer, checkedAt, certificate: found } = hashed.body as RegisterAnswer;
  const byHash = { answer, checkedAt, certificate: found };
  return [typed.body, linked.body as RegisterAnswer, byHash, uploaded.register];
}
