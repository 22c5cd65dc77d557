import type { Locator, Page } from 'playwright-core';
import { describe, expect } from 'vitest';
import { expectAccessible, test } from '../support/browser-test.ts';
import { signInThroughPage } from '../support/sign-in-page.ts';

const WHISTLE = 'Wharf D whistle';

const holeButton = (page: Page, number: number) =>
  page.getByRole('button', { name: new RegExp(`^Hole ${number}, `) });

/** What a hole's button says: where it is, how wide, and how its notes sound. */
const spoken = (hole: Locator) => hole.getAttribute('aria-label');

/** The header of a narrow window has one too, which is not to be seen here. */
const savedNote = (page: Page) => page.getByText(/^Saved \d/).filter({ visible: true });

async function openWhistle(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Designs', exact: true }).click();
  await page
    .getByRole('link', { name: new RegExp(WHISTLE) })
    .first()
    .click();
  await page.getByRole('heading', { level: 1, name: WHISTLE }).waitFor();
  await page.getByRole('button', { name: /^Hole 3, .* cents (flat|sharp)/ }).waitFor();
}

async function drag(page: Page, hole: Locator, byPx: number): Promise<void> {
  const box = await hole.boundingBox();
  if (box === null) throw new Error('The hole is not on the screen.');
  const x = box.x + box.width / 2;
  const y = box.y + box.height / 2;
  await page.mouse.move(x, y);
  await page.mouse.down();
  await page.mouse.move(x + byPx / 2, y);
  await page.mouse.move(x + byPx, y);
  await page.mouse.up();
}

/** Until a save that began after `version` has been answered: the server's own word, not the screen's. */
async function expectStored(page: Page, text: (document: string) => boolean): Promise<void> {
  const id = /\/designs\/(\d+)/.exec(page.url())?.[1] ?? '';
  await expect
    .poll(async () => text(await (await page.request.get(`/api/designs/${id}/draft`)).text()), {
      timeout: 15_000,
    })
    .toBe(true);
}

const holesIn = (draft: string) =>
  (JSON.parse(draft) as { document: { holes: unknown[] } }).document.holes.length;

describe('a maker at the workbench', () => {
  test('drags a hole, places another, and finds both again; the sheet comes out', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const before = await spoken(holeButton(page, 3));

    await drag(page, holeButton(page, 3), 16);
    await expect.poll(() => spoken(holeButton(page, 3))).not.toBe(before);
    // Towards the foot the note falls: the figures have followed the place.
    expect(centsOf(await spoken(holeButton(page, 3)))).toBeLessThan(centsOf(before));

    await page.getByRole('button', { name: 'Add a hole' }).click();
    await page.getByRole('button', { name: /^Place a hole here/ }).click();
    await holeButton(page, 7).waitFor();
    await expectStored(page, (draft) => holesIn(draft) === 7);
    await savedNote(page).waitFor();
    const dragged = await spoken(holeButton(page, 3));
    const placed = await spoken(holeButton(page, 7));

    await page.reload();
    await expect.poll(() => spoken(holeButton(page, 3))).toBe(dragged);
    expect(await spoken(holeButton(page, 7))).toBe(placed);

    await page.getByRole('button', { name: 'Print sheets' }).click();
    const href = await page.getByRole('menuitem', { name: 'On A4' }).getAttribute('href');
    const sheet = await page.request.get(href ?? '');
    expect(sheet.headers()['content-type']).toBe('application/pdf');
    expect((await sheet.body()).subarray(0, 5).toString()).toBe('%PDF-');
  });

  test('moves a hole with the keyboard and takes it back', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const before = await spoken(holeButton(page, 2));
    await holeButton(page, 2).press('Enter');
    await page.keyboard.press('Alt+ArrowRight');
    await expect.poll(() => spoken(holeButton(page, 2))).not.toBe(before);
    await page.keyboard.press('Control+Z');
    await expect.poll(() => spoken(holeButton(page, 2))).toBe(before);
  });

  test('goes on working while the line is down, and loses nothing', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const before = await spoken(holeButton(page, 5));
    await page.context().setOffline(true);
    await holeButton(page, 5).press('Enter');
    await page.keyboard.press('Alt+ArrowLeft');
    await page.getByText(/^No line since/).waitFor();
    await expect.poll(() => spoken(holeButton(page, 5))).not.toBe(before);
    const moved = await spoken(holeButton(page, 5));

    await page.context().setOffline(false);
    await savedNote(page).waitFor({ timeout: 40_000 });
    await page.reload();
    await expect.poll(() => spoken(holeButton(page, 5))).toBe(moved);
  });

  test.for(['bore', 'holes', 'notes', 'air'])(
    'the %s panel can be used by everybody',
    async (panel, { page }) => {
      await signInThroughPage(page, 'maker');
      await openWhistle(page);
      await page.goto(page.url().replace(/holes(\?.*)?$/, panel));
      await page.getByRole('button', { name: /^Hole 3, .* cents (flat|sharp)/ }).waitFor();
      await expectAccessible(page);
    },
  );
});

describe('two people in one draft', () => {
  test('the second to save is shown both, and nothing is written over', async ({ openPage }) => {
    const [first, second] = [await openPage(), await openPage()];
    await signInThroughPage(first, 'maker');
    const { name } = await signInThroughPage(second, 'owner');
    await openWhistle(first);
    await openWhistle(second);

    await holeButton(second, 1).press('Enter');
    await second.keyboard.press('Alt+ArrowLeft');
    await savedNote(second).waitFor();
    await holeButton(first, 1).press('Enter');
    await first.keyboard.press('Alt+ArrowRight');

    await first.getByRole('dialog', { name: new RegExp(`^${name} saved this draft`) }).waitFor();
    await expectAccessible(first);
  });
});

describe('whoever may not', () => {
  test('an apprentice is not told that a design of somebody else exists', async ({ page }) => {
    await signInThroughPage(page, 'apprentice');
    await page.goto('/designs/1');
    await page.getByRole('heading', { name: 'There is nothing on this peg' }).waitFor();
  });
});

/** The first figure that a hole's button speaks: flat is below zero. */
function centsOf(text: string | null): number {
  const found = /(\d+\.\d) cents (flat|sharp)/.exec(text ?? '');
  if (found === null) throw new Error(`"${text ?? ''}" speaks no cents.`);
  return Number(found[1]) * (found[2] === 'flat' ? -1 : 1);
}
