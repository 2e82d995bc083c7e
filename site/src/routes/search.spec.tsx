import { screen, within } from '@testing-library/react';
import { beforeEach, expect, it } from 'vitest';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { renderRoute } from '../testing/render-route.tsx';

const paragraph = {
  kind: 'paragraph',
  title: 'The long run',
  sheet: '3.4',
  paragraph: 2,
  heading: 'Under load',
  link: '/sheets/3.4#p2',
  snippet: { text: 'The drop is paid twice.', marks: [{ from: 4, to: 8 }] },
};
const table = {
  kind: 'table',
  title: 'Voltage a circuit may lose',
  sheet: null,
  paragraph: null,
  heading: null,
  link: '/tables#drop-limits',
  snippet: { text: 'Out and back', marks: [] },
};
const found = { query: 'drop', corrected: null, more: false, results: [paragraph, table] };

beforeEach(() => {
  signInAs();
  serve('get', '/api/course', makeCourseMap());
});

it('quotes sheet and paragraph of each place and marks the words', async () => {
  serve('get', '/api/search', found);
  renderRoute('/search?q=drop');
  expect(await screen.findByRole('heading', { name: '2 places for “drop”' })).toBeVisible();
  const place = screen.getByText('Sheet 3.4, paragraph 2').closest('li');
  expect(within(place ?? document.body).getByRole('link')).toHaveAttribute(
    'href',
    '/sheets/3.4#p2',
  );
  expect(screen.getByText('drop', { selector: 'mark' })).toBeVisible();
});

it('says when nothing was found, and when the server does not answer', async () => {
  serve('get', '/api/search', { ...found, query: 'xyzzy', results: [] });
  const { router } = renderRoute('/search?q=xyzzy');
  expect(await screen.findByRole('heading', { name: 'Nothing for “xyzzy”' })).toBeVisible();
  serveWith('get', '/api/search', () => problemReply(500, 'server-error'));
  await router.navigate('/search?q=other');
  expect(await screen.findByRole('button', { name: 'Try again' })).toBeVisible();
});

it('is reached by "/", moved in by arrows, opened by Enter and closed by Escape', async () => {
  serve('get', '/api/search', found);
  serve('get', '/api/tables', { tables: [], symbols: { source: '', list: [] }, local: 'Local.' });
  const { user, router } = renderRoute('/course');
  const field = await screen.findByRole('combobox', { name: /Search/ });
  await user.keyboard('/');
  expect(field).toHaveFocus();
  expect(field).toHaveValue('');
  await user.keyboard('drop');
  expect(await screen.findAllByRole('option')).toHaveLength(2);
  await user.keyboard('{Escape}');
  expect(screen.queryByRole('option')).toBeNull();
  await user.keyboard('s');
  await screen.findAllByRole('option');
  await user.keyboard('{ArrowDown}{ArrowDown}');
  expect(screen.getByRole('option', { selected: true })).toHaveTextContent('Voltage a circuit');
  await user.keyboard('{Enter}');
  await screen.findByRole('heading', { name: 'Tables' });
  expect(router.state.location.hash).toBe('#drop-limits');
});
