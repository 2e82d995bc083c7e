import { screen, within } from '@testing-library/react';
import { beforeEach, expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeBank } from '../testing/practice.ts';
import { renderRoute } from '../testing/render-route.tsx';

const summary = {
  number: 'W3',
  title: 'Runs and returns',
  unit: { number: 3, title: 'Voltage drop' },
  questions: 3,
  practise: ['vd-deck-lamps', 'vd-chart-table'],
  passPercent: 80,
  attempts: [
    {
      id: 'a1',
      attempt: 1,
      startedAt: '2026-11-30T09:00:00Z',
      handedInAt: '2026-11-30T09:40:00Z',
      marks: 4,
      outOf: 7,
      percent: 57,
    },
    {
      id: 'a2',
      attempt: 2,
      startedAt: '2026-12-01T09:00:00Z',
      handedInAt: null,
      marks: null,
      outOf: 7,
      percent: null,
    },
  ],
};

beforeEach(() => {
  signInAs();
  serve('get', '/api/practice/questions', makeBank());
});

it('lists every attempt, the last first, and goes on with the open one', async () => {
  serve('get', '/api/worksheets/W3', summary);
  renderRoute('/worksheets/W3');
  const rows = within(await screen.findByRole('table')).getAllByRole('row');
  expect(rows[1]).toHaveTextContent(/Attempt 2.*open since/);
  expect(rows[2]).toHaveTextContent(/Attempt 1.*4 of 7.*57\s%, not passed/);
  expect(screen.getByRole('button', { name: 'Go on with attempt 2' })).toBeVisible();
});

it('says that nothing is kept yet, and why a start was refused', async () => {
  serve('get', '/api/worksheets/W3', { ...summary, attempts: [] });
  serveWith('post', '/api/worksheets/W3/attempts', () =>
    problemReply(429, 'too-many-attempts', { title: 'Too many at once', retryAfterSeconds: 30 }),
  );
  const { user } = renderRoute('/worksheets/W3');
  expect(await screen.findByText(/None yet/)).toBeVisible();
  await user.click(screen.getByRole('button', { name: 'Work it' }));
  expect(await screen.findByRole('alert')).toHaveTextContent(/Too many at once.*30 seconds/);
});

it('offers to build up to each of its questions, in their order', async () => {
  serve('get', '/api/worksheets/W3', summary);
  renderRoute('/worksheets/W3');
  const links = await screen.findAllByRole('link', { name: /^Build up to it/ });
  expect(links.map((link) => link.getAttribute('href'))).toEqual([
    '/practice/vd-deck-lamps?left=0',
    '/practice/vd-chart-table?left=0',
  ]);
});
