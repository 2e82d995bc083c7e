import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { FastifyRequest } from 'fastify';
import type { SignedInAccount } from '../accounts/account.ts';
import { NotSignedIn } from '../problems/common.errors.ts';

export interface RequestWithAccount extends FastifyRequest {
  account?: SignedInAccount;
}

/** The account behind the session of this request. */
export const CurrentAccount = createParamDecorator((_: unknown, context: ExecutionContext) => {
  const { account } = context.switchToHttp().getRequest<RequestWithAccount>();
  if (!account) throw new NotSignedIn();
  return account;
});
