import { describe, expect } from 'vitest';
import { expectAccessible, test } from '../support/browser-test.ts';
import { signInThroughPage } from '../support/sign-in-page.ts';
import { drag, expectStored, holeButton, openWhistle, savedNote, spoken } from './bench-pages.ts';

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

describe('both ends of the instrument', () => {
  test('the window is dragged toward the foot: the holes stay, every note rises, and Undo puts it back', async ({
    page,
  }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const window = page.getByRole('button', { name: /^Window, / });
    const before = await spoken(window);
    const hole = await spoken(holeButton(page, 4));
    const place = /[\d.]+ mm from foot/.exec(hole ?? '')?.[0] ?? '';

    await drag(page, window, 40);
    await expect.poll(() => spoken(window)).not.toBe(before);
    await expect.poll(async () => centsOf(await spoken(holeButton(page, 4)))).toBeGreaterThan(centsOf(hole));
    expect(await spoken(holeButton(page, 4))).toContain(place);

    await page.keyboard.press('Control+Z');
    await expect.poll(() => spoken(holeButton(page, 4))).toBe(hole);
  });

  test('the foot is pulled out past the edge of the drawing, and every figure follows', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const foot = page.getByRole('button', { name: /^Foot, / });
    const lengthMm = async () => Number(/[\d.]+/.exec((await spoken(foot)) ?? '')?.[0]);
    const before = await lengthMm();
    const hole = await spoken(holeButton(page, 6));

    await drag(page, foot, 90);
    await expect.poll(lengthMm).toBeGreaterThan(before + 10);
    await expect.poll(async () => centsOf(await spoken(holeButton(page, 6)))).not.toBe(centsOf(hole));
    await page.keyboard.press('Control+Z');
    await expect.poll(lengthMm).toBe(before);
    await expect.poll(() => spoken(holeButton(page, 6))).toBe(hole);
  });

  test('the foot is trimmed by the keys alone', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const foot = page.getByRole('button', { name: /^Foot, / });
    const before = await spoken(foot);
    await page.keyboard.press('0');
    await page.keyboard.press('Alt+Shift+ArrowLeft');
    await expect.poll(() => spoken(foot)).not.toBe(before);
  });
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

    const dialog = first.getByRole('dialog', { name: new RegExp(`^${name} saved this draft`) });
    await dialog.waitFor();
    await expectAccessible(first);

    const theirs = await spoken(holeButton(second, 1));
    const use = dialog.getByRole('button', { name: 'Use what is chosen' });
    expect(await use.isEnabled()).toBe(false);
    await dialog.getByRole('radio', { name: new RegExp(`^Hole 1 position: that of ${name}`) }).check();
    await use.click();
    await dialog.waitFor({ state: 'hidden' });
    await savedNote(first).waitFor();
    await expect.poll(() => spoken(holeButton(first, 1))).toBe(theirs);
    await first.reload();
    await expect.poll(() => spoken(holeButton(first, 1))).toBe(theirs);
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
