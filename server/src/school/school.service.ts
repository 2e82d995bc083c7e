import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { Transactions } from '../database/transactions.ts';
import { NotFound } from '../problems/common.errors.ts';
import type { PracticeProfile } from './practice-profile.ts';
import { SchoolRepository } from './school.repository.ts';

const NO_SCHOOL = 'The school itself is not entered yet, so it has no settings.';

/** What the school has chosen for everyone who learns in it. */
@Injectable()
export class SchoolService {
  constructor(
    private readonly repository: SchoolRepository,
    private readonly events: SecurityEventsService,
    private readonly transactions: Transactions,
  ) {}

  /** The profile a person's school asks its questions under; metric where there is no school. */
  async profileFor(accountId: string): Promise<PracticeProfile> {
    return (await this.repository.profileFor(accountId)) ?? 'metric';
  }

  /** @throws {NotFound} when no school is entered. */
  async profile(): Promise<PracticeProfile> {
    const profile = await this.repository.profileFor(null);
    if (!profile) throw new NotFound(NO_SCHOOL);
    return profile;
  }

  /** @throws {NotFound} when no school is entered. */
  choose(
    actor: { id: string; address: string },
    profile: PracticeProfile,
  ): Promise<PracticeProfile> {
    return this.transactions.run(async () => {
      const chosen = await this.repository.setProfile(profile);
      if (!chosen) throw new NotFound(NO_SCHOOL);
      await this.events.record({
        ...{ kind: 'practice-profile-chosen', accountId: actor.id, actorId: actor.id },
        ...{ address: actor.address, detail: { profile } },
      });
      return chosen;
    });
  }
}
