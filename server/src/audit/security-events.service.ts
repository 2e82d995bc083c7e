import { Injectable } from '@nestjs/common';
import { Clock } from '../clock/clock.ts';
import type { SecurityEvent } from './security-event.ts';
import { SecurityEventsRepository, type RecordedEvent } from './security-events.repository.ts';

@Injectable()
export class SecurityEventsService {
  constructor(
    private readonly repository: SecurityEventsRepository,
    private readonly clock: Clock,
  ) {}

  /** Joins the open transaction: what is rolled back is not recorded as done. */
  record(event: SecurityEvent): Promise<void> {
    return this.repository.add(event, this.clock.now());
  }

  /** The newest events that concern an account. */
  latelyOf(accountId: string, most: number): Promise<RecordedEvent[]> {
    return this.repository.latelyOf(accountId, most);
  }
}
