import { Inject, Injectable } from '@nestjs/common';
import { PassportStrategy } from '@nestjs/passport';
import { createSecretKey } from 'node:crypto';
import type { FastifyRequest } from 'fastify';
import { Strategy } from 'passport-jwt';
import type { SignedInAccount } from '../accounts/account.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { TOKEN_AUDIENCE, type SessionToken } from './session.ts';
import { sessionCookie, SessionsService } from './sessions.service.ts';

/**
 * The secret as a key that is ready. Text would be tried as a public key first, on every
 * request: a tenth of all the processor time a request takes. The types know of no such key.
 */
const heldKey = (secret: string) => createSecretKey(secret, 'utf8') as unknown as Buffer;

@Injectable()
export class SessionStrategy extends PassportStrategy(Strategy, 'session') {
  constructor(
    @Inject(CONFIG) config: Config,
    private readonly sessions: SessionsService,
  ) {
    const { name } = sessionCookie(config);
    super({
      jwtFromRequest: (request: unknown) => (request as FastifyRequest).cookies[name] ?? null,
      secretOrKey: heldKey(config.SESSION_SECRET),
      algorithms: ['HS256'],
      audience: TOKEN_AUDIENCE,
    });
  }

  async validate(token: SessionToken): Promise<SignedInAccount | false> {
    return (await this.sessions.resolve(token)) ?? false;
  }
}
