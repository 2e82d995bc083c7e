import { screen } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { problemReply, serveWith } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('uses the link up only when the button is pressed', async () => {
  const posted: unknown[] = [];
  serveWith('post', '/api/email-confirmations', (body) => {
    posted.push(body);
    return HttpResponse.json({ email: 'wilf@harrowquay.example' });
  });
  const { user } = renderRoute('/confirm#kettle-token');
  const button = await screen.findByRole('button', { name: 'Confirm my address' });
  expect(posted).toEqual([]);
  await user.click(button);
  expect(await screen.findByText(/wilf@harrowquay.example is yours/)).toBeVisible();
  expect(posted).toEqual([{ token: 'kettle-token' }]);
});

it('offers a new link when this one is spent', async () => {
  serveWith('post', '/api/email-confirmations', () => problemReply(410, 'link-not-valid'));
  const { user } = renderRoute('/confirm#old');
  await user.click(await screen.findByRole('button', { name: 'Confirm my address' }));
  expect(await screen.findByRole('link', { name: 'Send a new link' })).toBeVisible();
});

it('says that a link without its token is not whole', async () => {
  renderRoute('/confirm');
  expect(await screen.findByText('The link is not whole.')).toBeVisible();
  expect(screen.queryByRole('button', { name: 'Confirm my address' })).toBeNull();
});
