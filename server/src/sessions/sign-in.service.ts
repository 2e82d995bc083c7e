import { Injectable } from '@nestjs/common';
import type { Account, SignedInAccount } from '../accounts/account.ts';
import { SignInRefused } from '../accounts/accounts.errors.ts';
import { CredentialsService } from '../accounts/credentials.service.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { TooManyAttempts } from '../problems/common.errors.ts';
import {
  signInAtAccount,
  signInFromAddress,
  signInFromDevice,
  subscriberOf,
} from '../throttles/throttle.ts';
import { ThrottlesService, type Counted, type CountedTry } from '../throttles/throttles.service.ts';
import { deviceName } from './device-name.ts';
import { KnownDevicesService } from './known-devices.service.ts';
import type { SignIn } from './sessions.schemas.ts';
import { SessionsService, type OpenedSession } from './sessions.service.ts';

export interface SignedIn {
  readonly opened: OpenedSession;
  readonly accountId: string;
  /** Token by which this device is known next time. */
  readonly device: string;
}

/** What the browser brought along. */
interface Brought {
  readonly knownDevice: string | null;
  /** The session this one takes the place of. */
  readonly replaced: string | undefined;
}

@Injectable()
export class SignInService {
  constructor(
    private readonly credentials: CredentialsService,
    private readonly devices: KnownDevicesService,
    private readonly sessions: SessionsService,
    private readonly throttles: ThrottlesService,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  /**
   * Every way to fail looks alike and costs the same work.
   *
   * @throws {SignInRefused | TooManyAttempts}
   */
  async signIn(input: SignIn, source: RequestSource, brought: Brought): Promise<SignedIn> {
    const email = input.email.trim().toLowerCase();
    const account = await this.credentials.findByEmail(email);
    const device = await this.devices.recognise(brought.knownDevice, account?.id);
    const counts = countsFor(email, device, source);
    const counted = await this.count(counts, account, source);
    const isRight = await this.credentials.opens(account, input.password);
    if (!account || !isRight || !account.isConfirmed || account.isSuspended) {
      await this.noteRefusal(account, isRight, source);
      throw new SignInRefused();
    }
    await counted.forgive();
    await this.throttles.clear(counts[0]);
    await this.credentials.renewHash(account, input.password);
    const opened = await this.open(account, source, brought.replaced);
    const remembered = await this.devices.remember(account.id, device);
    return { opened, accountId: account.id, device: remembered };
  }

  async signOut(account: SignedInAccount, source: RequestSource): Promise<void> {
    await this.sessions.end(account.sessionId);
    await this.note('sign-out', account.id, source);
  }

  private open(
    account: Account,
    source: RequestSource,
    replaced: string | undefined,
  ): Promise<OpenedSession> {
    return this.transactions.run(async () => {
      if (replaced !== undefined) await this.sessions.end(replaced);
      await this.note('sign-in', account.id, source);
      const device = deviceName(source.userAgent);
      return this.sessions.open(account.id, { device, address: source.address });
    });
  }

  private async count(
    counts: readonly Counted[],
    account: Account | null,
    source: RequestSource,
  ): Promise<CountedTry> {
    try {
      return await this.throttles.count(...counts);
    } catch (error) {
      if (error instanceof TooManyAttempts) {
        await this.note('sign-in-held-back', account?.id ?? null, source);
      }
      throw error;
    }
  }

  private async noteRefusal(
    account: Account | null,
    isRight: boolean,
    source: RequestSource,
  ): Promise<void> {
    await this.events.record({
      kind: 'sign-in-refused',
      accountId: account?.id ?? null,
      actorId: null,
      address: source.address,
      detail: { why: whyRefused(account, isRight) },
    });
  }

  private note(kind: string, accountId: string | null, source: RequestSource): Promise<void> {
    const { address } = source;
    return this.events.record({ kind, accountId, actorId: accountId, address });
  }
}

function whyRefused(account: Account | null, isRight: boolean): string {
  if (!account) return 'unknown address';
  if (!isRight) return 'wrong passphrase';
  return account.isSuspended ? 'suspended' : 'email not confirmed';
}

/** A known device answers for itself; anything else for the account and for where it is. */
function countsFor(
  email: string,
  device: string | null,
  source: RequestSource,
): [Counted, ...Counted[]] {
  if (device !== null) return [{ rule: signInFromDevice, subject: `${email} ${device}` }];
  return [
    { rule: signInAtAccount, subject: email },
    { rule: signInFromAddress, subject: subscriberOf(source.address) },
  ];
}
