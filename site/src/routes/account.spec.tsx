import { screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { acceptedReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

const sessions = [
  {
    id: 's1',
    current: true,
    startedAt: '2026-12-01T08:12:00Z',
    lastSeenAt: '2026-12-01T12:47:00Z',
    device: 'Laptop',
    address: '192.0.2.14',
  },
  {
    id: 's2',
    current: false,
    startedAt: '2026-11-22T19:05:00Z',
    lastSeenAt: '2026-11-28T12:47:00Z',
    device: 'Phone',
    address: '198.51.100.7',
  },
];

it('ends another session and leaves this one', async () => {
  signInAs();
  serve('get', '/api/me/sessions', { sessions });
  const { user } = renderRoute('/account');
  const end = await screen.findByRole('button', { name: 'End the session on Phone' });
  expect(screen.queryByRole('button', { name: /session on Laptop/ })).toBeNull();
  serveWith('delete', '/api/me/sessions/:id', () => acceptedReply(204));
  serve('get', '/api/me/sessions', { sessions: sessions.slice(0, 1) });
  await user.click(end);
  await expect.poll(() => screen.queryByText('Phone')).toBeNull();
});

it('changes the passphrase and empties the form', async () => {
  signInAs();
  serve('get', '/api/me/sessions', { sessions });
  let sent: unknown;
  serveWith('put', '/api/me/password', (body) => {
    sent = body;
    return acceptedReply(204);
  });
  const { user } = renderRoute('/account');
  const form = await screen.findByRole('form', { name: 'Change passphrase' });
  await user.type(within(form).getByLabelText('Passphrase now'), 'tin kettle over harbour');
  await user.type(within(form).getByLabelText('New passphrase'), 'five wet');
  await user.click(within(form).getByLabelText('End my other sessions'));
  await user.click(within(form).getByRole('button', { name: 'Change passphrase' }));
  expect(await screen.findByText(/Changed\. We mailed you/)).toBeVisible();
  expect(sent).toEqual({
    currentPassword: 'tin kettle over harbour',
    newPassword: 'five wet',
    endOtherSessions: false,
  });
  expect(screen.getByLabelText('Passphrase now')).toHaveValue('');
});

it('keeps a choice of light or dark on this device', async () => {
  signInAs();
  serve('get', '/api/me/sessions', { sessions });
  const { user } = renderRoute('/account');
  await user.click(await screen.findByRole('radio', { name: 'Dark' }));
  expect(document.querySelector('.radix-themes')).toHaveClass('dark');
  expect(Object.values({ ...localStorage })).toEqual(['dark']);
});

it('sends somebody who is not signed in to the door, and back afterwards', async () => {
  const { router } = renderRoute('/account');
  await screen.findByRole('heading', { name: 'Sign in' });
  expect(router.state.location.search).toBe('?next=%2Faccount');
});
