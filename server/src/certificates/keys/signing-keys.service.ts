import { Inject, Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { Clock } from '../../clock/clock.ts';
import { CONFIG } from '../../config/config.module.ts';
import type { Config } from '../../config/config.schema.ts';
import { IssuersRepository } from '../issuers.repository.ts';
import { NoSigningKey, readKey, type HeldKey } from './key-folder.ts';

/** Holds the key in use. The boot stops without one. */
@Injectable()
export class SigningKeysService implements OnApplicationBootstrap {
  private held: HeldKey | undefined;

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly issuers: IssuersRepository,
    private readonly clock: Clock,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    await this.current();
  }

  /** @throws {NoSigningKey} when there is none, or when its time is over. */
  async current(): Promise<HeldKey> {
    this.held ??= await this.takeIntoUse();
    this.requireInItsTime(this.held);
    return this.held;
  }

  private async takeIntoUse(): Promise<HeldKey> {
    const key = await readKey(this.config.KEYS_FOLDER);
    const { keyId, rootKeyId, certificatePem, validFrom, validTo } = key;
    this.requireInItsTime(key);
    await this.issuers.addMissing([
      ...key.chainPem.map((pem) => ({
        ...{ keyId: rootKeyId, kind: 'root' as const, pem },
        validFrom: key.rootValidFrom,
        validTo: key.rootValidTo,
      })),
      { keyId, kind: 'leaf', pem: certificatePem, validFrom, validTo },
    ]);
    return key;
  }

  private requireInItsTime({ keyId, validFrom, validTo }: HeldKey): void {
    const now = this.clock.now();
    if (validFrom <= now && now <= validTo) return;
    throw new NoSigningKey(
      this.config.KEYS_FOLDER,
      `key ${keyId} may sign from ${validFrom.toISOString()} to ${validTo.toISOString()}.`,
    );
  }
}
