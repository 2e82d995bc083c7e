import { createPrivateKey, sign } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { createAuthority, fontFiles, renderCertificate, signPdf } from '@ferrule/certificates';
import { compare, repeated } from './rounds.mjs';

const rounds = 15;
const turn = { milliseconds: 30, batch: 20 };
const drawingRounds = 5;
const signedAt = new Date('2026-12-01T12:00:00Z');

const statement = {
  number: 'HQ7K-2M4T-9XWD',
  holderName: 'Zoë Nguyễn-Łukasiewicz',
  scheme: {
    slug: 'auxiliary-dc-installer',
    revision: 'A',
    title: 'Auxiliary DC systems installer',
  },
  scope: ['Find the voltage drop of a cable run and choose a cable size that keeps within a limit'],
  limits: ['Nothing above 48 V nominal'],
  howSat: 'unsupervised, on the candidate’s own device',
  issuedOn: '2026-12-01',
  expiresOn: '2029-12-01',
  issuer: { name: 'Harrow Quay Technical School', address: 'The Old Ropewalk, Harrow Quay' },
  registerUrl: 'https://register.example/check/0123456789abcdef0123456789abcdef',
  registerPage: 'register.example/check',
};

async function makeKey() {
  const options = { organisation: 'Harrow Quay Technical School', leafYears: 5, rootYears: 10 };
  const authority = await createAuthority({ ...options, now: new Date('2026-11-01T00:00:00Z') });
  const { keyId, privateKeyPem, certificatePem, rootCertificatePem } = authority;
  return { keyId, privateKeyPem, certificatePem, chainPem: [rootCertificatePem] };
}

const readFonts = () =>
  Object.fromEntries(Object.entries(fontFiles()).map(([face, path]) => [face, readFileSync(path)]));

/** Signing a drawn certificate against the bare signature over the same bytes with the same key. */
export async function measureSigning({ signal }) {
  const key = await makeKey();
  const fonts = readFonts();
  const pdf = await renderCertificate(statement, fonts);
  const privateKey = createPrivateKey(key.privateKeyPem);
  const bare = repeated(() => sign('sha256', pdf, privateKey), turn);
  const signing = await compare({
    ours: repeated(() => signPdf(pdf, key, signedAt), turn),
    ...{ rounds, bare, signal },
  });
  const drawAndSign = async () => signPdf(await renderCertificate(statement, fonts), key, signedAt);
  const drawing = await compare({
    ours: repeated(drawAndSign, { milliseconds: 30 }),
    ...{ rounds: drawingRounds, bare, signal },
  });
  return [
    { what: 'Signing a certificate', ...signing.processor },
    { what: 'Drawing and signing it (for information)', ...drawing.processor },
  ];
}
