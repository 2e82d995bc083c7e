import { DomainError } from '../problems/domain-error.ts';

/** The pool holds too few questions, or the scheme behind the paper is not published. */
export class PaperNotReady extends DomainError {
  readonly code = 'paper-not-ready';
  constructor(why: string) {
    super(`This paper cannot be sat just now: ${why} The school has to put that right.`);
  }
}
