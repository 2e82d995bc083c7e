import { Injectable } from '@nestjs/common';
import { randomBytes, randomUUID } from 'node:crypto';
import type { SignedInAccount } from '../accounts/account.ts';
import type { Paper } from '../papers/paper.ts';
import { PapersService } from '../papers/papers.service.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { AllowancesRepository } from './allowances.repository.ts';
import { closingTime, freezeRules, type Sitting } from './sitting.ts';
import { SittingsRepository, type SittingItem } from './sittings.repository.ts';
import type { StartSitting } from './sittings.schemas.ts';

export interface DrawnPaper {
  readonly sitting: Sitting;
  readonly items: readonly SittingItem[];
}

/** Names of questions within one sitting: they say nothing of the question. */
const newItemKey = () => randomBytes(5).toString('hex');

/** Puts one candidate's paper together: which questions, which figures, under which rules. */
@Injectable()
export class PaperDrawing {
  constructor(
    private readonly papers: PapersService,
    private readonly questions: QuestionsService,
    private readonly allowances: AllowancesRepository,
    private readonly repository: SittingsRepository,
  ) {}

  async draw(paper: Paper, account: SignedInAccount, input: StartSitting): Promise<DrawnPaper> {
    const id = randomUUID();
    const items = await this.drawItems(paper, id);
    const outOf = items.reduce((sum, { marks }) => sum + marks, 0);
    const extraTimePercent = await this.allowances.percentFor(account.id);
    const rules = freezeRules(paper.blueprint, outOf, extraTimePercent);
    const startedAt = await this.repository.now();
    const sitting: Sitting = {
      ...{ id, rules, startedAt },
      accountId: account.id,
      paperSlug: paper.blueprint.slug,
      blueprintRevisionId: paper.revisionId,
      schemeId: paper.schemeId,
      agreementHash: paper.agreementHash,
      givenName: input.givenName.normalize('NFC'),
      familyName: input.familyName.normalize('NFC'),
      writingSessionId: account.sessionId,
      closesAt: closingTime(startedAt, rules),
      handedInAt: null,
      handedInHow: null,
    };
    return { sitting, items };
  }

  private async drawItems(paper: Paper, sittingId: string): Promise<SittingItem[]> {
    const revisions = await this.papers.assemble(paper, `paper|${sittingId}`);
    const published = await Promise.all(revisions.map((id) => this.questions.byRevision(id)));
    return published.map((one, index) => {
      const key = newItemKey();
      const { drawn } = this.questions.drawFor(`sitting|${sittingId}|${key}`, one);
      const { subject, marks } = one.question.meta;
      const { revisionId: questionRevisionId } = one;
      return { key, number: index + 1, questionRevisionId, subject, marks, drawn };
    });
  }
}
