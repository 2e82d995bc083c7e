import { Injectable } from '@nestjs/common';
import type { SignedInAccount } from '../accounts/account.ts';
import { Clock } from '../clock/clock.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import type { ThrottleRule } from '../throttles/throttle.ts';
import { ThrottlesService } from '../throttles/throttles.service.ts';
import type { ClassMember, ClassRecord, Enrolment, School } from './class-records.ts';
import { AlreadyInClass, JoinCodeUnknown } from './classes.errors.ts';
import { ClassesRepository } from './classes.repository.ts';
import type { ClassList, JoinedClass } from './classes.schemas.ts';

/** Nobody tries the codes of a school one after the other. */
const joinCodeTry: ThrottleRule = {
  kind: 'join-code',
  freeTries: 10,
  firstWaitMs: 60_000,
  longestWaitMs: 15 * 60_000,
  memoryMs: 60 * 60_000,
};

/** An administrator who has given the second factor sees every class. */
const seesEveryClass = ({ roles, secondFactorAt }: SignedInAccount): boolean =>
  roles.includes('administrator') && secondFactorAt !== null;

@Injectable()
export class ClassesService {
  constructor(
    private readonly repository: ClassesRepository,
    private readonly throttles: ThrottlesService,
    private readonly content: PublishedContentService,
    private readonly clock: Clock,
  ) {}

  async listFor(account: SignedInAccount): Promise<ClassList> {
    const seesAll = seesEveryClass(account);
    const classes = await this.repository.listFor(account.id, seesAll);
    const courses = await this.content.all('course');
    const titles = new Map(courses.map(({ slug, content }) => [slug, content.title]));
    return {
      classes: classes.map(({ courseSlug, joinCode, ...listed }) => ({
        ...listed,
        course: titles.get(courseSlug) ?? courseSlug,
        joinCode: listed.trainer || seesAll ? joinCode : null,
      })),
    };
  }

  /**
   * @throws {JoinCodeUnknown}
   * @throws {AlreadyInClass}
   * @throws {TooManyAttempts} after too many wrong codes.
   */
  async join(accountId: string, joinCode: string): Promise<JoinedClass> {
    const counted = await this.throttles.count({ rule: joinCodeTry, subject: accountId });
    const found = await this.repository.findByJoinCode(joinCode.toUpperCase());
    if (!found) throw new JoinCodeUnknown();
    await counted.forgive();
    const isAdded = await this.repository.addMember(found.id, accountId, this.clock.now());
    if (!isAdded) throw new AlreadyInClass(found.name);
    return { class: { id: found.id, name: found.name } };
  }

  /** Whether the trainee is in a class of this trainer. */
  trains(trainerId: string, traineeId: string): Promise<boolean> {
    return this.repository.trains(trainerId, traineeId);
  }

  /** The school of a person, or of this place when the person is in no class. */
  schoolOf(accountId: string | null): Promise<School | null> {
    return this.repository.school(accountId);
  }

  enrolment(accountId: string, courseSlug: string): Promise<Enrolment | null> {
    return this.repository.enrolment(accountId, courseSlug);
  }

  /** A class with its people, for those who may see it; null otherwise. */
  async trainedClass(account: SignedInAccount, id: string): Promise<TrainedClass | null> {
    const record = await this.repository.findTrained(id, account.id, seesEveryClass(account));
    if (!record) return null;
    const [trainers, members] = await Promise.all([
      this.repository.trainers(id),
      this.repository.members(id),
    ]);
    return { record, trainers, members };
  }
}

export interface TrainedClass {
  readonly record: ClassRecord;
  readonly trainers: readonly string[];
  readonly members: readonly ClassMember[];
}
