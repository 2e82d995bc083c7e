import { BLADE_A, BOLT_DOWN_A } from '../electrical/fuse-series.ts';
import { FUSE_RATINGS_A, nextSize, prevSize } from '../electrical/stock.ts';
import { AMPS, at, fixed, type FunctionEntries } from './trade-function.ts';

const AMPS_OF_AMPS = { takes: [AMPS], gives: AMPS };

/** Fuse-links by their series. */
export const PROTECTION_FUNCTIONS: FunctionEntries = [
  ['nextFuse', fixed('next fuse from', AMPS_OF_AMPS, (si) => nextSize(at(si, 0), FUSE_RATINGS_A))],
  [
    'prevFuse',
    fixed('largest fuse within', AMPS_OF_AMPS, (si) => prevSize(at(si, 0), FUSE_RATINGS_A)),
  ],
  ['nextBlade', fixed('next blade fuse from', AMPS_OF_AMPS, (si) => nextSize(at(si, 0), BLADE_A))],
  [
    'nextBolt',
    fixed('next bolt-down fuse from', AMPS_OF_AMPS, (si) => nextSize(at(si, 0), BOLT_DOWN_A)),
  ],
];
