import { DomainError } from './domain-error.ts';

/** Something that is not there, or that this person may not see: the two must look alike. */
export class NotFound extends DomainError {
  readonly code = 'not-found';
  constructor(what = 'There is nothing here under this address.') {
    super(what);
  }
}

export class NotAllowed extends DomainError {
  readonly code = 'not-allowed';
  constructor(message = 'Your account may not do this. Ask an administrator if it should.') {
    super(message);
  }
}

export class NotSignedIn extends DomainError {
  readonly code = 'not-signed-in';
  constructor() {
    super('Sign in first; a session ends after a time without use.');
  }
}

export interface FieldError {
  pointer: string;
  detail: string;
}

/** Input that breaks a rule of its form. */
export class InvalidRequest extends DomainError {
  readonly code = 'invalid-request';
  override readonly extensions: { errors: FieldError[] };
  constructor(errors: FieldError[]) {
    super(
      errors.map(({ detail }) => detail).join(' ') ||
        'The request does not have the form asked for.',
    );
    this.extensions = { errors };
  }
}

export class TooManyAttempts extends DomainError {
  readonly code = 'too-many-attempts';
  override readonly extensions: { retryAfterSeconds: number };
  constructor(retryAfterSeconds: number) {
    super(`Too many tries. Wait ${retryAfterSeconds} seconds and try again.`);
    this.extensions = { retryAfterSeconds };
  }
}

/** A request that came from another site. */
export class CrossSiteRequest extends DomainError {
  readonly code = 'cross-site-request';
  constructor() {
    super('This request did not come from one of our own pages, so nothing was done.');
  }
}
