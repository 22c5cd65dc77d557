import AxeBuilder from '@axe-core/playwright';
import { chromium, type Browser, type BrowserContext, type ConsoleMessage, type Page } from 'playwright-core';
import { test as base, expect } from 'vitest';
import { startApp, type RunningApp } from './start-app.ts';

/** An answer that refuses on purpose, or a line that a test cut, is no fault of the page; Chromium reports both as one. */
const REFUSAL =
  /^Failed to load resource: (the server responded with a status of 4\d\d|net::ERR_INTERNET_DISCONNECTED)/;

interface BrowserFixtures {
  databaseUrl: string;
  clientFolder: string;
  browserEndpoint: string;
  app: RunningApp;
  browser: Browser;
  /** Opens pages, each in a browser profile of its own, as different people would have them. */
  openPage: () => Promise<Page>;
  /** A page in a browser profile of its own. Whatever it writes as an error to the console fails the test. */
  page: Page;
}

const provided = { injected: true, scope: 'file' } as const;

export const test = base.extend<BrowserFixtures>({
  databaseUrl: ['', provided],
  clientFolder: ['', provided],
  browserEndpoint: ['', provided],
  app: [
    async ({ databaseUrl, clientFolder }, use) => {
      const app = await startApp({ databaseUrl, clientFolder });
      await use(app);
      await app.stop();
    },
    { scope: 'file' },
  ],
  browser: [
    async ({ browserEndpoint }, use) => {
      const browser = await chromium.connect(browserEndpoint);
      await use(browser);
      await browser.close();
    },
    { scope: 'file' },
  ],
  openPage: async ({ app, browser }, use) => {
    const contexts: BrowserContext[] = [];
    const errors: string[] = [];
    await use(async () => {
      const context = await browser.newContext({
        baseURL: app.address,
        viewport: { width: 1440, height: 900 },
        reducedMotion: 'reduce',
      });
      context.setDefaultTimeout(15_000);
      contexts.push(context);
      const page = await context.newPage();
      gatherErrors(page, errors);
      return page;
    });
    for (const context of contexts) await context.close();
    expect(errors, 'errors in the console').toEqual([]);
  },
  page: async ({ openPage }, use) => {
    await use(await openPage());
  },
});

function gatherErrors(page: Page, errors: string[]): void {
  page.on('pageerror', (error) => errors.push(error.stack ?? error.message));
  page.on('console', (message) => {
    if (message.type() === 'error' && !isRefusal(message))
      errors.push(`${message.text()} (${message.location().url})`);
  });
}

function isRefusal(message: ConsoleMessage): boolean {
  const address = message.location().url;
  if (!REFUSAL.test(message.text()) || !URL.canParse(address)) return false;
  const { pathname } = new URL(address);
  // The icon is fetched by the browser itself, at a moment of its own choosing.
  return pathname.startsWith('/api/') || pathname === '/mark.svg';
}

/** Every rule of WCAG 2.2 A and AA that axe can judge; names rule and element of what it finds. */
export async function expectAccessible(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const found = violations.flatMap(({ id, help, nodes }) =>
    nodes.map((node) => `${id}: ${help} (${node.target.join(' ')})`),
  );
  expect(found).toEqual([]);
}
