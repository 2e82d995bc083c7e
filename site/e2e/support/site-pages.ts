import { type Page } from '@playwright/test';
import { type Held } from './held.ts';

export interface SitePage {
  /** As the router writes it. */
  route: string;
  /** Its address, where that is more than the route. */
  at?: string | ((held: Held) => string);
  /** The one first heading, by which the page is known to have come. */
  heading: string | RegExp;
  /** What a person does there before it looks like this. */
  after?: (page: Page) => Promise<void>;
}

const press = (name: string) => (page: Page) => page.getByRole('button', { name }).click();

const checkTyped = async (page: Page) => {
  await page.getByLabel('Certificate number').fill('HQ7K-2M4T-9XWO');
  await page.getByLabel('Holder’s family name').fill('Vandermeer');
  await page.getByRole('button', { name: 'Check', exact: true }).click();
};

const dropForeignFile = (page: Page) =>
  page.getByLabel('The certificate’s PDF').setInputFiles({
    ...{ name: 'letter.pdf', mimeType: 'application/pdf' },
    buffer: Buffer.from('%PDF-1.7\n% Not a certificate.\n%%EOF\n'),
  });

const drawFigures = async (page: Page) => {
  await page.getByRole('button', { name: 'Draw my figures' }).click();
  await page.getByLabel('Answer to (a)').waitFor();
};

const markUnanswered = async (page: Page) => {
  await page.getByRole('button', { name: 'Mark it' }).click();
  await page.locator('.marked').waitFor();
};

const showFound = (page: Page) => page.locator('.results-found').waitFor();

const openItems = async (page: Page) => {
  await page.getByLabel('Reason, kept with the look').fill('An appeal.');
  await page.getByRole('button', { name: 'Open the items' }).click();
  await page.locator('.marked').first().waitFor();
};

const link = (name: 'expiredLink' | 'withdrawnLink') => (held: Held) => `check/${held[name]}`;

export const visitorPages: SitePage[] = [
  { route: '', heading: /^The handbook for DC installers/ },
  { route: 'sign-in', heading: 'Sign in' },
  { route: 'sign-in', heading: 'Sign in', after: press('Sign in') },
  { route: 'sign-up', heading: 'Open an account' },
  { route: 'sign-up', heading: 'Open an account', after: press('Open account') },
  { route: 'sign-up/sent', heading: 'Check your email' },
  { route: 'confirm', at: 'confirm#token', heading: 'Confirm your email' },
  { route: 'confirm', heading: 'Confirm your email' },
  { route: 'reset', heading: 'A new passphrase' },
  { route: 'reset/new', at: 'reset/new#token', heading: 'Choose it' },
  { route: 'reset/new', heading: 'Choose it' },
  { route: 'email-change', at: 'email-change#token', heading: 'Your new address' },
  { route: 'email-change/undo', at: 'email-change/undo#token', heading: 'Keep the old address' },
  {
    route: 'first-administrator',
    at: 'first-administrator#token',
    heading: 'The first administrator',
  },
  { route: 'check', heading: 'Check a certificate' },
  { route: 'check', heading: 'Not on the register', after: checkTyped },
  { route: 'check', heading: 'Not signed', after: dropForeignFile },
  { route: 'check/:code', at: link('expiredLink'), heading: 'Expired' },
  { route: 'check/:code', at: link('withdrawnLink'), heading: 'Withdrawn' },
  { route: 'check/:code', at: `check/${'A'.repeat(22)}`, heading: 'Not on the register' },
  { route: 'problems/:slug', at: 'problems/wait-not-over', heading: /./ },
  { route: '*', at: 'no/such/sheet', heading: 'There is no such sheet' },
];

export const traineePages: SitePage[] = [
  { route: 'course', heading: /^Auxiliary DC systems/ },
  { route: 'sheets/:number', at: 'sheets/1.4', heading: 'Isolate, lock, prove dead' },
  { route: 'sheets/:number', at: 'sheets/3.4', heading: 'The long run' },
  {
    route: 'sheets/:number',
    at: 'sheets/3.4',
    heading: 'The long run',
    after: drawFigures,
  },
  { route: 'sheets/:number', at: 'sheets/4.1', heading: 'What a conductor can carry' },
  { route: 'sheets/:number', at: 'sheets/5.6', heading: 'Reading a charge curve' },
  { route: 'sheets/:number', at: 'sheets/6.7', heading: 'Three meters, one current' },
  { route: 'worksheets/:number', at: 'worksheets/W3', heading: 'Runs and returns' },
  {
    route: 'worksheet-attempts/:id',
    at: ({ markedWorksheet }) => `worksheet-attempts/${markedWorksheet}`,
    heading: 'Runs and returns',
  },
  { route: 'sheets/:number', at: 'sheets/5.3', heading: 'Bulk, absorption, float' },
  {
    route: 'sheets/:number',
    at: 'sheets/6.4',
    heading: /Two inputs/,
    after: press('Next event'),
  },
  { route: 'tables', heading: 'Tables' },
  { route: 'glossary', heading: 'Glossary' },
  { route: 'search', heading: 'Search' },
  { route: 'search', at: 'search?q=voltage+drop', heading: 'Search', after: showFound },
  { route: 'search', at: 'search?q=zzzz', heading: 'Search' },
  { route: 'papers/:slug', at: 'papers/final-paper', heading: 'Final paper' },
  { route: 'record', heading: 'My record' },
  { route: 'account', heading: 'Ifeoma Castellan' },
];

export const practicePages: SitePage[] = [
  { route: 'practice', heading: 'One question at a time' },
  { route: 'practice', at: 'practice?subject=VD&level=apply', heading: 'One question at a time' },
  { route: 'practice', at: 'practice?find=nothing-like-it', heading: 'One question at a time' },
  { route: 'practice/:slug', at: 'practice/vd-chart-table', heading: 'Feeding the chart table' },
  {
    route: 'practice/:slug',
    at: 'practice/vd-chart-table?left=2',
    heading: 'Feeding the chart table',
  },
  {
    route: 'practice/:slug',
    at: 'practice/vd-chart-table?left=1',
    heading: 'Feeding the chart table',
    after: markUnanswered,
  },
  { route: 'practice/:slug', at: 'practice/si-order-two-sources', heading: /./ },
  { route: 'practice/:slug', at: 'practice/si-spanner', heading: /./, after: markUnanswered },
  { route: 'practice/:slug', at: 'practice/cc-stage-points', heading: /./ },
  { route: 'practice/:slug', at: 'practice/no-such-question', heading: /no such question/ },
];

/** What only someone who has not passed sees. */
export const failedCandidatePages: SitePage[] = [
  {
    route: 'sittings/:id/result',
    at: ({ failedSitting }) => `sittings/${failedSitting}/result`,
    heading: 'Not passed',
  },
  { route: 'papers/:slug', at: 'papers/final-paper', heading: 'Final paper' },
];

export const holderPages: SitePage[] = [
  {
    route: 'sittings/:id/result',
    at: ({ passedSitting }) => `sittings/${passedSitting}/result`,
    heading: 'Passed',
  },
  {
    route: 'certificates/:id',
    at: ({ certificate }) => `certificates/${certificate}`,
    heading: 'Auxiliary DC systems installer',
  },
  { route: 'record', heading: 'My record' },
  {
    route: 'worksheet-attempts/:id',
    at: ({ markedCurve }) => `worksheet-attempts/${markedCurve}`,
    heading: 'Name the stage',
  },
];

export const trainerPages: SitePage[] = [
  { route: 'classes', heading: 'Classes' },
  { route: 'class/:id', at: (held) => `class/${held.class}`, heading: 'Autumn class 2026' },
  {
    route: 'class/:id',
    at: (held) => `class/${held.class}?trainee=${held.trainee}`,
    heading: 'Autumn class 2026',
  },
  {
    route: 'worksheet-attempts/:id',
    at: ({ markedWorksheet }) => `worksheet-attempts/${markedWorksheet}`,
    heading: 'Runs and returns',
  },
];

export const managerPages: SitePage[] = [
  { route: 'results', heading: 'Results' },
  {
    route: 'results',
    at: ({ failedSitting }) => `results?sitting=${failedSitting}`,
    heading: 'Results',
  },
  {
    route: 'results',
    at: ({ failedSitting }) => `results?sitting=${failedSitting}`,
    heading: 'Results',
    after: openItems,
  },
];

export const administratorPages: SitePage[] = [
  { route: 'people', heading: 'People' },
  { route: 'people', at: ({ trainee }) => `people?person=${trainee}`, heading: 'People' },
  { route: 'people', at: 'people?find=nobody-at-all', heading: 'People' },
  { route: 'certificates', heading: 'Certificates' },
  {
    route: 'certificates',
    at: ({ certificate }) => `certificates?certificate=${certificate}`,
    heading: 'Certificates',
  },
  { route: 'account', heading: 'Marit Oyelaran' },
];

/** An attempt and a paper that lie open, as their candidate has them. */
export const openPages = (attempt: string, sitting: string): SitePage[] => [
  {
    route: 'worksheet-attempts/:id',
    at: `worksheet-attempts/${attempt}`,
    heading: 'Name the stage',
  },
  ...[1, 3, 5].map((number) => ({
    route: 'sittings/:id',
    at: `sittings/${sitting}?q=${number}`,
    heading: /./,
  })),
  {
    route: 'sittings/:id/review',
    at: `sittings/${sitting}/review`,
    heading: 'Before you hand in',
  },
  { route: 'papers/:slug', at: 'papers/final-paper', heading: 'Final paper' },
];
