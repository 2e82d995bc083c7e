import { Inject, Injectable } from '@nestjs/common';
import { assemblePaper, PoolTooSmall } from '@ferrule/assessments';
import { createHash, createHmac } from 'node:crypto';
import { CONFIG } from '../config/config.module.ts';
import type { Config } from '../config/config.schema.ts';
import { NotFound } from '../problems/common.errors.ts';
import { PublishedContentService } from '../publishing/published-content.service.ts';
import { QuestionsService } from '../questions/questions.service.ts';
import { marksOf, type Paper, type Practice } from './paper.ts';
import { PaperNotReady } from './papers.errors.ts';
import { PapersRepository } from './papers.repository.ts';

@Injectable()
export class PapersService {
  constructor(
    private readonly content: PublishedContentService,
    private readonly questions: QuestionsService,
    private readonly repository: PapersRepository,
    @Inject(CONFIG) private readonly config: Config,
  ) {}

  /** @throws {NotFound} when no such paper is published. */
  async current(slug: string): Promise<Paper> {
    const published = await this.content.current('blueprint', slug);
    if (!published) throw new NotFound('There is no such paper.');
    const blueprint = published.content;
    const { scheme } = blueprint;
    const schemeId = await this.repository.findScheme(scheme.slug, scheme.revision);
    if (!schemeId) throw new PaperNotReady('the scheme it leads to is not published.');
    const agreementHash = createHash('sha256').update(blueprint.agreement).digest('hex');
    return Object.freeze({ revisionId: published.id, schemeId, blueprint, agreementHash });
  }

  /** The marks of the paper when they are the same whatever is drawn. */
  async marks(paper: Paper): Promise<number | null> {
    const questions = await this.content.all('question');
    const pool = questions
      .filter((question) => question.pool === 'paper')
      .map(({ content: { meta } }) => ({ subject: meta.subject, marks: meta.marks }));
    return marksOf(paper.blueprint, pool);
  }

  /**
   * The question revisions of one paper, in order; the same purpose gives the same paper.
   *
   * @throws {PaperNotReady} when the pool holds too few.
   */
  async assemble(paper: Paper, purpose: string): Promise<string[]> {
    const pool = await this.questions.paperPool();
    const revisions = new Map(pool.map(({ slug, revisionId }) => [slug, revisionId]));
    const { slug, revision } = paper.blueprint;
    const seed = createHmac('sha256', Buffer.from(this.config.DRAW_SECRET, 'hex'))
      .update([purpose, slug, revision].join('|'))
      .digest('hex');
    try {
      const slugs = assemblePaper(paper.blueprint, pool, seed);
      return slugs.map((slug) => revisions.get(slug)).filter((id) => id !== undefined);
    } catch (error) {
      if (error instanceof PoolTooSmall) throw new PaperNotReady(error.message);
      throw error;
    }
  }

  /** @throws {PaperNotReady} when no paper could be put together now. */
  async requirePool(paper: Paper): Promise<void> {
    await this.assemble(paper, 'look');
  }

  /** Where the course of a paper practises lessons, by lesson number. */
  async practice(courseSlug: string): Promise<Map<string, Practice>> {
    const [course, lessons] = await Promise.all([
      this.content.current('course', courseSlug),
      this.content.all('lesson'),
    ]);
    const units = course?.content.units ?? [];
    const worksheetOf = (sheet: string) =>
      units.find(({ sheets }) => sheets.includes(sheet))?.worksheet?.number ?? null;
    return new Map(
      lessons.map(({ content: { number, title } }) => [
        number,
        { sheet: number, title, worksheet: worksheetOf(number) },
      ]),
    );
  }
}
