import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { beforeEach, expect, it, vi } from 'vitest';
import { type Answer } from '../api/views.ts';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { makeLesson } from '../testing/lesson.ts';
import { makeMarked, makeQuestion } from '../testing/questions.ts';
import { renderRoute } from '../testing/render-route.tsx';

type ProgressView = Answer<'Lessons_progress'>;

const begun: ProgressView = { state: 'begun', paragraph: 1, revisionRead: null, current: 'C' };

/** Shows every paragraph as soon as it is watched. */
class SightOfEverything {
  readonly show: (entries: { isIntersecting: boolean; target: Element }[]) => void;
  constructor(show: SightOfEverything['show']) {
    this.show = show;
  }
  observe(target: Element) {
    this.show([{ isIntersecting: true, target }]);
  }
  disconnect() {}
}

beforeEach(() => {
  vi.stubGlobal('IntersectionObserver', SightOfEverything);
  signInAs();
  serve('get', '/api/course', makeCourseMap());
  serve('get', '/api/lessons/3.4', makeLesson());
  serve('get', '/api/lessons/3.4/progress', begun);
  serve('put', '/api/lessons/3.4/progress', { ...begun, paragraph: 2 });
});

it('marks the sheet done, and takes it back', async () => {
  const sent: unknown[] = [];
  serveWith('put', '/api/lessons/3.4/done', (body) => {
    sent.push(body);
    return HttpResponse.json({ ...begun, state: 'done', revisionRead: 'C' });
  });
  serve('delete', '/api/lessons/3.4/done', begun);
  const { user } = renderRoute('/sheets/3.4');
  await user.click(await screen.findByRole('button', { name: 'Mark sheet done' }));
  await user.click(await screen.findByRole('button', { name: 'Not done after all' }));
  expect(sent).toEqual([{ revision: 'C' }]);
  expect(await screen.findByRole('button', { name: 'Mark sheet done' })).toBeVisible();
  expect(screen.getByRole('link', { name: 'Worksheet W3' })).toHaveAttribute(
    'href',
    '/worksheets/W3',
  );
});

it('keeps how far one has read when the sheet is left', async () => {
  const sent: unknown[] = [];
  serveWith('put', '/api/lessons/3.4/progress', (body) => {
    sent.push(body);
    return HttpResponse.json({ ...begun, paragraph: 2 });
  });
  const { router } = renderRoute('/sheets/3.4');
  await screen.findByRole('heading', { name: 'The long run' });
  await router.navigate('/course');
  await expect.poll(() => sent).toEqual([{ paragraph: 2 }]);
});

it('tells a reader of revision B that C is out', async () => {
  serve('get', '/api/lessons/3.4/progress', { ...begun, state: 'done', revisionRead: 'B' });
  renderRoute('/sheets/3.4');
  expect(await screen.findByText('Revision C is out.')).toBeVisible();
  expect(screen.getByRole('button', { name: 'Mark sheet done' })).toBeVisible();
});

it('gives the formula of a part as a hint, and says so when it is marked', async () => {
  serve('post', '/api/practice', { id: 'p1', question: makeQuestion() });
  let asked: unknown;
  serveWith('post', '/api/practice/p1/hints', (sent) => {
    asked = sent;
    const line = [
      { kind: 'symbol', text: 'R' },
      { kind: 'operator', text: '=' },
      { kind: 'symbol', text: 'ρ' },
    ];
    return HttpResponse.json({ line });
  });
  serve('post', '/api/practice/p1/answers', { marked: makeMarked(), hints: ['a'] });
  const { user } = renderRoute('/sheets/3.4');
  const block = await screen.findByRole('region', { name: 'Try it' });
  await user.click(within(block).getByRole('button', { name: 'Draw my figures' }));
  const button = await within(block).findByRole('button', { name: 'Hint for (a)' });
  await user.click(button);
  await expect.poll(() => button.parentElement?.textContent).toContain('R = ρ');
  expect(asked).toEqual({ part: 'a' });
  expect(button).toHaveFocus();
  await user.click(within(block).getByRole('button', { name: 'Mark it' }));
  expect(await within(block).findByText('1 of 2 marks, with a hint.')).toBeVisible();
});

it('marks a tried question in place and asks back what cannot be read', async () => {
  serve('post', '/api/practice', { id: 'p1', question: makeQuestion() });
  let asked = false;
  serveWith('post', '/api/practice/p1/answers', () => {
    if (asked) return HttpResponse.json({ marked: makeMarked(), hints: [] });
    asked = true;
    return problemReply(422, 'answer-unclear', {
      unclear: [{ part: 'a', ask: 'Is 1,234 one thousand or one point two?', readings: [] }],
    });
  });
  const { user } = renderRoute('/sheets/3.4');
  const block = await screen.findByRole('region', { name: 'Try it' });
  await user.click(within(block).getByRole('button', { name: 'Draw my figures' }));
  await user.type(await within(block).findByRole('textbox', { name: 'Answer to (a)' }), '1,234');
  await user.click(within(block).getByRole('button', { name: 'Mark it' }));
  expect(await within(block).findByText(/one thousand or one point two/)).toBeVisible();
  expect(within(block).getByRole('textbox', { name: 'Answer to (a)' })).toHaveValue('1,234');
  await user.click(within(block).getByRole('button', { name: 'Mark it' }));
  expect(await within(block).findByText('1 of 2 marks.')).toBeVisible();
  expect(within(block).getByText('Mark lost:', { exact: false })).toBeInTheDocument();
});

it('brings the paragraph that the address names into sight, marks it and reads from there', async () => {
  const scrollIntoView = vi.fn();
  Element.prototype.scrollIntoView = scrollIntoView;
  renderRoute('/sheets/3.4#p2');
  const row = (await screen.findByText('A conductor is a resistor.')).closest('.sheet-row');
  expect(row).toHaveClass('named');
  expect(row).toHaveFocus();
  expect(scrollIntoView).toHaveBeenCalled();
  expect(screen.getByText('Stand at the fuse board.').closest('.sheet-row')).not.toHaveClass(
    'named',
  );
});

it('says what to read first, where things stand and which questions ask for it', async () => {
  serve(
    'get',
    '/api/lessons/3.4',
    makeLesson({
      needs: [{ number: '3.2', title: 'Two wires' }],
      headings: [{ text: 'Under load', paragraph: 2 }],
    }),
  );
  renderRoute('/sheets/3.4');
  expect(await screen.findByRole('link', { name: 'Sheet 3.2, Two wires' })).toHaveAttribute(
    'href',
    '/sheets/3.2',
  );
  expect(screen.getByRole('link', { name: 'Under load, 2' })).toHaveAttribute(
    'href',
    '/sheets/3.4#p2',
  );
  expect(
    screen.getByRole('link', { name: 'Practise: size a two-wire run, question 1' }),
  ).toHaveAttribute('href', '/practice/vd-chart-table');
});

it('explains a word of the glossary where it first stands, and Escape closes the note', async () => {
  const terms = [{ term: 'resistor', means: 'what turns volts into heat', forms: ['resistor'] }];
  const body = 'A conductor is a Resistor.\n\nEvery resistor warms.';
  serve('get', '/api/lessons/3.4', makeLesson({ terms, body }));
  const { user } = renderRoute('/sheets/3.4');
  const word = await screen.findByRole('button', { name: 'Resistor' });
  expect(word).toHaveAccessibleDescription(/what turns volts into heat/);
  expect(screen.getByText('Every resistor warms.')).toBeVisible();
  word.focus();
  await user.keyboard('{Enter}');
  expect(screen.getByText(/what turns volts into heat/)).toBeVisible();
  expect(screen.getByRole('link', { name: 'In the glossary' })).toHaveAttribute(
    'href',
    '/glossary#resistor',
  );
  await user.keyboard('{Tab}{Escape}');
  expect(screen.getByText(/what turns volts into heat/)).not.toBeVisible();
  expect(word).toHaveFocus();
});
