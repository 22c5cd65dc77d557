import AxeBuilder from '@axe-core/playwright';
import { chromium, type Browser, type ConsoleMessage, type Page } from 'playwright-core';
import { test as base, expect } from 'vitest';
import { startApp, type RunningApp } from './start-app.ts';

/** An answer that refuses something on purpose is no fault of the page, though Chromium reports it as one. */
const REFUSAL = /^Failed to load resource: the server responded with a status of 4\d\d/;

interface BrowserFixtures {
  databaseUrl: string;
  clientFolder: string;
  browserEndpoint: string;
  app: RunningApp;
  browser: Browser;
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
  page: async ({ app, browser }, use) => {
    const context = await browser.newContext({
      baseURL: app.address,
      viewport: { width: 1440, height: 900 },
      reducedMotion: 'reduce',
      acceptDownloads: true,
    });
    context.setDefaultTimeout(15_000);
    const page = await context.newPage();
    const errors = gatherErrors(page);
    await use(page);
    await context.close();
    expect(errors, 'errors in the console').toEqual([]);
  },
});

function gatherErrors(page: Page): string[] {
  const errors: string[] = [];
  page.on('pageerror', (error) => errors.push(error.stack ?? error.message));
  page.on('console', (message) => {
    if (message.type() === 'error' && !isRefusal(message)) errors.push(message.text());
  });
  return errors;
}

function isRefusal(message: ConsoleMessage): boolean {
  const address = message.location().url;
  return (
    REFUSAL.test(message.text()) && URL.canParse(address) && new URL(address).pathname.startsWith('/api/')
  );
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
