import { screen } from '@testing-library/react';
import { expect, it, vi } from 'vitest';
import { serve, signInAs } from '../testing/api-server.ts';
import { renderRoute } from '../testing/render-route.tsx';

const term = (name: string, more: object = {}) => ({
  ...{ term: name, anchor: name, means: `What ${name} is.`, also: [], sheets: [] },
  ...more,
});

it('stands by letters, with the sheet that explains each word, and marks the one asked for', async () => {
  Element.prototype.scrollIntoView = vi.fn();
  signInAs();
  const sheets = [{ number: '3.1', title: 'Where volts go' }];
  const terms = [term('awg'), term('Ångström'), term('drop', { sheets, also: ['loss'] })];
  serve('get', '/api/glossary', { language: 'en', revision: 'A', terms });
  renderRoute('/glossary#drop');
  expect(await screen.findByRole('link', { name: 'Letter D' })).toHaveAttribute(
    'href',
    '#letter-D',
  );
  expect(screen.getAllByRole('link', { name: /^Letter/ })).toHaveLength(2);
  expect(screen.getByText('drop').parentElement).toHaveClass('named');
  expect(screen.getByText('awg').parentElement).not.toHaveClass('named');
  expect(screen.getByText('Also: loss')).toBeVisible();
  expect(screen.getByRole('link', { name: 'Sheet 3.1, Where volts go' })).toHaveAttribute(
    'href',
    '/sheets/3.1',
  );
});
