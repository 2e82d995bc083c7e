import { DomainError } from '../problems/domain-error.ts';

/** An answer, or anything else, for a paper that has been handed in. */
export class SittingClosed extends DomainError {
  readonly code = 'sitting-closed';
  override readonly extensions: { closedAt: string };
  constructor(closedAt: Date) {
    super('This paper has been handed in. What was saved up to then was kept and counts.');
    this.extensions = { closedAt: closedAt.toISOString() };
  }
}

export class TakenOver extends DomainError {
  readonly code = 'taken-over';
  constructor() {
    super(
      'This paper is being written on another device. Carry on there, or take it over on this one.',
    );
  }
}

export class SittingAlreadyOpen extends DomainError {
  readonly code = 'sitting-already-open';
  override readonly extensions: { sittingId: string | null };
  constructor(sittingId: string | null) {
    super('You have a paper open already. Carry on with that one.');
    this.extensions = { sittingId };
  }
}

export class WaitNotOver extends DomainError {
  readonly code = 'wait-not-over';
  override readonly extensions: { mayStartAt: string };
  constructor(mayStartAt: Date) {
    super('The waiting time after your last sitting is not over.');
    this.extensions = { mayStartAt: mayStartAt.toISOString() };
  }
}

export class AgreementChanged extends DomainError {
  readonly code = 'agreement-changed';
  constructor() {
    super(
      'The rules of the sitting have changed since you read them. Read them again, then agree.',
    );
  }
}

export class AlreadyCertified extends DomainError {
  readonly code = 'already-certified';
  override readonly extensions: { certificateId: string };
  constructor(certificateId: string) {
    super('You hold the certificate this paper leads to.');
    this.extensions = { certificateId };
  }
}

export class ResultNotReady extends DomainError {
  readonly code = 'result-not-ready';
  constructor() {
    super('This paper is not marked yet. Marking starts when it is handed in and takes a moment.');
  }
}

/** Two different answers under one number: the later one needs a higher number. */
export class SequenceUsed extends DomainError {
  readonly code = 'sequence-used';
  override readonly extensions: { highest: number };
  constructor(highest: number) {
    super(
      `Another answer was saved under this number. Send it again numbered ${highest + 1} or higher.`,
    );
    this.extensions = { highest };
  }
}
