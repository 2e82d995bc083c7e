import { screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { makeSession, problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('asks an administrator for a code on the way to the people page', async () => {
  signInAs(['administrator'], { secondFactor: 'needed' });
  serve('post', '/api/session/second-factor', makeSession(['administrator']));
  serve('get', '/api/people', { people: [], nextCursor: null });
  serve('get', '/api/school/practice-profile', { profile: 'metric' });
  const { user, router } = renderRoute('/people');
  await user.type(await screen.findByLabelText('Code'), '123456');
  await user.click(screen.getByRole('button', { name: 'Carry on' }));
  expect(await screen.findByRole('heading', { name: 'People' })).toBeVisible();
  expect(router.state.location.pathname).toBe('/people');
});

it('keeps the door shut on a wrong code', async () => {
  signInAs(['administrator'], { secondFactor: 'needed' });
  serveWith('post', '/api/session/second-factor', () =>
    problemReply(409, 'second-factor-refused', { title: 'That code was refused' }),
  );
  const { user } = renderRoute('/second-factor');
  await user.type(await screen.findByLabelText('Code'), '000000');
  await user.click(screen.getByRole('button', { name: 'Carry on' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('That code was refused');
});

it('enrols with a square code and shows the recovery codes before going on', async () => {
  signInAs(['administrator'], { secondFactor: 'to-enrol' });
  serve('post', '/api/me/second-factor', {
    secret: 'ABCD EFGH',
    otpauthUri: 'otpauth://totp/x',
    qrSvg: '<svg xmlns="http://www.w3.org/2000/svg"/>',
  });
  serve('post', '/api/me/second-factor/confirmation', {
    recoveryCodes: ['k7q2-1000', 'm3x9-2000'],
  });
  serve('get', '/api/people', { people: [], nextCursor: null });
  serve('get', '/api/school/practice-profile', { profile: 'metric' });
  const { user } = renderRoute('/second-factor');
  await user.click(await screen.findByRole('button', { name: 'Set up the second step' }));
  expect(await screen.findByRole('img', { name: /Square code/ })).toBeVisible();
  await user.type(screen.getByLabelText('Six figures'), '123456');
  await user.click(screen.getByRole('button', { name: 'Check the figures' }));
  expect(await screen.findByText('m3x9-2000')).toBeVisible();
  expect(screen.getByRole('button', { name: 'Carry on' })).toBeDisabled();
  signInAs(['administrator'], { secondFactor: 'done' });
  await user.click(screen.getByLabelText('I have kept them'));
  await user.click(screen.getByRole('button', { name: 'Carry on' }));
  expect(await screen.findByRole('heading', { name: 'People' })).toBeVisible();
});
