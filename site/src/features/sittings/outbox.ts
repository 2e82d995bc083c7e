import { type Sending } from './queries.ts';

const nameOf = (sittingId: string) => `ferrule.waiting.${sittingId}`;

/** Answers that the server has not confirmed yet: they outlive a reload and a closed browser. */
export class Outbox {
  private readonly name: string;
  private waiting: Sending[];

  constructor(sittingId: string) {
    this.name = nameOf(sittingId);
    this.waiting = readWaiting(this.name);
  }

  get all(): readonly Sending[] {
    return this.waiting;
  }

  /** A later answer to the same part takes the place of one that still waits. */
  put(sending: Sending): void {
    this.waiting = [...this.waiting.filter((one) => !isSamePlace(one, sending)), sending];
    this.keep();
  }

  /** Removes that very answer; a later one to the same part stays. */
  remove({ idempotencyKey }: Sending): void {
    this.waiting = this.waiting.filter((one) => one.idempotencyKey !== idempotencyKey);
    this.keep();
  }

  empty(): void {
    this.waiting = [];
    this.keep();
  }

  private keep(): void {
    try {
      if (this.waiting.length === 0) localStorage.removeItem(this.name);
      else localStorage.setItem(this.name, JSON.stringify(this.waiting));
    } catch {
      // Without storage the answers still wait in memory; the page says how many.
    }
  }
}

const isSamePlace = (one: Sending, other: Sending) =>
  one.item === other.item && one.part === other.part;

function readWaiting(name: string): Sending[] {
  try {
    return JSON.parse(localStorage.getItem(name) ?? '[]') as Sending[];
  } catch {
    return [];
  }
}
