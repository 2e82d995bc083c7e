import { DomainError } from '../problems/domain-error.ts';

/** The sheet was read in an older revision than the one that is out. */
export class LessonRevised extends DomainError {
  readonly code = 'lesson-revised';
  override readonly extensions: { current: string };
  constructor(read: string, current: string) {
    super(`You read revision ${read}; revision ${current} is out. Read it, then mark it done.`);
    this.extensions = { current };
  }
}
