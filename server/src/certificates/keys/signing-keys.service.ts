import { Inject, Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { CONFIG } from '../../config/config.module.ts';
import type { Config } from '../../config/config.schema.ts';
import { IssuersRepository } from '../issuers.repository.ts';
import { readKey, type HeldKey } from './key-folder.ts';

/** Holds the key in use. The boot stops without one. */
@Injectable()
export class SigningKeysService implements OnApplicationBootstrap {
  private held: HeldKey | undefined;

  constructor(
    @Inject(CONFIG) private readonly config: Config,
    private readonly issuers: IssuersRepository,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    await this.current();
  }

  /** @throws {NoSigningKey} */
  async current(): Promise<HeldKey> {
    this.held ??= await this.takeIntoUse();
    return this.held;
  }

  private async takeIntoUse(): Promise<HeldKey> {
    const key = await readKey(this.config.KEYS_FOLDER);
    const validFrom = new Date(key.validFrom);
    await this.issuers.addMissing([
      {
        ...{ keyId: key.rootKeyId, kind: 'root', pem: key.chainPem[0] ?? '', validFrom },
        validTo: new Date(key.rootValidTo),
      },
      {
        ...{ keyId: key.keyId, kind: 'leaf', pem: key.certificatePem, validFrom },
        validTo: new Date(key.validTo),
      },
    ]);
    return key;
  }
}
