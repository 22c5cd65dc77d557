import type { Page } from 'playwright-core';
import { describe, expect } from 'vitest';
import { expectAccessible, test } from '../support/browser-test.ts';
import { signInThroughPage } from '../support/sign-in-page.ts';

const WHISTLE = 'Wharf D whistle';

async function openBore(page: Page): Promise<void> {
  await page.getByRole('link', { name: 'Designs', exact: true }).click();
  await page
    .getByRole('link', { name: new RegExp(WHISTLE) })
    .first()
    .click();
  await page.getByRole('heading', { level: 1, name: WHISTLE }).waitFor();
  await page.getByRole('link', { name: 'Bore', exact: true }).click();
  await page.getByRole('button', { name: 'Read in a measured bore' }).click();
  await page.getByRole('heading', { name: /^Measured bore/ }).waitFor();
}

/** A reading each 5 mm from the lip, a bore that widens evenly by 0.4 to the foot, one slip, one row that says nothing. */
function table(lengthMm: number): string {
  const comma = (value: number, digits: number) => value.toFixed(digits).replace('.', ',');
  const rows = Array.from({ length: Math.floor(lengthMm / 5) + 1 }, (_, index) => {
    const place = index * 5;
    const width = 12.5 + (0.4 * place) / lengthMm + (place === 100 ? 0.5 : 0);
    return `${comma(place, 1)};${comma(width, 3)};${comma(12, 1)}`;
  });
  return ['Place;Across;Temperature', ...rows, 'Mean;12,7;'].join('\n');
}

interface StoredBore {
  document: { bore: { stations: { positionMm: number; diameterMm: number }[] } };
}

async function storedStations(page: Page) {
  const id = /\/designs\/(\d+)/.exec(page.url())?.[1] ?? '';
  const draft = (await (await page.request.get(`/api/designs/${id}/draft`)).json()) as StoredBore;
  return draft.document.bore.stations;
}

const heldNotes = (page: Page) => page.getByRole('table', { name: 'Drawn and measured bore at the holes' });

describe('a maker with a measured bore', () => {
  test('pastes the table, mends what was taken wrongly, sees what it does, uses it, and takes it back', async ({
    page,
  }) => {
    await signInThroughPage(page, 'maker');
    await openBore(page);
    const before = await storedStations(page);
    const lengthMm = before.at(-1)!.positionMm;

    const pasted = table(lengthMm);
    await page.getByRole('textbox', { name: 'Table of measurements' }).fill(pasted);
    await page.getByText(/readings? become/).waitFor();
    // The heading does not say what was measured: the figures do.
    const holds = (column: number) => page.getByRole('combobox', { name: `Column ${column} holds` });
    expect(await holds(1).inputValue()).toBe('distance');
    expect(await holds(2).inputValue()).toBe('diameter');
    await holds(2).selectOption('radius');
    await page.getByRole('alert').filter({ hasText: 'breaks through the outside' }).waitFor();
    await holds(2).selectOption('diameter');

    await page.getByText('“Mean” cannot be read as a length').waitFor();
    await page.getByRole('button', { name: /^Use it: 1\d\.\d\d at/ }).waitFor();
    await page.getByText('1 is left out').waitFor();
    await expect.poll(() => heldNotes(page).innerText()).toMatch(/Moves register 1 cents[^–]*[+−]\d+\.\d/);
    await expectAccessible(page);

    // Closed by mistake and loaded again: the table is still there, and nothing was changed.
    await page.reload();
    await page.getByText('1 is left out').waitFor();
    expect(await storedStations(page)).toEqual(before);

    await page.getByRole('button', { name: /^Use these \d station/ }).click();
    await page.getByText(/^The bore is now \d stations? of the pasted table/).waitFor();
    const width = async () => (await storedStations(page)).at(-1)!.diameterMm;
    await expect.poll(width, { timeout: 15_000 }).toBeCloseTo(12.9, 1);

    await page.getByRole('button', { name: 'Undo' }).filter({ visible: true }).click();
    await expect.poll(() => storedStations(page), { timeout: 15_000 }).toEqual(before);
  });

  test('chooses a file, is told what it is not, and keeps the measured bore beside the drawn one', async ({
    page,
  }) => {
    await signInThroughPage(page, 'maker');
    await openBore(page);
    const file = page.getByLabel('File of measurements, CSV or TSV');
    await file.setInputFiles({
      name: 'bore.xlsx',
      mimeType: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
      buffer: Buffer.from('PK\u0003\u0004'),
    });
    await page.getByRole('alert').filter({ hasText: 'Save the sheet as CSV' }).waitFor();
    await expectAccessible(page);
    await file.setInputFiles({ name: 'bore.csv', mimeType: 'text/csv', buffer: Buffer.from(table(250)) });
    await page.getByRole('heading', { name: /bore\.csv, 51 readings/ }).waitFor();
    await page.getByRole('button', { name: 'Keep beside the drawn bore' }).click();
    await page.getByText('Dashed: the measured bore, bore.csv').waitFor();
    await page.getByRole('button', { name: 'Go on with it' }).click();
    await page.getByRole('button', { name: 'Put it back' }).click();
    await expect.poll(() => page.getByText('Dashed: the measured bore').count()).toBe(0);
  });
});
