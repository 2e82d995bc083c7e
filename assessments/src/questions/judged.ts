import { type Compiled, type Drawn, type Part } from './compiled.ts';
import { type Finding } from './judge.ts';
import { type OwnAccount } from './own-values.ts';
import { type TypedQuantity } from './read-answer.ts';
import { type PartView, type RawAnswer } from './types.ts';

/** One part after the marker has looked at it. */
export interface Judged {
  part: Part;
  view: PartView;
  answer: RawAnswer;
  finding: Finding;
  own: OwnAccount | null;
  typed: TypedQuantity | null;
}

/** A question being explained; `shown` are the steps whose lines have been printed already. */
export interface Page {
  question: Compiled;
  drawn: Drawn;
  shown: Set<string>;
}
