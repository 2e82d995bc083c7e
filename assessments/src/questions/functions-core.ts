import { at, fixed, type FunctionEntries, PURE } from './trade-function.ts';

/** Functions of plain arithmetic. */
export const CORE_FUNCTIONS: FunctionEntries = [
  [
    'sqrt',
    { arity: [1, 1], shape: { kind: 'root' }, run: (si) => Math.sqrt(at(si, 0)), says: '√' },
  ],
  [
    'abs',
    { arity: [1, 1], shape: { kind: 'same' }, run: (si) => Math.abs(at(si, 0)), says: 'size of' },
  ],
  [
    'min',
    {
      arity: [2, 4],
      shape: { kind: 'same' },
      run: (si) => Math.min(...si),
      says: 'the smaller of',
    },
  ],
  [
    'max',
    { arity: [2, 4], shape: { kind: 'same' }, run: (si) => Math.max(...si), says: 'the larger of' },
  ],
  ['ln', fixed('ln', { takes: [PURE], gives: PURE }, (si) => Math.log(at(si, 0)))],
];
