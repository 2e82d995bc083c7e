import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { noAnswerProblem, toProblem } from '../../api/problem.ts';
import { blankAnswer } from '../../ui/question/views.ts';
import { AnswerKeeper } from './answer-keeper.ts';

const typed = (text: string) => ({ ...blankAnswer, text });
const saved = { savedAt: '2026-12-01T12:41:00Z', readings: {} };

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

function keep(save: ConstructorParameters<typeof AnswerKeeper>[1]) {
  return new AnswerKeeper({ answers: { q1: {} }, savedAt: null }, save);
}

it('saves once typing rests, only the parts that changed', async () => {
  const save = vi.fn().mockResolvedValue(saved);
  const keeper = keep(save);
  keeper.change('q1', 'a', typed('2'));
  keeper.change('q1', 'a', typed('24'));
  await vi.advanceTimersByTimeAsync(1000);
  expect(save.mock.calls).toEqual([['q1', { a: typed('24') }]]);
  expect(keeper.read()).toMatchObject({ state: 'saved', savedAt: saved.savedAt });
});

it('never sends a newer answer before the older one has landed', async () => {
  let land = () => {};
  const save = vi.fn(() => new Promise<typeof saved>((done) => (land = () => done(saved))));
  const keeper = keep(save);
  keeper.change('q1', 'a', typed('1'));
  void keeper.flush();
  keeper.change('q1', 'a', typed('2'));
  await vi.advanceTimersByTimeAsync(2000);
  expect(save).toHaveBeenCalledTimes(1);
  land();
  await vi.advanceTimersByTimeAsync(2000);
  expect(save).toHaveBeenLastCalledWith('q1', { a: typed('2') });
});

it('holds answers without a signal and sends them when there is one', async () => {
  const save = vi.fn().mockRejectedValueOnce(noAnswerProblem()).mockResolvedValue(saved);
  const keeper = keep(save);
  keeper.change('q1', 'a', typed('24'));
  expect(await keeper.flush()).toBe(false);
  expect(keeper.read()).toMatchObject({ state: 'waiting', error: null });
  expect(keeper.hasUnsent).toBe(true);
  await vi.advanceTimersByTimeAsync(6000);
  expect(keeper.read().state).toBe('saved');
  expect(save).toHaveBeenLastCalledWith('q1', { a: typed('24') });
});

it('says a refusal and does not send the same again by itself', async () => {
  const refusal = toProblem({ type: '/problems/worksheet-handed-in', title: 'Handed in' }, 409);
  const save = vi
    .fn()
    .mockRejectedValue(Object.assign(refusal, { problem: { ...refusal.problem, status: 409 } }));
  const keeper = keep(save);
  keeper.change('q1', 'a', typed('24'));
  await vi.advanceTimersByTimeAsync(20_000);
  expect(save).toHaveBeenCalledTimes(1);
  expect(keeper.read()).toMatchObject({ state: 'refused', error: refusal });
});
