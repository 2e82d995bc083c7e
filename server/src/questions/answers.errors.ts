import { DomainError } from '../problems/domain-error.ts';

/** A part whose answer can be read in more than one way, or in none. */
export interface UnclearPart {
  /** Item of a worksheet; a single question has none. */
  readonly key?: string;
  readonly part: string;
  readonly ask: string;
  readonly readings: readonly string[];
}

/** Answers that must be asked back before anything is marked. Nothing was used up. */
export class AnswerUnclear extends DomainError {
  readonly code = 'answer-unclear';
  override readonly extensions: { unclear: readonly UnclearPart[] };
  constructor(unclear: readonly UnclearPart[]) {
    super('Some answers cannot be read. Nothing has been marked; say what you mean, then go on.');
    this.extensions = { unclear };
  }
}
