import { Injectable } from '@nestjs/common';
import { JobsService } from '../jobs/jobs.service.ts';
import { ClosingService } from './closing.service.ts';
import { MarkingService } from './marking.service.ts';

/** What happens to a sitting without its candidate. */
@Injectable()
export class SittingsJobs {
  constructor(jobs: JobsService, closing: ClosingService, marking: MarkingService) {
    jobs.handle('close-sitting', ({ sittingId }) => closing.closeIfDue(sittingId));
    jobs.handle('mark-sitting', ({ sittingId }) => marking.markOnce(sittingId));
  }
}
