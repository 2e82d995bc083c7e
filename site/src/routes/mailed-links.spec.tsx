import { screen } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { serve, serveWith } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('changes the address when the button is pressed', async () => {
  serve('post', '/api/email-changes/confirmations', { email: 'new@harrowquay.example' });
  const { user } = renderRoute('/email-change#t');
  await user.click(await screen.findByRole('button', { name: 'Use this address' }));
  expect(await screen.findByText(/Sign in with new@harrowquay.example/)).toBeVisible();
});

it('undoes a change of address and points to a new passphrase', async () => {
  serve('post', '/api/email-changes/undo', { email: 'old@harrowquay.example' });
  const { user } = renderRoute('/email-change/undo#t');
  await user.click(await screen.findByRole('button', { name: 'Undo the change' }));
  expect(await screen.findByText(/belongs to old@harrowquay.example again/)).toBeVisible();
  expect(screen.getByRole('link', { name: 'Choose a new passphrase' })).toBeVisible();
});

it('makes the first administrator with the link of the first start', async () => {
  let sent: unknown;
  serveWith('post', '/api/administrator-claims', (body) => {
    sent = body;
    return HttpResponse.json({}, { status: 201 });
  });
  const { user } = renderRoute('/first-administrator#start-token');
  await user.type(await screen.findByLabelText('Given name'), 'Marit');
  await user.type(screen.getByLabelText('Family name'), 'Oyelaran');
  await user.type(screen.getByLabelText('Email'), 'marit@harrowquay.example');
  await user.type(screen.getByLabelText('Passphrase'), 'tin kettle');
  await user.type(screen.getByLabelText('Name of the school'), 'Tidewater College');
  await user.type(screen.getByLabelText('Address of the school'), '1 Slip Lane');
  await user.click(screen.getByRole('button', { name: 'Open the account' }));
  expect(await screen.findByText('The account is open.')).toBeVisible();
  const school = { schoolName: 'Tidewater College', schoolAddress: '1 Slip Lane' };
  expect(sent).toMatchObject({ token: 'start-token', givenName: 'Marit', ...school });
});
