import { DomainError } from '../problems/domain-error.ts';

export class JoinCodeUnknown extends DomainError {
  readonly code = 'join-code-unknown';
  constructor() {
    super('No class has this code. Check it with your trainer; it stands on the class’s letter.');
  }
}

export class AlreadyInClass extends DomainError {
  readonly code = 'already-in-class';
  constructor(name: string) {
    super(`You are in ${name} already.`);
  }
}
