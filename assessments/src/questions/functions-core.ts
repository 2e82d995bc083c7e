import { nextSize, prevSize } from '../electrical/stock.ts';
import { at, fixed, type FunctionEntries, PURE, type TradeFunction } from './trade-function.ts';

/** A function of quantities of one kind that gives such a quantity. */
function alike(
  says: string,
  arity: TradeFunction['arity'],
  run: (si: readonly number[]) => number,
): TradeFunction {
  return { arity, shape: { kind: 'same' }, run, says };
}

/** The listed sizes that follow the wanted one, smallest first. */
const listed = (si: readonly number[]): number[] => si.slice(1).sort((a, b) => a - b);
const MOST_LISTED = 24;

/** Functions of plain arithmetic. */
export const CORE_FUNCTIONS: FunctionEntries = [
  [
    'sqrt',
    { arity: [1, 1], shape: { kind: 'root' }, run: (si) => Math.sqrt(at(si, 0)), says: '√' },
  ],
  ['abs', alike('size of', [1, 1], (si) => Math.abs(at(si, 0)))],
  ['min', alike('the smaller of', [2, 4], (si) => Math.min(...si))],
  ['max', alike('the larger of', [2, 4], (si) => Math.max(...si))],
  [
    'nextOf',
    alike('next in the list from', [2, MOST_LISTED], (si) => nextSize(at(si, 0), listed(si))),
  ],
  [
    'prevOf',
    alike('largest in the list within', [2, MOST_LISTED], (si) => prevSize(at(si, 0), listed(si))),
  ],
  ['ln', fixed('ln', { takes: [PURE], gives: PURE }, (si) => Math.log(at(si, 0)))],
  ['exp', fixed('exp', { takes: [PURE], gives: PURE }, (si) => Math.exp(at(si, 0)))],
];
