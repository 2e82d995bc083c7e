import { Controller, Get, Req, Res } from '@nestjs/common';
import { ApiExcludeController } from '@nestjs/swagger';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { Allow } from '../http/allow.decorator.ts';
import { HealthService } from './health.service.ts';

const LOOPBACK = new Set(['127.0.0.1', '::1', '::ffff:127.0.0.1']);

@ApiExcludeController()
@Controller()
export class HealthController {
  constructor(private readonly health: HealthService) {}

  @Get('livez')
  @Allow('anyone')
  live(@Res() reply: FastifyReply): void {
    void reply.header('cache-control', 'no-store').send({ live: true });
  }

  /** What is missing is told only to this machine. */
  @Get('readyz')
  @Allow('anyone')
  async ready(@Req() request: FastifyRequest, @Res() reply: FastifyReply): Promise<void> {
    const missing = await this.health.missing();
    const isLocal = LOOPBACK.has(request.socket.remoteAddress ?? '');
    void reply
      .status(missing.length === 0 ? 200 : 503)
      .header('cache-control', 'no-store')
      .send({ ready: missing.length === 0, ...(isLocal ? { missing } : {}) });
  }
}
