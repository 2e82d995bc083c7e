import { type ChargeLog } from '../electrical/charging/log-charge.ts';
import {
  type ChoicePart,
  type Compiled,
  type Drawn,
  type DrawnPart,
  FORMAT_VERSION,
  MARKER_VERSION,
  openQuestion,
  type QuantityPart,
  type SizePart,
} from './compiled.ts';
import { runCurve } from './curve-run.ts';
import { drawCurve, readOff } from './curve.ts';
import { type Expr } from './expression.ts';
import { drawChoices, drawMatch, drawOrder } from './draw-listed.ts';
import { type Draws, drawsFrom, opaqueIds } from './random.ts';
import { isRightOption, slipValues } from './predictions.ts';
import { holds, solveInto } from './solve.ts';
import { isSameSize, sizeSi } from './sizes.ts';
import { isTooNear, keyOf, rangeOf } from './tolerance.ts';
import { type CompiledQuestion, type CurveView, type DrawnQuestion } from './types.ts';
import { placesOf, valueAt, workingsOf } from './workings.ts';

/** A question that gives no draw; the message names the question and what is wrong. */
class DrawFailed extends Error {
  constructor(slug: string, why: string) {
    super(`Question ${slug} cannot be drawn: ${why}`);
    this.name = 'DrawFailed';
  }
}

/** Sets of values drawn before a draw is given up. */
export const MOST_TRIES = 400;

/**
 * Draws a question: values, keys, tolerances, order of options. The same seed gives the same draw.
 *
 * @param seed - hex of a keyed hash, at least 32 digits.
 * @param onRejected - told of each set of values that did not meet the conditions.
 * @throws {DrawFailed} when no draw meets the conditions, or one has no single answer.
 */
export function drawQuestion(
  stored: CompiledQuestion,
  seed: string,
  onRejected: () => void = () => undefined,
): DrawnQuestion {
  const question = openQuestion(stored);
  const draws = drawsFrom(seed);
  try {
    const { values, curve } = drawValues(question, draws, onRejected);
    const table = { question, values, draws };
    const parts: Record<string, DrawnPart> = {};
    for (const part of question.parts) parts[part.id] = drawPart(part, table);
    const drawn: Drawn = {
      formatVersion: FORMAT_VERSION,
      markerVersion: MARKER_VERSION,
      slug: question.meta.slug,
      revision: question.meta.revision,
      values: inOrder(question, values),
      parts,
      curve,
    };
    return drawn;
  } catch (error) {
    if (error instanceof DrawFailed) throw error;
    throw new DrawFailed(
      question.meta.slug,
      error instanceof Error ? error.message : String(error),
    );
  }
}

function drawValues(
  question: Compiled,
  draws: Draws,
  onRejected: () => void,
): { values: Map<string, number>; curve: CurveView | null } {
  const { plain, onCurve } = workingsOf(question);
  for (let tries = 0; tries < MOST_TRIES; tries += 1) {
    if (tries > 0) onRejected();
    const values = drawGivens(question, draws);
    const isMet = (condition: Expr): boolean => holds(question, condition, values);
    // A curve takes a hundred times as long as the rest: it is run only when the rest is right.
    if (!plain.every(isMet)) continue;
    const log = question.curve ? runCurve(question.curve, values) : null;
    if (log) readInto(values, question, log);
    if (!onCurve.every(isMet)) continue;
    const curve = question.curve && log ? drawCurve(question.curve, log, values) : null;
    return { values: solveInto(question, values), curve };
  }
  throw new Error(`none of ${MOST_TRIES} draws meets its conditions; widen the given values.`);
}

function drawGivens(question: Compiled, draws: Draws): Map<string, number> {
  const values = new Map<string, number>();
  for (const given of question.givens) {
    const place = given.source.kind === 'value' ? 0 : draws.below(placesOf(given));
    values.set(given.name, valueAt(question, given, place));
  }
  return values;
}

/** Steps are worked as conditions ask for them; they are kept as they stand on the sheet. */
function inOrder(question: Compiled, values: ReadonlyMap<string, number>): Record<string, number> {
  const kept: Record<string, number> = {};
  for (const name of workingsOf(question).names) kept[name] = values.get(name) ?? NaN;
  return kept;
}

/** Adds what is read off a curve to the values. */
function readInto(values: Map<string, number>, question: Compiled, log: ChargeLog): void {
  for (const step of question.steps) {
    if (step.how.kind === 'read') values.set(step.name, readOff(log, step.how.read, values));
  }
}

interface Table {
  question: Compiled;
  values: Map<string, number>;
  draws: Draws;
}

function drawPart(part: Compiled['parts'][number], table: Table): DrawnPart {
  const { question, values, draws } = table;
  switch (part.kind) {
    case 'quantity':
      return drawQuantity(part, table);
    case 'size':
      return drawSizes(part, table);
    case 'choice':
      return drawOptions(part, table);
    case 'choices':
      return drawChoices(part, draws, (index) => isRightOption(question, part, { index, values }));
    case 'order':
      return drawOrder(part, draws);
    case 'match':
      return drawMatch(part, draws);
  }
}

function drawQuantity(part: QuantityPart, { question, values }: Table): DrawnPart {
  const step = question.steps.find((one) => one.name === part.step);
  const value = values.get(part.step);
  if (!step || value === undefined) throw new Error(`part ${part.id} has no step ${part.step}.`);
  const key = keyOf(part, step.unit, value);
  const slips = slipValues(question, part.step, values).filter(
    ({ value: slipped }) => !isTooNear(part, key, slipped),
  );
  return { kind: 'quantity', key, ...rangeOf(part, key), slips };
}

function drawSizes(part: SizePart, { question, values, draws }: Table): DrawnPart {
  const ids = opaqueIds(part.sizes.length, draws);
  const idOf = (si: number | undefined): string | undefined =>
    ids.find((_, index) => isSameSize(sizeSi(part, index), si ?? NaN));
  const right = idOf(values.get(part.step));
  if (right === undefined) {
    const given = part.sizes.join(', ');
    throw new Error(`part ${part.id} needs a size that is not among ${given}; widen them.`);
  }
  const slips = slipValues(question, part.step, values).flatMap(({ slip, value }) => {
    const id = idOf(value);
    return id === undefined || id === right ? [] : [{ slip, id }];
  });
  return { kind: 'options', options: ids.map((id, index) => ({ id, index })), right, slips };
}

function drawOptions(part: ChoicePart, { question, values, draws }: Table): DrawnPart {
  const ids = opaqueIds(part.options.length, draws);
  const options = draws.shuffled(ids.map((id, index) => ({ id, index })));
  const right = options.filter(({ index }) => isRightOption(question, part, { index, values }));
  const [only] = right;
  if (!only || right.length > 1) {
    throw new Error(`part ${part.id} has ${right.length} right options; exactly one must hold.`);
  }
  return { kind: 'options', options, right: only.id, slips: [] };
}
