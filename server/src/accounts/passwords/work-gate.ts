import { TooBusy } from '../accounts.errors.ts';

/** Lets so many pieces of work run at once and so many wait; more than that are turned away. */
export class WorkGate {
  private running = 0;
  private readonly waiting: Array<() => void> = [];

  constructor(
    private readonly mostRunning: number,
    private readonly mostWaiting: number,
  ) {}

  /** @throws {TooBusy} when the queue is full. */
  async run<T>(work: () => Promise<T>): Promise<T> {
    await this.enter();
    try {
      return await work();
    } finally {
      this.leave();
    }
  }

  private async enter(): Promise<void> {
    if (this.running < this.mostRunning) {
      this.running += 1;
      return;
    }
    if (this.waiting.length >= this.mostWaiting) throw new TooBusy();
    await new Promise<void>((resolve) => this.waiting.push(resolve));
  }

  /** Hands the place to whoever waits longest, or gives it up. */
  private leave(): void {
    const next = this.waiting.shift();
    if (next) next();
    else this.running -= 1;
  }
}
