import { expect, it } from 'vitest';
import { placeCells } from './cell-rows.ts';

it('gives each cell the edges it shares with the frame', () => {
  const placed = placeCells([
    { label: 'Sheet no.', value: '3.4', kind: 'strong' },
    { label: 'Revision', value: 'B' },
    { label: 'Issued', value: '2 Nov 2026' },
    { label: 'Subject', value: 'Voltage drop', span: 4 },
    { label: 'Checked by', value: 'R. Nakamura' },
  ]);
  expect(placed.map((cell) => cell.className)).toEqual([
    'span-2 strong row-start first-row',
    'span-2 first-row',
    'span-2 row-end first-row',
    'span-4 row-start last-row',
    'span-2 row-end last-row',
  ]);
});

it('starts a new row for a cell that does not fit', () => {
  const placed = placeCells([
    { label: 'Name', value: 'a', span: 4 },
    { label: 'Course', value: 'b', span: 4 },
  ]);
  expect(placed[1]?.className).toBe('span-4 row-start last-row');
});
