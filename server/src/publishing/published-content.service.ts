import { Injectable } from '@nestjs/common';
import type { ContentKind, Listing, Published } from './content.ts';
import { PublishedContentRepository } from './published-content.repository.ts';

const MOST_KEPT = 1_000;

/**
 * Reads what has been published. A revision never changes, so it is kept in memory; which
 * revision is current is asked each time.
 */
@Injectable()
export class PublishedContentService {
  private readonly kept = new Map<string, Published<ContentKind>>();

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
    const kept = this.kept.get(id);
    if (kept) return kept.kind === kind ? (kept as Published<K>) : null;
    return this.fillOne<K>(await this.repository.findById(kind, id));
  }

  private async fillOne<K extends ContentKind>(
    found: Listing | null,
  ): Promise<Published<K> | null> {
    const [published] = await this.fill<K>(found ? [found] : []);
    return published ?? null;
  }

  private async fill<K extends ContentKind>(listings: Listing[]): Promise<Published<K>[]> {
    const missing = listings.filter(({ id }) => !this.kept.has(id));
    const read = missing.length > 0 ? await this.repository.compiled(missing) : [];
    const found = new Map([...this.kept, ...read.map((item) => [item.id, item] as const)]);
    this.keep(read);
    return listings.flatMap(({ id }) => (found.get(id) as Published<K> | undefined) ?? []);
  }

  private keep(read: readonly Published<ContentKind>[]): void {
    for (const item of read) this.kept.set(item.id, item);
    for (const id of this.kept.keys()) {
      if (this.kept.size <= MOST_KEPT) return;
      this.kept.delete(id);
    }
  }
}
