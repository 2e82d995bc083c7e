import { screen, within } from '@testing-library/react';
import { HttpResponse } from 'msw';
import { beforeEach, expect, it, vi } from 'vitest';
import { type Answer } from '../api/views.ts';
import { problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { makeCourseMap } from '../testing/course-map.ts';
import { makeMarked, makeQuestion } from '../testing/questions.ts';
import { renderRoute } from '../testing/render-route.tsx';

type LessonView = Answer<'Lessons_read'>;
type ProgressView = Answer<'Lessons_progress'>;

const lesson: LessonView = {
  number: '3.4',
  slug: 'the-long-run',
  title: 'The long run',
  revision: 'C',
  issued: '2026-11-02',
  language: 'en',
  unit: { number: 3, title: 'Voltage drop' },
  author: 'O. Marchetti',
  checkedBy: 'R. Nakamura',
  minutes: 14,
  lead: 'Both conductors cost you volts.',
  can: ['size a two-wire run'],
  objectives: [{ does: 'size a two-wire run', questions: ['vd-chart-table'], recall: [1] }],
  needs: [],
  headings: [],
  terms: [],
  drawings: {},
  body: 'Stand at the fuse board.\n\nA conductor is a resistor.\n\n::try{question="vd-chart-table"}',
  paragraphs: 2,
  words: [],
  sources: ['IEC 60228:2004 (from memory)'],
  recall: [{ ask: 'Why twice?', answer: 'Out and back.' }],
  formulas: {},
  figures: {},
  worked: {},
  tries: ['vd-chart-table'],
  previous: { number: '1.4', title: 'Isolate, lock, prove dead' },
  next: null,
};

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
  serve('get', '/api/lessons/3.4', lesson);
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
