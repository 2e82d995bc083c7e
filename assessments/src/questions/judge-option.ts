import { type ChoicePart, type Compiled, type DrawnPart, type SizePart } from './compiled.ts';
import { type Finding } from './judge.ts';
import { type OwnSums } from './own-values.ts';
import { isRightOption } from './predictions.ts';
import { isSameSize, sizeSi } from './sizes.ts';

/** One chosen option and everything it is judged by. */
export interface OptionCase {
  question: Compiled;
  part: SizePart | ChoicePart;
  held: Extract<DrawnPart, { kind: 'options' }>;
  chosen: { id: string; index: number };
  /** Everything recomputed on the trainee's own earlier values. */
  sums: OwnSums;
  /** Slips recognised in earlier parts. */
  slipsBefore: readonly number[];
}

/** The marker's order for options: right, carried or refused, slip, wrong. */
export function judgeOption(it: OptionCase): Finding {
  const { part, held, chosen } = it;
  const say = (): string => `option ${chosen.index + 1} was chosen`;
  if (chosen.id === held.right) {
    return { verdict: 'right', marks: part.marks, rule: 'right', say };
  }
  return onOwnError(it, say) ?? slipOrWrong(it, say);
}

function onOwnError(it: OptionCase, say: () => string): Finding | null {
  const own = it.sums.account;
  const isOwn = own !== null && fitsOwn(it, own.values);
  if (it.part.carry === 'own' && isOwn) {
    const marks = it.part.marks;
    return { verdict: 'carried-forward', marks, rule: 'carried-forward', say };
  }
  const slip = slipOf(it);
  // The same slip again is the same error carried on, even where the sum does not lean on it.
  const isRepeated = slip !== undefined && it.slipsBefore.includes(slip);
  if (it.part.carry === 'never' && (isOwn || isRepeated)) {
    return { verdict: 'not-carried', marks: 0, rule: 'not-carried', say };
  }
  return null;
}

function slipOf({ held, chosen }: OptionCase): number | undefined {
  return held.slips.find(({ id }) => id === chosen.id)?.slip;
}

function slipOrWrong(it: OptionCase, say: () => string): Finding {
  const { part, question } = it;
  const slip = slipOf(it);
  if (slip === undefined || part.kind !== 'size') {
    return { verdict: 'wrong', marks: 0, rule: 'wrong', say };
  }
  const made = question.slips[slip]?.makes.find(({ step }) => step === part.step);
  const marks = made?.keep ?? 0;
  const words = (): string => `${say()}: slip ${slip + 1}`;
  return { verdict: 'slip', marks, rule: 'slip', slip, say: words };
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
