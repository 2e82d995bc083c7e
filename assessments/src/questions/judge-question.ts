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
import { type Finding, judgeQuantity } from './judge.ts';
import { judgeChoices, judgeMatch, judgeOrder } from './judge-listed.ts';
import { judgeOption } from './judge-option.ts';
import { type Judged } from './judged.ts';
import { isBeyondSense, OwnSums, type OwnValues } from './own-values.ts';
import { readTypedIn } from './read-answer.ts';
import { chosenIn, readChosenId } from './read-chosen.ts';
import { sizeSi } from './sizes.ts';
import {
  type Answers,
  type CompiledQuestion,
  type DrawnQuestion,
  type JudgedQuestion,
  type RawAnswer,
} from './types.ts';
import { toSi } from './units.ts';
import { workingsOf } from './workings.ts';

const NOTHING: RawAnswer = { text: '', unit: null, option: null, working: '' };

/** A question on the marker's desk; `own` grows part by part. */
interface Desk {
  question: Compiled;
  drawn: Drawn;
  own: OwnValues;
  judged: Judged[];
}

/**
 * Marks and verdicts of what was answered, without the lines and words that explain them:
 * what `markQuestion` gives, in a fraction of the time.
 *
 * @throws {Error} when the draw does not belong to the question.
 */
export function judgeQuestion(
  stored: CompiledQuestion,
  drawing: DrawnQuestion,
  answers: Answers,
): JudgedQuestion {
  const question = openQuestion(stored);
  const drawn = openDrawn(question, drawing);
  const parts = judgeParts({ question, drawn }, question.parts, answers).map(
    ({ part: { id, marks: outOf }, finding: { verdict, marks, rule } }) => {
      return { id, verdict, marks, outOf, rule };
    },
  );
  return {
    markerVersion: MARKER_VERSION,
    marks: parts.reduce((sum, part) => sum + part.marks, 0),
    outOf: parts.reduce((sum, part) => sum + part.outOf, 0),
    parts,
  };
}

/** Judges the parts that were asked, in their order, each on what was answered before it. */
export function judgeParts(
  { question, drawn }: Pick<Desk, 'question' | 'drawn'>,
  asked: readonly Part[],
  answers: Answers,
): Judged[] {
  const desk: Desk = { question, drawn, own: [], judged: [] };
  for (const part of asked) {
    const answer = Object.hasOwn(answers, part.id) ? answers[part.id] : undefined;
    desk.judged.push(judgePart(desk, part, answer ?? NOTHING));
  }
  return desk.judged;
}

function judgePart(desk: Desk, part: Part, answer: RawAnswer): Judged {
  const held = desk.drawn.parts[part.id];
  return part.kind === 'quantity'
    ? judgeTyped(desk, { part, answer, held })
    : judgeChosen(desk, { part, answer, held });
}

interface Asked<P extends Part> {
  part: P;
  answer: RawAnswer;
  held: DrawnPart | undefined;
}

const BLANK: Finding = {
  ...{ marks: 0, rule: 'blank', say: () => 'nothing was answered' },
  verdict: 'blank',
};
/** A part that was not drawn: nothing can be said of it. */
const UNDRAWN: Finding = { verdict: 'wrong', marks: 0, rule: 'read', say: () => '' };

const notUnderstood = (ask: string): Finding => ({
  ...{ marks: 0, rule: 'not-understood', say: () => ask },
  verdict: 'not-understood',
});

function unjudged({ part, answer }: Asked<Part>, finding: Finding): Judged {
  return { part, answer, finding, sums: null, typed: null, isCarryStopped: false };
}

function judgeTyped(desk: Desk, asked: Asked<QuantityPart>): Judged {
  const { part, answer, held } = asked;
  const reading = readTypedIn(part.units, answer);
  if (reading.state === 'blank') return unjudged(asked, BLANK);
  // A unit of another kind is a figure all the same: the marker says what is wrong with it.
  if (reading.state !== 'typed') return unjudged(asked, notUnderstood(reading.ask));
  if (held?.kind !== 'quantity') return unjudged(asked, UNDRAWN);
  const { typed } = reading;
  const { question, drawn } = desk;
  const sums = new OwnSums(question, drawn, { step: part.step, own: desk.own });
  const { values } = drawn;
  const finding = judgeQuantity({ question, part, drawn: held, typed, sums, values });
  const value = toSi(typed.figure, typed.unit);
  const isCarryStopped = typed.isOfKind && !keepOwn(desk, part, { finding, value });
  return { part, answer, finding, sums, typed, isCarryStopped };
}

function judgeChosen(desk: Desk, asked: Asked<Exclude<Part, QuantityPart>>): Judged {
  const { part, answer, held } = asked;
  const reading = readChosenId(part, held, answer);
  if (reading.state === 'blank') return unjudged(asked, BLANK);
  if (reading.state !== 'understood') return unjudged(asked, notUnderstood(reading.ask));
  if (held && (part.kind === 'size' || part.kind === 'choice')) {
    return judgeOneOf(desk, { part, answer, held });
  }
  return unjudged(asked, judgeListed(part, held, chosenIn(answer)));
}

function judgeListed(part: Part, held: DrawnPart | undefined, chosen: readonly string[]): Finding {
  if (part.kind === 'choices' && held?.kind === 'choices') return judgeChoices(part, held, chosen);
  if (part.kind === 'order' && held?.kind === 'order') return judgeOrder(part, held, chosen);
  if (part.kind === 'match' && held?.kind === 'match') return judgeMatch(part, held, chosen);
  return UNDRAWN;
}

function judgeOneOf(desk: Desk, asked: Asked<SizePart | ChoicePart>): Judged {
  const { part, answer, held } = asked;
  const chosen = held?.kind === 'options' && held.options.find(({ id }) => id === answer.option);
  if (held?.kind !== 'options' || !chosen) return unjudged(asked, UNDRAWN);
  const names = part.kind === 'size' ? { step: part.step } : { options: part.options };
  const { question, drawn } = desk;
  const sums = new OwnSums(question, drawn, { ...names, own: desk.own });
  const slipsBefore = desk.judged.flatMap((one) => one.finding.slip ?? []);
  const finding = judgeOption({ question, part, held, chosen, sums, slipsBefore });
  const isCarryStopped =
    part.kind === 'size' && !keepOwn(desk, part, { finding, value: sizeSi(part, chosen.index) });
  return { part, answer, finding, sums, typed: null, isCarryStopped };
}

/** Keeps an own value for the parts that follow; false when nobody could have meant it. */
function keepOwn(
  desk: Desk,
  part: QuantityPart | SizePart,
  { finding, value }: { finding: Finding; value: number },
): boolean {
  const step = workingsOf(desk.question).steps.get(part.step)?.step;
  if (step && isBeyondSense(value, desk.drawn.values[part.step] ?? NaN, step.unit)) return false;
  const isOff = finding.verdict !== 'right';
  desk.own.push({ step: part.step, value, part: part.id, isOff });
  return true;
}
