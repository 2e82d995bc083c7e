import { expect, test } from '@playwright/test';
import { newPerson, signUp } from './support/people.ts';
import { answerPaper, handInPaper, startPaper } from './support/sittings.ts';
import { mailTo } from './support/stack.ts';

test('a paper that is not passed says what to practise and when it may be sat again', async ({
  page,
}) => {
  const person = newPerson('Oluwaseun', 'Brack');
  await signUp(page, person);
  const sitting = await startPaper(page);
  await answerPaper(page, sitting, 2);
  await handInPaper(page);
  await expect(page.getByRole('heading', { name: /not passed/i }).first()).toBeVisible();
  await expect(page.getByRole('heading', { name: 'What to practise' })).toBeVisible();
  const mail = await mailTo(person.email, /^Your result/);
  expect(mail.subject).not.toMatch(/\d/);
  await page.goto('/papers/final-paper');
  await expect(page.getByRole('heading', { name: /may sit again/i })).toBeVisible();
  await expect(page.getByRole('button', { name: /start the paper/i })).toHaveCount(0);
  const again = await page.request.post('/api/sittings', {
    headers: { 'sec-fetch-site': 'same-origin' },
    data: {
      ...{ paper: 'final-paper', agreed: true, givenName: 'Oluwaseun', familyName: 'Brack' },
      agreementHash: (await (await page.request.get('/api/papers/final-paper')).json())
        .agreementHash as string,
    },
  });
  expect(again.status()).toBe(409);
  expect((await again.json()) as object).toMatchObject({ type: '/problems/wait-not-over' });
});
