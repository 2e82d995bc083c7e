import { DomainError } from '../problems/domain-error.ts';

/** A code for a secret that was never shown, or was replaced by a newer one. */
export class NoEnrolment extends DomainError {
  readonly code = 'no-enrolment';
  constructor() {
    super('Begin again: show the picture first, then give the code of the app that read it.');
  }
}
