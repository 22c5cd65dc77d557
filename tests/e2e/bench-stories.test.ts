import type { Page } from 'playwright-core';
import { describe, expect } from 'vitest';
import { test } from '../support/browser-test.ts';
import { demoPerson, signInThroughPage } from '../support/sign-in-page.ts';
import { expectStored, holeButton, openWhistle, savedNote, spoken } from './bench-pages.ts';

describe('a new instrument', () => {
  test('is drawn from nothing: kind, lowest note, on the bench, a hole of its own, kept', async ({
    page,
  }) => {
    await signInThroughPage(page, 'maker');
    await page.getByRole('link', { name: 'Designs', exact: true }).click();
    await page.getByRole('link', { name: 'New design' }).first().click();
    await page.getByRole('radio', { name: /fipple whistle/i }).check();
    await page.getByLabel('Name').fill('Quay whistle');
    const lay = page.getByRole('button', { name: 'Lay it on the bench' });
    await expect.poll(() => lay.isEnabled(), { timeout: 15_000 }).toBe(true);
    await lay.click();

    await page.getByRole('heading', { level: 1, name: 'Quay whistle' }).waitFor();
    await page.getByRole('button', { name: /^Hole 1, .* cents (flat|sharp)|^Hole 1, .* in tune/ }).waitFor();
    await page.getByRole('button', { name: 'Add a hole' }).click();
    await page.getByRole('button', { name: /^Place a hole here/ }).click();
    await holeButton(page, 7).waitFor();
    await expectStored(page, (draft) => draft.includes('"name":"Quay whistle"') && holesIn(draft) === 7);
  });
});

describe('a sign-in that runs out', () => {
  test('is asked for over the page, and what was done meanwhile is saved', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    const before = await spoken(holeButton(page, 6));
    await page.context().clearCookies();
    await holeButton(page, 6).press('Enter');
    await page.keyboard.press('Alt+ArrowRight');

    const dialog = page.getByRole('dialog', { name: 'Your sign-in has run out' });
    await dialog.waitFor();
    await dialog.getByLabel('Password').fill((await demoPerson('maker')).password);
    await dialog.getByRole('button', { name: 'Sign in and go on' }).click();
    await savedNote(page).waitFor();
    const moved = await spoken(holeButton(page, 6));
    expect(moved).not.toBe(before);
    await page.reload();
    await expect.poll(() => spoken(holeButton(page, 6))).toBe(moved);
  });
});

describe('by the keyboard alone', () => {
  test('a maker signs in, opens a design, moves and widens a hole, and takes both back', async ({ page }) => {
    const { email, password, name } = await demoPerson('maker');
    await page.goto('/sign-in');
    await page.getByLabel('Email').focus();
    await page.keyboard.type(email);
    await page.keyboard.press('Tab');
    await page.keyboard.type(password);
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name }).waitFor();
    await tabTo(page, 'Designs');
    await page.keyboard.press('Enter');
    await page
      .getByRole('link', { name: /Wharf D whistle/ })
      .first()
      .waitFor();
    await tabTo(page, 'Wharf D whistle');
    await page.keyboard.press('Enter');
    await page.getByRole('button', { name: /^Hole 4, .* cents (flat|sharp)/ }).waitFor();

    const before = await spoken(holeButton(page, 4));
    await page.keyboard.press('4');
    await page.keyboard.press('Alt+Shift+ArrowRight');
    await page.keyboard.press('Alt+ArrowUp');
    await expect.poll(() => spoken(holeButton(page, 4))).not.toBe(before);
    await expect.poll(() => page.getByRole('button', { name: 'Undo' }).first().isEnabled()).toBe(true);
    await page.keyboard.press('Control+Z');
    await page.keyboard.press('Control+Z');
    await expect.poll(() => spoken(holeButton(page, 4))).toBe(before);
  });
});

describe('sound', () => {
  test('comes only when asked for: the note, the reference, and both beating at the figure shown', async ({
    page,
  }) => {
    await page.addInitScript(countOscillators);
    await signInThroughPage(page, 'maker');
    await openWhistle(page);
    await holeButton(page, 4).press('Enter');
    expect(await heard(page)).toEqual([]);

    await page.getByRole('button', { name: 'Play both' }).click();
    const [predicted = 0, reference = 0] = await heard(page);
    const shown = await page.getByText(/beats a second/).textContent();
    expect(Math.abs(predicted - reference)).toBeCloseTo(Number(/[\d.]+/.exec(shown ?? '')?.[0]), 1);
    await page.getByRole('button', { name: 'Stop' }).click();
    await expect.poll(() => heard(page)).toEqual([]);

    await page.keyboard.press('Tab');
    await page.getByRole('heading', { level: 1 }).click();
    await page.keyboard.press('Space');
    await expect.poll(() => heard(page)).toEqual([reference]);
    await page.keyboard.press('Space');
    await expect.poll(() => heard(page)).toEqual([]);
  });
});

const holesIn = (draft: string) =>
  (JSON.parse(draft) as { document: { holes: unknown[] } }).document.holes.length;

/** Presses Tab until something with this name has the focus. */
async function tabTo(page: Page, name: string): Promise<void> {
  for (let presses = 0; presses < 60; presses += 1) {
    await page.keyboard.press('Tab');
    const focused = await page.evaluate(
      () => document.activeElement?.getAttribute('aria-label') ?? document.activeElement?.textContent ?? '',
    );
    if (focused.startsWith(name)) return;
  }
  throw new Error(`The Tab key never came to "${name}".`);
}

/** Runs in the page before it: keeps the oscillators that have been made and not stopped. */
function countOscillators(): void {
  const sounding = new Set<OscillatorNode>();
  window.AudioContext = class extends AudioContext {
    override createOscillator(): OscillatorNode {
      const oscillator = super.createOscillator();
      const stop = oscillator.stop.bind(oscillator);
      sounding.add(oscillator);
      oscillator.stop = (when) => {
        sounding.delete(oscillator);
        stop(when);
      };
      return oscillator;
    }
  };
  Object.assign(window, { soundingHz: () => [...sounding].map(({ frequency }) => frequency.value) });
}

const heard = (page: Page) =>
  page.evaluate(() => (window as unknown as { soundingHz: () => number[] }).soundingHz());
