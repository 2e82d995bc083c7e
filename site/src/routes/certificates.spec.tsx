import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { type CertificateView } from '../api/views.ts';
import { makeSession, problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

const certificate: CertificateView = {
  id: 'c1',
  number: 'HQ7K-2M4T-9XWD',
  holderName: 'Priya Vandermeer',
  scheme: { title: 'Auxiliary DC systems installer', revision: 'F' },
  scope: ['Cable sizing'],
  limits: ['AC mains'],
  howSat: 'Unsupervised, on the candidate’s own device',
  issuedOn: '2026-11-03',
  expiresOn: '2029-11-03',
  state: 'valid',
  ready: true,
  registerUrl: 'https://harrowquay.example/check/abc',
  replacedBy: null,
  withdrawn: null,
  history: [],
};

function openDesk(roles: Parameters<typeof signInAs>[0] = ['administrator']) {
  signInAs(roles);
  serve('get', '/api/certificates', { certificates: [certificate], nextCursor: null });
  return renderRoute('/certificates?certificate=c1');
}

it('asks for the passphrase again before a withdrawal and then carries it out', async () => {
  const { user } = openDesk();
  const reasons: unknown[] = [];
  serveWith('post', '/api/certificates/:id/withdrawal', (body) => {
    reasons.push(body);
    return problemReply(403, 'fresh-sign-in-needed');
  });
  await user.type(
    await screen.findByLabelText('Reason, kept in the history'),
    'Sat by another person',
  );
  await user.click(screen.getByRole('button', { name: 'Withdraw HQ7K-2M4T-9XWD' }));

  serve('post', '/api/session/confirmation', makeSession(['administrator']));
  const withdrawn: CertificateView = {
    ...certificate,
    state: 'withdrawn',
    withdrawn: { on: '2026-12-01', reason: 'Sat by another person' },
  };
  serveWith('post', '/api/certificates/:id/withdrawal', (body) => {
    reasons.push(body);
    return HttpResponse.json(withdrawn);
  });
  serve('get', '/api/certificates', { certificates: [withdrawn], nextCursor: null });
  await user.type(await screen.findByLabelText('Your passphrase'), 'tin kettle over harbour');
  await user.click(screen.getByRole('button', { name: 'Confirm and carry on' }));

  const panel = screen.getByRole('complementary', { name: 'Priya Vandermeer' });
  expect(await within(panel).findByText('Reason: Sat by another person')).toBeVisible();
  expect(within(panel).queryByRole('button', { name: /Withdraw/ })).toBeNull();
  expect(reasons).toEqual([
    { reason: 'Sat by another person' },
    { reason: 'Sat by another person' },
  ]);
});

it('corrects a name by issuing again', async () => {
  const { user } = openDesk();
  await user.click(await screen.findByRole('button', { name: 'Correct the name' }));
  const form = screen.getByRole('form', { name: 'Correct the name' });
  await user.type(within(form).getByLabelText('Given name'), 'Priya');
  await user.type(within(form).getByLabelText('Family name'), 'van der Meer');
  await user.type(within(form).getByLabelText('Reason, kept in the history'), 'Misspelt');
  serve('post', '/api/certificates/:id/name-correction', {
    ...certificate,
    id: 'c2',
    number: 'HQ7K-2M4T-9XWE',
    holderName: 'Priya van der Meer',
  });
  await user.click(within(form).getByRole('button', { name: 'Issue it again' }));
  expect(await screen.findByText('HQ7K-2M4T-9XWE')).toBeVisible();
});

it('lets a certification manager look and not act', async () => {
  openDesk(['certification-manager']);
  expect(await screen.findByRole('complementary')).toBeVisible();
  expect(screen.queryByRole('button', { name: /Withdraw/ })).toBeNull();
});
