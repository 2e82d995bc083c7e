import {
  type ChoicePart,
  type Compiled,
  type Drawn,
  type DrawnPart,
  MARKER_VERSION,
  openDrawn,
  openQuestion,
  type Part,
  type QuantityPart,
  type SizePart,
} from './compiled.ts';
import { explainPart } from './explain.ts';
import { type Finding, judgeQuantity } from './judge.ts';
import { judgeChoices, judgeMatch, judgeOrder } from './judge-listed.ts';
import { judgeOption } from './judge-option.ts';
import { type Judged } from './judged.ts';
import { fadeQuestion } from './fade.ts';
import { isBeyondSense, type OwnValues, ownFor } from './own-values.ts';
import { presentPart } from './present.ts';
import { readAnswer, readTyped } from './read-answer.ts';
import { chosenIn } from './read-chosen.ts';
import { sizeSi } from './sizes.ts';
import { summarise } from './summary.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type MarkedQuestion,
  type PartView,
  type RawAnswer,
  type TraceEntry,
} from './types.ts';
import { toSi } from './units.ts';

const NOTHING: RawAnswer = { text: '', unit: null, option: null, working: '' };

/** A question on the marker's desk; `own` grows part by part. */
interface Desk {
  question: Compiled;
  drawn: Drawn;
  own: OwnValues;
  judged: Judged[];
  trace: TraceEntry[];
}

/**
 * Marks what was answered, part by part, against the values that were drawn.
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
  { question, drawn }: Pick<Desk, 'question' | 'drawn'>,
  asked: readonly Part[],
  answers: Answers,
): MarkedQuestion {
  const desk: Desk = { question, drawn, own: new Map(), judged: [], trace: [] };
  for (const part of asked) {
    const answer = Object.hasOwn(answers, part.id) ? answers[part.id] : undefined;
    markPart(desk, part, answer ?? NOTHING);
  }
  const shown = new Set<string>();
  const parts = desk.judged.map((judged) => explainPart({ question, drawn, shown }, judged));
  return {
    markerVersion: MARKER_VERSION,
    marks: parts.reduce((sum, part) => sum + part.marks, 0),
    outOf: parts.reduce((sum, part) => sum + part.outOf, 0),
    summary: summarise(question, desk.judged),
    parts,
    trace: desk.trace,
  };
}

function markPart(desk: Desk, part: Part, answer: RawAnswer): void {
  const view = presentPart(desk.question, desk.drawn, part);
  const held = desk.drawn.parts[part.id];
  const base: Judged = {
    part,
    view,
    answer,
    finding: unread(view, answer),
    own: null,
    typed: null,
  };
  const judged = base.finding.rule === 'read' && held ? judgePart(desk, base, held) : base;
  desk.judged.push(judged);
  desk.trace.push({ part: part.id, rule: judged.finding.rule, detail: judged.finding.detail });
}

function judgePart(desk: Desk, base: Judged, held: DrawnPart): Judged {
  const { part } = base;
  const chosen = chosenIn(base.answer);
  if (part.kind === 'quantity') return markQuantity(desk, { ...base, part }, held);
  if (part.kind === 'choices' && held.kind === 'choices') {
    return { ...base, finding: judgeChoices(part, held, chosen) };
  }
  if (part.kind === 'order' && held.kind === 'order') {
    return { ...base, finding: judgeOrder(part, held, chosen) };
  }
  if (part.kind === 'match' && held.kind === 'match') {
    return { ...base, finding: judgeMatch(part, held, chosen) };
  }
  return part.kind === 'size' || part.kind === 'choice'
    ? markOption(desk, { ...base, part }, held)
    : base;
}

/** What the reading alone decides; rule `read` lets the marker go on. */
function unread(view: PartView, answer: RawAnswer): Finding {
  const reading = readAnswer(view, answer);
  if (reading.state === 'blank') {
    return { verdict: 'blank', marks: 0, rule: 'blank', detail: 'nothing was answered' };
  }
  // A unit of another kind is a figure all the same: the marker says what is wrong with it.
  const typed = view.kind === 'quantity' ? readTyped(view, answer) : null;
  if (reading.state === 'understood' || typed?.state === 'typed') {
    return { verdict: 'wrong', marks: 0, rule: 'read', detail: '' };
  }
  return { verdict: 'not-understood', marks: 0, rule: 'not-understood', detail: reading.ask };
}

function markQuantity(
  desk: Desk,
  judged: Judged & { part: QuantityPart },
  held: DrawnPart,
): Judged {
  const { part, view, answer } = judged;
  const reading = readTyped(view, answer);
  if (reading.state !== 'typed' || held.kind !== 'quantity') return judged;
  const { typed } = reading;
  const own = ownFor(desk.question, desk.drawn, { step: part.step, own: desk.own });
  const finding = judgeQuantity({
    question: desk.question,
    part,
    drawn: held,
    typed,
    values: desk.drawn.values,
    own: own?.values ?? null,
    ownIsOff: own?.isOff ?? false,
  });
  if (typed.isOfKind) keepOwn(desk, part, { finding, value: toSi(typed.figure, typed.unit) });
  return { ...judged, finding, own, typed };
}

function markOption(
  desk: Desk,
  judged: Judged & { part: SizePart | ChoicePart },
  held: DrawnPart,
): Judged {
  const { part, answer } = judged;
  const chosen = held.kind === 'options' && held.options.find(({ id }) => id === answer.option);
  if (held.kind !== 'options' || !chosen) return judged;
  const names = part.kind === 'size' ? { step: part.step } : { options: part.options };
  const own = ownFor(desk.question, desk.drawn, { ...names, own: desk.own });
  const finding = judgeOption({
    question: desk.question,
    part,
    held,
    chosen,
    own: own?.values ?? null,
    slipsBefore: desk.judged.flatMap((one) => one.finding.slip ?? []),
  });
  if (part.kind === 'size') keepOwn(desk, part, { finding, value: sizeSi(part, chosen.index) });
  return { ...judged, finding, own };
}

function keepOwn(
  desk: Desk,
  part: QuantityPart | SizePart,
  { finding, value }: { finding: Finding; value: number },
): void {
  const step = desk.question.steps.find((one) => one.name === part.step);
  if (step && isBeyondSense(value, desk.drawn.values[part.step] ?? NaN, step.unit)) {
    const detail = 'the value is beyond sense and is not carried on';
    desk.trace.push({ part: part.id, rule: 'carry-stopped', detail });
    return;
  }
  desk.own.set(part.step, { value, part: part.id, isOff: finding.verdict !== 'right' });
}
