import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { noAnswerProblem, ProblemError } from '../../api/problem.ts';
import { makeItem, makeSitting } from '../../testing/sitting.ts';
import { blankAnswer, type RawAnswer } from '../../ui/question/views.ts';
import { AnswerDesk } from './answer-desk.ts';
import { type Saved, type Sending } from './queries.ts';

const typed = (text: string): RawAnswer => ({ ...blankAnswer, text });

function refusal(slug: string, status = 409, more: object = {}): ProblemError {
  return new ProblemError({ type: `/problems/${slug}`, title: slug, status, ...more });
}

/** Keeps what arrives as the server does: the highest sequence of a part wins, a key counts once. */
class KeepingServer {
  readonly kept = new Map<string, Sending>();
  readonly arrived: Sending[] = [];
  private readonly keys = new Map<string, Saved>();
  refuse: (sending: Sending) => Error | null = () => null;
  /** The answer is kept and its receipt is lost on the way back. */
  losesReceipts = false;

  readonly send = async (sending: Sending): Promise<Saved> => {
    this.arrived.push(sending);
    await Promise.resolve();
    const error = this.refuse(sending);
    if (error) throw error;
    const saved = this.keys.get(sending.idempotencyKey) ?? this.keep(sending);
    if (this.losesReceipts) throw noAnswerProblem();
    return saved;
  };

  textOf(item: string, part: string): string | undefined {
    return this.kept.get(`${item} ${part}`)?.answer.text;
  }

  private keep(sending: Sending): Saved {
    const place = `${sending.item} ${sending.part}`;
    const highest = this.kept.get(place)?.sequence ?? 0;
    if (sending.sequence <= highest) throw refusal('sequence-used', 409, { highest });
    this.kept.set(place, sending);
    const now = new Date().toISOString();
    const saved: Saved = {
      savedAt: now,
      receipt: `F1-${this.keys.size + 1}`,
      sequence: sending.sequence,
      reading: { state: 'understood', value: 1, shown: '1' },
      now,
      closesAt: now,
    };
    this.keys.set(sending.idempotencyKey, saved);
    return saved;
  }
}

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

const pass = (ms: number) => vi.advanceTimersByTimeAsync(ms);

function openDesk(server: KeepingServer, sitting = makeSitting()): AnswerDesk {
  const desk = new AnswerDesk(sitting, server.send);
  desk.start();
  return desk;
}

describe('writing', () => {
  it('sends once typing pauses, and only the last of what was typed', async () => {
    const server = new KeepingServer();
    const desk = openDesk(server);
    for (const text of ['0', '0.', '0.7']) desk.write('k1', 'a', typed(text));
    await pass(500);
    expect(server.arrived).toHaveLength(0);
    await pass(1_000);
    expect(server.arrived.map(({ answer }) => answer.text)).toEqual(['0.7']);
    expect(desk.snapshot()).toMatchObject({ waiting: 0, receipts: [{ item: 1, part: 'a' }] });
  });

  it('sends at once when an entry is left', async () => {
    const server = new KeepingServer();
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('0.7'));
    desk.flush();
    await pass(0);
    expect(server.textOf('k1', 'a')).toBe('0.7');
  });

  it('keeps what is typed while an older answer is on its way', async () => {
    const server = new KeepingServer();
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('1'));
    desk.flush();
    desk.write('k1', 'a', typed('12'));
    await pass(1_000);
    expect(server.textOf('k1', 'a')).toBe('12');
    expect(desk.snapshot()).toMatchObject({ waiting: 0, answers: { k1: { a: { text: '12' } } } });
  });
});

describe('without a signal', () => {
  it('counts what waits, tries again with longer pauses, and says when it has caught up', async () => {
    const server = new KeepingServer();
    server.refuse = noAnswerProblem;
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('1'));
    desk.write('k2', 'a', typed('2'));
    await pass(900);
    expect(desk.snapshot()).toMatchObject({ waiting: 2, cut: 'signal', savedAt: null });
    await pass(20_000);
    expect(server.arrived.length).toBeLessThan(7);
    server.refuse = () => null;
    await pass(15_000);
    expect(desk.snapshot()).toMatchObject({ waiting: 0, cut: null, caughtUp: 2 });
    expect([server.textOf('k1', 'a'), server.textOf('k2', 'a')]).toEqual(['1', '2']);
  });

  it('goes on at once when the signal is back', async () => {
    const server = new KeepingServer();
    server.refuse = noAnswerProblem;
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('1'));
    await pass(30_000);
    server.refuse = () => null;
    desk.tryAgain();
    await pass(0);
    expect(desk.snapshot().waiting).toBe(0);
  });

  it('brings waiting answers over a reload', async () => {
    const server = new KeepingServer();
    server.refuse = noAnswerProblem;
    const before = openDesk(server);
    before.write('k1', 'a', typed('0.768'));
    await pass(900);
    before.leave();
    server.refuse = () => null;
    const after = openDesk(server);
    expect(after.snapshot()).toMatchObject({
      waiting: 1,
      answers: { k1: { a: { text: '0.768' } } },
    });
    await pass(0);
    expect(server.textOf('k1', 'a')).toBe('0.768');
    expect(localStorage.length).toBe(0);
  });

  it('repeats an answer whose receipt was lost under the same key', async () => {
    const server = new KeepingServer();
    server.losesReceipts = true;
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('1'));
    await pass(900);
    server.losesReceipts = false;
    await pass(1_000);
    const keys = new Set(server.arrived.map(({ idempotencyKey }) => idempotencyKey));
    expect([server.arrived.length, keys.size]).toEqual([2, 1]);
    expect(desk.snapshot().waiting).toBe(0);
  });

  it('lets go of a waiting answer when the server holds a later one', async () => {
    const server = new KeepingServer();
    server.refuse = noAnswerProblem;
    openDesk(server).write('k1', 'a', typed('old'));
    server.refuse = () => null;
    const receipt = { savedAt: new Date().toISOString(), receipt: 'F1-9', sequence: 4 };
    const later = makeItem(1, { answers: { a: { ...typed('new'), ...receipt } } });
    const desk = openDesk(server, makeSitting({ items: [later, makeItem(2)] }));
    expect(desk.snapshot()).toMatchObject({ waiting: 0, answers: { k1: { a: { text: 'new' } } } });
  });
});

describe('refusals', () => {
  it('counts on from the highest sequence and sends what stands there now', async () => {
    const server = new KeepingServer();
    const other = openDesk(server);
    for (const text of ['1', '2', '3']) {
      other.write('k1', 'a', typed(text));
      other.flush();
      await pass(0);
    }
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('4'));
    desk.flush();
    desk.write('k1', 'a', typed('45'));
    await pass(900);
    expect(server.textOf('k1', 'a')).toBe('45');
    expect(desk.snapshot().waiting).toBe(0);
  });

  it('says at the part why an answer was not kept', async () => {
    const server = new KeepingServer();
    server.refuse = () => refusal('invalid-request', 422, { detail: 'At most 200 characters.' });
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('9'));
    await pass(900);
    expect(desk.snapshot().unclear['k1 a']).toBe('This was not kept. At most 200 characters.');
    expect(desk.snapshot().waiting).toBe(0);
  });

  it.each([
    ['sitting-closed', 'closed'],
    ['taken-over', 'taken-over'],
  ])('stops at %s and keeps count of what did not arrive', async (slug, stopped) => {
    const server = new KeepingServer();
    server.refuse = () => refusal(slug);
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('1'));
    await pass(900);
    expect(desk.snapshot()).toMatchObject({ stopped, waiting: 1 });
    desk.write('k1', 'a', typed('2'));
    await pass(60_000);
    expect(server.arrived).toHaveLength(1);
  });

  it('tries no more once its page is left', async () => {
    const server = new KeepingServer();
    server.refuse = noAnswerProblem;
    const desk = openDesk(server);
    desk.write('k1', 'a', typed('1'));
    desk.leave();
    await pass(60_000);
    expect(server.arrived).toHaveLength(1);
  });
});

it('ends with the last answer of each part, whatever was lost, repeated or late', async () => {
  // A small linear congruential generator: the same disorder on each run.
  let seed = 7;
  const chance = () => (seed = (seed * 1_103_515_245 + 12_345) % 2 ** 31) / 2 ** 31;
  const server = new KeepingServer();
  const last: Record<string, string> = {};
  let desk = openDesk(server);
  for (let step = 0; step < 200; step += 1) {
    const [item, text] = [chance() < 0.5 ? 'k1' : 'k2', String(step)];
    server.losesReceipts = chance() < 0.2;
    const isCut = chance() < 0.3;
    server.refuse = () => (isCut ? noAnswerProblem() : null);
    desk.write(item, 'a', typed(text));
    last[item] = text;
    await pass(chance() * 2_000);
    if (chance() < 0.1) {
      desk.leave();
      await pass(0);
      desk = openDesk(server, asRead(server));
    }
  }
  server.losesReceipts = false;
  server.refuse = () => null;
  desk.flush();
  await pass(60_000);
  expect(desk.snapshot().waiting).toBe(0);
  expect({ k1: server.textOf('k1', 'a'), k2: server.textOf('k2', 'a') }).toEqual(last);
});

/** The sitting as the server would give it now. */
function asRead(server: KeepingServer) {
  const items = [1, 2].map((number) => {
    const kept = server.kept.get(`k${number} a`);
    if (!kept) return makeItem(number);
    const receipt = { savedAt: new Date().toISOString(), receipt: 'F1', sequence: kept.sequence };
    return makeItem(number, { answers: { a: { ...kept.answer, ...receipt } } });
  });
  return makeSitting({ items });
}

it('opens again with the choices of an answer that has several', () => {
  const receipt = { savedAt: '2026-12-01T10:03:10Z', receipt: 'F1-OLD', sequence: 3 };
  const answers = { a: { ...blankAnswer, options: ['s2', 's1'], ...receipt } };
  const desk = new AnswerDesk(makeSitting({ items: [makeItem(1, { answers })] }), vi.fn());
  expect(desk.snapshot().answers['k1']?.['a']).toEqual({ ...blankAnswer, options: ['s2', 's1'] });
});
