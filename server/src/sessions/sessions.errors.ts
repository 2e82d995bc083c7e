import { DomainError } from '../problems/domain-error.ts';

export class SecondFactorNeeded extends DomainError {
  readonly code = 'second-factor-needed';
  constructor() {
    super('Administrators give a code from their second factor in each session.');
  }
}

export class FreshSignInNeeded extends DomainError {
  readonly code = 'fresh-sign-in-needed';
  constructor() {
    super('Give your passphrase once more: this can be done in the quarter of an hour after it.');
  }
}
