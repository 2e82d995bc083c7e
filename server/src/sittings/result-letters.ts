import { Inject, Injectable } from '@nestjs/common';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { MailService } from '../mail/mail.service.ts';
import { longDay } from './days.ts';
import type { Result } from './result.ts';
import { percentOf, type Sitting } from './sitting.ts';
import { SittingsRepository } from './sittings.repository.ts';

/** One line a subject. */
const subjectLines = ({ bySubject }: Result) =>
  bySubject.map(({ name, marks, outOf }) => `${name}\t${marks} of ${outOf}`).join('\n');

/** Tells a candidate by mail that a paper is marked. */
@Injectable()
export class ResultLetters {
  constructor(
    private readonly mail: MailService,
    private readonly sittings: SittingsRepository,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** Joins the open transaction; a second letter about the same sitting is never written. */
  async write(sitting: Sitting, result: Result): Promise<void> {
    const to = await this.sittings.findCandidate(sitting.accountId);
    if (!to) return;
    await this.mail.queue({
      template: result.passed ? 'result-passed' : 'result-not-passed',
      to,
      accountId: sitting.accountId,
      dedupeKey: `result:${sitting.id}`,
      values: this.values(sitting, result),
    });
  }

  private values(sitting: Sitting, result: Result): Record<string, string> {
    const { id, rules, startedAt } = sitting;
    const { zone } = rules.scheme;
    return {
      givenName: sitting.givenName,
      paperNumber: rules.paper.number,
      paperTitle: rules.paper.title,
      satOn: longDay(zone, startedAt),
      marks: String(result.marks),
      outOf: String(result.outOf),
      percent: String(percentOf(result.marks, result.outOf)),
      passPercent: String(rules.passPercent),
      bySubject: subjectLines(result),
      maySitAgainOn: result.maySitAgainAt ? longDay(zone, result.maySitAgainAt) : '',
      url: new URL(`/sittings/${id}/result`, this.config.PUBLIC_URL).href,
    };
  }
}
