import { expect, type Page } from '@playwright/test';
import { linkIn, mailTo, passphraseOf } from './stack.ts';

export async function signInAs(page: Page, email: string, passphrase = passphraseOf(email)) {
  await page.goto('/sign-in');
  await page.getByLabel('Email').fill(email);
  await page.getByLabel('Passphrase', { exact: true }).fill(passphrase);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await expect(page).not.toHaveURL(/sign-in/);
}

/** Signs in without the page, where signing in is not what is tested. */
export async function openSession(page: Page, email: string): Promise<void> {
  const reply = await page.request.post('/api/sessions', {
    headers: { 'sec-fetch-site': 'same-origin' },
    data: { email, password: passphraseOf(email) },
  });
  expect(reply.status()).toBe(201);
}

export interface NewPerson {
  givenName: string;
  familyName: string;
  email: string;
  passphrase: string;
}

export function newPerson(givenName: string, familyName: string): NewPerson {
  const mark = Math.random().toString(36).slice(2, 10);
  return {
    ...{ givenName, familyName },
    email: `${mark}@people.example`,
    passphrase: `copper busbar ${mark} lamp`,
  };
}

/** Opens an account, confirms its address from the mail and signs in. */
export async function signUp(page: Page, person: NewPerson): Promise<void> {
  await page.goto('/sign-up');
  await page.getByLabel('Given name').fill(person.givenName);
  await page.getByLabel('Family name').fill(person.familyName);
  await page.getByLabel('Email').fill(person.email);
  await page.getByLabel('Passphrase', { exact: true }).fill(person.passphrase);
  await page.getByRole('button', { name: 'Open account' }).click();
  await expect(page).toHaveURL(/sign-up\/sent/);
  const mail = await mailTo(person.email, /confirm/i);
  await page.goto(linkIn(mail.text, '/confirm'));
  await page.getByRole('button', { name: /confirm my address/i }).click();
  await expect(page.getByText('Confirmed.')).toBeVisible();
  await signInAs(page, person.email, person.passphrase);
}
