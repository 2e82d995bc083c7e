import { Injectable } from '@nestjs/common';
import { Transactions } from '../database/transactions.ts';
import { InvalidRequest } from '../problems/common.errors.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { ClassNotPossible } from './classes.errors.ts';
import type { OpenClass, OpenedClass } from './classes.schemas.ts';
import { newJoinCode } from './join-code.ts';
import { OpeningRepository } from './opening.repository.ts';

/** Opens classes of the school for its course. */
@Injectable()
export class OpeningService {
  constructor(
    private readonly repository: OpeningRepository,
    private readonly content: PublishedContentService,
    private readonly transactions: Transactions,
  ) {}

  /**
   * @throws {InvalidRequest} naming each address that is not a trainer's.
   * @throws {ClassNotPossible} without a school or a published course.
   */
  open({ trainers, ...input }: OpenClass): Promise<OpenedClass> {
    return this.transactions.run(async () => {
      const [course] = await this.content.all('course');
      if (!course) throw new ClassNotPossible('no course is published.');
      const trainerIds = await this.trainerIds(trainers);
      const joinCode = newJoinCode();
      const record = { ...input, joinCode, courseSlug: course.slug };
      const id = await this.repository.add(record, trainerIds);
      if (!id) throw new ClassNotPossible('the school itself is not entered.');
      return { class: { id, name: input.name, joinCode } };
    });
  }

  private async trainerIds(emails: readonly string[]): Promise<string[]> {
    const found = await this.repository.findTrainers(emails);
    const known = new Map(found.map(({ email, id }) => [email, id]));
    const strange = emails.filter((email) => !known.has(email));
    if (strange.length === 0) return [...known.values()];
    const detail = `No trainer has the address ${strange.join(', ')}. Give the person the role on the people page first.`;
    throw new InvalidRequest([{ pointer: '#/trainers', detail }]);
  }
}
