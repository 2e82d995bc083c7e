import { type ChoicePart, type Compiled, type DrawnPart, type SizePart } from './compiled.ts';
import { type Finding } from './judge.ts';
import { isRightOption } from './predictions.ts';
import { isSameSize, sizeSi } from './sizes.ts';

/** One chosen option and everything it is judged by. */
export interface OptionCase {
  question: Compiled;
  part: SizePart | ChoicePart;
  held: Extract<DrawnPart, { kind: 'options' }>;
  chosen: { id: string; index: number };
  /** All values recomputed on the trainee's own earlier ones; null when there are none. */
  own: Map<string, number> | null;
  /** Slips recognised in earlier parts. */
  slipsBefore: readonly number[];
}

/** The marker's order for options: right, carried or refused, slip, wrong. */
export function judgeOption(it: OptionCase): Finding {
  const { part, held, chosen } = it;
  const detail = `option ${chosen.index + 1} was chosen`;
  if (chosen.id === held.right) {
    return { verdict: 'right', marks: part.marks, rule: 'right', detail };
  }
  return onOwnError(it, detail) ?? slipOrWrong(it, detail);
}

function onOwnError(it: OptionCase, detail: string): Finding | null {
  const isOwn = it.own !== null && fitsOwn(it, it.own);
  if (it.part.carry === 'own' && isOwn) {
    const marks = it.part.marks;
    return { verdict: 'carried-forward', marks, rule: 'carried-forward', detail };
  }
  const slip = slipOf(it);
  // The same slip again is the same error carried on, even where the sum does not lean on it.
  const isRepeated = slip !== undefined && it.slipsBefore.includes(slip);
  if (it.part.carry === 'never' && (isOwn || isRepeated)) {
    return { verdict: 'not-carried', marks: 0, rule: 'not-carried', detail };
  }
  return null;
}

function slipOf({ held, chosen }: OptionCase): number | undefined {
  return held.slips.find(({ id }) => id === chosen.id)?.slip;
}

function slipOrWrong(it: OptionCase, detail: string): Finding {
  const { part, question } = it;
  const slip = slipOf(it);
  if (slip === undefined || part.kind !== 'size') {
    return { verdict: 'wrong', marks: 0, rule: 'wrong', detail };
  }
  const made = question.slips[slip]?.makes.find(({ step }) => step === part.step);
  const marks = made?.keep ?? 0;
  return { verdict: 'slip', marks, rule: 'slip', slip, detail: `${detail}: slip ${slip + 1}` };
}

function fitsOwn(it: OptionCase, own: Map<string, number>): boolean {
  if (it.part.kind === 'choice') {
    try {
      return isRightOption(it.question, it.part, { index: it.chosen.index, values: own });
    } catch {
      // Own values may lead outside every table; then the option fits nothing.
      return false;
    }
  }
  const wanted = own.get(it.part.step) ?? NaN;
  return isSameSize(sizeSi(it.part, it.chosen.index), wanted);
}
