import { type Locator, type Page } from '@playwright/test';
import { query } from './stack.ts';

interface HeldOption {
  id: string;
}

/** All that apply, an order, or an option for each row. */
interface HeldList {
  kind: 'choices' | 'order' | 'match';
  right: string[];
  options: HeldOption[];
}

type HeldPart =
  | { kind: 'quantity'; key: number; slips: { value: number }[] }
  | { kind: 'options'; right: string; options: HeldOption[] }
  | HeldList;

export interface HeldItem {
  key: string;
  number: number;
  parts: Record<string, HeldPart>;
}

/** What one of each unit is in SI, for typing a stored key the way a person would. */
const inSi: Record<string, number> = {
  ...{ mΩ: 1e-3, Ω: 1, V: 1, mV: 1e-3, A: 1, mA: 1e-3, W: 1, '%': 0.01 },
  ...{ 'mm²': 1e-6, m: 1, mm: 1e-3, Ah: 3600, h: 3600, min: 60, s: 1, ms: 1e-3 },
};

export async function itemsOfSitting(sittingId: string): Promise<HeldItem[]> {
  return query<HeldItem>(
    `SELECT key, number, drawn -> 'parts' AS parts FROM sitting_items
      WHERE sitting_id = $1 ORDER BY number`,
    [sittingId],
  );
}

export async function itemsOfAttempt(attemptId: string): Promise<HeldItem[]> {
  return query<HeldItem>(
    `SELECT item ->> 'key' AS key, number::int AS number, item -> 'drawn' -> 'parts' AS parts
       FROM worksheet_attempts, jsonb_array_elements(items) WITH ORDINALITY AS one (item, number)
      WHERE id = $1 ORDER BY number`,
    [attemptId],
  );
}

/** Of the practice question that was drawn last for that person. */
export async function partsOfPractice(slug: string, email: string): Promise<HeldItem['parts']> {
  const [latest] = await query<Pick<HeldItem, 'parts'>>(
    `SELECT drawn -> 'drawn' -> 'parts' AS parts
       FROM practice_attempts JOIN accounts ON accounts.id = account_id
      WHERE drawn ->> 'slug' = $1 AND email = $2 ORDER BY started_at DESC LIMIT 1`,
    [slug, email],
  );
  return latest?.parts ?? {};
}

interface Wanted {
  /** Half of the right figure, or another option than the right one. */
  wrong?: boolean;
}

/** Answers every part of one question as it stands on the page. */
export async function answerQuestion(
  question: Page | Locator,
  item: HeldItem,
  { wrong = false }: Wanted = {},
): Promise<void> {
  for (const [part, held] of Object.entries(item.parts)) {
    if (held.kind === 'options') await choose(question, wrongOrRight(held, wrong));
    else if (held.kind === 'quantity')
      await type(question, part, wrong ? held.key / 3.7 : held.key);
    else await list[held.kind](question, part, wrong ? [...held.right].reverse() : held.right);
  }
}

function wrongOrRight({ right, options }: Extract<HeldPart, { kind: 'options' }>, wrong: boolean) {
  return wrong ? (options.find(({ id }) => id !== right)?.id ?? right) : right;
}

async function choose(question: Page | Locator, option: string): Promise<void> {
  await question.locator(`input[type="radio"][value="${option}"]`).check({ force: true });
}

const list: Record<
  HeldList['kind'],
  (question: Page | Locator, part: string, right: readonly string[]) => Promise<void>
> = { choices: tick, order: putInOrder, match: pair };

async function tick(question: Page | Locator, _part: string, ids: readonly string[]) {
  for (const id of ids) {
    await question.locator(`input[type="checkbox"][value="${id}"]`).check({ force: true });
  }
}

async function putInOrder(question: Page | Locator, part: string, ids: readonly string[]) {
  const steps = question.getByRole('group', { name: `Steps for (${part})` });
  await steps.getByRole('button', { name: /as they stand/ }).click();
  for (const [to, id] of ids.entries()) {
    const laid = await steps
      .locator('li')
      .evaluateAll((rows) => rows.map((row) => row.getAttribute('data-step') ?? ''));
    for (let from = laid.indexOf(id); from > to; from -= 1) {
      await steps.locator(`li[data-step="${id}"] .move-up`).click();
    }
  }
}

async function pair(question: Page | Locator, part: string, ids: readonly string[]) {
  const rows = question.getByRole('group', { name: `Pairs for (${part})` }).locator('select');
  for (const [row, id] of ids.entries()) await rows.nth(row).selectOption(id);
}

async function type(question: Page | Locator, part: string, si: number): Promise<void> {
  const unit = question.getByLabel(`Unit of (${part})`);
  const offered = (await unit.count()) > 0 ? await unit.locator('option').allTextContents() : [];
  const typed = asTyped(si, offered);
  if (typed.unit) await unit.selectOption(typed.unit);
  await question.getByLabel(`Answer to (${part})`).fill(typed.figure);
}

/**
 * A stored key as a person types it: in a unit of those offered, with a comma for the point,
 * save where three places after it could be read as thousands.
 */
export function asTyped(si: number, offered: string[]): { unit: string; figure: string } {
  const unit = offered.find((text) => inSi[text] !== undefined) ?? '';
  const figure = si / (inSi[unit] ?? 1);
  const text = String(Number(figure.toPrecision(6)));
  return { unit, figure: /\.\d{3}$/.test(text) ? text : text.replace('.', ',') };
}
