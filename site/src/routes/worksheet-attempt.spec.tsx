import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { beforeEach, expect, it } from 'vitest';
import { type Answer } from '../api/views.ts';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { makeMarked, makeQuestion } from '../testing/questions.ts';
import { renderRoute } from '../testing/render-route.tsx';

type WorksheetView = Answer<'Worksheets_open'>;

const id = '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0200';
const page = `/worksheet-attempts/${id}`;
const path = `/api${page}`;

const open: WorksheetView = {
  id,
  number: 'W3',
  title: 'Runs and returns',
  unit: { number: 3, title: 'Voltage drop' },
  variant: 'K7-218',
  attempt: 1,
  trainee: { givenName: 'Ifeoma', familyName: 'Castellan' },
  mine: true,
  startedAt: '2026-12-01T12:30:00Z',
  handedInAt: null,
  passPercent: 80,
  setBy: 'O. Marchetti',
  items: [
    {
      ...{ key: 'q1', slug: 'vd-chart-table', question: makeQuestion() },
      ...{ answers: {}, marked: null, readAgain: null },
    },
  ],
  recall: [
    { sheet: { number: '2.1', title: 'The crimp' }, ask: 'What does a crimp need?', answer: null },
  ],
  marks: null,
  outOf: 4,
  percent: null,
  passed: null,
  savedAt: null,
};

const marked: WorksheetView = {
  ...open,
  handedInAt: '2026-12-01T12:45:00Z',
  marks: 1,
  percent: 25,
  passed: false,
  recall: open.recall.map((one) => ({ ...one, answer: 'Its own tool.' })),
  items: [
    {
      key: 'q1',
      slug: 'vd-chart-table',
      question: makeQuestion(),
      answers: {},
      marked: makeMarked(),
      readAgain: { sheet: '3.4', title: 'The long run' },
    },
  ],
};

const answerBox = () => screen.findByRole('textbox', { name: 'Answer to (a)' });

beforeEach(() => {
  signInAs();
  serve('get', '/api/course', makeCourseMap());
  serve('get', path, open);
  serve('put', `${path}/items/q1/answers`, { savedAt: '2026-12-01T12:41:07Z', readings: {} });
});

it('saves what is typed and says when', async () => {
  const sent: unknown[] = [];
  serveWith('put', `${path}/items/q1/answers`, (body) => {
    sent.push(body);
    return HttpResponse.json({ savedAt: '2026-12-01T12:41:07Z', readings: {} });
  });
  const { user } = renderRoute(page);
  await user.type(await answerBox(), '24,1');
  await user.selectOptions(screen.getByRole('combobox', { name: 'Unit of (a)' }), 'mΩ');
  await user.tab();
  expect(await screen.findByText(/Saved \d\d:41:07/)).toBeVisible();
  expect(sent.at(-1)).toEqual({
    answers: { a: { text: '24,1', unit: 'mΩ', option: null, working: '' } },
  });
  expect(screen.getByText('1 of 2 parts answered.')).toBeVisible();
});

it('asks back an answer that can be read in two ways, once it is left', async () => {
  serve('put', `${path}/items/q1/answers`, {
    savedAt: '2026-12-01T12:41:07Z',
    readings: {
      a: { state: 'ambiguous', ask: 'Is that 1234 or 1.234?', readings: ['1234', '1.234'] },
    },
  });
  const { user } = renderRoute(page);
  const box = await answerBox();
  await user.type(box, '1,234');
  await user.tab();
  expect(await screen.findByText('Is that 1234 or 1.234?')).toBeVisible();
  expect(box).toHaveAttribute('aria-invalid', 'true');
  expect(box).toHaveValue('1,234');
});

it('asks once about blank parts, then hands in and shows the marked paper', async () => {
  serve('post', `${path}/hand-in`, marked);
  const { user } = renderRoute(page);
  await user.click(await screen.findByRole('button', { name: 'Hand in for marking' }));
  expect(screen.getByText('2 parts are blank.')).toBeVisible();
  await user.click(screen.getByRole('button', { name: 'Hand in for marking' }));
  const part = await screen.findByRole('group', { name: 'Part a' });
  expect(within(part).getByText(/out and back/)).toBeVisible();
  expect(screen.getByRole('heading', { level: 1 })).toHaveFocus();
  expect(screen.getByText(/1 of 4 marks, 25\s%. Not passed, 3 marks short/)).toBeVisible();
  expect(screen.getByRole('link', { name: 'Read 3.4, The long run' })).toHaveAttribute(
    'href',
    '/sheets/3.4',
  );
});

it('uses nothing up when handing in finds an answer it cannot read', async () => {
  serveWith('post', `${path}/hand-in`, () =>
    problemReply(422, 'answer-unclear', {
      unclear: [{ key: 'q1', part: 'a', ask: 'Which is it?', readings: [] }],
    }),
  );
  const { user } = renderRoute(page);
  await user.type(await answerBox(), '1,234');
  await user.click(screen.getByRole('button', { name: 'Hand in for marking' }));
  await user.click(screen.getByRole('button', { name: 'Hand in for marking' }));
  expect(await screen.findByText('Which is it?')).toBeVisible();
  expect(await answerBox()).toHaveFocus();
  expect(screen.getByRole('button', { name: 'Hand in for marking' })).toBeEnabled();
});

it('opens a kept attempt as it was, and begins another with fresh figures', async () => {
  serve('get', path, marked);
  const next = { ...open, id: '7d0f6a52-0c5e-4f3e-9a3b-3f1c9b6a0201', attempt: 2 };
  serve('post', '/api/worksheets/W3/attempts', next);
  serve('get', `/api/worksheet-attempts/${next.id}`, next);
  const { user, router } = renderRoute(page);
  await user.click(await screen.findByRole('button', { name: /again with fresh figures/ }));
  await expect.poll(() => router.state.location.pathname).toBe(`/worksheet-attempts/${next.id}`);
});

it('lets a trainer look at an open worksheet but not write in it', async () => {
  serve('get', path, { ...open, mine: false });
  renderRoute(page);
  expect(await screen.findByText('Not handed in yet.')).toBeVisible();
  expect(await answerBox()).toHaveAttribute('readonly');
  expect(screen.queryByRole('button', { name: 'Hand in for marking' })).toBeNull();
});

const earlierSheets = () => screen.findByRole('region', { name: 'From earlier sheets' });

it('asks about earlier sheets before handing in, without a box or an answer', async () => {
  renderRoute(page);
  const section = await earlierSheets();
  expect(within(section).getByText('What does a crimp need?')).toBeVisible();
  expect(within(section).getByText(/They carry no marks/)).toBeVisible();
  expect(within(section).queryByRole('textbox')).toBeNull();
  expect(within(section).queryByText('Answer')).toBeNull();
  expect(screen.getByText('0 of 2 parts answered.')).toBeVisible();
});

it('opens the answer to a question of an earlier sheet once it is handed in', async () => {
  serve('get', path, marked);
  const { user } = renderRoute(page);
  const section = await earlierSheets();
  expect(within(section).getByText('Its own tool.')).not.toBeVisible();
  await user.click(within(section).getByText('Answer'));
  expect(within(section).getByText('Its own tool.')).toBeVisible();
  expect(within(section).getByRole('link', { name: 'Read 2.1, The crimp' })).toHaveAttribute(
    'href',
    '/sheets/2.1',
  );
});

it('has no section of earlier sheets where an attempt was kept without them', async () => {
  serve('get', path, { ...marked, recall: [] });
  renderRoute(page);
  expect(await screen.findByText('Total')).toBeVisible();
  expect(screen.queryByText('From earlier sheets')).toBeNull();
});
