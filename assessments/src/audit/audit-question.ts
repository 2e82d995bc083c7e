import { type Compiled, type Drawn, type Given, openQuestion } from '../questions/compiled.ts';
import { keepRuns } from '../questions/curve-run.ts';
import { drawQuestion } from '../questions/draw.ts';
import { type CompiledQuestion, type DrawnQuestion } from '../questions/types.ts';
import { keyWords } from './key-words.ts';
import { type PartAudit, PartTally } from './part-tally.ts';

/** What many draws of one question showed. */
export interface QuestionAudit {
  slug: string;
  draws: number;
  /** Draws that gave no question at all, and why the first did not. */
  failures: { count: number; first: string };
  /** Share of the drawn sets of values that the conditions threw away. */
  rejectedShare: number;
  parts: PartAudit[];
  /** Share of the draws in which a slip can be recognised in any part. */
  slips: { is: string; liveShare: number }[];
  /** Papers whose keys differ. */
  papers: number;
  /** Whether any figure is drawn at all. */
  hasDrawnFigures: boolean;
  readsCurve: boolean;
  msPerDraw: number;
}

interface AuditJob {
  draws: number;
  /** Milliseconds since any moment; only differences count. */
  clock: () => number;
  /** Sees every draw. */
  onDrawn?: (drawn: DrawnQuestion, number: number) => void;
}

/**
 * Draws a question over and over and adds up what is worth knowing before trainees see it.
 *
 * @throws {Error} when the question was compiled by another format version.
 */
export function auditQuestion(stored: CompiledQuestion, job: AuditJob): QuestionAudit {
  const question = openQuestion(stored);
  const tally = new QuestionTally(question);
  const draw = (number: number): void => {
    const drawn = tally.draw(auditSeed(number));
    if (drawn) job.onDrawn?.(drawn, number);
  };
  const untimed = Math.max(0, job.draws - MOST_TIMED);
  const runs = question.curve && keepRuns(question.curve);
  for (let number = 0; number < untimed; number += 1) draw(number);
  runs?.forget();
  const began = job.clock();
  for (let number = untimed; number < job.draws; number += 1) draw(number);
  return tally.result((job.clock() - began) / (job.draws - untimed));
}

/** The last draws are timed, each with a run of its own where there is a curve. */
const MOST_TIMED = 20;

/** A keyed hash's worth of hex, one for each number: audits are repeatable. */
function auditSeed(number: number): string {
  const mixed = (Math.imul(number + 1, 0x9e3779b1) >>> 0).toString(16).padStart(8, '0');
  return mixed + number.toString(16).padStart(56, '0');
}

class QuestionTally {
  private readonly question: Compiled;
  private readonly parts: PartTally[];
  private readonly live: number[];
  private readonly papers = new Set<string>();
  private readonly failures = { count: 0, first: '' };
  private rejected = 0;
  private drawn = 0;

  constructor(question: Compiled) {
    this.question = question;
    this.parts = question.parts.map((part) => new PartTally(part, question.givens));
    this.live = question.slips.map(() => 0);
  }

  draw(seed: string): Drawn | null {
    try {
      const drawn = drawQuestion(this.question, seed, () => (this.rejected += 1)) as Drawn;
      this.add(drawn);
      return drawn;
    } catch (error) {
      if (this.failures.count === 0) this.failures.first = String(error);
      this.failures.count += 1;
      return null;
    }
  }

  private add(drawn: Drawn): void {
    this.drawn += 1;
    for (const part of this.parts) part.add(drawn);
    this.papers.add(keyWords(drawn));
    const made = Object.values(drawn.parts).flatMap((held) =>
      'slips' in held ? held.slips.map(({ slip }) => slip) : [],
    );
    for (const slip of new Set(made)) this.live[slip] = (this.live[slip] ?? 0) + 1;
  }

  result(msPerDraw: number): QuestionAudit {
    const { question, drawn, rejected } = this;
    return {
      slug: question.meta.slug,
      draws: drawn + this.failures.count,
      failures: this.failures,
      rejectedShare: rejected / Math.max(1, rejected + drawn),
      parts: this.parts.map((part) => part.result()),
      slips: question.slips.map(({ is }, at) => ({
        is,
        liveShare: (this.live[at] ?? 0) / Math.max(1, drawn),
      })),
      papers: this.papers.size,
      hasDrawnFigures: question.givens.some(isDrawn),
      readsCurve: question.curve !== null,
      msPerDraw,
    };
  }
}

function isDrawn({ source }: Given): boolean {
  if (source.kind === 'value') return false;
  return source.kind === 'range' ? source.to > source.from : source.figures.length > 1;
}
