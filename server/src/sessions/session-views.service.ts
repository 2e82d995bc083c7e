import { Inject, Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import type { RequestSource } from '../http/request-source.decorator.ts';
import { presentOwnSessions, presentSession } from './session.presenter.ts';
import type { OwnSessions, SessionView } from './sessions.schemas.ts';
import { SessionsService } from './sessions.service.ts';

/** What somebody sees and ends of their own sessions. */
@Injectable()
export class SessionViewsService {
  constructor(
    private readonly sessions: SessionsService,
    private readonly events: SecurityEventsService,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  async current(sessionId: string): Promise<SessionView> {
    const standing = await this.sessions.standing(sessionId);
    return presentSession(standing, this.config.DEMONSTRATION === '1');
  }

  async listOwn({ id, sessionId }: SignedInAccount): Promise<OwnSessions> {
    return presentOwnSessions(await this.sessions.listOpen(id), sessionId);
  }

  async endOthers(account: SignedInAccount, source: RequestSource): Promise<void> {
    await this.sessions.endAll(account.id, account.sessionId);
    await this.note('other-sessions-ended', account, source);
  }

  async endOne(account: SignedInAccount, sessionId: string, source: RequestSource): Promise<void> {
    await this.sessions.endOwn(account.id, sessionId);
    await this.note('session-ended', account, source);
  }

  private note(kind: string, { id }: SignedInAccount, { address }: RequestSource): Promise<void> {
    return this.events.record({ kind, accountId: id, actorId: id, address });
  }
}
