import { act, fireEvent, screen, within } from '@testing-library/react';
import { http, HttpResponse } from 'msw';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { type Sending, type SittingView } from '../features/sittings/queries.ts';
import { apiServer, problemReply, serve, serveWith, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';
import { makeItem, makeResult, makeSitting, sittingId } from '../testing/sitting.ts';
import { blankAnswer } from '../ui/question/views.ts';

const page = `/sittings/${sittingId}`;

interface Kept extends Pick<Sending, 'answer' | 'sequence' | 'idempotencyKey'> {
  place: string;
}

/** Keeps each answer that arrives, and gives it a receipt. */
function keepAnswers(sitting: SittingView): Kept[] {
  const kept: Kept[] = [];
  apiServer.use(
    http.put('*/api/sittings/:id/items/:key/parts/:part', async ({ params, request }) => {
      const sent = (await request.json()) as Omit<Kept, 'place'>;
      kept.push({ ...sent, place: `${String(params['key'])} ${String(params['part'])}` });
      const now = new Date().toISOString();
      return HttpResponse.json({
        ...{ savedAt: now, now, closesAt: sitting.closesAt, sequence: sent.sequence },
        receipt: `F1-KEPT-${kept.length}`,
        reading:
          sent.answer.text === '1,234'
            ? { state: 'ambiguous', ask: 'Is that 1234 or 1.234?', readings: ['1234', '1.234'] }
            : { state: 'understood', value: 1, shown: sent.answer.text },
      });
    }),
  );
  return kept;
}

function open(more: Partial<SittingView> = {}, path = `${page}?q=1`) {
  signInAs();
  const sitting = makeSitting(more);
  serve('get', '/api/sittings/:id', sitting);
  const kept = keepAnswers(sitting);
  return { ...renderRoute(path), kept, sitting };
}

const heading = (name: string) => screen.findByRole('heading', { level: 1, name });
const focusOn = async (name: string) => {
  const found = await heading(name);
  await vi.waitFor(() => expect(found).toHaveFocus());
};

afterEach(() => {
  sessionStorage.clear();
  vi.useRealTimers();
});

describe('a question', () => {
  it('keeps an answer as it is left, and shows its receipt', async () => {
    const { user, kept } = open();
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '48.1');
    await user.tab();
    const receipts = screen.getByRole('table', { name: 'The latest receipts' });
    expect(await within(receipts).findByText('F1-KEPT-1')).toBeVisible();
    expect(kept).toMatchObject([{ place: 'k1 a', answer: { text: '48.1' } }]);
    expect(screen.getByText(/^Saved \d\d:\d\d:\d\d$/)).toBeVisible();
    expect(screen.getByRole('link', { name: 'Question 1, part answered' })).toBeVisible();
  });

  it('asks back about what can be read in two ways', async () => {
    const { user } = open();
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '1,234');
    await user.tab();
    expect(await screen.findByRole('alert')).toHaveTextContent('Is that 1234 or 1.234?');
  });

  it('resumes with what was written, the pennants and the time of the server', async () => {
    const receipt = { savedAt: '2026-12-01T10:03:10Z', receipt: 'F1-OLD', sequence: 3 };
    const answered = makeItem(1, {
      answers: { a: { ...blankAnswer, text: '48.1', unit: 'mΩ', ...receipt } },
    });
    // The clock of this device runs an hour behind the school's.
    const later = (ms: number) => new Date(Date.now() + 3_600_000 + ms).toISOString();
    const { user, kept } = open({
      items: [answered, makeItem(2, { comeBack: true })],
      receipts: [{ ...receipt, item: 1, part: 'a' }],
      now: later(0),
      closesAt: later(20 * 60_000),
    });
    expect(await screen.findByRole('textbox', { name: 'Answer to (a)' })).toHaveValue('48.1');
    expect(screen.getByRole('timer')).toHaveTextContent(/^(20:00|19:5\d)$/);
    expect(
      screen.getByRole('link', { name: 'Question 2, not answered, come back to' }),
    ).toBeVisible();
    await user.type(screen.getByRole('textbox', { name: 'Answer to (a)' }), '5');
    await user.tab();
    await screen.findByText('F1-KEPT-1');
    expect(kept[0]?.sequence).toBe(4);
  });

  it('marks a question to come back to', async () => {
    const sent: unknown[] = [];
    const { user } = open();
    serveWith('put', '/api/sittings/:id/items/:key/come-back', (body) => {
      sent.push(body);
      return HttpResponse.json(body as { comeBack: boolean });
    });
    await user.click(await screen.findByRole('checkbox', { name: 'Come back to question 1' }));
    expect(await screen.findByRole('link', { name: /Question 1, .*come back to/ })).toBeVisible();
    await vi.waitFor(() => expect(sent).toEqual([{ comeBack: true }]));
  });
});

describe('the clock', () => {
  it('can be hidden, stays hidden on the next page, and returns at five minutes', async () => {
    const { user } = open();
    await user.click(await screen.findByRole('button', { name: 'Hide clock' }));
    expect(screen.queryByRole('timer')).toBeNull();
    await user.click(screen.getByRole('link', { name: 'Review and hand in' }));
    await heading('Before you hand in');
    expect(screen.queryByRole('timer')).toBeNull();
    vi.useFakeTimers({ shouldAdvanceTime: true, now: Date.now() + 41 * 60_000 });
    expect(await screen.findByRole('timer')).toHaveTextContent(/^[34]:\d\d$/);
    expect(screen.queryByRole('button', { name: /clock/ })).toBeNull();
    expect(screen.getByText('Less than five minutes left.')).toBeVisible();
  });

  it('announces half time, ten minutes and one minute, and nothing else', async () => {
    vi.useFakeTimers({ shouldAdvanceTime: true });
    open();
    await heading('Run 1');
    const said: string[] = [];
    const start = Date.now();
    for (let second = 0; second < 44 * 60 + 30; second += 30) {
      vi.setSystemTime(start + second * 1000);
      await act(() => vi.advanceTimersByTimeAsync(500));
      const now = screen
        .getAllByRole('status')
        .map((status) => status.textContent)
        .filter((text) => text?.includes('left'))
        .join();
      if (now && now !== said.at(-1)) said.push(now);
    }
    expect(said).toEqual(['Half of the time is left.', 'Ten minutes left.', 'One minute left.']);
    expect(screen.getByRole('timer')).toHaveAttribute('aria-live', 'off');
  });

  it('goes to the result when the server has handed the paper in', async () => {
    const { router } = open({ closesAt: new Date(Date.now() + 1_500).toISOString() });
    await heading('Run 1');
    serve('get', '/api/sittings/:id', makeSitting({ state: 'handed-in', items: [] }));
    serve('get', '/api/sittings/:id/result', makeResult({ handedInHow: 'at-the-deadline' }));
    expect(await screen.findByText('The time is over.')).toBeVisible();
    await heading('Not passed');
    expect(router.state.location.pathname).toBe(`${page}/result`);
    expect(screen.getByText('At the deadline')).toBeVisible();
  });
});

describe('without a signal', () => {
  it('says how many answers wait, and sends them when it is back', async () => {
    const { user, kept } = open();
    apiServer.use(
      http.put('*/api/sittings/:id/items/:key/parts/:part', () => HttpResponse.error(), {
        once: true,
      }),
    );
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '48');
    await user.tab();
    expect(await screen.findByText('No signal.')).toBeVisible();
    expect(screen.getByText('1 answer waits on this device')).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Answer to (a)' })).toHaveValue('48');
    act(() => void window.dispatchEvent(new Event('online')));
    expect(await screen.findByText('Signal back.')).toBeVisible();
    expect(kept).toMatchObject([{ answer: { text: '48' } }]);
  });

  it('tells on the result what did not arrive in time', async () => {
    const { user } = open();
    serveWith('put', '/api/sittings/:id/items/:key/parts/:part', () =>
      problemReply(409, 'sitting-closed'),
    );
    serve('get', '/api/sittings/:id/result', makeResult());
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '48');
    await user.tab();
    await heading('Not passed');
    expect(screen.getByText(/One answer did not reach the school/)).toBeVisible();
    expect(localStorage.length).toBe(0);
  });
});

describe('on another device', () => {
  it('can be read, and taken over in words', async () => {
    const { user, kept } = open({ readOnly: true });
    const entry = await screen.findByRole('textbox', { name: 'Answer to (a)' });
    expect(entry).toHaveAttribute('readonly');
    serve('post', '/api/sittings/:id/take-over', makeSitting());
    await user.click(screen.getByRole('button', { name: 'Take over here' }));
    const writable = await screen.findByRole('textbox', { name: 'Answer to (a)' });
    await vi.waitFor(() => expect(writable).not.toHaveAttribute('readonly'));
    await user.type(screen.getByRole('textbox', { name: 'Answer to (a)' }), '7');
    await user.tab();
    await screen.findByText('F1-KEPT-1');
    expect(kept).toHaveLength(1);
  });

  it('becomes read only when the other takes over, and can take it back', async () => {
    const { user } = open();
    apiServer.use(
      http.put('*/api/sittings/:id/items/:key/parts/:part', () => problemReply(409, 'taken-over'), {
        once: true,
      }),
    );
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '48');
    await user.tab();
    await screen.findByText('This paper is being written somewhere else.');
    serve('post', '/api/sittings/:id/take-over', makeSitting());
    await user.click(screen.getByRole('button', { name: 'Take over here' }));
    // What was written here meanwhile is still here, and goes now.
    expect(await screen.findByText('F1-KEPT-1')).toBeVisible();
    expect(screen.getByRole('textbox', { name: 'Answer to (a)' })).toHaveValue('48');
  });
});

describe('the review', () => {
  it('lists what is blank and hands in after asking once more', async () => {
    const { user } = open({}, `${page}/review`);
    const table = await screen.findByRole('table', { name: 'Questions of this paper' });
    expect(within(table).getAllByText('Not answered')).toHaveLength(2);
    const handedIn: unknown[] = [];
    serveWith('post', '/api/sittings/:id/hand-in', (body) => {
      handedIn.push(body);
      return HttpResponse.json({ state: 'handed-in', handedInAt: new Date().toISOString() });
    });
    serve('get', '/api/sittings/:id/result', makeResult());
    await user.click(screen.getByRole('button', { name: 'Hand in paper F1' }));
    expect(screen.getByText('Hand in now?')).toBeVisible();
    expect(handedIn).toHaveLength(0);
    await user.click(screen.getByRole('button', { name: 'Yes, hand in' }));
    await heading('Not passed');
    expect(handedIn).toEqual([{}]);
  });

  it('shows an answer given a moment ago', async () => {
    const { user } = open();
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '48');
    await user.click(screen.getByRole('link', { name: 'Review and hand in' }));
    const row = await screen.findByRole('row', { name: /Run 1/ });
    expect(row).toHaveTextContent('Part answered, (b) is blank');
    expect(await within(row).findByText('F1-KEPT-1')).toBeVisible();
  });

  it('does not hand in while an answer waits', async () => {
    const { user } = open();
    serveWith('put', '/api/sittings/:id/items/:key/parts/:part', () =>
      problemReply(503, 'unavailable'),
    );
    await user.type(await screen.findByRole('textbox', { name: 'Answer to (a)' }), '48');
    await user.click(screen.getByRole('link', { name: 'Review and hand in' }));
    expect(
      await screen.findByRole('button', { name: 'Waits until all answers are sent' }),
    ).toBeDisabled();
    expect(screen.getByText('The school’s server does not take answers just now.')).toBeVisible();
  });
});

it('is sat from the first key to the last without a pointer', async () => {
  const { user, kept } = open();
  await heading('Run 1');
  const tabTo = async (target: HTMLElement) => {
    for (let steps = 0; document.activeElement !== target; steps += 1) {
      if (steps > 60) throw new Error(`Tab never reached ${target.outerHTML}`);
      await user.tab();
    }
  };
  await tabTo(screen.getByRole('textbox', { name: 'Answer to (a)' }));
  await user.keyboard('48.1');
  await tabTo(screen.getByRole('combobox', { name: 'Unit of (a)' }));
  // jsdom does not move a select by arrow keys as browsers do.
  fireEvent.change(screen.getByRole('combobox', { name: 'Unit of (a)' }), {
    target: { value: 'mΩ' },
  });
  await tabTo(screen.getByRole('radio', { name: '4 mm²' }));
  await user.keyboard(' ');
  await tabTo(screen.getByRole('link', { name: 'Question 2' }));
  await user.keyboard('{Enter}');
  await focusOn('Run 2');
  await tabTo(screen.getByRole('link', { name: 'Review and hand in' }));
  await user.keyboard('{Enter}');
  await focusOn('Before you hand in');
  await vi.waitFor(() => expect(kept.map(({ place }) => place)).toContain('k1 b'));
  serve('post', '/api/sittings/:id/hand-in', {
    state: 'handed-in',
    handedInAt: new Date().toISOString(),
  });
  serve('get', '/api/sittings/:id/result', makeResult());
  await tabTo(await screen.findByRole('button', { name: 'Hand in paper F1' }));
  await user.keyboard('{Enter}');
  expect(screen.getByRole('button', { name: 'Yes, hand in' })).toHaveFocus();
  await user.keyboard('{Enter}');
  await heading('Not passed');
});
