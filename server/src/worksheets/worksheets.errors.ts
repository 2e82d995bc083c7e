import { DomainError } from '../problems/domain-error.ts';

export class WorksheetHandedIn extends DomainError {
  readonly code = 'worksheet-handed-in';
  constructor() {
    super('This worksheet has been handed in and marked. Take it again with fresh figures.');
  }
}
