import { presentQuestion, SUBJECTS, type CompiledQuestion } from '@ferrule/assessments';
import { answersThatCount, minutesAllowed, type SavedAnswer, type Sitting } from './sitting.ts';
import type { SittingItem, SittingNow } from './sittings.repository.ts';
import type { SittingView } from './sittings.schemas.ts';

const MOST_RECEIPTS = 50;

export interface ShownItem {
  readonly item: SittingItem;
  readonly question: CompiledQuestion;
}

interface Shown {
  /** Empty once the paper is handed in: its questions are not seen again. */
  readonly items: readonly ShownItem[];
  readonly numbers: ReadonlyMap<string, number>;
  readonly saved: readonly SavedAnswer[];
  readonly pennants: ReadonlySet<string>;
  readonly resultReady: boolean;
  readonly sessionId: string;
}

export const candidateName = ({ givenName, familyName }: Sitting): string =>
  `${givenName} ${familyName}`.trim();

function presentItems({ items, saved, pennants }: Shown): SittingView['items'] {
  const counted = answersThatCount(saved);
  return items.map(({ item, question }) => ({
    key: item.key,
    number: item.number,
    subject: SUBJECTS[item.subject] ?? item.subject,
    question: presentQuestion(question, item.drawn),
    answers: Object.fromEntries(
      [...(counted.get(item.key) ?? [])].map(([part, { answer, receipt, sequence, savedAt }]) => [
        part,
        { ...answer, receipt, sequence, savedAt: savedAt.toISOString() },
      ]),
    ),
    comeBack: pennants.has(item.key),
  }));
}

function presentReceipts({ saved, numbers }: Shown): SittingView['receipts'] {
  const newest = [...saved].reverse().slice(0, MOST_RECEIPTS);
  return newest.map(({ itemKey, part, receipt, sequence, savedAt }) => ({
    ...{ part, receipt, sequence },
    item: numbers.get(itemKey) ?? 0,
    savedAt: savedAt.toISOString(),
  }));
}

/** What the candidate may see of a sitting: never a key, step, tolerance or mark gained. */
export function presentSitting({ sitting, now }: SittingNow, shown: Shown): SittingView {
  const { id, rules, handedInAt, handedInHow } = sitting;
  const { slug, number, title } = rules.paper;
  return {
    id,
    paper: { slug, number, title, sat: rules.sat, aids: [...rules.aids] },
    name: candidateName(sitting),
    startedAt: sitting.startedAt.toISOString(),
    closesAt: sitting.closesAt.toISOString(),
    now: now.toISOString(),
    minutes: minutesAllowed(rules.minutes, rules.extraTimePercent),
    marks: rules.outOf,
    passPercent: rules.passPercent,
    state: handedInAt ? 'handed-in' : 'open',
    handedInAt: handedInAt?.toISOString() ?? null,
    handedInHow,
    resultReady: shown.resultReady,
    readOnly: sitting.writingSessionId !== shown.sessionId,
    items: presentItems(shown),
    receipts: presentReceipts(shown),
  };
}
