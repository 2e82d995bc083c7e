import { expect, type Page } from '@playwright/test';
import { answerQuestion, itemsOfSitting } from './answers.ts';

/** From the paper's page to its first question. */
export async function startPaper(page: Page): Promise<string> {
  await page.goto('/papers/final-paper');
  await page.getByText('I have read this and agree to it.').click();
  await page.getByRole('button', { name: /start the paper/i }).click();
  await expect(page).toHaveURL(/\/sittings\/[0-9a-f-]{36}\?q=1/);
  return new URL(page.url()).pathname.split('/')[2] ?? '';
}

/** Waits until nothing typed waits for its receipt. */
export async function allSaved(page: Page): Promise<void> {
  await expect(page.getByText(/answers? waits? on this device/)).toHaveCount(0);
  await expect(page.getByText(/^Saved \d\d:\d\d:\d\d$/)).toBeVisible();
}

export async function answerPaper(page: Page, sittingId: string, wrongFrom = Infinity) {
  for (const item of await itemsOfSitting(sittingId)) {
    await page.goto(`/sittings/${sittingId}?q=${item.number}`);
    await answerQuestion(page, item, { wrong: item.number >= wrongFrom });
    await page.getByRole('heading', { name: 'Receipts' }).click();
    await allSaved(page);
  }
}

export async function handInPaper(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Review and hand in' }).click();
  await expect(page).toHaveURL(/review/);
  await page.getByRole('button', { name: 'Hand in paper F1' }).click();
  await page.getByRole('button', { name: 'Yes, hand in' }).click();
  await expect(page).toHaveURL(/result/);
}
