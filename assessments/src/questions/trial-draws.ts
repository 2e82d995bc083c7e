import { type Compiled } from './compiled.ts';
import { drawQuestion, MOST_TRIES } from './draw.ts';
import { attempt, type Desk } from './sheet-desk.ts';

/** Draws tried when a sheet is published: enough to meet every value of a list; a curve is slow. */
const TRIALS = { plain: 100, curve: 12 };
/** With fewer of the drawn values kept, a trainee might one day be left without a question. */
const LEAST_KEPT = 0.1;
const TRIED_BY_CONDITION = 5;

interface Tally {
  kept: number;
  rejected: number;
}

/** Draws a checked question a number of times; what goes wrong is an issue of the sheet. */
export function tryDraws(desk: Desk, question: Compiled): void {
  const tally: Tally = { kept: 0, rejected: 0 };
  const trials = question.curve ? TRIALS.curve : TRIALS.plain;
  for (let trial = 1; trial <= trials; trial += 1) {
    const { rejected } = tally;
    const failure = drawOnce(question, trial, tally);
    // All values turned away is a matter of the conditions, anything else of the draw itself.
    if (failure !== null && tally.rejected - rejected < MOST_TRIES - 1) {
      return tell(desk, ['given'], failure);
    }
    if (failure !== null) break;
  }
  const share = shareOf(tally);
  if (share >= LEAST_KEPT) return;
  const { index, alone } = strictestCondition(question);
  tell(
    desk,
    ['require', index],
    `${percent(share)} of the drawn values meet the conditions, and ${percent(alone)} this one alone; loosen it or narrow the given values.`,
  );
}

function tell(desk: Desk, field: PropertyKey[], message: string): void {
  attempt(desk, field, () => {
    throw new Error(message);
  });
}

const shareOf = ({ kept, rejected }: Tally): number => kept / Math.max(1, kept + rejected);
const percent = (share: number): string => `${Math.round(share * 100)} %`;

/** Draws with the seed of a trial; says why when there is no draw. */
function drawOnce(question: Compiled, trial: number, tally: Tally): string | null {
  try {
    drawQuestion(question, seedOf(trial), () => (tally.rejected += 1));
    tally.kept += 1;
    return null;
  } catch (error) {
    return error instanceof Error ? error.message : String(error);
  }
}

/** The same trials on every machine. */
function seedOf(trial: number): string {
  return (Math.imul(trial, 0x9e3779b1) >>> 0).toString(16).padStart(64, '0');
}

/** The condition that turns most values away when it stands alone, and the share it keeps. */
function strictestCondition(question: Compiled): { index: number; alone: number } {
  const kept = question.require.map((condition) => {
    const tally: Tally = { kept: 0, rejected: 0 };
    const one: Compiled = { ...question, require: [condition] };
    for (let trial = 1; trial <= TRIED_BY_CONDITION; trial += 1) drawOnce(one, trial, tally);
    return shareOf(tally);
  });
  const alone = Math.min(...kept);
  return { index: kept.indexOf(alone), alone };
}
