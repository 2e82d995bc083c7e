import { expect, type Page, test } from '@playwright/test';
import { generate } from 'otplib';
import { signInAs } from './support/people.ts';
import { query } from './support/stack.ts';

const administrator = 'desmond.feaver@harrow-quay.example';

async function giveSecondFactor(page: Page) {
  await page.getByRole('button', { name: /begin|set up|start/i }).click();
  const secret = (await page.locator('.secret').textContent())?.trim() ?? '';
  await page.getByLabel('Six figures').fill(await generate({ secret }));
  await page.getByRole('button', { name: 'Check the figures' }).click();
  await expect(page.getByText(/recovery codes/i).first()).toBeVisible();
}

test('a withdrawn certificate says so everywhere at once', async ({ page, browser }) => {
  const [held] = await query<{ number: string; link_code: string; pdf: Buffer }>(
    `SELECT c.number, c.link_code, f.pdf FROM certificates c
       JOIN certificate_files f ON f.certificate_id = c.id
      WHERE c.holder_name = 'Bartholomew Quist'`,
  );
  if (!held) throw new Error('The demonstration has no certificate for Bartholomew Quist.');
  const employer = await (await browser.newContext()).newPage();
  await employer.goto(`/check/${held.link_code}`);
  await expect(employer.getByRole('heading', { name: /^valid/i })).toBeVisible();

  await signInAs(page, administrator);
  await giveSecondFactor(page);
  await page.goto('/certificates');
  await page.getByRole('searchbox').or(page.getByLabel(/find/i)).first().fill(held.number);
  await page.keyboard.press('Enter');
  await page.getByRole('link', { name: /Bartholomew Quist/ }).click();
  await page.getByLabel('Reason, kept in the history').fill('Issued on a mixed-up file.');
  await page.getByRole('button', { name: `Withdraw ${held.number}` }).click();
  await expect(page.getByRole('button', { name: `Withdraw ${held.number}` })).toHaveCount(0);

  await employer.reload();
  await expect(employer.getByRole('heading', { name: /withdrawn/i })).toBeVisible();
  await expect(employer.getByText('Bartholomew Quist')).toHaveCount(0);
  await employer.goto('/check');
  await employer.getByLabel('The certificate’s PDF').setInputFiles({
    ...{ name: 'certificate.pdf', mimeType: 'application/pdf' },
    buffer: Buffer.from(held.pdf),
  });
  await expect(employer.getByText(/withdrawn/i).first()).toBeVisible();
});
