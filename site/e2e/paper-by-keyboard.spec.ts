import { expect, test } from '@playwright/test';
import { answerByKeyboard, pressOn, tabTo } from './support/keyboard.ts';
import { itemsOfSitting } from './support/answers.ts';
import { newPerson, signUp } from './support/people.ts';
import { allSaved } from './support/sittings.ts';

test('a paper is sat from its page to its result with the keyboard alone', async ({ page }) => {
  await signUp(page, newPerson('Perpetua', 'Lockhart'));
  await page.goto('/papers/final-paper');
  await test.step('agree and start', async () => {
    await pressOn(page.getByRole('checkbox', { name: /I have read this/ }), 'Space');
    await pressOn(page.getByRole('button', { name: /start the paper/i }), 'Enter');
    await expect(page).toHaveURL(/\/sittings\/[0-9a-f-]{36}\?q=1/);
  });
  const items = await itemsOfSitting(new URL(page.url()).pathname.split('/')[2] ?? '');
  for (const item of items) {
    await test.step(`answer question ${item.number}`, async () => {
      const isLast = item.number === items.length;
      await answerByKeyboard(page, item);
      const onwards = isLast ? 'Review and hand in' : `Question ${item.number + 1}`;
      await tabTo(page.getByRole('link', { name: onwards, exact: true }));
      await allSaved(page);
      await page.keyboard.press('Enter');
      if (!isLast) await expect(page).toHaveURL(new RegExp(`q=${item.number + 1}$`));
    });
    // Each page takes the focus to its own heading, so that reading begins there.
    await expect(page.locator('main h1')).toBeFocused();
  }
  await test.step('review and hand in', async () => {
    await expect(page).toHaveURL(/review$/);
    await pressOn(page.getByRole('button', { name: 'Hand in paper F1' }), 'Enter');
    await pressOn(page.getByRole('button', { name: 'Yes, hand in' }), 'Enter');
    await expect(page).toHaveURL(/result$/);
  });
  await expect(page.getByRole('heading', { level: 1, name: 'Passed' })).toBeVisible();
  await expect(page.locator('main h1')).toBeFocused();
});
