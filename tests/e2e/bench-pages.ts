import type { Locator, Page } from 'playwright-core';
import { expect } from 'vitest';

export const WHISTLE = 'Wharf D whistle';

export const holeButton = (page: Page, number: number) =>
  page.getByRole('button', { name: new RegExp(`^Hole ${number}, `) });

/** What a hole's button says: where it is, how wide, and how its notes sound. */
export const spoken = (hole: Locator) => hole.getAttribute('aria-label');

/** The header of a narrow window has one too, which is not to be seen here. */
export const savedNote = (page: Page) => page.getByText(/^Saved \d/).filter({ visible: true });

export async function openWhistle(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Designs', exact: true }).click();
  await page
    .getByRole('link', { name: new RegExp(WHISTLE) })
    .first()
    .click();
  await page.getByRole('heading', { level: 1, name: WHISTLE }).waitFor();
  await page.getByRole('button', { name: /^Hole 3, .* cents (flat|sharp)/ }).waitFor();
}

export async function drag(page: Page, grip: Locator, byPx: number): Promise<void> {
  const box = await grip.boundingBox();
  if (box === null) throw new Error('There is nothing to drag on the screen.');
  const x = box.x + box.width / 2;
  const y = box.y + box.height / 2;
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + byPx / 2, y);
  await page.mouse.move(x + byPx, y);
  await page.mouse.up();
}

/** Until the server itself holds a draft like this: its own word, not the screen's. */
export async function expectStored(page: Page, holds: (draft: string) => boolean): Promise<void> {
  const id = /\/designs\/(\d+)/.exec(page.url())?.[1] ?? '';
  await expect
    .poll(async () => holds(await (await page.request.get(`/api/designs/${id}/draft`)).text()), {
      timeout: 15_000,
    })
    .toBe(true);
}
