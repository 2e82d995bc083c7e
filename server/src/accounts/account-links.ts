import { Inject, Injectable } from '@nestjs/common';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';

/**
 * Addresses of the site's pages that mails lead to. A key stands behind the #, so that it is in
 * no log and no referrer, and opening the page does not use it.
 */
@Injectable()
export class AccountLinks {
  private readonly base: string;

  constructor(@Inject(CONFIG) config: Config) {
    this.base = new URL(config.PUBLIC_URL).origin;
  }

  readonly signIn = () => `${this.base}/sign-in`;
  readonly reset = () => `${this.base}/reset`;
  readonly confirm = (token: string) => `${this.base}/confirm#${token}`;
  readonly newPassword = (token: string) => `${this.base}/reset/new#${token}`;
  readonly changeEmail = (token: string) => `${this.base}/email-change#${token}`;
  readonly undoEmailChange = (token: string) => `${this.base}/email-change/undo#${token}`;
}
