import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import {
  hashToken,
  newToken,
  TOKEN_LIFE_MS,
  type OpenToken,
  type TokenPurpose,
} from './account-token.ts';
import { AccountTokensRepository } from './account-tokens.repository.ts';
import { LinkNotValid } from './accounts.errors.ts';

/** Keys that travel in links: only their hashes are kept. */
@Injectable()
export class AccountTokensService {
  constructor(
    private readonly repository: AccountTokensRepository,
    private readonly clock: Clock,
  ) {}

  /** A new key. Older ones for the same purpose are cancelled. */
  async issue(
    purpose: TokenPurpose,
    accountId: string | null,
    email: string | null = null,
  ): Promise<string> {
    // A thief who changes the address twice must not take away the way back to the first.
    if (purpose !== 'undo-email-change') await this.cancel(purpose, accountId);
    const token = newToken();
    const createdAt = this.clock.now();
    const expiresAt = new Date(createdAt.getTime() + TOKEN_LIFE_MS[purpose]);
    const tokenHash = hashToken(token);
    await this.repository.add({ accountId, purpose, tokenHash, email, createdAt, expiresAt });
    return token;
  }

  cancel(purpose: TokenPurpose, accountId: string | null): Promise<void> {
    return this.repository.cancelOpen(accountId, purpose, this.clock.now());
  }

  /**
   * What a key stands for, without using it up.
   *
   * @throws {LinkNotValid}
   */
  async look(purpose: TokenPurpose, token: string): Promise<OpenToken> {
    const found = await this.repository.findOpen(purpose, hashToken(token), this.clock.now());
    if (!found) throw new LinkNotValid();
    return found;
  }

  /** @throws {LinkNotValid} */
  async use(purpose: TokenPurpose, token: string): Promise<OpenToken> {
    const used = await this.repository.use(purpose, hashToken(token), this.clock.now());
    if (!used) throw new LinkNotValid();
    return used;
  }

  /** As `use`, for a key that belongs to an account. */
  async useOf(
    purpose: TokenPurpose,
    token: string,
  ): Promise<{ accountId: string; email: string | null }> {
    const { accountId, email } = await this.use(purpose, token);
    if (accountId === null) throw new LinkNotValid();
    return { accountId, email };
  }
}
