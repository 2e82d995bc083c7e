/** Why a file is not one of ours as issued. */
export type FileFault =
  | 'not-a-pdf'
  | 'not-signed'
  | 'changed-after-signing'
  | 'added-to'
  | 'wrong-issuer'
  | 'unknown-key'
  | 'malformed-signature'
  | 'expired-key-at-issue'
  | 'too-large';

/** Ends a check; `detail` is for the person who brought the file. */
export class Refusal extends Error {
  constructor(
    readonly fault: FileFault,
    readonly detail: string,
  ) {
    super(detail);
  }
}

export function malformed(detail: string): Refusal {
  return new Refusal(
    'malformed-signature',
    `The signature is not made the way ours are: ${detail}`,
  );
}
