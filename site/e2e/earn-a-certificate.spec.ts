import { expect, type Page, test } from '@playwright/test';
import { readFile, writeFile } from 'node:fs/promises';
import { answerQuestion, itemsOfAttempt } from './support/answers.ts';
import { newPerson, signUp } from './support/people.ts';
import { answerPaper, handInPaper, startPaper } from './support/sittings.ts';
import { mailTo } from './support/stack.ts';

const joinCode = 'QUAY-2026';

async function joinClass(page: Page) {
  await page.goto('/course');
  await page.getByLabel('Code of the class').fill('WRONG-1');
  await page.getByRole('button', { name: 'Join the class' }).click();
  await expect(page.getByText(/No class has this code/).first()).toBeVisible();
  await page.getByLabel('Code of the class').fill(joinCode);
  await page.getByRole('button', { name: 'Join the class' }).click();
  await expect(page.getByText('Autumn class 2026').first()).toBeVisible();
}

async function readSheet(page: Page) {
  await page.goto('/sheets/3.4');
  await expect(page.getByRole('heading', { level: 1, name: 'The long run' })).toBeVisible();
  await page.getByRole('button', { name: 'Mark sheet done' }).click();
  await expect(page.getByRole('button', { name: 'Not done after all' })).toBeVisible();
  await page.goto('/course');
  await expect(page.getByRole('link', { name: /3\.4.*done/i }).first()).toBeVisible();
}

async function workWorksheet(page: Page): Promise<string> {
  await expect(page).toHaveURL(/worksheet-attempts\/[0-9a-f-]{36}/);
  const id = new URL(page.url()).pathname.split('/')[2] ?? '';
  const items = await itemsOfAttempt(id);
  const cards = page.locator('.question');
  await expect(cards).toHaveCount(items.length);
  for (const item of items) await answerQuestion(cards.nth(item.number - 1), item);
  return id;
}

async function workAndWorkAgain(page: Page) {
  await page.goto('/worksheets/W3');
  await page
    .getByRole('button', { name: /start|work/i })
    .first()
    .click();
  const first = await workWorksheet(page);
  await page.getByRole('button', { name: 'Hand in for marking' }).click();
  await expect(page.getByText('Worksheet, marked')).toBeVisible();
  await expect(page.getByText('Worked', { exact: true }).first()).toBeVisible();
  await page.getByRole('button', { name: /fresh figures/i }).click();
  await expect(page).not.toHaveURL(new RegExp(first));
  const second = new URL(page.url()).pathname.split('/')[2] ?? '';
  const [before, now] = await Promise.all([itemsOfAttempt(first), itemsOfAttempt(second)]);
  expect(now).not.toEqual(before);
  await page.goto('/course');
  await expect(page.getByText(/100\s?%/).first()).toBeVisible();
}

async function checkTyped(page: Page, number: string, familyName: string) {
  await page.goto('/check');
  await page.getByLabel('Certificate number').fill(number);
  await page.getByLabel('Holder’s family name').fill(familyName);
  await page.getByRole('button', { name: 'Check', exact: true }).click();
}

test('from sign-up to a certificate that an employer can check', async ({
  page,
  browser,
}, info) => {
  const person = newPerson('Zoë', 'Nguyễn-Łukasiewicz');
  await test.step('sign up and join the class', async () => {
    await signUp(page, person);
    await joinClass(page);
  });
  await test.step('read a sheet', () => readSheet(page));
  await test.step('work a worksheet, twice', () => workAndWorkAgain(page));
  await test.step('sit the paper and pass', async () => {
    const sitting = await startPaper(page);
    await answerPaper(page, sitting);
    await handInPaper(page);
    await expect(page.getByRole('heading', { name: /^passed/i })).toBeVisible();
  });
  const file = await test.step('get the certificate by mail and as a download', async () => {
    const mail = await mailTo(person.email, /^Your certificate HQ/);
    const attached = mail.attachments.find(({ type }) => type === 'application/pdf');
    const pdf = Buffer.from(attached?.content ?? '', 'base64');
    expect(pdf.subarray(0, 5).toString()).toBe('%PDF-');
    await page.goto('/record');
    const [download] = await Promise.all([
      page.waitForEvent('download'),
      page.getByRole('link', { name: /^Download certificate HQ/ }).click(),
    ]);
    const saved = await readFile(await download.path());
    expect(saved.equals(pdf)).toBe(true);
    const number = /HQ\w\w-\w{4}-\w{4}/.exec(mail.subject)?.[0] ?? '';
    return { number, pdf };
  });
  await test.step('an employer without an account checks it', async () => {
    const employer = await (await browser.newContext()).newPage();
    await checkTyped(employer, file.number, 'nguyen lukasiewicz');
    await expect(employer.getByRole('heading', { name: /^valid/i })).toBeVisible();
    await expect(employer.getByText('Zoë Nguyễn-Łukasiewicz').first()).toBeVisible();
    await checkTyped(employer, file.number, 'Somebody');
    await expect(employer.getByRole('heading', { name: /not on/i })).toBeVisible();
    await dropFiles(employer, file.pdf, info.outputPath('checked.pdf'));
  });
});

async function dropFiles(page: Page, pdf: Buffer, path: string) {
  await page.goto('/check');
  await writeFile(path, pdf);
  await page.getByLabel('The certificate’s PDF').setInputFiles(path);
  await expect(page.getByText(/very file|as issued|unchanged/i).first()).toBeVisible();
  const changed = Buffer.from(pdf);
  const at = Math.floor(changed.length / 4);
  changed[at] = (changed[at] ?? 0) ^ 1;
  await writeFile(path, changed);
  await page.goto('/check');
  await page.getByLabel('The certificate’s PDF').setInputFiles(path);
  await expect(page.getByRole('heading', { name: 'Changed' })).toBeVisible();
}
