import { render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { useState } from 'react';
import { expect, it, vi } from 'vitest';
import { PartEntry } from './part-entry.tsx';
import { blankAnswer, isAnswered, type PartView, type RawAnswer, standingOf } from './views.ts';

const part = (more: Partial<PartView>): PartView => ({
  id: 'a',
  kind: 'choices',
  prompt: 'Which belong?',
  marks: 3,
  symbol: null,
  units: [],
  rounding: null,
  options: [
    { id: 'x', text: 'Load on' },
    { id: 'y', text: 'Measure the supply' },
    { id: 'z', text: 'Measure at the load' },
  ],
  rows: [],
  layout: 'rows',
  ...more,
});

const order = part({ kind: 'order' });
const match = part({
  kind: 'match',
  rows: [
    { id: 'r', text: 'bilge pump' },
    { id: 's', text: 'cabin light' },
  ],
});

/** Keeps the answer as a page would, and tells what it was each time. */
function open(asked: PartView) {
  const onChange = vi.fn<(answer: RawAnswer) => void>();
  const onLeave = vi.fn();
  function Page() {
    const [answer, setAnswer] = useState<RawAnswer>();
    const keep = (next: RawAnswer) => {
      onChange(next);
      setAnswer(next);
    };
    return (
      <>
        <PartEntry part={asked} answer={answer} onChange={keep} onLeave={onLeave} />
        <button type="button">elsewhere</button>
      </>
    );
  }
  render(<Page />);
  const last = () => onChange.mock.lastCall?.[0].options;
  return { user: userEvent.setup(), last, onLeave };
}

it('takes every tick, in the order of the list, and counts as left when the list is left', async () => {
  const { user, last, onLeave } = open(part({}));
  await user.click(screen.getByRole('checkbox', { name: 'Measure at the load' }));
  await user.click(screen.getByRole('checkbox', { name: 'Load on' }));
  expect(last()).toEqual(['x', 'z']);
  await user.click(screen.getByRole('checkbox', { name: 'Measure at the load' }));
  expect(last()).toEqual(['x']);
  expect(onLeave).not.toHaveBeenCalled();
  await user.click(screen.getByRole('button', { name: 'elsewhere' }));
  expect(onLeave).toHaveBeenCalledOnce();
});

it('moves a step by the keyboard, keeps the focus on it and says where it stands', async () => {
  const { user, last } = open(order);
  const up = screen.getByRole('button', { name: 'Move up: Measure at the load' });
  up.focus();
  await user.keyboard('{Enter}');
  expect(last()).toEqual(['x', 'z', 'y']);
  expect(up).toHaveFocus();
  expect(screen.getByRole('status')).toHaveTextContent('Measure at the load: step 2 of 3.');
  await user.keyboard(' ');
  expect(last()).toEqual(['z', 'x', 'y']);
  const rows = screen.getAllByRole('listitem').map((row) => row.textContent);
  expect(rows.slice(-3).map((text) => text.slice(0, 2))).toEqual(['1M', '2L', '3M']);
  // At the top it goes no further, and the focus is not lost.
  expect(up).toHaveAttribute('aria-disabled', 'true');
  await user.keyboard(' ');
  expect(last()).toEqual(['z', 'x', 'y']);
  expect(up).toHaveFocus();
});

it('takes the steps as they stand when that is said, and not before', async () => {
  const { user, last } = open(order);
  expect(screen.getByText(/Nothing has been put in order yet/)).toBeVisible();
  await user.click(screen.getByRole('button', { name: /right order as they stand/ }));
  expect(last()).toEqual(['x', 'y', 'z']);
});

it('keeps the choice for each item at the place of the item', async () => {
  const { user, last } = open(match);
  await user.selectOptions(screen.getByLabelText('cabin light'), 'Load on');
  expect(last()).toEqual(['', 'x']);
  await user.selectOptions(screen.getByLabelText('bilge pump'), 'Load on');
  expect(last()).toEqual(['x', 'x']);
  await user.selectOptions(screen.getByLabelText('cabin light'), 'choose');
  expect(last()).toEqual(['x', '']);
});

it('can be looked at without being changed', () => {
  render(<PartEntry part={order} answer={undefined} readOnly onChange={() => {}} />);
  expect(screen.queryByRole('button')).toBeNull();
  expect(within(screen.getByRole('group')).getAllByRole('listitem')).toHaveLength(3);
});

it('counts a match as answered when each item has its text, and as begun before', () => {
  const answers = (options: string[]) => ({ a: { ...blankAnswer, options } });
  expect(isAnswered(match, answers(['x', '']).a)).toBe(false);
  expect(standingOf([match], answers(['x', '']))).toBe('part');
  expect(standingOf([match], answers(['', '']))).toBe('not');
  expect(standingOf([match], answers(['x', 'x']))).toBe('answered');
  expect(standingOf([order], answers([]))).toBe('not');
});
