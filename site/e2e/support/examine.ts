import AxeBuilder from '@axe-core/playwright';
import { expect, type Page, type Request } from '@playwright/test';

const looks = [
  { scheme: 'light', width: 1440 },
  { scheme: 'dark', width: 1440 },
  { scheme: 'dark', width: 390 },
  { scheme: 'light', width: 390 },
] as const;

type Look = (typeof looks)[number];

/** The narrowest screen we draw for. */
const narrowest = 320;

const isAboutSession = (url: string) => new URL(url).pathname === '/api/session';

/** Collects what the browser complains about and what is still on its way. */
export class Watch {
  readonly complaints: string[] = [];
  private readonly underWay = new Set<Request>();

  constructor(readonly page: Page) {
    page.on('request', (request) => this.underWay.add(request));
    page.on('requestfinished', (request) => this.underWay.delete(request));
    page.on('requestfailed', (request) => this.underWay.delete(request));
    page.on('pageerror', ({ message }) => this.complain(message));
    page.on('console', (message) => {
      if (message.type() !== 'error') return;
      // A visitor is answered 401 to "who is here?", which the browser always writes down.
      if (message.text().includes('401') && isAboutSession(message.location().url)) return;
      this.complain(message.text());
    });
  }

  /** Nothing is being fetched and no part of the page is busy. */
  async settle(): Promise<void> {
    const standing = async () => ({
      busy: await this.page.locator('[aria-busy="true"]').count(),
      awaited: [...this.underWay].map((request) => request.url()),
    });
    // Twice, since what has just come may ask for more.
    for (let quiet = 0; quiet < 2; quiet += 1) {
      await expect.poll(standing, { intervals: [20] }).toEqual({ busy: 0, awaited: [] });
      await this.page.waitForTimeout(20);
    }
    await this.page.evaluate(() => document.fonts.ready.then(() => undefined));
  }

  private complain(what: string): void {
    this.complaints.push(`${new URL(this.page.url()).pathname}: ${what}`);
  }
}

/** Everything wrong with the page as it stands, in light and dark, wide and narrow. */
export async function examine({ page }: Watch): Promise<string[]> {
  const found = await wrongWithOutline(page);
  for (const look of looks) {
    await take(page, look);
    found.push(...(await wrongByAxe(page, look)));
    if (look.scheme === 'light') found.push(...(await sidewaysScroll(page, look.width)));
  }
  await page.setViewportSize({ width: narrowest, height: 700 });
  found.push(...(await sidewaysScroll(page, narrowest)));
  const at = await page.evaluate(() => location.pathname + location.search);
  return found.map((what) => `${at}: ${what}`);
}

async function wrongWithOutline(page: Page): Promise<string[]> {
  const found = [];
  if (!(await page.title()).trim()) found.push('the document has no title');
  const headings = await page.locator('h1').allTextContents();
  if (headings.length !== 1)
    found.push(`${headings.length} first headings: ${headings.join('; ')}`);
  return found;
}

async function take(page: Page, { scheme, width }: Look): Promise<void> {
  await page.setViewportSize({ width, height: 900 });
  await page.emulateMedia({ colorScheme: scheme, reducedMotion: 'reduce' });
  await page.locator(`.radix-themes.${scheme}`).waitFor();
}

/** All of axe's rules, and the size of what is pressed, which it leaves out by default. */
async function wrongByAxe(page: Page, { scheme, width }: Look): Promise<string[]> {
  // axe is put into a page once: that takes as long as its rules do.
  const isThere = await page.evaluate(() => 'axe' in window);
  // Our pages hold no frames, so the legacy mode sees all and spares a blank page each time.
  const { violations } = await new AxeBuilder({ page, ...(isThere && { axeSource: ';' }) })
    .setLegacyMode()
    .options({ resultTypes: ['violations'], rules: { 'target-size': { enabled: true } } })
    .analyze();
  return violations.flatMap(({ id, nodes }) =>
    nodes.map(({ target, failureSummary = '' }) => {
      const why = failureSummary.replaceAll(/\s+/g, ' ');
      return `${scheme}, ${width} px: ${id} at ${target.join(' ')}: ${why}`;
    }),
  );
}

/** Tables and drawings may scroll inside their own box; the page may not. */
async function sidewaysScroll(page: Page, width: number): Promise<string[]> {
  const across = await page.evaluate(() => document.documentElement.scrollWidth);
  return across > width ? [`${width} px: scrolls sideways, it is ${across} px across`] : [];
}
