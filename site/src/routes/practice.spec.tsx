import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { beforeEach, expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeBank, makePractice } from '../testing/practice.ts';
import { makeMarked } from '../testing/questions.ts';
import { renderRoute } from '../testing/render-route.tsx';

beforeEach(() => {
  signInAs();
  serve('get', '/api/practice/questions', makeBank());
});

const titles = () =>
  within(screen.getByRole('table'))
    .getAllByRole('link')
    .map(({ textContent }) => textContent);

it('lists the bank by subject with what has been shown', async () => {
  renderRoute('/practice');
  const shown = await screen.findByRole('row', { name: /Lamps on deck/ });
  expect(shown).toHaveTextContent(/Recall.*figures, a choice.*28 Nov 2026/);
  expect(screen.getByRole('row', { name: /Feeding the chart table/ })).toHaveTextContent(
    'not tried',
  );
  expect(screen.getByRole('row', { name: /Name the stage/ })).toHaveTextContent(
    /reads a curve.*AWG practice.*tried once, best 50\s%/,
  );
  expect(screen.getByRole('link', { name: /^Voltage drop.*1.*shown of.*2/ })).toHaveAttribute(
    'href',
    '/practice?subject=VD',
  );
});

it('keeps subject, level and title in the address', async () => {
  const { user, router } = renderRoute('/practice?subject=VD');
  await screen.findByRole('table');
  expect(titles()).toEqual(['Feeding the chart table', 'Lamps on deck']);
  await user.click(screen.getByRole('radio', { name: 'Recall' }));
  await expect.poll(titles).toEqual(['Lamps on deck']);
  await user.type(screen.getByRole('searchbox', { name: 'Find a title' }), 'chart');
  expect(await screen.findByText('No question like that')).toBeVisible();
  expect(router.state.location.search).toBe('?subject=VD&level=recall&find=chart');
});

it('says when there is nothing to practise yet', async () => {
  serve('get', '/api/practice/questions', { profile: 'metric', questions: [] });
  renderRoute('/practice');
  expect(await screen.findByText('No practice questions yet')).toBeVisible();
});

/** Answers what is drawn, telling what was asked for each time. */
function serveDraws(draw: (left: number | undefined) => ReturnType<typeof makePractice>) {
  const sent: unknown[] = [];
  let count = 0;
  serveWith('post', '/api/practice', (body) => {
    sent.push(body);
    count += 1;
    const { left } = body as { left?: number };
    return HttpResponse.json({ ...draw(left), id: `00000000-0000-4000-8000-00000000000${count}` });
  });
  return sent;
}

const whole = makePractice({ left: 2, shown: [], asked: ['a', 'b'] });

it('works all but the last step, marks it and goes on by one step with fresh figures', async () => {
  const sent = serveDraws((left) => (left === 1 ? makePractice() : whole));
  const { user } = renderRoute('/practice/vd-chart-table?left=1');
  expect(await screen.findByRole('heading', { name: 'The last step is yours' })).toBeVisible();
  expect(screen.queryByRole('textbox', { name: 'Answer to (a)' })).toBeNull();
  expect(screen.getByText(/^48\.1/)).toBeVisible();
  const levels = within(screen.getByRole('navigation', { name: 'How much is left to you' }));
  expect(levels.getAllByRole('link').map(({ textContent }) => textContent)).toEqual([
    'See it worked',
    'Last step',
    'The whole',
  ]);
  await user.click(screen.getByRole('radio', { name: '10 mm²' }));
  const answers: unknown[] = [];
  serveWith('post', '/api/practice/:id/answers', (body) => {
    answers.push(body);
    return HttpResponse.json({ marked: makeMarked({ marks: 2 }), hints: [] });
  });
  await user.click(screen.getByRole('button', { name: 'Mark it' }));
  expect(await screen.findByRole('heading', { name: 'Marked' })).toHaveFocus();
  expect(answers).toMatchObject([{ answers: { b: { option: 'o2' } } }]);
  const said = screen.getByText(/^2 of 2 marks/).closest('[role="status"]');
  expect(said).toHaveTextContent(/Marked like the whole/);
  await user.click(screen.getByRole('link', { name: 'One more step' }));
  expect(await screen.findByRole('heading', { name: 'All of it is yours' })).toBeVisible();
  expect(sent).toEqual([{ question: 'vd-chart-table', left: 1 }, { question: 'vd-chart-table' }]);
});

it('draws other figures when asked, and asks back what cannot be read', async () => {
  const sent = serveDraws(() => whole);
  const { user } = renderRoute('/practice/vd-chart-table');
  await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '1,2,3');
  serveWith('post', '/api/practice/:id/answers', () =>
    problemReply(422, 'answer-unclear', {
      unclear: [{ part: 'a', ask: 'Is that 1.2 or 12?', readings: [] }],
    }),
  );
  await user.click(screen.getByRole('button', { name: 'Mark it' }));
  expect(await screen.findByText('Is that 1.2 or 12?')).toBeVisible();
  await user.click(screen.getByRole('button', { name: 'Other figures' }));
  await expect.poll(() => sent).toHaveLength(2);
  expect(await screen.findByRole('heading', { name: 'All of it is yours' })).toHaveFocus();
  expect(screen.getByRole('textbox', { name: 'Answer to (a)' })).toHaveValue('');
});

it('says when there is no such question', async () => {
  renderRoute('/practice/vd-nothing');
  expect(await screen.findByText('There is no such question')).toBeVisible();
});

it('offers the whole where fewer steps are than were asked for', async () => {
  serveWith('post', '/api/practice', () => problemReply(422, 'invalid-request', { errors: [] }));
  const { user } = renderRoute('/practice/vd-chart-table?left=9');
  expect(await screen.findByText('It has fewer steps than that')).toBeVisible();
  serveDraws(() => whole);
  await user.click(screen.getByRole('link', { name: 'The whole' }));
  expect(await screen.findByRole('heading', { name: 'All of it is yours' })).toBeVisible();
});
