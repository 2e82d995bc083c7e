import { Injectable, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import type { SignedInAccount } from '../accounts/account.ts';
import { POLICY, type Policy } from '../http/allow.decorator.ts';
import type { RequestWithAccount } from '../http/current-account.decorator.ts';
import { NotAllowed, NotSignedIn } from '../problems/common.errors.ts';
import { SecondFactorNeeded } from './sessions.errors.ts';

/** Denies every route that has no policy, and keeps the policy of those that have. */
@Injectable()
export class SessionGuard extends AuthGuard('session') {
  constructor(private readonly reflector: Reflector) {
    super({ session: false, property: 'account' });
  }

  override async canActivate(context: ExecutionContext): Promise<boolean> {
    const policy = this.reflector.get<Policy | undefined>(POLICY, context.getHandler());
    if (policy === undefined) throw new NotAllowed();
    const isKnown = await this.isSignedIn(context);
    if (policy === 'anyone') return true;
    const { account } = context.switchToHttp().getRequest<RequestWithAccount>();
    if (!isKnown || !account) throw new NotSignedIn();
    if (policy !== 'signed-in') requireRole(account, policy);
    return true;
  }

  override handleRequest<T>(error: unknown, account: T): T {
    if (error instanceof Error) throw error;
    return account;
  }

  private async isSignedIn(context: ExecutionContext): Promise<boolean> {
    await super.canActivate(context);
    const request = context.switchToHttp().getRequest<RequestWithAccount>();
    if (!request.account) delete request.account;
    return request.account !== undefined;
  }
}

function requireRole(account: SignedInAccount, roles: Exclude<Policy, string>): void {
  const held = roles.filter((role) => account.roles.includes(role));
  if (held.length === 0) throw new NotAllowed();
  const onlyAsAdministrator = held.every((role) => role === 'administrator');
  if (onlyAsAdministrator && account.secondFactorAt === null) throw new SecondFactorNeeded();
}
