import { render, screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { TableExtract } from './table-extract.tsx';

it('heads each column with its unit, names each row and says the source', () => {
  const table = {
    caption: 'Least pull on a crimp, one minute',
    source: 'A standard (from memory)',
    columns: [
      { label: 'Gauge', unit: 'AWG' },
      { label: 'Least pull', unit: 'N' },
    ],
    rows: [
      ['16', '67'],
      ['14', '133'],
    ],
  };
  render(<TableExtract table={table} />);
  const drawn = within(screen.getByRole('table', { name: table.caption }));
  expect(drawn.getByRole('columnheader', { name: 'Least pull N' })).toBeVisible();
  expect(drawn.getByRole('row', { name: '14 133' })).toBeVisible();
  expect(drawn.getByRole('rowheader', { name: '14' })).toBeVisible();
  expect(screen.getByText('Source: A standard (from memory)')).toBeVisible();
  // It may be wider than a phone: the keyboard reaches it to scroll.
  expect(screen.getByRole('group', { name: table.caption })).toHaveAttribute('tabindex', '0');
});
