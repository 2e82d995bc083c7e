import { Injectable, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import type { SignedInAccount } from '../accounts/account.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Clock } from '../clock/clock.ts';
import { BEFORE_SECOND_FACTOR, FRESH, POLICY, type Policy } from '../http/allow.decorator.ts';
import type { RequestWithAccount } from '../http/current-account.decorator.ts';
import { NotAllowed, NotSignedIn } from '../problems/common.errors.ts';
import { FRESH_MS } from './session.ts';
import { FreshSignInNeeded, SecondFactorNeeded } from './sessions.errors.ts';

/** Denies every route that has no policy, and keeps the policy of those that have. */
@Injectable()
export class SessionGuard extends AuthGuard('session') {
  constructor(
    private readonly reflector: Reflector,
    private readonly clock: Clock,
    private readonly events: SecurityEventsService,
  ) {
    super({ session: false, property: 'account' });
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const policy = this.read<Policy>(POLICY, context);
    if (policy === undefined) throw new NotAllowed();
    const isKnown = await this.isSignedIn(context);
    if (policy === 'anyone') return true;
    const request = context.switchToHttp().getRequest<RequestWithAccount>();
    const { account } = request;
    if (!isKnown || !account) throw new NotSignedIn();
    if (policy !== 'signed-in') await this.requireRole(context, account, policy);
    if (this.read<boolean>(FRESH, context)) this.requireFresh(account);
    return true;
  }

  override handleRequest<T>(error: unknown, account: T): T {
    if (error instanceof Error) throw error;
    return account;
  }

  private read<T>(key: string, context: ExecutionContext): T | undefined {
    return this.reflector.get<T | undefined>(key, context.getHandler());
  }

  private async isSignedIn(context: ExecutionContext): Promise<boolean> {
    await super.canActivate(context);
    const request = context.switchToHttp().getRequest<RequestWithAccount>();
    if (!request.account) delete request.account;
    return request.account !== undefined;
  }

  private async requireRole(
    context: ExecutionContext,
    account: SignedInAccount,
    roles: Exclude<Policy, string>,
  ): Promise<void> {
    const held = roles.filter((role) => account.roles.includes(role));
    if (held.length === 0) {
      await this.noteDenial(context, account);
      throw new NotAllowed();
    }
    const isOnlyAdministrator = held.every((role) => role === 'administrator');
    const isStepTowardsIt = this.read<boolean>(BEFORE_SECOND_FACTOR, context) === true;
    if (isOnlyAdministrator && account.secondFactorAt === null && !isStepTowardsIt) {
      throw new SecondFactorNeeded();
    }
  }

  private requireFresh(account: SignedInAccount): void {
    const ageMs = this.clock.now().getTime() - account.authenticatedAt.getTime();
    if (ageMs > FRESH_MS) throw new FreshSignInNeeded();
  }

  private async noteDenial(context: ExecutionContext, account: SignedInAccount): Promise<void> {
    const request = context.switchToHttp().getRequest<RequestWithAccount>();
    await this.events.record({
      kind: 'access-denied',
      accountId: account.id,
      actorId: account.id,
      address: request.ip,
      detail: { method: request.method, route: request.routeOptions.url ?? '' },
    });
  }
}
