import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { FastifyRequest } from 'fastify';

/** Where a request came from. The address is the proxy's word only where the proxy is trusted. */
export interface RequestSource {
  readonly address: string;
  readonly userAgent: string;
}

export const CurrentSource = createParamDecorator(
  (_: unknown, context: ExecutionContext): RequestSource => {
    const request = context.switchToHttp().getRequest<FastifyRequest>();
    const userAgent = (request.headers['user-agent'] ?? '').slice(0, 400);
    return { address: request.ip, userAgent };
  },
);
