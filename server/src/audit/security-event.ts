/** Something done to an account, a session or a certificate that may have to be explained later. */
export interface SecurityEvent {
  readonly kind: string;
  /** Whom it concerns. */
  readonly accountId: string | null;
  /** Who did it. */
  readonly actorId: string | null;
  readonly address?: string;
  /** Plain facts; never a secret, a token, a passphrase or an answer. */
  readonly detail?: Readonly<Record<string, string | number | boolean>>;
}
