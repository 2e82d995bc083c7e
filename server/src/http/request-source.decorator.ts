import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { FastifyRequest } from 'fastify';

/** Where a request came from. The address is the proxy's word only where the proxy is trusted. */
export interface RequestSource {
  readonly address: string;
  readonly userAgent: string;
}

export const sourceOf = (request: FastifyRequest): RequestSource => ({
  address: request.ip,
  userAgent: (request.headers['user-agent'] ?? '').slice(0, 400),
});

export const CurrentSource = createParamDecorator((_: unknown, context: ExecutionContext) =>
  sourceOf(context.switchToHttp().getRequest<FastifyRequest>()),
);
