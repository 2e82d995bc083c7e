import { Injectable } from '@nestjs/common';
import { SecurityEventsService } from '../audit/security-events.service.ts';
import { log } from '../http/log.ts';
import { JobsService } from '../jobs/jobs.service.ts';
import type { Difference } from './remark.ts';
import { RemarkingService } from './remarking.service.ts';

/** Enough to see what it is about; the command lists them all. */
const MOST_LOGGED = 20;

/** Every night: does every attempt still come out as it was marked? */
@Injectable()
export class RemarkingJobs {
  constructor(
    jobs: JobsService,
    private readonly remarking: RemarkingService,
    private readonly events: SecurityEventsService,
  ) {
    jobs.handle('remark-attempts', () => this.remark());
  }

  private async remark(): Promise<void> {
    const first: Difference[] = [];
    let differences = 0;
    const attempts = await this.remarking.remarkAll({
      onDifference: (difference) => {
        differences += 1;
        if (first.length < MOST_LOGGED) first.push(difference);
      },
    });
    if (differences === 0) {
      log.info({ attempts }, 'every attempt marked again: all as stored');
      return;
    }
    log.error({ attempts, differences, first }, 'marked again, attempts come out otherwise');
    const [{ kind, id }] = first as [Difference];
    await this.events.record({
      kind: 'marking-differs',
      accountId: null,
      actorId: null,
      detail: { attempts, differences, firstKind: kind, firstId: id },
    });
  }
}
