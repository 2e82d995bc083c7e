import { type Sending } from './queries.ts';

const prefixOf = (sittingId: string) => `ferrule.waiting.${sittingId}.`;
const placeOf = ({ item, part }: Pick<Sending, 'item' | 'part'>) => `${item} ${part}`;

/**
 * Answers that the server has not confirmed yet, one for each part: they outlive a reload and a
 * closed browser. Each has its own entry in storage, so that two pages do not wipe out each other's.
 */
export class Outbox {
  private readonly prefix: string;
  private readonly waiting: Map<string, Sending>;

  constructor(sittingId: string) {
    this.prefix = prefixOf(sittingId);
    this.waiting = readWaiting(this.prefix);
  }

  get all(): readonly Sending[] {
    return [...this.waiting.values()];
  }

  get size(): number {
    return this.waiting.size;
  }

  /** A later answer to the same part takes the place of one that still waits. */
  put(sending: Sending): void {
    const place = placeOf(sending);
    this.waiting.set(place, sending);
    try {
      localStorage.setItem(this.prefix + place, JSON.stringify(sending));
    } catch {
      // Without storage the answers still wait in memory; the page says how many.
    }
  }

  /** Removes that very answer; a later one to the same part stays. */
  remove(sending: Sending): void {
    const place = placeOf(sending);
    if (this.waiting.get(place)?.idempotencyKey !== sending.idempotencyKey) return;
    this.waiting.delete(place);
    try {
      localStorage.removeItem(this.prefix + place);
    } catch {
      // Nothing was kept there.
    }
  }

  empty(): void {
    for (const sending of this.all) this.remove(sending);
  }
}

function readWaiting(prefix: string): Map<string, Sending> {
  const waiting = new Map<string, Sending>();
  try {
    for (const name of Object.keys(localStorage).filter((key) => key.startsWith(prefix))) {
      const sending = JSON.parse(localStorage.getItem(name) ?? '') as Sending;
      waiting.set(placeOf(sending), sending);
    }
  } catch {
    // No storage, or nothing of ours in it.
  }
  return waiting;
}
