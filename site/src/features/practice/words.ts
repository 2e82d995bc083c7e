import { sayNumber } from '../../ui/words.ts';
import { type BankQuestion } from './queries.ts';

/** How much of a question is left to do: a number of its last steps. */
export function nameLeft(left: number, all: number): string {
  if (left === 0) return 'See it worked';
  if (left >= all) return 'The whole';
  return left === 1 ? 'Last step' : `Last ${sayNumber(left)}`;
}

/** Over the figures that were drawn. */
export function titleOf(left: number, all: number): string {
  if (left === 0) return 'Worked for you';
  if (left >= all) return 'All of it is yours';
  return left === 1 ? 'The last step is yours' : `The last ${sayNumber(left)} steps are yours`;
}

export const levelNames: Record<BankQuestion['level'], string> = {
  recall: 'Recall',
  apply: 'Apply',
  reason: 'Reason',
};

const kindNames: Record<BankQuestion['kinds'][number], string> = {
  quantity: 'figures',
  choice: 'a choice',
  choices: 'all that apply',
  order: 'an order',
  match: 'pairs',
};

/** "Figures, a choice; reads a curve" */
export function sayKinds({
  kinds,
  readsCurve,
}: Pick<BankQuestion, 'kinds' | 'readsCurve'>): string {
  const asked = kinds.map((kind) => kindNames[kind]).join(', ');
  return readsCurve ? `${asked}; reads a curve` : asked;
}
