import { expect, type Locator, type Page } from '@playwright/test';
import { asTyped, type HeldItem } from './answers.ts';

/** More stops than any page of ours has, and more choices than any part. */
const most = { stops: 200, choices: 20 };

const hasFocus = (wanted: Locator) =>
  wanted.evaluateAll((elements) => elements.some((one) => one === document.activeElement));

/** Goes on with Tab until the wanted part, or one of several, has the focus in sight. */
export async function tabTo(wanted: Locator): Promise<void> {
  await expect(wanted.first()).toBeVisible();
  const { keyboard } = wanted.page();
  for (let stop = 0; stop < most.stops; stop += 1) {
    if (await hasFocus(wanted)) return expect(wanted.page().locator(':focus')).toBeInViewport();
    await keyboard.press('Tab');
  }
  throw new Error(`Tab never comes to ${wanted.toString()}.`);
}

export async function pressOn(wanted: Locator, key: 'Enter' | 'Space'): Promise<void> {
  await tabTo(wanted);
  await wanted.page().keyboard.press(key);
}

/** Answers every part of the question on the page rightly, with the keyboard alone. */
export async function answerByKeyboard(page: Page, item: Pick<HeldItem, 'parts'>): Promise<void> {
  for (const [part, held] of Object.entries(item.parts)) {
    if (held.kind === 'options') await choose(page, part, held.right);
    else if (held.kind === 'quantity') await type(page, part, held.key);
    else if (held.kind === 'choices') await tick(page, part, held.right);
    else if (held.kind === 'order') await putInOrder(page, part, held.right);
    else await match(page, part, held.right);
  }
}

async function choose(page: Page, part: string, option: string): Promise<void> {
  const choices = page.getByRole('group', { name: `Choices for (${part})` }).getByRole('radio');
  const wanted = choices.and(page.locator(`[value="${option}"]`));
  await tabTo(choices);
  await page.keyboard.press('Space');
  await pressUntil(page, () => wanted.isChecked());
}

async function type(page: Page, part: string, si: number): Promise<void> {
  const answer = page.getByLabel(`Answer to (${part})`);
  const unit = page.getByLabel(`Unit of (${part})`);
  const offered = (await unit.count()) > 0 ? await unit.locator('option').allTextContents() : [];
  const typed = asTyped(si, offered);
  await tabTo(answer);
  await page.keyboard.type(typed.figure);
  if (!typed.unit) return;
  await tabTo(unit);
  await pressUntil(page, async () => (await unit.inputValue()) === typed.unit);
}

async function tick(page: Page, part: string, ids: readonly string[]): Promise<void> {
  const choices = page.getByRole('group', { name: `Choices for (${part})` });
  for (const id of ids) await pressOn(choices.locator(`[value="${id}"]`), 'Space');
}

async function putInOrder(page: Page, part: string, ids: readonly string[]): Promise<void> {
  const steps = page.getByRole('group', { name: `Steps for (${part})` });
  await pressOn(steps.getByRole('button', { name: /as they stand/ }), 'Enter');
  for (const [to, id] of ids.entries()) {
    const step = steps.locator(`[data-step="${id}"]`);
    const placeOf = async () => Number(await step.locator('.step-number').textContent()) - 1;
    const up = step.getByRole('button', { name: /^Move up/ });
    for (let from = await placeOf(); from > to; from -= 1) {
      await pressOn(up, 'Space');
      // It has moved, and the focus with it.
      await expect.poll(placeOf).toBe(from - 1);
      await expect(up).toBeFocused();
    }
  }
}

async function match(page: Page, part: string, ids: readonly string[]): Promise<void> {
  const rows = page.getByRole('group', { name: `Pairs for (${part})` }).getByRole('combobox');
  for (const [at, id] of ids.entries()) {
    await tabTo(rows.nth(at));
    await pressUntil(page, async () => (await rows.nth(at).inputValue()) === id);
  }
}

async function pressUntil(page: Page, isThere: () => Promise<boolean>): Promise<void> {
  for (let choice = 0; choice < most.choices; choice += 1) {
    if (await isThere()) return;
    await page.keyboard.press('ArrowDown');
  }
  throw new Error('The arrow keys never come to the wanted choice.');
}
