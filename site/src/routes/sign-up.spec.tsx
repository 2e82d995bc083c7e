import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { acceptedReply, problemReply, serve, serveWith } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

async function fillIn(passphrase: string) {
  const page = renderRoute('/sign-up');
  await page.user.type(await screen.findByLabelText('Given name'), 'Wilf');
  await page.user.type(screen.getByLabelText('Family name'), 'Dragomir');
  await page.user.type(screen.getByLabelText('Email'), 'wilf@harrowquay.example');
  await page.user.type(screen.getByLabelText('Passphrase'), passphrase);
  return page;
}

it('counts a passphrase against fifteen', async () => {
  await fillIn('tin kettle ');
  expect(screen.getByText('11 of 15. Four more to go.')).toBeVisible();
});

it('tells a common passphrase apart before it is sent', async () => {
  serve('post', '/api/password-checks', {
    lengthShort: 0,
    common: true,
    reason: 'This one is on a list of common passphrases.',
  });
  await fillIn('passwordpassword');
  expect(await screen.findByText(/on a list of common passphrases/)).toBeVisible();
});

it('puts the server’s refusal beside the field, moves there, and takes it back on typing', async () => {
  serveWith('post', '/api/accounts', () =>
    problemReply(422, 'invalid-request', {
      errors: [{ pointer: '#/password', detail: 'It contains your name.' }],
    }),
  );
  serve('post', '/api/password-checks', { lengthShort: 0, common: false, reason: null });
  const { user } = await fillIn('wilf dragomir');
  await user.click(screen.getByRole('button', { name: 'Open account' }));
  const field = await screen.findByLabelText('Passphrase');
  await expect.poll(() => document.activeElement).toBe(field);
  expect(field).toHaveAccessibleDescription(/It contains your name\./);
  expect(field).toHaveValue('wilf dragomir');

  await user.type(field, ' kettle');
  expect(screen.queryByText('It contains your name.')).toBeNull();
  expect(field).toHaveFocus();
});

it('shows where the link went, also for one-name people', async () => {
  let sent: unknown;
  serveWith('post', '/api/accounts', (body) => {
    sent = body;
    return acceptedReply();
  });
  const { user, router } = renderRoute('/sign-up');
  await user.type(await screen.findByLabelText('Given name'), 'Tomasi');
  await user.type(screen.getByLabelText('Email'), 'tomasi@harrowquay.example');
  await user.click(screen.getByLabelText('Passphrase'));
  await user.paste('tin kettle');
  await user.click(screen.getByRole('button', { name: 'Open account' }));
  expect(await screen.findByText('tomasi@harrowquay.example')).toBeVisible();
  expect(router.state.location.pathname).toBe('/sign-up/sent');
  expect(sent).toMatchObject({ givenName: 'Tomasi', familyName: '', password: 'tin kettle' });
});
