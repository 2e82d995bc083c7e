import { screen, within } from '@testing-library/react';
import { expect, it } from 'vitest';
import { serve, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

it('prints each table with its units, its caution and how far to trust it', async () => {
  signInAs();
  serve('get', '/api/tables', {
    tables: [
      {
        slug: 'ambient-formula',
        title: 'Ambient factor',
        note: 'Empty where the air is as hot as the jacket.',
        columns: [
          { label: 'Air', unit: '°C' },
          { label: '60 °C jacket', unit: '' },
        ],
        rows: [{ cells: ['30', '1.00'] }, { cells: ['60', ''] }],
        sources: [{ text: 'Formula', provenance: 'from memory' }],
        caution: 'Your local code decides.',
      },
    ],
    symbols: {
      source: 'IEC 60617 (from memory)',
      list: [{ slug: 'fuse', letter: 'F', name: 'Fuse', looks: 'A box.', means: 'It opens.' }],
    },
    local: 'Local first.',
  });
  renderRoute('/tables');
  const table = await screen.findByRole('region', { name: /Ambient factor/ });
  expect(within(table).getByRole('columnheader', { name: 'Air, °C' })).toBeVisible();
  expect(within(table).getByRole('row', { name: '60 none' })).toBeVisible();
  expect(table).toHaveTextContent(/Before you use it Your local code decides/);
  expect(table).toHaveTextContent(/Formula \(from memory\)/);
  expect(screen.getByRole('link', { name: /Ambient factor/ })).toHaveAttribute(
    'href',
    '#ambient-formula',
  );
  expect(screen.getByRole('rowheader', { name: 'Fuse' })).toBeVisible();
});
