import { render } from '@testing-library/react';
import { expect, it } from 'vitest';
import { Line, type Token } from './line.tsx';

const set = (...tokens: Token[]) => render(<Line tokens={tokens} />).container;

it('keeps a value with its unit and a bracket with what it holds', () => {
  const line = set(
    { kind: 'symbol', text: 'A_min' },
    { kind: 'operator', text: '=' },
    { kind: 'number', text: '2' },
    { kind: 'symbol', text: 'L' },
    { kind: 'operator', text: '÷' },
    { kind: 'operator', text: '(' },
    { kind: 'number', text: '3' },
    { kind: 'unit', text: '%' },
    { kind: 'operator', text: '×' },
    { kind: 'number', text: '-12.8' },
    { kind: 'unit', text: 'V' },
    { kind: 'operator', text: ')' },
  );
  expect(line).toHaveTextContent('Amin = 2L ÷ (3\u2009% × \u221212.8\u2009V)', {
    normalizeWhitespace: false,
  });
});

it('sets words apart from figures and underlines the term that differs', () => {
  const line = set(
    { kind: 'operator', text: '=' },
    { kind: 'text', text: 'next stock size from' },
    { kind: 'number', text: '7.52', differs: true },
    { kind: 'unit', text: 'mm²' },
  );
  expect(line).toHaveTextContent('= next stock size from 7.52\u2009mm²', {
    normalizeWhitespace: false,
  });
  expect(line.querySelector('u')).toHaveTextContent('7.52');
});
