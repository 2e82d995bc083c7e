import { isProblem, ProblemError } from '../../api/problem.ts';
import { blankAnswer, type RawAnswer } from '../../ui/question/views.ts';
import { Outbox } from './outbox.ts';
import { type Receipt, type Saved, type Sending, type SittingView } from './queries.ts';

/** What keeps the desk from taking answers. */
export type Stopped = 'closed' | 'taken-over' | null;

export interface DeskState {
  /** By item, by part: as typed last, sent or not. */
  answers: Record<string, Record<string, RawAnswer>>;
  /** By "item part": what is asked back of an answer as it was read. */
  unclear: Record<string, string>;
  receipts: readonly Receipt[];
  /** How many answers have no receipt yet. */
  waiting: number;
  savedAt: string | null;
  /** The last try to send failed: there is no signal, or no server. */
  isCut: boolean;
  stopped: Stopped;
  /** Server time minus the time of this device, in milliseconds. */
  clockOffsetMs: number;
}

type Send = (sending: Sending) => Promise<Saved>;

const typingPauseMs = 900;
const retryMs = [1_000, 2_000, 5_000, 10_000, 15_000];

const placeOf = (item: string, part: string) => `${item} ${part}`;

/**
 * Keeps what is typed in a sitting and brings it to the server, one answer at a time, in order.
 * An answer counts as saved only with its receipt; until then it waits and is tried again.
 */
export class AnswerDesk {
  private state: DeskState;
  private readonly outbox: Outbox;
  private readonly listeners = new Set<() => void>();
  private readonly sequences = new Map<string, number>();
  private readonly pauses = new Map<string, ReturnType<typeof setTimeout>>();
  private readonly numbers: Map<string, number>;
  private retry: ReturnType<typeof setTimeout> | undefined;
  private failures = 0;
  private isSending = false;

  constructor(
    sitting: SittingView,
    private readonly send: Send,
  ) {
    this.outbox = new Outbox(sitting.id);
    this.numbers = new Map(sitting.items.map(({ key, number }) => [key, number]));
    this.state = this.opening(sitting);
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly snapshot = (): DeskState => this.state;

  /** Sends what an earlier visit left behind. */
  start(): void {
    void this.deliver();
  }

  /** Typing: kept at once on this device, sent after a pause. */
  write(item: string, part: string, answer: RawAnswer): void {
    if (this.state.stopped) return;
    const ofItem = { ...this.state.answers[item], [part]: answer };
    this.queue({ item, part, answer });
    this.update({ answers: { ...this.state.answers, [item]: ofItem } });
    const place = placeOf(item, part);
    clearTimeout(this.pauses.get(place));
    this.pauses.set(
      place,
      setTimeout(() => void this.deliver(), typingPauseMs),
    );
  }

  /** Leaving an entry, or going elsewhere: send now. */
  flush(): void {
    for (const pause of this.pauses.values()) clearTimeout(pause);
    this.pauses.clear();
    void this.deliver();
  }

  /** The signal is back. */
  tryAgain(): void {
    this.failures = 0;
    clearTimeout(this.retry);
    void this.deliver();
  }

  stop(): void {
    clearTimeout(this.retry);
    for (const pause of this.pauses.values()) clearTimeout(pause);
  }

  private queue({ item, part, answer }: Pick<Sending, 'item' | 'part' | 'answer'>): void {
    const place = placeOf(item, part);
    const sequence = (this.sequences.get(place) ?? 0) + 1;
    this.sequences.set(place, sequence);
    this.outbox.put({ item, part, answer, sequence, idempotencyKey: crypto.randomUUID() });
  }

  private async deliver(): Promise<void> {
    if (this.isSending || this.state.stopped) return;
    this.isSending = true;
    for (let next = this.outbox.all[0]; next && (await this.deliverOne(next));) {
      next = this.outbox.all[0];
    }
    this.isSending = false;
    this.update({});
  }

  /** False when there is no point in going on now. */
  private async deliverOne(sending: Sending): Promise<boolean> {
    try {
      this.accept(sending, await this.send(sending));
      return true;
    } catch (error) {
      return this.afterFailure(sending, error);
    }
  }

  private accept(sending: Sending, saved: Saved): void {
    const { item, part } = sending;
    this.failures = 0;
    this.outbox.remove(sending);
    const receipt = {
      ...{ part, savedAt: saved.savedAt, receipt: saved.receipt, sequence: saved.sequence },
      item: this.numbers.get(item) ?? 0,
    };
    const ask = 'ask' in saved.reading ? saved.reading.ask : '';
    this.update({
      receipts: [receipt, ...this.state.receipts],
      savedAt: saved.savedAt,
      unclear: { ...this.state.unclear, [placeOf(item, part)]: ask },
      clockOffsetMs: Date.parse(saved.now) - Date.now(),
      isCut: false,
    });
  }

  private afterFailure(sending: Sending, error: unknown): boolean {
    if (isProblem(error, 'sitting-closed')) return this.cease('closed');
    if (isProblem(error, 'taken-over')) return this.cease('taken-over');
    if (isProblem(error, 'sequence-used')) {
      this.outbox.remove(sending);
      this.sequences.set(placeOf(sending.item, sending.part), sending.sequence + 100);
      this.queue(sending);
      return true;
    }
    if (isFinal(error)) {
      this.outbox.remove(sending);
      return true;
    }
    this.update({ isCut: true });
    const wait = retryMs[Math.min(this.failures, retryMs.length - 1)];
    this.failures += 1;
    clearTimeout(this.retry);
    this.retry = setTimeout(() => void this.deliver(), wait);
    return false;
  }

  private cease(stopped: Stopped): boolean {
    if (stopped === 'closed') this.outbox.empty();
    this.update({ stopped });
    return false;
  }

  private opening(sitting: SittingView): DeskState {
    const answers: DeskState['answers'] = {};
    for (const item of sitting.items) {
      const kept = Object.entries(item.answers);
      answers[item.key] = Object.fromEntries(kept.map(([part, answer]) => [part, typed(answer)]));
      for (const [part, { sequence }] of kept) {
        this.sequences.set(placeOf(item.key, part), sequence);
      }
    }
    for (const { item, part, answer, sequence } of this.outbox.all) {
      answers[item] = { ...answers[item], [part]: answer };
      const before = this.sequences.get(placeOf(item, part)) ?? 0;
      this.sequences.set(placeOf(item, part), Math.max(before, sequence));
    }
    return {
      answers,
      unclear: {},
      receipts: sitting.receipts,
      waiting: this.outbox.all.length,
      savedAt: sitting.receipts[0]?.savedAt ?? null,
      isCut: false,
      stopped: stoppedFrom(sitting),
      clockOffsetMs: Date.parse(sitting.now) - Date.now(),
    };
  }

  private update(change: Partial<DeskState>): void {
    this.state = { ...this.state, ...change, waiting: this.outbox.all.length };
    for (const listener of this.listeners) listener();
  }
}

function typed(answer: RawAnswer): RawAnswer {
  const { text, unit, option, working } = { ...blankAnswer, ...answer };
  return { text, unit, option, working };
}

function stoppedFrom({ state, readOnly }: SittingView): Stopped {
  if (state === 'handed-in') return 'closed';
  return readOnly ? 'taken-over' : null;
}

/** The server understood and refused: sending the same again would change nothing. */
function isFinal(error: unknown): boolean {
  if (!(error instanceof ProblemError)) return false;
  const { status } = error.problem;
  return status === 404 || status === 422;
}
