/** A page of Steelyard in Chromium. Any request beyond this machine, and any error in the page, fails the test. */
import { type Browser, type BrowserContextOptions, chromium, type Page } from 'playwright-core';
import { test as base, expect, inject } from 'vitest';

/** `prepare` runs in the page before anything of it does. */
export type Visit = (options?: BrowserContextOptions, prepare?: () => void) => Promise<Page>;

const LAPTOP = { width: 1440, height: 900 };

interface Fixtures {
  /** Requests beyond this machine and errors in the page so far; none may be left at the end. */
  faults: string[];
  /** Opens the page in a context of its own, as a first visit. */
  visit: Visit;
}

export const test = base.extend<Fixtures>({
  faults: async ({ task: _ }, use) => {
    const faults: string[] = [];
    await use(faults);
    expect(faults).toEqual([]);
  },
  visit: async ({ faults }, use) => {
    const browser = await chromium.connect(inject('browser'));
    await use((options = {}, prepare = () => {}) => firstVisit(browser, options, prepare, faults));
    await browser.close();
  },
});

async function firstVisit(
  browser: Browser,
  options: BrowserContextOptions,
  prepare: () => void,
  faults: string[],
): Promise<Page> {
  const context = await browser.newContext({ viewport: LAPTOP, serviceWorkers: 'block', ...options });
  context.on('request', (request) => {
    const { protocol, hostname } = new URL(request.url());
    if (protocol.startsWith('http') && hostname !== '127.0.0.1') faults.push(`request to ${request.url()}`);
  });
  context.on('weberror', (error) => faults.push(error.error().stack ?? error.error().message));
  context.on('console', (message) => {
    if (message.type() === 'error') faults.push(message.text());
  });
  await context.addInitScript(prepare);
  const page = await context.newPage();
  await open(page);
  return page;
}

/** Goes to the page and waits until the craft is on it. */
export async function open(page: Page): Promise<void> {
  await page.goto(inject('page'));
  await page.getByRole('heading', { name: 'Steelyard' }).waitFor();
}

/** The one sentence. */
export const headline = (page: Page): Promise<string> =>
  page.locator('.headline').evaluate((element) => element.textContent);
