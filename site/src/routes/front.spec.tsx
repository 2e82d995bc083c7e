import { screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { type FrontView } from '../api/views.ts';
import { makeSession, problemReply, serve, serveWith } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

const front: FrontView = {
  demonstration: true,
  school: { name: 'Harrow Quay Technical School', address: 'Unit 4, The Old Ropewalk' },
  course: {
    number: 'HQ-DC2',
    title: 'Auxiliary DC systems: installation',
    sheets: 5,
    units: 6,
    questions: 9,
    minutesToRead: 74,
  },
  people: [
    { role: 'trainee', name: 'Ifeoma Castellan', email: 'ifeoma.castellan@harrowquay.example' },
  ],
  joinCode: 'QUAY-2026',
};

it('counts the course from the server and says what in the demonstration is invented', async () => {
  serve('get', '/api/front', front);
  renderRoute('/');
  const list = await screen.findByRole('table', { name: 'What the course holds' });
  expect(within(list).getByRole('row', { name: /Lesson sheets/ })).toHaveTextContent('5');
  expect(screen.getByText(/Nobody is qualified for work/)).toBeVisible();
  expect(screen.getByText('QUAY-2026')).toBeVisible();
  expect(screen.getByRole('cell', { name: 'ifeoma.castellan@harrowquay.example' })).toBeVisible();
});

it('signs a trainee in and opens the course map', async () => {
  serve('get', '/api/front', front);
  serve('post', '/api/sessions', makeSession());
  serveWith('get', '/api/course', () => problemReply(404, 'not-found'));
  const { user, router } = renderRoute('/');
  await user.type(await screen.findByLabelText('Email'), 'ifeoma.castellan@harrowquay.example');
  await user.type(screen.getByLabelText('Passphrase'), 'tin kettle over harbour');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
  await expect.poll(() => router.state.location.pathname).toBe('/course');
});

it('says why a sign-in was refused and keeps what was typed', async () => {
  serve('get', '/api/front', front);
  serveWith('post', '/api/sessions', () =>
    problemReply(401, 'sign-in-refused', { title: 'That sign-in was refused' }),
  );
  const { user } = renderRoute('/');
  await user.type(await screen.findByLabelText('Email'), 'ifeoma@harrowquay.example');
  await user.type(screen.getByLabelText('Passphrase'), 'not this one at all');
  await user.click(screen.getByRole('button', { name: 'Sign in' }));
  expect(await screen.findByRole('alert')).toHaveTextContent('That sign-in was refused');
  expect(screen.getByLabelText('Email')).toHaveValue('ifeoma@harrowquay.example');
});

it('moves to the first field that is wrong', async () => {
  serve('get', '/api/front', front);
  const { user } = renderRoute('/');
  await user.click(await screen.findByRole('button', { name: 'Sign in' }));
  expect(screen.getByLabelText('Email')).toHaveFocus();
  expect(screen.getByLabelText('Email')).toHaveAccessibleDescription(/Type the email address/);
});
