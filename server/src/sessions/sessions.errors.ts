import { DomainError } from '../problems/domain-error.ts';

export class SecondFactorNeeded extends DomainError {
  readonly code = 'second-factor-needed';
  constructor() {
    super('Administrators give a code from their second factor in each session.');
  }
}
