import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { createHash, randomBytes } from 'node:crypto';
import type { SignedInAccount } from '../accounts/account.ts';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { NotFound, NotSignedIn } from '../problems/common.errors.ts';
import {
  ABSOLUTE_MS,
  IDLE_MS,
  TOKEN_AUDIENCE,
  TOUCH_MS,
  type OpenSession,
  type SessionStanding,
  type SessionToken,
} from './session.ts';
import { SessionsRepository } from './sessions.repository.ts';

const hash = (key: string) => createHash('sha256').update(key).digest();

export interface OpenedSession {
  readonly id: string;
  readonly token: string;
  readonly endsAt: Date;
}

@Injectable()
export class SessionsService {
  constructor(
    private readonly repository: SessionsRepository,
    private readonly jwt: JwtService,
    private readonly clock: Clock,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Opens a session and signs the token its cookie carries. */
  async open(accountId: string, from: { device: string; address: string }): Promise<OpenedSession> {
    const key = randomBytes(32).toString('base64url');
    const startedAt = this.clock.now();
    const endsAt = new Date(startedAt.getTime() + ABSOLUTE_MS);
    const tokenHash = hash(key);
    const id = await this.repository.add({ accountId, tokenHash, startedAt, endsAt, ...from });
    const token = await this.jwt.signAsync({ sid: id, key } satisfies SessionToken, {
      audience: TOKEN_AUDIENCE,
      expiresIn: ABSOLUTE_MS / 1_000,
    });
    return { id, token, endsAt };
  }

  /** The account behind a token, or null when the session is over for any reason. */
  async resolve(token: SessionToken): Promise<SignedInAccount | null> {
    const now = this.clock.now();
    const found = await this.repository.findOpen(token.sid, hash(token.key), this.openNow());
    if (!found) return null;
    if (now.getTime() - found.lastSeenAt.getTime() > TOUCH_MS) {
      await this.repository.touch(token.sid, now);
    }
    return found.account;
  }

  /** How an open session stands, for the person it belongs to. */
  async standing(sessionId: string): Promise<SessionStanding> {
    const standing = await this.repository.findStanding(sessionId, this.openNow());
    if (!standing) throw new NotSignedIn();
    return standing;
  }

  listOpen(accountId: string): Promise<OpenSession[]> {
    return this.repository.listOpen(accountId, this.openNow());
  }

  /** Ends a session, whatever it stands at. */
  async end(sessionId: string): Promise<void> {
    await this.repository.end(sessionId, this.clock.now());
  }

  /** @throws {NotFound} when it is not an open session of this account. */
  async endOwn(accountId: string, sessionId: string): Promise<void> {
    const ended = await this.repository.endOwn(accountId, sessionId, this.clock.now());
    if (!ended) throw new NotFound('There is no open session of yours under this address.');
  }

  /** @param exceptId - a session that goes on. */
  async endAll(accountId: string, exceptId: string | null = null): Promise<void> {
    await this.repository.endAll(accountId, exceptId, this.clock.now());
  }

  async markSecondFactor(sessionId: string): Promise<void> {
    await this.repository.mark(sessionId, { secondFactorAt: this.clock.now() });
  }

  async markFresh(sessionId: string): Promise<void> {
    await this.repository.mark(sessionId, { authenticatedAt: this.clock.now() });
  }

  /** Name and attributes of the session cookie under this public address. */
  cookie(): { name: string; options: CookieOptions } {
    return sessionCookie(this.config);
  }

  private openNow(): { now: Date; idleSince: Date } {
    const now = this.clock.now();
    return { now, idleSince: new Date(now.getTime() - IDLE_MS) };
  }
}

export interface CookieOptions {
  readonly path: '/';
  readonly httpOnly: true;
  readonly sameSite: 'lax';
  readonly secure: boolean;
}

/** On plain http (the demonstration on loopback) no browser would keep a Secure cookie. */
export function sessionCookie(config: Config): { name: string; options: CookieOptions } {
  const secure = config.PUBLIC_URL.startsWith('https:');
  return {
    name: secure ? '__Host-ferrule' : 'ferrule',
    options: { path: '/', httpOnly: true, sameSite: 'lax', secure },
  };
}
