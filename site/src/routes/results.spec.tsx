import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { expect, it } from 'vitest';
import { type LookView, type ResultRow } from '../features/results/queries.ts';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { makeMarked, makeQuestion } from '../testing/questions.ts';
import { renderRoute } from '../testing/render-route.tsx';
import { sittingId } from '../testing/sitting.ts';
import { blankAnswer } from '../ui/question/views.ts';

const row: ResultRow = {
  id: sittingId,
  name: 'Emrys Quillfeather',
  satOn: '2026-12-01',
  handedInHow: 'by-candidate',
  percent: 63,
  passed: false,
  looks: 0,
};

function open(results: ResultRow[] = [row], path = '/results') {
  signInAs(['certification-manager']);
  serve('get', '/api/course', makeCourseMap());
  serve('get', '/api/papers/:slug/results', { results, nextCursor: null });
  serve('get', '/api/time-allowances', { allowances: [] });
  return renderRoute(path);
}

it('opens the items of a sitting for a reason, which is kept', async () => {
  const { user } = open();
  const sent: unknown[] = [];
  const look: LookView = {
    ...{ id: sittingId, name: row.name, satOn: row.satOn, marks: 23, outOf: 36, passed: false },
    looks: [{ at: '2026-12-03T09:00:00Z', by: 'Wilhelmina Adair', reason: 'Appeal' }],
    items: [
      {
        number: 1,
        subject: 'voltage drop',
        question: makeQuestion(),
        answers: { a: { ...blankAnswer, text: '24.1', working: '5.5 × 4.37' } },
        marked: makeMarked(),
      },
    ],
  };
  serveWith('post', '/api/sittings/:id/looks', (body) => {
    sent.push(body);
    return HttpResponse.json(look);
  });
  await user.click(await screen.findByRole('link', { name: 'Emrys Quillfeather' }));
  const panel = await screen.findByRole('region', { name: 'Emrys Quillfeather' });
  await user.click(within(panel).getByRole('button', { name: 'Open the items' }));
  expect(within(panel).getByText('Say why the items are opened.')).toBeVisible();
  expect(sent).toHaveLength(0);
  await user.type(within(panel).getByLabelText('Reason, kept with the look'), 'Appeal');
  await user.click(within(panel).getByRole('button', { name: 'Open the items' }));
  expect(await within(panel).findByText('5.5 × 4.37')).toBeVisible();
  expect(within(panel).getByText('out and back, 2 × 5.5 m')).toBeVisible();
  expect(sent).toEqual([{ reason: 'Appeal' }]);
});

it('grants extra time, and says what is wrong with a percentage', async () => {
  const { user } = open([]);
  expect(await screen.findByText('Nobody has handed in this paper yet')).toBeVisible();
  const form = screen.getByRole('form', { name: 'Grant extra time' });
  await user.type(within(form).getByLabelText('Candidate’s e-mail address'), 't@school.example');
  await user.type(within(form).getByLabelText('More time, per cent'), 'a lot');
  await user.type(within(form).getByLabelText('Reason, kept with the grant'), 'Reads slowly');
  await user.click(within(form).getByRole('button', { name: 'Grant the time' }));
  expect(within(form).getByText('Whole per cent, in figures.')).toBeVisible();
  const sent: unknown[] = [];
  const granted = {
    ...{ name: 'Tāne Ngārimu', email: 't@school.example', percent: 25 },
    ...{ reason: 'Reads slowly', grantedAt: '2026-12-01T09:00:00Z' },
  };
  serveWith('post', '/api/time-allowances', (body) => {
    sent.push(body);
    return HttpResponse.json({ allowances: [granted] }, { status: 201 });
  });
  await user.clear(within(form).getByLabelText('More time, per cent'));
  await user.type(within(form).getByLabelText('More time, per cent'), '25');
  await user.click(within(form).getByRole('button', { name: 'Grant the time' }));
  const table = await screen.findByRole('table', { name: 'Extra times granted' });
  expect(within(table).getByText('25 %')).toBeVisible();
  expect(sent).toEqual([{ email: 't@school.example', percent: 25, reason: 'Reads slowly' }]);
});

it('keeps the desk to certification managers', async () => {
  signInAs(['trainee']);
  const { router } = renderRoute('/results');
  await screen.findByRole('heading', { level: 1 });
  expect(router.state.location.pathname).toBe('/problems/not-allowed');
});

it('says in place when the results cannot be fetched', async () => {
  open();
  serveWith('get', '/api/papers/:slug/results', () => problemReply(503, 'unavailable'));
  expect(await screen.findByRole('button', { name: 'Try again' })).toBeVisible();
});
