import { type Compiled, type Drawn, type Part } from './compiled.ts';
import { type Finding } from './judge.ts';
import { type OwnSums } from './own-values.ts';
import { type TypedQuantity } from './read-answer.ts';
import { type RawAnswer } from './types.ts';

/** One part after the marker has looked at it. */
export interface Judged {
  part: Part;
  answer: RawAnswer;
  finding: Finding;
  /** Sums on own earlier values; null where none can be. */
  sums: OwnSums | null;
  typed: TypedQuantity | null;
  /** Whether the value was beyond sense, so that nothing is worked on with it. */
  isCarryStopped: boolean;
}

/** A question being explained; `shown` are the steps whose lines have been printed already. */
export interface Page {
  question: Compiled;
  drawn: Drawn;
  shown: Set<string>;
}
