import { type CompiledQuestion, judgeQuestion, markFaded } from '@ferrule/assessments';
import { Injectable } from '@nestjs/common';
import {
  type AttemptKind,
  changesIn,
  changesInTotals,
  type Difference,
  type QuestionMarks,
  REFUSED,
  type StoredAttempt,
  type StoredQuestion,
  totalsOf,
} from './remark.ts';
import { RemarkingRepository } from './remarking.repository.ts';

const KINDS: readonly AttemptKind[] = ['worksheet', 'practice', 'sitting'];
const BATCH = 50;
/** More than a school's bank ever held; each is kept in memory while it is asked for. */
const MOST_QUESTIONS = 1_000;

export interface Progress {
  readonly kind: AttemptKind;
  readonly done: number;
  readonly outOf: number;
}

/** What is told while attempts are marked again. */
export interface Listener {
  onDifference(difference: Difference): void;
  onProgress?(progress: Progress): void;
}

/** Marks every stored attempt again from the values that were stored with it. */
@Injectable()
export class RemarkingService {
  constructor(private readonly repository: RemarkingRepository) {}

  /**
   * Goes through all attempts, some at a time, and tells of what comes out otherwise.
   *
   * @returns how many attempts were marked.
   */
  async remarkAll(listener: Listener): Promise<number> {
    const outOf = await this.repository.count();
    const questions = new Map<string, CompiledQuestion>();
    let all = 0;
    for (const kind of KINDS) {
      let done = 0;
      for await (const batch of this.batches(kind)) {
        await this.fetch(batch, questions);
        for (const attempt of batch) tell(attempt, questions, listener);
        done += batch.length;
        listener.onProgress?.({ kind, done, outOf: outOf[kind] });
      }
      all += done;
    }
    return all;
  }

  private async *batches(kind: AttemptKind): AsyncGenerator<StoredAttempt[]> {
    let batch = await this.repository.next(kind, null, BATCH);
    while (batch.length > 0) {
      yield batch;
      batch = await this.repository.next(kind, batch.at(-1)?.id ?? null, BATCH);
    }
  }

  private async fetch(
    batch: readonly StoredAttempt[],
    known: Map<string, CompiledQuestion>,
  ): Promise<void> {
    const wanted = batch.flatMap(({ questions }) => questions.map(({ revisionId }) => revisionId));
    const missing = [...new Set(wanted)].filter((id) => !known.has(id));
    if (missing.length === 0) return;
    if (known.size > MOST_QUESTIONS) known.clear();
    const ids = known.size === 0 ? [...new Set(wanted)] : missing;
    for (const [id, question] of await this.repository.questions(ids)) known.set(id, question);
  }
}

function tell(
  attempt: StoredAttempt,
  questions: ReadonlyMap<string, CompiledQuestion>,
  listener: Listener,
): void {
  const { kind, id } = attempt;
  const marked = attempt.questions.map((question) => ({
    question,
    subject: question.subject,
    ...markAgain(question, questions.get(question.revisionId)),
  }));
  for (const { question, again, refusal } of marked) {
    for (const change of changesIn(question.stored, again, refusal)) {
      listener.onDifference({ kind, id, question: question.slug, ...change });
    }
  }
  for (const change of changesInTotals(attempt.totals, totalsOf(attempt, marked))) {
    listener.onDifference({ kind, id, question: null, ...change });
  }
}

/** What cannot be marked any more is a difference too: its draw may be of another format. */
function markAgain(
  { drawn, answers, left, revisionId }: StoredQuestion,
  question: CompiledQuestion | undefined,
): { again: QuestionMarks; refusal: string | null } {
  if (!question) return { again: REFUSED, refusal: `no revision ${revisionId} of the question` };
  try {
    const again =
      left === null
        ? judgeQuestion(question, drawn, answers)
        : markFaded(question, drawn, { left, answers });
    return { again, refusal: null };
  } catch (error) {
    return { again: REFUSED, refusal: error instanceof Error ? error.message : String(error) };
  }
}
