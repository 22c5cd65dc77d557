import { join } from 'node:path';
import AxeBuilder from '@axe-core/playwright';
import { chromium, type Browser, type Page } from 'playwright-core';
import { z } from 'zod';
import type { Role } from '#shared/contract/session.ts';
import { CHROMIUM_FLAGS } from '../support/chromium-flags.ts';
import { demoPerson } from '../support/sign-in-page.ts';
import { startApp } from '../support/start-app.ts';
import { SCREENS, type Screen } from './screens.ts';

const environment = z
  .object({
    TEST_DATABASE_URL: z.string(),
    BUILT_CLIENT: z.string(),
    CHROMIUM: z.string(),
    PICTURES_FOLDER: z.string(),
  })
  .parse(process.env);

/** Desk, tablet at the bench, phone. */
const SIZES = [
  { width: 1440, height: 900, isTouch: false },
  { width: 1024, height: 768, isTouch: true },
  { width: 390, height: 844, isTouch: true },
];

const THEMES = [
  { name: 'day', colorScheme: 'light' },
  { name: 'evening', colorScheme: 'dark' },
] as const;

const designsSchema = z.object({ items: z.array(z.object({ id: z.int(), name: z.string() })) });

interface Visit {
  screen: Screen;
  size: (typeof SIZES)[number];
  theme: (typeof THEMES)[number];
}

/** Names of screens on the command line choose those whose names begin so. */
const wanted = process.argv.slice(2);
const chosen = SCREENS.filter(
  ({ name }) => wanted.length === 0 || wanted.some((start) => name.startsWith(start)),
);

const visits: Visit[] = chosen.flatMap((screen) =>
  THEMES.flatMap((theme) => SIZES.map((size) => ({ screen, size, theme }))),
);

const app = await startApp({
  databaseUrl: environment.TEST_DATABASE_URL,
  clientFolder: environment.BUILT_CLIENT,
});
const browser = await chromium.launch({
  executablePath: environment.CHROMIUM,
  args: CHROMIUM_FLAGS,
});
const faults: string[] = [];
try {
  for (const visit of visits) faults.push(...(await takePicture(browser, visit)));
} finally {
  await browser.close();
  await app.stop();
}
process.stdout.write(
  `${JSON.stringify({ folder: environment.PICTURES_FOLDER, pictures: visits.length, faults }, null, 2)}\n`,
);
process.exitCode = faults.length > 0 ? 1 : 0;

/** Takes one picture; what axe finds, and what makes a page scroll sideways, comes back in words. */
async function takePicture(over: Browser, { screen, size, theme }: Visit): Promise<string[]> {
  const name = `${screen.name}-${size.width}-${theme.name}`;
  const context = await over.newContext({
    baseURL: app.address,
    viewport: size,
    colorScheme: theme.colorScheme,
    hasTouch: size.isTouch,
    reducedMotion: 'reduce',
  });
  context.setDefaultTimeout(30_000);
  try {
    const page = await context.newPage();
    await page.goto(screen.path(screen.role === null ? new Map() : await signIn(page, screen.role)));
    await screen.ready(page);
    await page.evaluate(() => document.fonts.ready);
    await page.screenshot({ path: join(environment.PICTURES_FOLDER, `${name}.png`) });
    return (await faultsOf(page)).map((fault) => `${name}: ${fault}`);
  } catch (error) {
    return [`${name}: ${error instanceof Error ? error.message : String(error)}`];
  } finally {
    await context.close();
  }
}

async function signIn(page: Page, role: Role): Promise<ReadonlyMap<string, number>> {
  const { email, password } = await demoPerson(role);
  await page.request.post('/api/session', { data: { email, password } });
  const answer = await page.request.get('/api/designs', { params: { pageSize: 100 } });
  return new Map(designsSchema.parse(await answer.json()).items.map(({ name, id }) => [name, id]));
}

async function faultsOf(page: Page): Promise<string[]> {
  const { violations } = await new AxeBuilder({ page })
    .withTags(['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'])
    .analyze();
  const found = violations.map(
    ({ id, nodes }) => `${id} at ${nodes.map(({ target }) => target.join(' ')).join(', ')}`,
  );
  const beyond = await page.evaluate(() => document.documentElement.scrollWidth - window.innerWidth);
  return beyond > 0 ? [...found, `the page is ${beyond} px wider than the window`] : found;
}
