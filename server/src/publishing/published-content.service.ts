import { Injectable } from '@nestjs/common';
import type { ContentByKind, ContentKind, Listing, Published } from './content.ts';
import { PublishedContentRepository } from './published-content.repository.ts';

const MOST_KEPT = 1_000;

/**
 * Reads what has been published. A revision never changes, so its compiled form is kept in
 * memory; which revision is current is asked each time.
 */
@Injectable()
export class PublishedContentService {
  private readonly kept = new Map<string, unknown>();

  constructor(private readonly repository: PublishedContentRepository) {}

  /** Every current revision of a kind, without contents. */
  list(kind: ContentKind): Promise<Listing[]> {
    return this.repository.listCurrent(kind);
  }

  /** Every current revision of a kind, by slug. */
  async all<K extends ContentKind>(kind: K): Promise<Published<K>[]> {
    return this.fill<K>(await this.repository.listCurrent(kind));
  }

  async current<K extends ContentKind>(kind: K, slug: string): Promise<Published<K> | null> {
    return this.fillOne<K>(await this.repository.findCurrent(kind, slug));
  }

  /** Any revision, superseded ones too: what was once handed out stays readable. */
  async byId<K extends ContentKind>(kind: K, id: string): Promise<Published<K> | null> {
    return this.fillOne<K>(await this.repository.findById(kind, id));
  }

  private async fillOne<K extends ContentKind>(
    found: Listing | null,
  ): Promise<Published<K> | null> {
    if (!found) return null;
    const [published] = await this.fill<K>([found]);
    return published ?? null;
  }

  private async fill<K extends ContentKind>(listings: Listing[]): Promise<Published<K>[]> {
    const missing = listings.map(({ id }) => id).filter((id) => !this.kept.has(id));
    const read =
      missing.length > 0 ? await this.repository.compiled(missing) : new Map<string, unknown>();
    const filled = listings.map((listing) => ({
      ...listing,
      content: (this.kept.get(listing.id) ?? read.get(listing.id)) as ContentByKind[K],
    }));
    this.keep(read);
    return filled;
  }

  private keep(read: Map<string, unknown>): void {
    for (const [id, compiled] of read) this.kept.set(id, compiled);
    for (const id of this.kept.keys()) {
      if (this.kept.size <= MOST_KEPT) return;
      this.kept.delete(id);
    }
  }
}
