import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { acceptedReply, problemReply, serveWith } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('answers the same whether or not the address is known', async () => {
  serveWith('post', '/api/password-resets', () => acceptedReply());
  const { user } = renderRoute('/reset');
  await user.type(await screen.findByLabelText('Email'), 'nobody@harrowquay.example');
  await user.click(screen.getByRole('button', { name: 'Send the link' }));
  expect(await screen.findByRole('status')).toHaveTextContent(
    'If that address has an account, a link is on its way.',
  );
});

it('sets the new passphrase with the link’s token and asks to sign in', async () => {
  let sent: unknown;
  serveWith('post', '/api/password-resets/confirmations', (body) => {
    sent = body;
    return acceptedReply(204);
  });
  const { user } = renderRoute('/reset/new#kettle-token');
  await user.type(await screen.findByLabelText('New passphrase'), 'tin kettle');
  await user.click(screen.getByRole('button', { name: 'Change passphrase' }));
  expect(await screen.findByText('Changed.')).toBeVisible();
  expect(sent).toEqual({ token: 'kettle-token', password: 'tin kettle' });
});

it('says so when the link no longer works, and keeps what was typed', async () => {
  serveWith('post', '/api/password-resets/confirmations', () =>
    problemReply(410, 'link-not-valid', { title: 'This link no longer works' }),
  );
  const { user } = renderRoute('/reset/new#old');
  await user.type(await screen.findByLabelText('New passphrase'), 'tin kettle');
  await user.click(screen.getByRole('button', { name: 'Change passphrase' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('This link no longer works');
  expect(screen.getByLabelText('New passphrase')).toHaveValue('tin kettle');
});
