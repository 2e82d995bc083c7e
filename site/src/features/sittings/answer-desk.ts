import { isProblem, ProblemError, sayProblem } from '../../api/problem.ts';
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
  /** Why the last try to send came to nothing: no signal, or a server in trouble. */
  cut: 'signal' | 'server' | null;
  /** How many answers have gone since the signal came back; none once something new is written. */
  caughtUp: number;
  stopped: Stopped;
  /** Server time minus the time of this device, in milliseconds. */
  clockOffsetMs: number;
}

type Send = (sending: Sending) => Promise<Saved>;
type Draft = Pick<Sending, 'item' | 'part' | 'answer'>;

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
  private readonly numbers: Map<string, number>;
  private pause: ReturnType<typeof setTimeout> | undefined;
  private retry: ReturnType<typeof setTimeout> | undefined;
  private failures = 0;
  private isSending = false;
  private isLeft = false;

  constructor(
    sitting: SittingView,
    private readonly send: Send,
  ) {
    this.outbox = new Outbox(sitting.id);
    this.numbers = new Map(sitting.items.map(({ key, number }) => [key, number]));
    this.state = this.open(sitting);
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  readonly snapshot = (): DeskState => this.state;

  /** Sends what an earlier visit left behind. */
  start(): void {
    this.isLeft = false;
    void this.deliver();
  }

  /** Typing: kept at once on this device, sent after a pause. */
  write(item: string, part: string, answer: RawAnswer): void {
    if (this.state.stopped) return;
    const ofItem = { ...this.state.answers[item], [part]: answer };
    this.queue({ item, part, answer });
    this.update({ answers: { ...this.state.answers, [item]: ofItem }, caughtUp: 0 });
    clearTimeout(this.pause);
    this.pause = setTimeout(() => void this.deliver(), typingPauseMs);
  }

  /** Leaving an entry, or going elsewhere: send now. */
  flush(): void {
    clearTimeout(this.pause);
    void this.deliver();
  }

  /** The signal is back. */
  tryAgain(): void {
    this.failures = 0;
    clearTimeout(this.retry);
    void this.deliver();
  }

  /** The page is left: sends what waits once, and tries no more. */
  leave(): void {
    this.flush();
    this.isLeft = true;
    clearTimeout(this.retry);
  }

  private queue({ item, part, answer }: Draft): void {
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
    const { savedAt, receipt, sequence } = saved;
    const received = { item: this.numbers.get(item) ?? 0, part, savedAt, receipt, sequence };
    const ask = 'ask' in saved.reading ? saved.reading.ask : '';
    const wasCut = this.state.cut !== null || this.state.caughtUp > 0;
    this.update({
      receipts: [received, ...this.state.receipts],
      savedAt,
      unclear: { ...this.state.unclear, [placeOf(item, part)]: ask },
      clockOffsetMs: Date.parse(saved.now) - Date.now(),
      cut: null,
      caughtUp: wasCut ? this.state.caughtUp + 1 : 0,
    });
  }

  private afterFailure(sending: Sending, error: unknown): boolean {
    if (isProblem(error, 'sitting-closed')) return this.cease('closed');
    if (isProblem(error, 'taken-over')) return this.cease('taken-over');
    if (isProblem(error, 'sequence-used') && !this.isLeft) return this.sendAnew(sending, error);
    if (isFinal(error)) return this.giveBack(sending, error);
    this.update({ cut: isSilence(error) ? 'signal' : 'server' });
    const wait = retryMs[Math.min(this.failures, retryMs.length - 1)];
    this.failures += 1;
    clearTimeout(this.retry);
    if (!this.isLeft) this.retry = setTimeout(() => void this.deliver(), wait);
    return false;
  }

  /** Another page of this sitting has counted on: what stands here now is newer still. */
  private sendAnew({ item, part, answer }: Sending, { problem }: ProblemError): boolean {
    const place = placeOf(item, part);
    const highest = typeof problem['highest'] === 'number' ? problem['highest'] : 0;
    this.sequences.set(place, Math.max(highest, this.sequences.get(place) ?? 0));
    this.queue({ item, part, answer: this.state.answers[item]?.[part] ?? answer });
    return true;
  }

  /** Understood and refused: the same again would be refused again, so the page says why. */
  private giveBack(sending: Sending, error: unknown): boolean {
    const { title, detail } = sayProblem(error);
    const place = placeOf(sending.item, sending.part);
    this.outbox.remove(sending);
    this.update({
      unclear: { ...this.state.unclear, [place]: `This was not kept. ${detail || title}` },
    });
    return true;
  }

  private cease(stopped: Stopped): boolean {
    this.update({ stopped });
    return false;
  }

  private open(sitting: SittingView): DeskState {
    const answers: DeskState['answers'] = {};
    for (const item of sitting.items) {
      const kept = Object.entries(item.answers);
      answers[item.key] = Object.fromEntries(kept.map(([part, answer]) => [part, typed(answer)]));
      for (const [part, { sequence }] of kept) {
        this.sequences.set(placeOf(item.key, part), sequence);
      }
    }
    for (const waiting of this.outbox.all) {
      const { item, part, answer, sequence } = waiting;
      // The highest sequence wins: what the server holds may be newer, or this very answer.
      if (sequence <= (this.sequences.get(placeOf(item, part)) ?? 0)) {
        this.outbox.remove(waiting);
        continue;
      }
      answers[item] = { ...answers[item], [part]: answer };
      this.sequences.set(placeOf(item, part), sequence);
    }
    return {
      answers,
      unclear: {},
      receipts: sitting.receipts,
      waiting: this.outbox.size,
      savedAt: sitting.receipts[0]?.savedAt ?? null,
      cut: null,
      caughtUp: 0,
      stopped: stoppedFrom(sitting),
      clockOffsetMs: Date.parse(sitting.now) - Date.now(),
    };
  }

  private update(change: Partial<DeskState>): void {
    this.state = { ...this.state, ...change, waiting: this.outbox.size };
    for (const listener of this.listeners) listener();
  }
}

function typed(answer: RawAnswer): RawAnswer {
  const { text, unit, option, options, working } = { ...blankAnswer, ...answer };
  return { text, unit, option, working, ...(options && { options }) };
}

function stoppedFrom({ state, readOnly }: SittingView): Stopped {
  if (state === 'handed-in') return 'closed';
  return readOnly ? 'taken-over' : null;
}

/** The server understood and refused: sending the same again would change nothing. */
function isFinal(error: unknown): error is ProblemError {
  if (!(error instanceof ProblemError)) return false;
  const { status } = error.problem;
  return status === 404 || status === 422;
}

const isSilence = (error: unknown) => error instanceof ProblemError && error.problem.status === 0;
