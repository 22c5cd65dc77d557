import { describe, expect, it, vi } from 'vitest';
import { buildHole, buildSheetInput, buildWhistle } from '../../../tests/sheets/build-sheet-input.ts';
import { drawnSheet, templatePages, tube, wordsOf } from '../../../tests/sheets/drawn-sheet.ts';

// Each test draws a set and reads it back; on a busy machine that takes seconds.
vi.setConfig({ testTimeout: 60_000 });

describe('words', () => {
  const LONG = 'Wwwwwwwwww'.repeat(12);

  it.each(['A4', 'Letter'] as const)(
    'stay on %s and in their boxes with the longest names',
    async (paper) => {
      const whistle = buildWhistle();
      const document = {
        ...whistle,
        name: LONG,
        holes: whistle.holes.map((hole) => ({ ...hole, name: LONG.slice(0, 40) })),
      };
      const sheet = await drawnSheet({
        document,
        paper,
        unit: 'both',
        drawnBy: LONG,
        workshop: { name: LONG, unit: 'mm', referenceEnd: 'mouth', bandCents: [5, 10, 20] },
      });
      for (const page of sheet.pages) {
        for (const { text, box } of page.texts) {
          if (text.startsWith('NOT APPROVED')) continue;
          expect(box.left, text).toBeGreaterThanOrEqual(12 - 0.01);
          expect(box.right, text).toBeLessThanOrEqual(page.widthMm - 12 + 0.01);
          expect(box.top, text).toBeGreaterThanOrEqual(12 - 0.01);
          expect(box.bottom, text).toBeLessThanOrEqual(page.heightMm - 12 + 0.01);
        }
        const name = page.texts.filter(({ text, box }) => text.startsWith('W') && box.bottom < 27.2);
        expect(name.length).toBeGreaterThan(0);
        for (const { box } of name) expect(box.right).toBeLessThan(page.widthMm - 12 - 65);
      }
    },
  );

  it.each([
    ['mm', 'foot'],
    ['mm', 'mouth'],
    ['inch', 'foot'],
    ['inch', 'mouth'],
    ['both', 'foot'],
    ['both', 'mouth'],
  ] as const)('in %s from the %s are never cut short', async (unit, referenceEnd) => {
    const whistle = buildWhistle();
    const document = {
      ...whistle,
      holes: whistle.holes.map((hole) => ({ ...hole, diameterMm: hole.diameterMm + 0.03 })),
    };
    for (const ownUnit of ['mm', 'inch'] as const) {
      const workshop = { name: 'Saltgate Yard', unit: ownUnit, referenceEnd, bandCents: [5, 10] };
      const sheet = await drawnSheet({ document, unit, workshop });
      for (const page of sheet.pages) expect(wordsOf(page)).not.toContain('…');
    }
  });

  it('are never smaller than 8 points', async () => {
    const sheet = await drawnSheet({ unit: 'both' });
    const sizes = sheet.pages.flatMap((page) => page.texts.map(({ sizeMm }) => (sizeMm / 25.4) * 72));
    expect(Math.min(...sizes)).toBeGreaterThanOrEqual(8 - 1e-3);
  });

  it('print names in the letters of several alphabets', async () => {
    const name = 'Flûte à Łódź, αυλός, свирель, tiêu';
    const sheet = await drawnSheet({ document: buildWhistle({ name }) });
    const runs = sheet.pages[0]!.texts.filter(({ box }) => box.bottom < 24).map(({ text }) => text);
    const letters = (text: string) => text.replaceAll(/\s/g, '');
    expect(letters(runs.join(''))).toContain(letters(name));
  });

  it('run over to further pages with 24 holes and 120 fingerings', async () => {
    const holes = Array.from({ length: 24 }, (_, index) =>
      buildHole({ id: `h${index}`, positionMm: 60 + index * 50, diameterMm: 6 }),
    );
    const fingerings = Array.from({ length: 120 }, (_, index) => ({
      id: `f${index}`,
      note: `${'CDEFGAB'.charAt(index % 7)}${3 + (index % 3)}`,
      register: 1,
      covered: holes.slice(0, index % 25).map((hole) => hole.id),
      half: [],
      weight: 1,
      centsOffset: 0,
    }));
    const document = { ...tube(1500, 30, holes), fingerings };
    const sheet = await drawnSheet({ document });
    const pages = sheet.pages.length;
    sheet.pages.forEach((page, index) => {
      expect(wordsOf(page)).toContain(`${index + 1} of ${pages}`);
      const foot = page.texts.find(({ text }) => text.startsWith('All sizes in'))!;
      for (const { text, box } of page.texts) {
        if (box.top > foot.box.top - 1 || text.startsWith('NOT APPROVED')) continue;
        expect(box.bottom, text).toBeLessThan(foot.box.top - 2);
      }
    });
    const table = sheet.pages.flatMap((page) =>
      page.texts.filter(({ text, box }) => /^\d+\.0$/.test(text) && box.left > 22 && box.right < 40),
    );
    for (const hole of holes) {
      expect(table.map(({ text }) => text)).toContain((1500 - hole.positionMm).toFixed(1));
    }
    const templates = templatePages(sheet);
    expect(templates.length).toBeGreaterThanOrEqual(10);
  });
});

describe('the figures', () => {
  it('are those of the document, in inches where the sheet is in inches', async () => {
    const sheet = await drawnSheet({ unit: 'inch' });
    const words = wordsOf(sheet.pages[0]!);
    // 265 − 218.9 = 46.1 mm = 1.815 in, between 1 13/16 (1.8125) and 1 53/64; 6 mm is 0.236 in, just over a B drill 0.238 less.
    expect(words).toMatch(/1\.815/);
    expect(words).toMatch(/~1 13\/16/);
    expect(words).toMatch(/0\.236/);
  });

  it('name the nearest drill that does not go beyond the hole, and what is left', async () => {
    const document = tube(300, 20, [buildHole({ id: 'a', positionMm: 200, diameterMm: 6.25 })]);
    const words = wordsOf((await drawnSheet({ document })).pages[0]!).replaceAll('\n', ' ');
    expect(words).toMatch(/6\.25/);
    expect(words).toMatch(/nearest 6\.2, \u22120\.05/);
  });

  it('carry every warning of the prediction', async () => {
    const input = buildSheetInput();
    const notices = [{ code: 'test', message: 'Hole 5 is wider than the formula holds for.' }];
    const sheet = await drawnSheet({ prediction: { ...input.prediction, notices } });
    expect(wordsOf(sheet.pages.at(-1)!)).toContain('Hole 5 is wider than the formula holds for.');
  });

  it('say what a degree does and what the bands are', async () => {
    const words = wordsOf((await drawnSheet()).pages.at(-1)!).replaceAll('\n', ' ');
    expect(words).toMatch(/add 2\.9 cents for each degree above 24 °C, take away 2\.9 for each degree below/);
    expect(words).toMatch(/±5 cents in register 1, ±10 in register 2/);
  });
});
