import { screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { type CertificateView } from '../api/views.ts';
import { serve, signInAs } from '../testing/api-server.ts';
import { makeCertificate } from '../testing/certificate.ts';
import { renderRoute } from '../testing/render-route.tsx';

function open(more: Partial<CertificateView> = {}) {
  signInAs();
  serve('get', '/api/certificates/:id', makeCertificate(more));
  serve('get', '/api/front', {
    demonstration: false,
    school: { name: 'Harrow Quay Technical School', address: '12 Basin Road' },
    course: null,
    people: [],
    joinCode: null,
  });
  return renderRoute('/certificates/c1');
}

it('shows the certificate as a page, with its file and its register page', async () => {
  open();
  const page = await screen.findByRole('article', { name: 'Certificate HQ7K-2M4T-9XWD' });
  for (const said of ['Ifeoma Castellan', 'Not covered', '1 December 2029']) {
    expect(within(page).getByText(said)).toBeVisible();
  }
  expect(screen.getByText('until 1 December 2029')).toBeVisible();
  expect(screen.getByRole('link', { name: 'Download the PDF' })).toBeVisible();
  expect(screen.getByRole('link', { name: 'its register page' })).toHaveAttribute(
    'href',
    'https://harrowquay.example/check/abc',
  );
});

it('offers the file once it is drawn', async () => {
  open({ ready: false });
  expect(await screen.findByText(/being drawn and signed/)).toBeVisible();
  serve('get', '/api/certificates/:id', makeCertificate());
  expect(await screen.findByRole('link', { name: 'Download the PDF' })).toBeVisible();
});

it.each<[Partial<CertificateView>, string, RegExp]>([
  [
    { state: 'withdrawn', withdrawn: { on: '2026-12-05', reason: 'Sat by another person' } },
    'Withdrawn',
    /on 5 December 2026. Reason: Sat by another person/,
  ],
  [{ state: 'superseded', replacedBy: 'HQ7K-2M4T-9XWE' }, 'Replaced', /Use that one/],
  [{ state: 'expired', expiresOn: '2026-11-01' }, 'Expired', /^on 1 November 2026$/],
])('says what the register says: %o', async (more, word, said) => {
  open(more);
  expect(await screen.findByText(word)).toBeVisible();
  expect(screen.getByText(said)).toBeVisible();
});
