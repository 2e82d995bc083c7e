import { Inject, Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { InvalidRequest } from '../problems/common.errors.ts';
import { secondFactorTry } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import { hashRecoveryCode } from './recovery-codes.ts';
import { unseal } from './seal.ts';
import { SecondFactorsRepository } from './second-factors.repository.ts';
import { stepOfCode } from './time-code.ts';

@Injectable()
export class SecondFactorsService {
  constructor(
    private readonly repository: SecondFactorsRepository,
    private readonly throttles: ThrottlesService,
    private readonly events: SecurityEventsService,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /**
   * Takes a code of the app, once in its time step, or a recovery code, once.
   *
   * @throws {InvalidRequest | TooManyAttempts}
   */
  async check(account: SignedInAccount, code: string, source: RequestSource): Promise<void> {
    const counted = { rule: secondFactorTry, subject: account.id };
    await this.throttles.count(counted);
    const kind = await this.take(account.id, code.trim());
    await this.events.record({
      kind: kind ?? 'second-factor-refused',
      accountId: account.id,
      actorId: account.id,
      address: source.address,
    });
    if (kind === null) {
      throw new InvalidRequest([
        {
          pointer: '#/code',
          detail: 'That code is not right, or was used. Wait for the next one.',
        },
      ]);
    }
    await this.throttles.clear(counted);
  }

  private async take(
    accountId: string,
    code: string,
  ): Promise<'second-factor-given' | 'recovery-code-used' | null> {
    if (await this.takeTimeCode(accountId, code)) return 'second-factor-given';
    const hash = hashRecoveryCode(code);
    const isUsed = await this.repository.useRecoveryCode(accountId, hash, this.clock.now());
    return isUsed ? 'recovery-code-used' : null;
  }

  private async takeTimeCode(accountId: string, code: string): Promise<boolean> {
    const sealed = (await this.repository.find(accountId))?.secretSealed;
    if (!sealed) return false;
    const secret = unseal(sealed, accountId, this.config.SECOND_FACTOR_KEY);
    const step = await stepOfCode(secret, code, this.clock.now());
    return step !== null && (await this.repository.useStep(accountId, step));
  }
}
