import { DomainError } from '../problems/domain-error.ts';

export class PracticeAnswered extends DomainError {
  readonly code = 'practice-answered';
  constructor() {
    super('This question has been marked already. Take it again with fresh figures.');
  }
}
