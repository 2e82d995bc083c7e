import { Injectable } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { SessionsService, type OpenedSession } from './sessions.service.ts';

/** The session's cookie, and the one by which a device that signed in before is known again. */
@Injectable()
export class SessionCookies {
  constructor(private readonly sessions: SessionsService) {}

  set(reply: FastifyReply, opened: OpenedSession): void {
    const { name, options } = this.sessions.cookie();
    void reply.setCookie(name, opened.token, options);
  }

  clear(reply: FastifyReply): void {
    const { name, options } = this.sessions.cookie();
    void reply.clearCookie(name, options);
  }

  readDevice(_request: FastifyRequest): string | null {
    return null;
  }

  setDevice(_reply: FastifyReply, _device: string): void {}
}
