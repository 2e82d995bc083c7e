import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ContentRevisionModel } from './models/content-revision.model.ts';
import type { ContentByKind, ContentKind, Listing, Published } from './content.ts';

const LISTED = ['id', 'kind', 'slug', 'revision', 'hash', 'pool', 'subject', 'lesson'];

function toListing(row: ContentRevisionModel): Listing {
  const { id, kind, slug, revision, pool, subject, lesson } = row;
  return Object.freeze({
    id,
    kind,
    slug,
    revision,
    hash: row.hash.toString('hex'),
    pool,
    subject,
    lesson,
  });
}

@Injectable()
export class PublishedContentRepository {
  constructor(
    @InjectModel(ContentRevisionModel) private readonly revisions: typeof ContentRevisionModel,
  ) {}

  async listCurrent(kind: ContentKind): Promise<Listing[]> {
    const rows = await this.revisions.findAll({
      attributes: LISTED,
      where: { kind, state: 'current' },
      order: [['slug', 'ASC']],
    });
    return rows.map(toListing);
  }

  async findCurrent(kind: ContentKind, slug: string): Promise<Listing | null> {
    const row = await this.revisions.findOne({
      attributes: LISTED,
      where: { kind, slug, state: 'current' },
    });
    return row ? toListing(row) : null;
  }

  async findById(kind: ContentKind, id: string): Promise<Listing | null> {
    const row = await this.revisions.findOne({ attributes: LISTED, where: { kind, id } });
    return row ? toListing(row) : null;
  }

  /** The listed revisions with their contents. */
  async compiled(listings: readonly Listing[]): Promise<Published<ContentKind>[]> {
    const rows = await this.revisions.findAll({
      attributes: ['id', 'compiled'],
      where: { id: listings.map(({ id }) => id) },
    });
    const contents = new Map(rows.map((row) => [row.id, row.compiled]));
    return listings.map((listing) =>
      Object.freeze({
        ...listing,
        content: contents.get(listing.id) as ContentByKind[ContentKind],
      }),
    );
  }
}
