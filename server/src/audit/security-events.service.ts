import { Injectable } from '@nestjs/common';

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

@Injectable()
export class SecurityEventsService {
  async record(_event: SecurityEvent): Promise<void> {
    throw new Error('not ready');
  }
}
