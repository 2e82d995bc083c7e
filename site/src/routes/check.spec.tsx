import { screen } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { type RegisterAnswer } from '../api/views.ts';
import { apiServer, problemReply, serve, serveWith } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

const valid: RegisterAnswer = {
  answer: 'valid',
  checkedAt: '2026-12-01T12:43:00Z',
  certificate: {
    number: 'HQ7K-2M4T-9XWD',
    holderName: 'Priya Vandermeer',
    scheme: { title: 'Auxiliary DC systems installer', revision: 'F' },
    scope: ['Cable sizing'],
    limits: ['AC mains'],
    howSat: 'Unsupervised, on the candidate’s own device',
    issuedOn: '2026-11-03',
    expiresOn: '2029-11-03',
    withdrawnOn: null,
  },
};

async function check(number: string, familyName: string) {
  const page = renderRoute('/check');
  await page.user.type(await screen.findByLabelText('Certificate number'), number);
  await page.user.type(screen.getByLabelText('Holder’s family name'), familyName);
  await page.user.click(screen.getByRole('button', { name: 'Check' }));
  return page;
}

it('says in a word that a certificate is valid, and moves there', async () => {
  serve('post', '/api/register/checks', valid);
  await check('hq7k 2m4t 9xwd', 'vandermeer');
  const word = await screen.findByRole('heading', { level: 1, name: 'Valid' });
  expect(word).toHaveFocus();
  expect(screen.getByText('until 3 November 2029')).toBeVisible();
  expect(screen.getByText('Priya Vandermeer')).toBeVisible();
  expect(screen.getByText(/1 December 2026 at 12:43 UTC/)).toBeVisible();
});

it('carries a check over from the front page', async () => {
  serve('get', '/api/front', {
    demonstration: false,
    school: { name: 'Harrow Quay Technical School', address: 'The Old Ropewalk' },
    course: null,
    people: [],
    joinCode: null,
  });
  serve('post', '/api/register/checks', valid);
  const { user } = renderRoute('/');
  await user.type(await screen.findByLabelText('Certificate number'), 'HQ7K-2M4T-9XWD');
  await user.type(screen.getByLabelText('Holder’s family name'), 'Vandermeer');
  await user.click(screen.getByRole('button', { name: 'Check' }));
  expect(await screen.findByRole('heading', { level: 1, name: 'Valid' })).toBeVisible();
});

it('shows back what was typed when nothing goes with it', async () => {
  serve('post', '/api/register/checks', { ...valid, answer: 'not-on-register', certificate: null });
  await check('HQ7K-2M4T-9XWO', 'Vandermeer');
  expect(
    await screen.findByRole('heading', { level: 1, name: 'Not on the register' }),
  ).toBeVisible();
  expect(screen.getByText('HQ7K-2M4T-9XWO')).toBeVisible();
  expect(screen.getByText(/never use the letters O and I/)).toBeVisible();
});

it('never says valid or not valid when the register is silent', async () => {
  apiServer.use(http.post('*/api/register/checks', () => HttpResponse.error()));
  await check('HQ7K-2M4T-9XWD', 'Vandermeer');
  expect(await screen.findByRole('alert')).toHaveTextContent('The register did not answer');
  expect(screen.getByRole('heading', { level: 1 })).toHaveTextContent('Check a certificate');
});

it('says how long to wait after too many checks', async () => {
  serveWith('post', '/api/register/checks', () =>
    problemReply(429, 'too-many-attempts', { retryAfterSeconds: 600 }),
  );
  await check('HQ7K-2M4T-9XWD', 'Vandermeer');
  expect(await screen.findByRole('alert')).toHaveTextContent('Try again in 10 minutes.');
});

it('names nobody on a withdrawn certificate behind its code', async () => {
  const certificate = valid.certificate && {
    ...valid.certificate,
    holderName: null,
    withdrawnOn: '2026-11-22',
  };
  serve('get', '/api/register/links/:code', { ...valid, answer: 'withdrawn', certificate });
  renderRoute('/check/abc');
  expect(await screen.findByRole('heading', { level: 1, name: 'Withdrawn' })).toBeVisible();
  expect(screen.getByText('on 22 November 2026')).toBeVisible();
  expect(screen.queryByText('Holder')).toBeNull();
  expect(screen.queryByText('Assessed')).toBeNull();
});

it('looks at a dropped file here and sends it only when asked', async () => {
  const missing: RegisterAnswer = { ...valid, answer: 'not-on-register', certificate: null };
  const uploads: string[] = [];
  serve('get', '/api/register/files/:sha256', { ...missing, signedAt: null });
  serve('get', '/api/register/issuers', { issuers: [] });
  apiServer.use(
    http.post('*/api/register/files', ({ request }) => {
      uploads.push(request.headers.get('content-type') ?? '');
      return HttpResponse.json({
        file: 'not-a-pdf',
        detail: 'No PDF header.',
        number: null,
        register: missing,
      });
    }),
  );
  const { user } = renderRoute('/check');
  const file = new File(['just some words'], 'certificate.pdf', { type: 'application/pdf' });
  await user.upload(await screen.findByLabelText('The certificate’s PDF'), file);
  expect(await screen.findByRole('heading', { level: 1, name: 'Not a PDF' })).toBeVisible();
  expect(screen.getByText('certificate.pdf')).toBeVisible();
  expect(uploads).toEqual([]);

  await user.click(screen.getByRole('button', { name: /Send it to the school/ }));
  expect(await screen.findByText(/No PDF header/)).toBeVisible();
  expect(uploads).toEqual([expect.stringContaining('multipart/form-data')]);
});
