import { DomainError } from '../problems/domain-error.ts';

/** A link whose token is unknown, used, replaced, too old, or for something else: all look alike. */
export class LinkNotValid extends DomainError {
  readonly code = 'link-not-valid';
  constructor() {
    super(
      'The link was used before, replaced by a newer one, or is too old. Ask for a new one; nothing was changed.',
    );
  }
}

/** Unknown, wrong, not confirmed or suspended: nobody learns which. */
export class SignInRefused extends DomainError {
  readonly code = 'sign-in-refused';
  constructor() {
    super(
      'That email and passphrase do not open an account here. Check both; an account opens once its email is confirmed.',
    );
  }
}

/** More passphrases wait to be checked than this machine can keep up with. */
export class TooBusy extends DomainError {
  readonly code = 'unavailable';
  constructor() {
    super('Too many people are signing in at this moment. Try again in a few seconds.');
  }
}

/** There is an administrator already: the first one's link opens nothing more. */
export class AdministratorExists extends DomainError {
  readonly code = 'administrator-exists';
  constructor() {
    super('There is an administrator already. Ask them for the role on the people page.');
  }
}
