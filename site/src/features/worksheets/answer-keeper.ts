import { ProblemError } from '../../api/problem.ts';
import { type Answers, blankAnswer, type RawAnswer } from '../../ui/question/views.ts';
import { type Reading } from './queries.ts';

type Save = (
  key: string,
  answers: Answers,
) => Promise<{ savedAt: string; readings: Record<string, Reading> }>;

export interface Kept {
  /** By item, then by part. */
  answers: Record<string, Answers>;
  state: 'saved' | 'saving' | 'waiting' | 'refused';
  savedAt: string | null;
  /** The last refusal; a lost signal is no refusal. */
  error: unknown;
  /** By item, then by part: how what was saved is understood. */
  readings: Record<string, Record<string, Reading>>;
}

const restMs = 800;
const retryMs = 5000;

/**
 * Saves answers as they are typed: when typing rests, one request at a time, so that an older
 * answer never lands on a newer one. Without a signal it holds them and tries again.
 */
export class AnswerKeeper {
  private kept: Kept;
  private readonly save: Save;
  private readonly unsent = new Map<string, Set<string>>();
  private readonly listeners = new Set<() => void>();
  private timer: ReturnType<typeof setTimeout> | undefined;
  private sending: Promise<boolean> | null = null;

  constructor(start: Pick<Kept, 'answers' | 'savedAt'>, save: Save) {
    this.kept = { ...start, state: 'saved', error: null, readings: {} };
    this.save = save;
  }

  readonly read = (): Kept => this.kept;

  readonly watch = (listener: () => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  change(key: string, part: string, answer: RawAnswer): void {
    const ofItem = { ...this.kept.answers[key], [part]: answer };
    this.unsent.set(key, new Set(this.unsent.get(key)).add(part));
    this.tell({ answers: { ...this.kept.answers, [key]: ofItem }, state: 'saving' });
    this.sendAfter(restMs);
  }

  get hasUnsent(): boolean {
    return this.unsent.size > 0 || this.sending !== null;
  }

  /** Sends what has not been sent; true once nothing is left. */
  async flush(): Promise<boolean> {
    clearTimeout(this.timer);
    while (this.hasUnsent) {
      this.sending ??= this.sendNext().finally(() => {
        this.sending = null;
      });
      if (!(await this.sending)) return false;
    }
    return true;
  }

  private sendAfter(ms: number): void {
    clearTimeout(this.timer);
    this.timer = setTimeout(() => void this.flush(), ms);
  }

  private async sendNext(): Promise<boolean> {
    const [next] = this.unsent;
    if (!next) return true;
    const [key, parts] = next;
    this.unsent.delete(key);
    const ofItem = this.kept.answers[key];
    const answers = Object.fromEntries(
      [...parts].map((part) => [part, ofItem?.[part] ?? blankAnswer]),
    );
    try {
      const { savedAt, readings } = await this.save(key, answers);
      this.tell({
        savedAt,
        error: null,
        readings: { ...this.kept.readings, [key]: readings },
        state: this.unsent.size > 0 ? 'saving' : 'saved',
      });
      return true;
    } catch (error) {
      this.unsent.set(key, new Set([...parts, ...(this.unsent.get(key) ?? [])]));
      this.hold(error);
      return false;
    }
  }

  private hold(error: unknown): void {
    const status = error instanceof ProblemError ? error.problem.status : 0;
    const isRefusal = status >= 400 && status < 500 && status !== 429;
    this.tell(isRefusal ? { state: 'refused', error } : { state: 'waiting', error: null });
    if (!isRefusal) this.sendAfter(retryMs);
  }

  private tell(change: Partial<Kept>): void {
    this.kept = { ...this.kept, ...change };
    this.listeners.forEach((listener) => listener());
  }
}
