import { expect, type Page, test } from '@playwright/test';
import { partsOfPractice } from './support/answers.ts';
import { answerByKeyboard, pressOn, tabTo } from './support/keyboard.ts';
import { newPerson, signUp } from './support/people.ts';

interface Listed {
  slug: string;
  title: string;
  kinds: string[];
}

/** The first question of the bank that asks in that way, and in the fewest others. */
async function findAsking(page: Page, kind: string): Promise<Listed> {
  const reply = await page.request.get('/api/practice/questions');
  const { questions } = (await reply.json()) as { questions: Listed[] };
  const [found] = questions
    .filter(({ kinds }) => kinds.includes(kind))
    .sort((one, other) => one.kinds.length - other.kinds.length);
  if (!found) throw new Error(`No question of the bank asks for ${kind}.`);
  return found;
}

test('a question is built up to and answered in every way with the keyboard alone', async ({
  page,
}) => {
  const person = newPerson('Marguerite', 'Ostrander');
  await signUp(page, person);
  for (const kind of ['choices', 'order', 'match']) {
    await test.step(`a question that asks for ${kind}`, async () => {
      const { slug, title } = await findAsking(page, kind);
      await page.goto('/practice');
      await pressOn(page.getByRole('link', { name: title, exact: true }), 'Enter');
      await expect(page.locator('main h1')).toBeFocused();
      await pressOn(page.getByRole('link', { name: 'See it worked' }), 'Enter');
      await expect(page.getByRole('heading', { name: 'Worked for you' })).toBeVisible();
      await tabTo(page.getByRole('link', { name: 'The whole' }).first());
      await page.keyboard.press('Enter');
      await expect(page.getByRole('heading', { name: 'All of it is yours' })).toBeVisible();
      await answerByKeyboard(page, { parts: await partsOfPractice(slug, person.email) });
      await pressOn(page.getByRole('button', { name: 'Mark it' }), 'Enter');
      await expect(page.getByRole('heading', { name: 'Marked' })).toBeFocused();
      const total = await page.locator('.run-foot [role="status"] b').textContent();
      expect(total).toMatch(/^(\d+) of \1 marks\./);
    });
  }
  await page.goto('/record');
  await expect(page.getByText('What you have shown')).toBeVisible();
  await expect(page.getByRole('img', { name: /^[1-9]\d* of \d+ questions shown/ })).not.toHaveCount(
    0,
  );
});
