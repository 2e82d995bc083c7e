import { act, screen } from '@testing-library/react';
import { expect, it, vi } from 'vitest';
import { acceptedReply, problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('says that there is no signal, and stops saying so', async () => {
  renderRoute('/nowhere');
  await screen.findByRole('heading', { name: 'There is no such sheet' });
  const onLine = vi.spyOn(navigator, 'onLine', 'get').mockReturnValue(false);
  act(() => void window.dispatchEvent(new Event('offline')));
  expect(screen.getByRole('status')).toHaveTextContent('No signal.');
  onLine.mockRestore();
  act(() => void window.dispatchEvent(new Event('online')));
  expect(screen.queryByText('No signal.')).toBeNull();
});

it('begins a new page at its heading and names it in the title', async () => {
  const { user } = renderRoute('/sign-in');
  await user.click(await screen.findByRole('link', { name: 'Forgotten passphrase' }));
  const heading = await screen.findByRole('heading', { name: 'A new passphrase' });
  await expect.poll(() => document.activeElement).toBe(heading);
  expect(document.title).toBe('A new passphrase – Ferrule');
});

it('signs out, forgets the person and goes to the front page', async () => {
  signInAs();
  serve('get', '/api/me/sessions', { sessions: [] });
  serveWith('get', '/api/front', () => problemReply(503, 'unavailable'));
  serveWith('delete', '/api/session', () => acceptedReply(204));
  const { user, queryClient } = renderRoute('/account');
  await user.click(await screen.findByRole('button', { name: 'Sign out' }));
  expect(await screen.findByRole('heading', { name: 'Sign in' })).toBeVisible();
  expect(screen.queryByText('Ifeoma Castellan')).toBeNull();
  await expect.poll(() => queryClient.getQueryData(['own-sessions'])).toBeUndefined();
});

it('shows a fault of the server in place, with the number to quote', async () => {
  serveWith('get', '/api/session', () =>
    problemReply(500, 'fault', {
      title: 'Something went wrong on our side',
      instance: 'urn:uuid:7f3a',
    }),
  );
  renderRoute('/account');
  expect(
    await screen.findByRole('heading', { name: 'Something went wrong on our side' }),
  ).toBeVisible();
  expect(screen.getByText('7f3a')).toBeVisible();
});

it('has a page of advice for every kind of problem, also for one it does not know', async () => {
  renderRoute('/problems/constructor');
  expect(
    await screen.findByRole('heading', { level: 1, name: 'Something did not work' }),
  ).toBeVisible();
});
