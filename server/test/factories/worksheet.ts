import type { Answers, QuestionView } from '../../src/questions/question-view.ts';
import type { WorksheetView } from '../../src/worksheets/worksheets.schemas.ts';
import type { Caller, Reply } from '../sign-in.ts';

export const typed = (text: string, unit: string | null = null) => ({
  ...{ text, unit, option: null, working: '' },
});

/** The drop, worked out from what the trainee sees of a practice question. */
function dropOf({ given }: QuestionView): number {
  const value = (symbol: string) =>
    Number(given.find((one) => one.symbol === symbol)?.value ?? NaN);
  return (value('I') * value('R')) / 1_000;
}

/** Right answers, or those that come of the predicted slip, carried on. */
export function answersTo(question: QuestionView, kind: 'right' | 'slip' = 'right'): Answers {
  const drop = dropOf(question) * (kind === 'right' ? 1 : 2.2);
  const options = question.parts.find(({ id }) => id === 'c')?.options;
  const option = options?.find(({ text }) => text === 'Thicker cable')?.id ?? null;
  return {
    a: { ...typed(drop.toFixed(4), 'V'), working: 'I × R' },
    b: typed((drop * 2).toFixed(4), 'V'),
    c: { ...typed(''), option },
  };
}

export async function startWorksheet(caller: Caller, number = 'W1'): Promise<WorksheetView> {
  const reply = await caller.call('POST', `/api/worksheets/${number}/attempts`);
  if (reply.status !== 201) throw new Error(JSON.stringify(reply.body));
  return reply.body as WorksheetView;
}

export const saveItem = (
  caller: Caller,
  at: { id: string; key: string },
  answers: object,
): Promise<Reply> =>
  caller.call('PUT', `/api/worksheet-attempts/${at.id}/items/${at.key}/answers`, { answers });

export const handInWorksheet = (caller: Caller, id: string): Promise<Reply> =>
  caller.call('POST', `/api/worksheet-attempts/${id}/hand-in`, {});

/** A whole attempt, handed in and marked. */
export async function workWorksheet(
  caller: Caller,
  kind: 'right' | 'slip' = 'right',
): Promise<WorksheetView> {
  const sheet = await startWorksheet(caller);
  for (const { key, question } of sheet.items) {
    await saveItem(caller, { id: sheet.id, key }, answersTo(question, kind));
  }
  const reply = await handInWorksheet(caller, sheet.id);
  if (reply.status !== 200) throw new Error(JSON.stringify(reply.body));
  return reply.body as WorksheetView;
}
