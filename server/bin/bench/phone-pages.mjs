import AxeBuilder from '@axe-core/playwright';
import { chromium } from '@playwright/test';

const pages = [
  { what: 'Course map', path: '/course' },
  { what: 'Sheet with figures', path: '/sheets/3.4' },
  { what: 'Worksheet', path: '/worksheets/W3' },
];
const visits = 3;
const restMilliseconds = 500;
/** A phone of the middle range on a slow cellular line: four times slower, 150 ms, 1.6 Mbit/s. */
const slowness = 4;
const line = { offline: false, latency: 150, downloadThroughput: 2e5, uploadThroughput: 9e4 };
const phone = { viewport: { width: 412, height: 823 }, isMobile: true, hasTouch: true };

const launch = {
  executablePath: '/usr/bin/chromium',
  args: ['--no-sandbox', '--disable-gpu', '--disable-background-networking'],
};

/** Runs in the page before everything else. */
function watch() {
  const seen = { largestMs: 0, shifted: 0, blockedMs: 0 };
  globalThis.seenByBench = seen;
  const on = (type, take) =>
    new PerformanceObserver((list) => list.getEntries().forEach(take)).observe({
      ...{ type, buffered: true },
    });
  on('largest-contentful-paint', ({ startTime }) => (seen.largestMs = startTime));
  on('layout-shift', ({ value, hadRecentInput }) => (seen.shifted += hadRecentInput ? 0 : value));
  on('longtask', ({ duration }) => (seen.blockedMs += Math.max(0, duration - 50)));
}

/** One first visit: nothing is cached. */
async function visit(browser, { url, cookies, audit = false }) {
  const context = await browser.newContext(phone);
  try {
    await context.addCookies(cookies);
    const page = await context.newPage();
    const devtools = await context.newCDPSession(page);
    await devtools.send('Network.enable');
    await devtools.send('Network.emulateNetworkConditions', line);
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: slowness });
    await page.addInitScript(watch);
    await page.goto(url);
    await page.locator('main h1').waitFor();
    await page.waitForLoadState('networkidle');
    await page.waitForTimeout(restMilliseconds);
    const seen = await page.evaluate(() => globalThis.seenByBench);
    if (!audit) return seen;
    await devtools.send('Emulation.setCPUThrottlingRate', { rate: 1 });
    const { violations } = await new AxeBuilder({ page }).analyze();
    return { ...seen, violations: violations.map(({ id }) => id) };
  } finally {
    await context.close();
  }
}

function cookiesOf({ cookie }, url) {
  return cookie.split('; ').map((pair) => {
    const [name, ...value] = pair.split('=');
    return { name, value: value.join('='), url };
  });
}

async function measurePage(browser, { page: { what, path }, siteUrl, cookies, signal }) {
  const all = [];
  for (let count = 0; count < visits; count += 1) {
    signal.throwIfAborted();
    const isLast = count === visits - 1;
    all.push(await visit(browser, { url: `${siteUrl}${path}`, cookies, audit: isLast }));
  }
  const middle = (name) => all.map((seen) => seen[name]).sort((a, b) => a - b)[(visits - 1) / 2];
  return {
    ...{ what, largestMs: middle('largestMs'), blockedMs: middle('blockedMs') },
    ...{ shifted: middle('shifted'), violations: all.at(-1).violations },
  };
}

/** First visits on a slow phone, and what axe finds there: the pages a trainee reads and works. */
export async function measurePhonePages({ siteUrl, headers, signal }) {
  const browser = await chromium.launch(launch);
  const cookies = cookiesOf(headers, siteUrl);
  try {
    const measured = [];
    for (const page of pages) {
      measured.push(await measurePage(browser, { page, siteUrl, cookies, signal }));
    }
    return measured;
  } finally {
    await browser.close();
  }
}
