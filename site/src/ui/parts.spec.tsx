import { render, screen } from '@testing-library/react';
import { expect, it } from 'vitest';
import { Line } from './line.tsx';
import { sayLength } from './pass-rule.tsx';

it('says how many characters are still to go', () => {
  expect(sayLength(11)).toBe('11 of 15. Four more to go.');
  expect(sayLength(14)).toBe('14 of 15. One more to go.');
  expect(sayLength(23)).toBe('23 characters: long enough.');
});

it('sets a line of working with its symbol, minus and unit, and underlines what differs', () => {
  render(
    <Line
      tokens={[
        { kind: 'symbol', text: 'U_d' },
        { kind: 'operator', text: '=' },
        { kind: 'number', text: '-0.5', differs: true },
        { kind: 'unit', text: 'V' },
      ]}
    />,
  );
  expect(screen.getByText('d').tagName).toBe('SUB');
  expect(screen.getByText('\u22120.5').closest('u')).not.toBeNull();
  expect(document.body.textContent).toBe('Ud = \u22120.5\u2009V');
});
