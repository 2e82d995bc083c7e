/** What the library refuses, told so that a person can act on it. */
export abstract class CertificateError extends Error {
  abstract readonly code: string;
}

/** The fonts have no letter for a character that was to be printed. */
export class CharacterNotInFonts extends CertificateError {
  readonly code = 'character-not-in-fonts';
  constructor(
    readonly character: string,
    readonly text: string,
  ) {
    const point = (character.codePointAt(0) ?? 0).toString(16).toUpperCase().padStart(4, '0');
    super(
      `“${text}” cannot be printed: the certificate fonts have no letter for “${character}” (U+${point}). ` +
        'They cover Latin, Greek and Cyrillic; use a spelling in one of those.',
    );
  }
}

/** More text than an A4 sheet holds at a size that can be read. */
export class StatementTooLong extends CertificateError {
  readonly code = 'statement-too-long';
}

/** A field of the statement that may not go on a certificate. */
export class StatementInvalid extends CertificateError {
  readonly code = 'statement-invalid';
}

/** The PDF has no place for a signature, or has been signed already. */
export class NoPlaceToSign extends CertificateError {
  readonly code = 'no-place-to-sign';
}

/** The key cannot sign certificates. */
export class KeyUnsuitable extends CertificateError {
  readonly code = 'key-unsuitable';
}
