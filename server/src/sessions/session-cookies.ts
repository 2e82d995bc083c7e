import { Inject, Injectable } from '@nestjs/common';
import type { FastifyReply, FastifyRequest } from 'fastify';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { DEVICE_MEMORY_DAYS } from './known-devices.service.ts';
import { sessionCookie, type OpenedSession } from './sessions.service.ts';

const DAY_S = 86_400;

/** The session's cookie, and the one by which a device that signed in before is known again. */
@Injectable()
export class SessionCookies {
  private readonly cookie: ReturnType<typeof sessionCookie>;

  constructor(@Inject(CONFIG) config: Config) {
    this.cookie = sessionCookie(config);
  }

  /** Kept until the session's end, so that a browser that broke down goes on where it was. */
  set(reply: FastifyReply, opened: OpenedSession): void {
    const { name, options } = this.cookie;
    void reply.setCookie(name, opened.token, { ...options, expires: opened.endsAt });
  }

  clear(reply: FastifyReply): void {
    const { name, options } = this.cookie;
    void reply.clearCookie(name, options);
  }

  readDevice(request: FastifyRequest): string | null {
    return request.cookies[this.deviceCookie()] ?? null;
  }

  setDevice(reply: FastifyReply, token: string): void {
    const maxAge = DEVICE_MEMORY_DAYS * DAY_S;
    void reply.setCookie(this.deviceCookie(), token, { ...this.cookie.options, maxAge });
  }

  private deviceCookie(): string {
    return `${this.cookie.name}-device`;
  }
}
