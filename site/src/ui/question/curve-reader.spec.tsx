import { fireEvent, render, screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { CurveReader } from './curve-reader.tsx';
import { readAt } from './curve-scales.ts';

const curve = {
  hours: [0, 2, 4, 8],
  volts: [12, 14.4, 14.4, 13.5],
  amps: [40, 40, 10, 2],
  intervals: [{ label: 'A', fromH: 2.5, toH: 3.5 }],
};

it('reads between the samples along a straight line', () => {
  expect(readAt(curve, 1)).toEqual({ hours: 1, values: [13.2, 40] });
  expect(readAt(curve, 3)).toMatchObject({ values: [14.4, 25] });
  expect(readAt(curve, 8)).toMatchObject({ values: [13.5, 2] });
});

it('moves by a tenth with the buttons and by an hour with the Page keys, and says the reading', () => {
  render(<CurveReader curve={curve} />);
  const slider = screen.getByRole('slider', { name: /time in hours/ });
  expect(slider).toHaveAttribute('aria-valuetext', '4.0 hours, 14.40 volts, 10.0 amperes');
  fireEvent.keyDown(slider, { key: 'PageDown' });
  expect(slider).toHaveAttribute('aria-valuetext', '3.0 hours, 14.40 volts, 25.0 amperes');
  fireEvent.click(screen.getByRole('button', { name: 'Cursor on 0.1 hours' }));
  expect(slider).toHaveAttribute('aria-valuetext', '3.1 hours, 14.40 volts, 23.5 amperes');
  for (let hour = 0; hour < 9; hour += 1) fireEvent.keyDown(slider, { key: 'PageUp' });
  expect(slider).toHaveValue('8');
});

it('gives the same data as a table, with the interval at the cursor marked', () => {
  render(<CurveReader curve={curve} />);
  fireEvent.change(screen.getByRole('slider'), { target: { value: '3' } });
  const volts = within(screen.getByRole('row', { name: /Voltage/ })).getAllByRole('cell');
  expect(volts.map((cell) => cell.textContent)).toHaveLength(17);
  expect(volts[4]).toHaveTextContent('14.40');
  expect(volts.filter((cell) => cell.className.includes('within'))).toHaveLength(3);
});

it('reads and lists a second voltage and a second current by their own names', () => {
  render(
    <CurveReader
      curve={{ ...curve, batteryVolts: [12, 13.9, 14.2, 13.5], batteryAmps: [30, 30, 0, -8] }}
    />,
  );
  expect(screen.getByRole('slider')).toHaveAttribute(
    'aria-valuetext',
    '4.0 hours, 14.40 volts, at the charger, 14.20 volts, at the battery, 10.0 amperes, charger, 0.0 amperes, into the battery',
  );
  const row = screen.getByRole('row', { name: /^Into the battery, A/ });
  expect(within(row).getAllByRole('cell').at(-1)).toHaveTextContent('−8.0');
});

it('reads a short log second by second', () => {
  const short = { ...curve, hours: [0, 0.05, 0.1, 0.2], intervals: [] };
  render(<CurveReader curve={short} />);
  const slider = screen.getByRole('slider', { name: /time in seconds/ });
  expect(slider).toHaveAttribute('max', '720');
  expect(slider).toHaveAttribute('aria-valuetext', '360 seconds, 14.40 volts, 10.0 amperes');
  fireEvent.click(screen.getByRole('button', { name: 'Cursor back 1 second' }));
  fireEvent.keyDown(slider, { key: 'PageDown' });
  expect(slider).toHaveValue('329');
  const times = within(screen.getByRole('row', { name: /^Time, s/ })).getAllByRole('cell');
  expect(times.map(({ textContent }) => textContent)).toHaveLength(25);
  expect(times.at(-1)).toHaveTextContent('720');
});
