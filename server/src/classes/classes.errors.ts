import { DomainError } from '../problems/domain-error.ts';

export class JoinCodeUnknown extends DomainError {
  readonly code = 'join-code-unknown';
  constructor() {
    super('No class has this code. Check it with your trainer; it stands on the class’s letter.');
  }
}

/** A class is a school's and follows a course: without both there is nothing to open. */
export class ClassNotPossible extends DomainError {
  readonly code = 'class-not-possible';
  constructor(missing: string) {
    super(`No class can be opened yet: ${missing}`);
  }
}

export class AlreadyInClass extends DomainError {
  readonly code = 'already-in-class';
  constructor(name: string) {
    super(`You are in ${name} already.`);
  }
}
