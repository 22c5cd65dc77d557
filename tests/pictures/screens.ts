import type { Page } from 'playwright-core';
import type { Role } from '#shared/contract/session.ts';
import { WHISTLE } from '../e2e/bench-pages.ts';

/** One screen in one state: who looks at it, where it is, and what is done before the picture is taken. */
export interface Screen {
  name: string;
  /** null: nobody has signed in. */
  role: Role | null;
  path: (designs: ReadonlyMap<string, number>) => string;
  /** Waits until the screen shows what it is about. */
  ready: (page: Page) => Promise<unknown>;
}

const heading = (name: string | RegExp) => (page: Page) =>
  page.getByRole('heading', { name }).first().waitFor();
const figures = (page: Page) =>
  page
    .getByRole('button', { name: /^Hole \d+, .* (cents (flat|sharp)|in tune)/ })
    .first()
    .waitFor();

/** The bobs hang where they belong. */
const hung = (page: Page) =>
  page
    .getByRole('button', { name: /^[A-G]( sharp| flat)? \d .*cents (flat|sharp)$/ })
    .first()
    .waitFor();

const bench = (panel: string, query = '', design = WHISTLE) => ({
  role: 'maker' as const,
  path: (designs: ReadonlyMap<string, number>) => `/designs/${designs.get(design) ?? 0}/r/1/${panel}${query}`,
});

const FRAME: readonly Screen[] = [
  { name: 'sign-in', role: null, path: () => '/sign-in', ready: heading(/./) },
  { name: 'start', role: null, path: () => '/start', ready: heading('Create a workshop') },
  { name: 'not-found', role: null, path: () => '/nowhere', ready: heading(/nothing on this peg/) },
  { name: 'today', role: 'maker', path: () => '/today', ready: heading(/./) },
  { name: 'designs', role: 'maker', path: () => '/designs', ready: heading('Designs') },
  {
    name: 'designs-none-found',
    role: 'maker',
    path: () => '/designs?find=zither',
    ready: heading('Designs'),
  },
  { name: 'designs-visitor', role: 'visitor', path: () => '/designs', ready: heading('Designs') },
  { name: 'new-design', role: 'maker', path: () => '/designs/new', ready: drawnNew },
  { name: 'account', role: 'maker', path: () => '/account', ready: heading('Account') },
  { name: 'workshop-defaults', role: 'owner', path: () => '/workshop/defaults', ready: heading(/./) },
  { name: 'workshop-members', role: 'owner', path: () => '/workshop/members', ready: heading(/./) },
  { name: 'keys', role: 'maker', path: () => '/today', ready: openKeys },
];

const WORKBENCH: readonly Screen[] = [
  { name: 'bench-holes', ...bench('holes', '?hole=4&note=G5'), ready: sizesAndCents },
  { name: 'bench-holes-idle', ...bench('holes'), ready: sizesAndCents },
  { name: 'bench-bore', ...bench('bore'), ready: figures },
  { name: 'bench-notes', ...bench('notes', '?note=G5'), ready: figures },
  { name: 'bench-air', ...bench('air', '?note=D5'), ready: drawnAir },
  { name: 'bench-measured-empty', ...bench('bore'), ready: openMeasured },
  { name: 'bench-measured', ...bench('bore'), ready: pasteMeasured },
  {
    name: 'bench-not-shared',
    role: 'visitor',
    path: () => '/designs/1',
    ready: heading(/nothing on this peg/),
  },
  { name: 'bench-no-line', ...bench('holes', '?hole=5'), ready: loseLine },
  { name: 'bench-sign-in-lost', ...bench('holes', '?hole=5'), ready: loseSignIn },
];

const OTHER = 'Saltmarsh low D whistle';

const compare = (view: string) => ({
  role: 'maker' as const,
  path: (designs: ReadonlyMap<string, number>) =>
    `/designs/compare/${designs.get(OTHER) ?? 0}/${designs.get(WHISTLE) ?? 0}/${view}`,
  ready: heading(/against/),
});

const COMPARED: readonly Screen[] = [
  { name: 'compare-choose', role: 'maker', path: () => '/designs?compare=two', ready: heading('Designs') },
  { name: 'compare-holes', ...compare('holes'), ready: hung },
  { name: 'compare-notes', ...compare('notes') },
  { name: 'compare-bore', ...compare('bore') },
];

export const SCREENS: readonly Screen[] = [...FRAME, ...WORKBENCH, ...COMPARED];

async function drawnNew(page: Page): Promise<void> {
  const lay = page.getByRole('button', { name: 'Lay it on the bench' });
  await lay.waitFor();
  await page.getByText(/Holes (stand|of these sizes)/).waitFor();
}

async function openKeys(page: Page): Promise<void> {
  await heading(/./)(page);
  await page.keyboard.press('?');
  await page.getByRole('dialog', { name: 'Keys' }).waitFor();
}

async function openMeasured(page: Page): Promise<void> {
  await figures(page);
  await page.getByRole('button', { name: 'Read in a measured bore' }).click();
  await page.getByRole('heading', { name: /^Measured bore/ }).waitFor();
}

/** A bore with a choke and one reading that cannot be right. */
async function pasteMeasured(page: Page): Promise<void> {
  await openMeasured(page);
  const rows = Array.from({ length: 27 }, (_, index) => {
    const diameter = index === 9 ? 15.2 : 12.7 - 0.25 * Math.exp(-(((index - 16) / 3) ** 2));
    return `${index * 10};${diameter.toFixed(2).replace('.', ',')}`;
  });
  const table = ['mm from foot;diameter', ...rows].join('\n');
  await page.getByRole('textbox', { name: 'Table of measurements' }).fill(table);
  await page.getByRole('button', { name: /^Use these \d+ station/ }).waitFor();
  await hung(page);
}

/** Last of all come the cents of a small step. */
async function sizesAndCents(page: Page): Promise<void> {
  await hung(page);
  await page.getByRole('row', { name: /^Wider .* [+−]\d/ }).waitFor();
}

async function drawnAir(page: Page): Promise<void> {
  await figures(page);
  await page.locator('.air-ribbon').first().waitFor();
  await page.locator('.air-curve').first().waitFor();
}

async function loseLine(page: Page): Promise<void> {
  await figures(page);
  await page.context().setOffline(true);
  await page.keyboard.press('Alt+ArrowLeft');
  await page.getByText(/^No line since/).waitFor();
}

async function loseSignIn(page: Page): Promise<void> {
  await figures(page);
  await page.context().clearCookies();
  await page.keyboard.press('Alt+ArrowLeft');
  await page.getByRole('dialog', { name: 'Your sign-in has run out' }).waitFor();
}
