import { Inject, Injectable } from '@nestjs/common';
import { generateSecret, generateURI } from 'otplib';
import QRCode from 'qrcode';
import type { SignedInAccount } from '../accounts/account.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { InvalidRequest } from '../problems/common.errors.ts';
import { SecondFactorNeeded } from '../sessions/sessions.errors.ts';
import { SessionsService } from '../sessions/sessions.service.ts';
import { hashRecoveryCode, newRecoveryCodes } from './recovery-codes.ts';
import { seal, unseal } from './seal.ts';
import { NoEnrolment } from './second-factors.errors.ts';
import { SecondFactorsRepository } from './second-factors.repository.ts';
import type { Enrolment, RecoveryCodes } from './second-factors.schemas.ts';
import { stepOfCode } from './time-code.ts';

/** Setting up a second factor, or another one in its place. */
@Injectable()
export class EnrolmentsService {
  constructor(
    private readonly repository: SecondFactorsRepository,
    private readonly sessions: SessionsService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /**
   * Shows a new secret. One in use works on until the new one is confirmed.
   *
   * @throws {SecondFactorNeeded} when there is one and this session has not given its code.
   */
  async begin(account: SignedInAccount): Promise<Enrolment> {
    const standing = await this.repository.find(account.id);
    if (standing?.secretSealed && account.secondFactorAt === null) throw new SecondFactorNeeded();
    const secret = generateSecret();
    const sealed = seal(secret, account.id, this.config.SECOND_FACTOR_KEY);
    await this.repository.keepPending(account.id, sealed, this.clock.now());
    const otpauthUri = generateURI({ issuer: 'Ferrule', label: account.email, secret });
    const qrSvg = await QRCode.toString(otpauthUri, { type: 'svg', errorCorrectionLevel: 'M' });
    return { secret, otpauthUri, qrSvg };
  }

  /**
   * The first code of the new secret puts it into use, with new recovery codes, and counts for
   * this session.
   *
   * @throws {NoEnrolment | InvalidRequest}
   */
  async confirm(
    account: SignedInAccount,
    code: string,
    source: RequestSource,
  ): Promise<RecoveryCodes> {
    const pendingSealed = (await this.repository.find(account.id))?.pendingSealed;
    if (!pendingSealed) throw new NoEnrolment();
    const secret = unseal(pendingSealed, account.id, this.config.SECOND_FACTOR_KEY);
    const at = this.clock.now();
    const step = await stepOfCode(secret, code, at);
    if (step === null) throw codeNotRight();
    const recoveryCodes = newRecoveryCodes();
    await this.transactions.run(async () => {
      const confirmed = { pendingSealed, step, at };
      if (!(await this.repository.confirmPending(account.id, confirmed))) throw new NoEnrolment();
      await this.repository.replaceRecoveryCodes(account.id, recoveryCodes.map(hashRecoveryCode));
      await this.sessions.markSecondFactor(account.sessionId);
      await this.events.record({
        kind: 'second-factor-enrolled',
        accountId: account.id,
        actorId: account.id,
        address: source.address,
      });
    });
    return { recoveryCodes };
  }
}

const codeNotRight = () =>
  new InvalidRequest([
    { pointer: '#/code', detail: 'That code is not right. Check the time of the telephone.' },
  ]);
