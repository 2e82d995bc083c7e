import { DomainError } from '../problems/domain-error.ts';

/** Somebody must always be able to give roles. */
export class LastAdministrator extends DomainError {
  readonly code = 'last-administrator';
  constructor() {
    super('This is the last administrator. Make somebody else one first.');
  }
}

/** What an administrator may not do to their own account. */
export class NotOnOneself extends DomainError {
  readonly code = 'not-on-oneself';
  constructor(what: string) {
    super(`${what} Another administrator can do it.`);
  }
}
