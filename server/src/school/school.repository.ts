import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes, Sequelize } from 'sequelize';
import type { PracticeProfile } from './practice-profile.ts';

interface ProfileRow {
  readonly profile: PracticeProfile;
}

@Injectable()
export class SchoolRepository {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  /** Of the school of the person's class, or of the school this place is run by. */
  profileFor(accountId: string | null): Promise<PracticeProfile | null> {
    return this.profile(
      `SELECT o.practice_profile AS profile FROM organisations o
         LEFT JOIN classes c ON c.organisation_id = o.id
         LEFT JOIN class_members m ON m.class_id = c.id AND m.account_id = $1 AND m.left_at IS NULL
        WHERE o.kind = 'school'
        ORDER BY m.joined_at DESC NULLS LAST, o.created_at, o.id LIMIT 1`,
      [accountId],
    );
  }

  /** Null when no school is entered. */
  setProfile(profile: PracticeProfile): Promise<PracticeProfile | null> {
    return this.profile(
      `UPDATE organisations SET practice_profile = $1
        WHERE id = (SELECT id FROM organisations WHERE kind = 'school'
                     ORDER BY created_at, id LIMIT 1)
        RETURNING practice_profile AS profile`,
      [profile],
    );
  }

  private async profile(sql: string, bind: unknown[]): Promise<PracticeProfile | null> {
    const [row] = await this.sequelize.query<ProfileRow>(sql, { bind, type: QueryTypes.SELECT });
    return row?.profile ?? null;
  }
}
