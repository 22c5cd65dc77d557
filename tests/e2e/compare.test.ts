import type { Page } from 'playwright-core';
import { describe, expect } from 'vitest';
import { expectAccessible, test } from '../support/browser-test.ts';
import { signInThroughPage } from '../support/sign-in-page.ts';

const WHISTLE = 'Wharf D whistle';
const LOW_WHISTLE = 'Saltmarsh low D whistle';

const rackLink = (page: Page, name: string) => page.getByRole('link', { name, exact: true });

const holeButton = (page: Page, number: number) =>
  page.getByRole('button', { name: new RegExp(`^Hole ${number}, .* cents (flat|sharp)`) });

async function openRack(page: Page): Promise<void> {
  await page.goto('/designs');
  await rackLink(page, WHISTLE).waitFor();
}

async function openWhistle(page: Page): Promise<number> {
  await openRack(page);
  await rackLink(page, WHISTLE).click();
  await page.getByRole('heading', { level: 1, name: WHISTLE }).waitFor();
  await holeButton(page, 3).waitFor();
  return Number(/\/designs\/(\d+)/.exec(page.url())?.[1]);
}

async function openFromBench(page: Page, place: string): Promise<void> {
  await page.getByRole('button', { name: 'Compare', exact: true }).click();
  await page.getByRole('menuitem', { name: place }).click();
}

interface StoredDraft {
  version: number;
  document: { pitch: { tonic: string }; air: { temperatureC: number }; fingerings: { note: string }[] };
}

const storedDraft = async (page: Page, id: number) =>
  (await (await page.request.get(`/api/designs/${id}/draft`)).json()) as StoredDraft;

describe('two designs over each other', () => {
  test('are chosen from the rack, and what differs is said in sentences, sizes and cents', async ({
    page,
  }) => {
    await signInThroughPage(page, 'maker');
    await openRack(page);
    await page.getByRole('link', { name: 'Compare two' }).click();
    await page.getByText('Choose the first of the two designs').waitFor();
    await rackLink(page, LOW_WHISTLE).click();
    await page.getByText(`Choose what to hold ${LOW_WHISTLE} against.`).waitFor();
    await expectAccessible(page);
    await rackLink(page, WHISTLE).click();

    await page
      .getByRole('heading', { level: 1, name: new RegExp(`${LOW_WHISTLE}.*against.*${WHISTLE}`) })
      .waitFor();
    await page.getByRole('button', { name: /^Hole 4 moved .* mm (footward|toward the window)/ }).click();
    await expect.poll(() => holeButton(page, 4).getAttribute('aria-pressed')).toBe('true');
    const sizes = page.getByRole('table', { name: 'Sizes of the holes, and what they were' });
    await sizes.getByRole('row', { name: /^Diameter mm/ }).waitFor();
    await expect
      .poll(() => sizes.getByRole('row', { name: /^Moves register 1/ }).innerText())
      .toMatch(/[+−]\d/);
    await expectAccessible(page);

    await page.getByRole('link', { name: 'Notes', exact: true }).click();
    const notes = page.getByRole('table', { name: 'Cents of every note of A and of B' });
    await expect
      .poll(() =>
        notes
          .getByRole('row', { name: /register 1/ })
          .first()
          .innerText(),
      )
      .toMatch(/\d\.\d.*[+−]\d+\.\d/s);
    await expectAccessible(page);

    await page.getByRole('link', { name: 'Bore', exact: true }).click();
    await page.getByRole('heading', { name: /^The bores differ/ }).waitFor();
    await page.getByRole('img', { name: /^Bores of A, dashed, and B/ }).waitFor();
    await expectAccessible(page);
  });

  test('that are not there are not there', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    await page.goto('/designs/compare/1/999999/holes');
    await page.getByRole('heading', { name: 'There is nothing on this peg.' }).waitFor();
  });
});

describe('a whistle at another pitch', () => {
  test('is looked at, changes the draft as one step, and is taken back', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    const id = await openWhistle(page);
    const before = await holeButton(page, 3).getAttribute('aria-label');
    await openFromBench(page, 'At another pitch');
    await page.getByLabel('Lowest note').selectOption('F5');
    await page.getByText(/^Every length is 0\.8409 of what it was/).waitFor();
    await page.getByText(/^No drills are sold in the sizes of holes/).waitFor();
    expect((await storedDraft(page, id)).document.pitch.tonic).toBe('D');
    await expectAccessible(page);

    await page.getByRole('button', { name: 'Change this draft' }).click();
    await page.waitForURL(/\/r\/\d+\/holes/);
    await holeButton(page, 3).waitFor();
    expect(await holeButton(page, 3).getAttribute('aria-label')).not.toBe(before);
    await expect.poll(async () => (await storedDraft(page, id)).document.fingerings[0]?.note).toBe('F5');

    await page.getByRole('button', { name: 'Undo' }).click();
    await expect.poll(() => holeButton(page, 3).getAttribute('aria-label')).toBe(before);
    await expect.poll(async () => (await storedDraft(page, id)).document.pitch.tonic).toBe('D');
  });

  test('becomes a design of its own with the bore kept', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    const id = await openWhistle(page);
    await page.goto(`/designs/compare/${id}/${id}/pitch?key=C5&bore=kept`);
    await page.getByText(/^The foot is carried on by \d+\.\d mm/).waitFor();
    await page.getByText(/^Kept: the width of bore and outside, the mouth end/).waitFor();
    await page.getByRole('button', { name: 'Make a copy' }).click();
    const dialog = page.getByRole('dialog', { name: 'Make a copy' });
    expect(await dialog.getByLabel('Name').inputValue()).toBe(`${WHISTLE}, in C5`);
    await dialog.getByRole('button', { name: 'Make the copy' }).click();
    await page.getByRole('heading', { level: 1, name: `${WHISTLE}, in C5` }).waitFor();
    expect((await storedDraft(page, id)).document.pitch.tonic).toBe('D');
  });

  test('is refused with the reason where the holes have no room', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    const id = await openWhistle(page);
    await page.goto(`/designs/compare/${id}/${id}/pitch?key=D6&bore=kept`);
    await page.getByText('This instrument cannot be taken there as it is. Nothing was changed.').waitFor();
    await page
      .getByText(/run into each other/)
      .first()
      .waitFor();
    expect(await page.getByRole('button', { name: 'Make a copy' }).isDisabled()).toBe(true);
  });
});

describe('a whistle at another temperature', () => {
  test('says how far every note moves, and changes nothing', async ({ page }) => {
    await signInThroughPage(page, 'maker');
    const id = await openWhistle(page);
    const { version } = await storedDraft(page, id);
    await openFromBench(page, 'At another temperature');
    const field = page.getByRole('textbox', { name: 'Air in the bore' });
    await field.fill('14');
    await field.press('Enter');
    await page.getByText(/^From \d+ to 14 °C every note moves by −\d+\.\d.* cents/).waitFor();
    const notes = page.getByRole('table', { name: /^Cents of every note of .* °C and of 14 °C/ });
    await expect.poll(() => notes.getByRole('row', { name: /^D 5|^D5/ }).innerText()).toMatch(/−\d+\.\d/);
    await expectAccessible(page);
    expect((await storedDraft(page, id)).version).toBe(version);
  });
});
