import { chromium, expect, test, type BrowserContext } from '@playwright/test';
import { mkdtemp, readdir, readFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { answerQuestion, itemsOfSitting } from './support/answers.ts';
import { newPerson, signInAs, signUp } from './support/people.ts';
import { allSaved, startPaper } from './support/sittings.ts';
import { query } from './support/stack.ts';

/** The browser processes that use this profile. */
async function processesOf(profile: string): Promise<number[]> {
  const found: number[] = [];
  for (const pid of (await readdir('/proc')).filter((name) => /^\d+$/.test(name))) {
    const line = await readFile(`/proc/${pid}/cmdline`, 'utf8').catch(() => '');
    if (line.includes(profile)) found.push(Number(pid));
  }
  return found;
}

async function killBrowser(context: BrowserContext, profile: string) {
  const closed = context.waitForEvent('close');
  for (const pid of await processesOf(profile)) {
    try {
      process.kill(pid, 'SIGKILL');
    } catch {
      // It went with its parent.
    }
  }
  await closed;
}

test('a sitting goes on where it stood when the browser was killed', async ({ baseURL }, info) => {
  const profile = await mkdtemp(join(tmpdir(), 'ferrule-profile-'));
  const { launchOptions } = info.project.use;
  const open = () =>
    chromium.launchPersistentContext(profile, { ...launchOptions, baseURL: baseURL ?? '' });
  const first = await open();
  const page = first.pages()[0] ?? (await first.newPage());
  const person = newPerson('Iolo', 'Farrant');
  await signUp(page, person);
  const sitting = await startPaper(page);
  const [item] = await itemsOfSitting(sitting);
  if (!item) throw new Error('The paper has no question.');
  await answerQuestion(page, item);
  await page.getByRole('heading', { name: 'Receipts' }).click();
  await allSaved(page);
  const before = await query('SELECT closes_at FROM sittings WHERE id = $1', [sitting]);
  const title = await page.getByRole('heading', { level: 1 }).textContent();
  await killBrowser(first, profile);

  const second = await open();
  const resumed = second.pages()[0] ?? (await second.newPage());
  // The session ended with the browser: after signing in again the paper is taken over.
  await signInAs(resumed, person.email, person.passphrase);
  await resumed.goto('/papers/final-paper');
  await resumed.getByRole('link', { name: 'Go on with the paper' }).click();
  await expect(resumed.getByRole('heading', { level: 1 })).toHaveText(title ?? '');
  const answered = resumed.getByRole('link', { name: /Question 1, answered/ });
  await expect(answered).toBeVisible();
  await resumed.getByRole('button', { name: 'Take over here' }).click();
  const [, next] = await itemsOfSitting(sitting);
  if (!next) throw new Error('The paper has one question.');
  await resumed.goto(`/sittings/${sitting}?q=2`);
  await answerQuestion(resumed, next);
  await resumed.getByRole('heading', { name: 'Receipts' }).click();
  await allSaved(resumed);
  expect(await query('SELECT closes_at FROM sittings WHERE id = $1', [sitting])).toEqual(before);
  await second.close();
});
