import { type Browser, expect, type Page, test } from '@playwright/test';
import { readFile } from 'node:fs/promises';
import { generate } from 'otplib';
import { examine, Watch } from './support/examine.ts';
import { findHeld } from './support/held.ts';
import { newPerson, openSession, signUp } from './support/people.ts';
import { startPaper } from './support/sittings.ts';
import {
  administratorPages,
  failedCandidatePages,
  holderPages,
  managerPages,
  openPages,
  practicePages,
  type SitePage,
  traineePages,
  trainerPages,
  visitorPages,
} from './support/site-pages.ts';

// Each looks at what no other changes, so that all workers share them.
test.describe.configure({ mode: 'parallel', timeout: 240_000 });

/** Goes through pages in one tab and says all that is wrong with any of them. */
async function examineAll(watch: Watch, pages: SitePage[]): Promise<string[]> {
  const held = await findHeld();
  const found: string[] = [];
  for (const [index, { route, at = route, heading, after }] of pages.entries()) {
    const path = `/${typeof at === 'string' ? at : at(held)}`;
    if (index === 0) await watch.page.goto(path);
    else await turnTo(watch, path);
    await watch.settle();
    await after?.(watch.page);
    await expect(watch.page.locator('main h1')).toHaveText(heading);
    found.push(...(await examine(watch)));
  }
  return [...found, ...watch.complaints];
}

/** As a link within the site does: another page is read from its heading. */
async function turnTo(watch: Watch, path: string): Promise<void> {
  const { page } = watch;
  const isOther = await page.evaluate((to) => {
    const { pathname } = location;
    if (document.activeElement instanceof HTMLElement) document.activeElement.blur();
    history.pushState(null, '', to);
    dispatchEvent(new PopStateEvent('popstate'));
    return location.pathname !== pathname;
  }, path);
  if (!isOther) return;
  await expect.soft(page.locator('main h1'), path).toBeFocused();
  await watch.settle();
  // What was waited for may have brought another heading.
  await expect.soft(page.locator('main h1'), path).toBeFocused();
}

async function tabOf(browser: Browser, email?: string): Promise<Watch> {
  const page = await browser.newPage();
  if (email) await openSession(page, email);
  return new Watch(page);
}

test('pages for everybody can be used by everybody', async ({ browser }) => {
  const watch = await tabOf(browser);
  expect(await examineAll(watch, visitorPages)).toEqual([]);
});

test('pages of a trainee can be used by everybody', async ({ browser }) => {
  const watch = await tabOf(browser, 'ifeoma.castellan@people.example');
  expect(await examineAll(watch, traineePages)).toEqual([]);
});

test('practice can be used by everybody', async ({ browser }) => {
  const watch = await tabOf(browser, 'ifeoma.castellan@people.example');
  expect(await examineAll(watch, practicePages)).toEqual([]);
});

test('results and certificates can be read by everybody', async ({ browser }) => {
  const failed = await tabOf(browser, 'zoe.nguyen-lukasiewicz@people.example');
  const holder = await tabOf(browser, 'bartholomew.quist@people.example');
  expect(await examineAll(failed, failedCandidatePages)).toEqual([]);
  expect(await examineAll(holder, holderPages)).toEqual([]);
});

test('a worksheet and a paper can be worked by everybody', async ({ browser }) => {
  const watch = await tabOf(browser);
  const { page } = watch;
  await signUp(page, newPerson('Ottoline', 'Vane'));
  const nothingYet = [
    { route: 'course', heading: /^Auxiliary DC systems/ },
    { route: 'record', heading: 'My record' },
    { route: 'papers/:slug', at: 'papers/final-paper', heading: 'Final paper' },
  ];
  const found = await examineAll(watch, nothingYet);
  await page.goto('/worksheets/W5');
  await page.getByRole('button', { name: 'Work it' }).click();
  await expect(page).toHaveURL(/worksheet-attempts/);
  const attempt = new URL(page.url()).pathname.split('/')[2] ?? '';
  const sitting = await startPaper(page);
  found.push(...(await examineAll(watch, openPages(attempt, sitting))));
  expect(found).toEqual([]);
});

test('pages of trainers and certification managers can be used by everybody', async ({
  browser,
}) => {
  const trainer = await tabOf(browser, 'odile.marchetti@harrow-quay.example');
  const manager = await tabOf(browser, 'gwilym.asante@harrow-quay.example');
  expect(await examineAll(trainer, trainerPages)).toEqual([]);
  expect(await examineAll(manager, managerPages)).toEqual([]);
});

test('pages of an administrator can be used by everybody', async ({ browser }) => {
  const watch = await tabOf(browser, 'marit.oyelaran@harrow-quay.example');
  const { page } = watch;
  const enrolling = { route: 'second-factor', heading: 'Set up the second step' };
  const begin = (at: Page) => at.getByRole('button', { name: 'Set up the second step' }).click();
  const found = await examineAll(watch, [enrolling, { ...enrolling, after: begin }]);
  await page.getByLabel('Six figures').fill(await generate({ secret: await secretOn(page) }));
  await page.getByRole('button', { name: 'Check the figures' }).click();
  await expect(page.getByText(/recovery codes/i).first()).toBeVisible();
  found.push(...(await examine(watch)));
  found.push(...(await examineAll(watch, administratorPages)));
  const { correctable, validLink } = await findHeld();
  const checked = { route: 'check/:code', at: `check/${validLink}` };
  found.push(...(await examineAll(watch, [{ ...checked, heading: 'Valid' }])));
  await correctName(page, correctable);
  found.push(...(await examineAll(watch, [{ ...checked, heading: 'Replaced' }])));
  const asked = { route: 'second-factor', heading: 'Second step' };
  const again = await tabOf(browser, 'marit.oyelaran@harrow-quay.example');
  found.push(...(await examineAll(again, [asked])));
  expect(found).toEqual([]);
});

const secretOn = async (page: Page) => (await page.locator('.secret').textContent())?.trim() ?? '';

async function correctName(page: Page, certificate: string) {
  // Another name each time, so that the test can be run again.
  const familyName = `Vander Meer ${Math.random().toString(36).slice(2)}`;
  const reply = await page.request.post(`/api/certificates/${certificate}/name-correction`, {
    headers: { 'sec-fetch-site': 'same-origin' },
    data: { givenName: 'Priya', familyName, reason: 'It was written in one word.' },
  });
  expect(reply.status()).toBe(201);
}

test('every page of the router is among them', async () => {
  const source = await readFile(new URL('../src/router.tsx', import.meta.url), 'utf8');
  const inRouter = [...source.matchAll(/\bpath: '([^']+)'/g)].map(([, path = '']) => path);
  const lists = [visitorPages, traineePages, practicePages, failedCandidatePages, holderPages];
  const desks = [trainerPages, managerPages, administratorPages, openPages('', '')];
  const examined = [...lists, ...desks].flat().map(({ route }) => route);
  const wanted = inRouter.filter(
    (path) => !examined.some((route) => route === path || route.endsWith(`/${path}`)),
  );
  expect(inRouter.length).toBeGreaterThan(0);
  // The administrator's test opens the second step between two others.
  expect(wanted).toEqual(['second-factor']);
});
