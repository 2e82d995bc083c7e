import { Injectable, type OnApplicationBootstrap } from '@nestjs/common';
import { createHash } from 'node:crypto';
import { Clock } from '../clock/clock.ts';
import { Transactions } from '../database/transactions.ts';
import { TooManyAttempts } from '../problems/common.errors.ts';
import { secondsToWait, signInAtAccount, type ThrottleRule } from './throttle.ts';
import { ThrottlesRepository } from './throttles.repository.ts';

const hash = (subject: string) => createHash('sha256').update(subject).digest();

/** What is counted: under which rule, and for whom or from where. */
export interface Counted {
  readonly rule: ThrottleRule;
  readonly subject: string;
}

/** A try that was counted before its outcome is known. */
export interface CountedTry {
  /** It was no failure after all. */
  forgive(): Promise<void>;
}

/** Counts tries in the database, so that every server process sees the same count. */
@Injectable()
export class ThrottlesService implements OnApplicationBootstrap {
  constructor(
    private readonly repository: ThrottlesRepository,
    private readonly transactions: Transactions,
    private readonly clock: Clock,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    const { memoryMs } = signInAtAccount;
    await this.repository.removeOlder(new Date(this.clock.now().getTime() - memoryMs));
  }

  /**
   * Counts a try, before it is made: tries that run at once cannot slip past the count.
   *
   * @throws {TooManyAttempts} when one of the counts asks to wait; nothing is counted then.
   */
  async count(...all: Counted[]): Promise<CountedTry> {
    const ids = await this.transactions.run(async () => {
      const now = this.clock.now();
      const added: string[] = [];
      for (const { rule, subject } of all) added.push(await this.countOne(rule, subject, now));
      return added;
    });
    return {
      forgive: async () => {
        for (const id of ids) await this.repository.remove(id);
      },
    };
  }

  /** As `count`, but answers whether there is room instead of throwing. */
  async hasRoom(counted: Counted): Promise<boolean> {
    try {
      await this.count(counted);
      return true;
    } catch (error) {
      if (error instanceof TooManyAttempts) return false;
      throw error;
    }
  }

  async clear({ rule, subject }: Counted): Promise<void> {
    await this.repository.removeAll(rule.kind, hash(subject));
  }

  private async countOne(rule: ThrottleRule, subject: string, now: Date): Promise<string> {
    const subjectHash = hash(subject);
    await this.repository.lock(rule.kind, subjectHash);
    const since = new Date(now.getTime() - rule.memoryMs);
    const past = await this.repository.past(rule.kind, subjectHash, since);
    const seconds = secondsToWait(rule, past, now);
    if (seconds > 0) throw new TooManyAttempts(seconds);
    return this.repository.add(rule.kind, subjectHash, now);
  }
}
