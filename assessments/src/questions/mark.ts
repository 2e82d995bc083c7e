import {
  type Compiled,
  type Drawn,
  MARKER_VERSION,
  openDrawn,
  openQuestion,
  type Part,
} from './compiled.ts';
import { explainPart } from './explain.ts';
import { fadeQuestion } from './fade.ts';
import { judgeParts } from './judge-question.ts';
import { type Judged } from './judged.ts';
import { summarise } from './summary.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type MarkedQuestion,
  type TraceEntry,
} from './types.ts';

/**
 * Marks what was answered, part by part, against the values that were drawn, and explains it.
 * Every decision is in the trace.
 */
export function markQuestion(
  stored: CompiledQuestion,
  drawing: DrawnQuestion,
  answers: Answers,
): MarkedQuestion {
  const question = openQuestion(stored);
  const drawn = openDrawn(question, drawing);
  return markParts({ question, drawn }, question.parts, answers);
}

/**
 * Marks a draw of which the first steps were shown worked: the parts that were left, and no others.
 * Each is worth what it is worth in the whole question.
 */
export function markFaded(
  stored: CompiledQuestion,
  drawing: DrawnQuestion,
  { left, answers }: { left: number; answers: Answers },
): MarkedQuestion {
  const question = openQuestion(stored);
  const drawn = openDrawn(question, drawing);
  const { asked } = fadeQuestion(question, drawn, left);
  const parts = question.parts.filter(({ id }) => asked.includes(id));
  return markParts({ question, drawn }, parts, answers);
}

function markParts(
  on: { question: Compiled; drawn: Drawn },
  asked: readonly Part[],
  answers: Answers,
): MarkedQuestion {
  const judged = judgeParts(on, asked, answers);
  const shown = new Set<string>();
  const parts = judged.map((one) => explainPart({ ...on, shown }, one));
  return {
    markerVersion: MARKER_VERSION,
    marks: parts.reduce((sum, part) => sum + part.marks, 0),
    outOf: parts.reduce((sum, part) => sum + part.outOf, 0),
    summary: summarise(on.question, judged),
    parts,
    trace: judged.flatMap(traceOf),
  };
}

function traceOf({ part, finding, isCarryStopped }: Judged): TraceEntry[] {
  const entry = { part: part.id, rule: finding.rule, detail: finding.say() };
  const stopped = 'the value is beyond sense and is not carried on';
  return isCarryStopped
    ? [{ part: part.id, rule: 'carry-stopped', detail: stopped }, entry]
    : [entry];
}
