import { Inject, Injectable } from '@nestjs/common';
import { JwtService } from '@nestjs/jwt';
import { createHash, randomBytes } from 'node:crypto';
import type { SignedInAccount } from '../accounts/account.ts';
import { Clock } from '../clock/clock.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { ABSOLUTE_MS, IDLE_MS, TOUCH_MS, type SessionToken } from './session.ts';
import type { OwnSessions, SessionView } from './sessions.schemas.ts';
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
      expiresIn: ABSOLUTE_MS / 1_000,
    });
    return { id, token, endsAt };
  }

  /** The account behind a token, or null when the session is over for any reason. */
  async resolve(token: SessionToken): Promise<SignedInAccount | null> {
    const now = this.clock.now();
    const found = await this.repository.findOpen(token.sid, hash(token.key), {
      now,
      idleSince: new Date(now.getTime() - IDLE_MS),
    });
    if (!found) return null;
    if (now.getTime() - found.lastSeenAt.getTime() > TOUCH_MS) {
      await this.repository.touch(token.sid, now);
    }
    return found.account;
  }

  async view(_account: SignedInAccount): Promise<SessionView> {
    throw new Error('not ready');
  }
  async listOwn(_account: SignedInAccount): Promise<OwnSessions> {
    throw new Error('not ready');
  }
  async endOthers(_account: SignedInAccount): Promise<void> {
    throw new Error('not ready');
  }
  async endOwn(_account: SignedInAccount, _id: string): Promise<void> {
    throw new Error('not ready');
  }

  /** Name and attributes of the session cookie under this public address. */
  cookie(): { name: string; options: CookieOptions } {
    return sessionCookie(this.config);
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
