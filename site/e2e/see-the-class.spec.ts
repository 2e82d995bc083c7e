import { expect, test } from '@playwright/test';
import { signInAs } from './support/people.ts';

test('a trainer sees how the class is doing and opens a marked worksheet', async ({ page }) => {
  await signInAs(page, 'odile.marchetti@harrow-quay.example');
  await page.goto('/classes');
  await page
    .getByRole('link', { name: /Autumn class 2026/ })
    .first()
    .click();
  await expect(page.getByRole('heading', { level: 1 })).toContainText('Autumn class 2026');
  await expect(page.getByText('QUAY-2026')).toBeVisible();
  await expect(page.getByText('Hemi Tāwhiri-Boyd').first()).toBeVisible();
  await expect(page.getByRole('heading', { name: 'Commonest slips' })).toBeVisible();
  await page
    .getByRole('link', { name: /Castellan W3/ })
    .first()
    .click();
  await expect(page.getByText('Worksheet, marked')).toBeVisible();
  await expect(page.getByRole('button', { name: /fresh figures/i })).toHaveCount(0);
});
