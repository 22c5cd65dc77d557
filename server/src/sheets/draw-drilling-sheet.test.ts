import { describe, expect, it, vi } from 'vitest';
import { drawnSheet, templatePages, tube, wordsOf } from '../../../tests/sheets/drawn-sheet.ts';
import { readTemplates } from '../../../tests/sheets/read-templates.ts';

// Each test draws a set and reads it back; on a busy machine that takes seconds.
vi.setConfig({ testTimeout: 60_000 });

describe('the file', () => {
  // ISO 216 and ANSI/ASME Y14.1, in points of 1/72 inch.
  it.each([
    ['A4', 595.276, 841.89],
    ['Letter', 612, 792],
  ] as const)('has pages of exactly %s', async (paper, widthPt, heightPt) => {
    const sheet = await drawnSheet({ paper });
    for (const page of sheet.pages) {
      expect((page.widthMm / 25.4) * 72).toBeCloseTo(widthPt, 3);
      expect((page.heightMm / 25.4) * 72).toBeCloseTo(heightPt, 3);
    }
  });

  it('forbids scaling, shows its title, is tagged and embeds every font', async () => {
    const { raw, title } = await drawnSheet();
    expect(raw).toMatch(/\/PrintScaling \/None/);
    expect(raw).toMatch(/\/DisplayDocTitle true/);
    expect(raw).toMatch(/\/Marked true/);
    expect(title).toBe('NOT APPROVED, Wharf D whistle rev 7');
    const fonts = raw.match(/\/Type \/FontDescriptor/g)?.length ?? 0;
    expect(fonts).toBeGreaterThan(0);
    expect(raw.match(/\/FontFile2/g)).toHaveLength(fonts);
    expect(raw).not.toMatch(/\/BaseFont \/(Helvetica|Times|Courier)/);
  });

  it('tags tables as tables, with heads of columns and rows', async () => {
    const { raw } = await drawnSheet();
    expect(raw.match(/\/S \/Table\b/g)).toHaveLength(3);
    expect(raw).toMatch(/\/Scope \/Column/);
    expect(raw).toMatch(/\/Scope \/Row/);
    expect(raw).toMatch(/\/S \/Figure/);
  });
});

describe('a print that nobody has approved', () => {
  it.each(['draft', 'in-review', 'changes-asked'] as const)('%s says so on every page', async (state) => {
    const sheet = await drawnSheet({
      revision: { number: 7, state, draftSavedAt: new Date(2026, 2, 12, 14, 6) },
    });
    for (const page of sheet.pages) {
      const bands = page.texts.filter(({ text }) => text === 'NOT APPROVED. DO NOT DRILL');
      expect(bands.map(({ box }) => box.top < 8.5 || box.bottom > page.heightMm - 8.5)).toEqual([true, true]);
      const bars = page.paths.filter((path) => Math.abs(path.lineWidthMm - 3) < 0.01 && path.isStroked);
      expect(bars[0]!.box.right - bars[0]!.box.left).toBeGreaterThan(page.widthMm);
      expect(wordsOf(page)).toMatch(/12 March, 14:06/);
      expect(wordsOf(page)).toMatch(/must not be drilled from/);
    }
  });

  it('has no sheet number and no check code', async () => {
    const sheet = await drawnSheet();
    for (const page of sheet.pages) {
      expect(wordsOf(page)).toMatch(/Sheet\nnone/);
      expect(wordsOf(page)).toMatch(/none issued/);
      expect(wordsOf(page)).toMatch(/no code/);
      expect(wordsOf(page)).not.toMatch(/[A-HJ-NP-Z2-9]{4}-[A-HJ-NP-Z2-9]{4}/);
    }
  });

  it('carries the words inside every template, whole', async () => {
    const sheet = await drawnSheet({ document: tube(700, 26, []) });
    expect(templatePages(sheet).length).toBeGreaterThan(3);
    for (const page of templatePages(sheet)) {
      for (const { outline } of readTemplates(page)) {
        const inside = page.texts.filter(
          ({ text, box }) =>
            text === 'NOT APPROVED' &&
            box.left >= outline.left &&
            box.right <= outline.right &&
            box.top >= outline.top &&
            box.bottom <= outline.bottom,
        );
        expect(inside.length).toBeGreaterThan(1);
      }
    }
  });
});
