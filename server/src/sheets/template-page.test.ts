import fc from 'fast-check';
import { describe, expect, it, vi } from 'vitest';
import { boreEnds, diameterAt } from '#shared/document/profile.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { buildHole, buildWhistle } from '../../../tests/sheets/build-sheet-input.ts';
import { drawnSheet, templatePages, tube, wordsOf } from '../../../tests/sheets/drawn-sheet.ts';
import type { ReadSheet } from '../../../tests/sheets/read-sheet.ts';
import { measureHoles, readTemplates } from '../../../tests/sheets/read-templates.ts';

// Each test draws a set and reads it back; on a busy machine that takes seconds.
vi.setConfig({ testTimeout: 60_000 });

/** Where holes must be found: from the foot and round the outside, by the document's own figures. */
function expectedMarks(document: DesignDocument) {
  return document.holes.map((hole) => ({
    hole,
    fromFootMm: boreEnds(document).footMm - hole.positionMm,
    roundMm: (hole.angleDeg / 360) * Math.PI * diameterAt(document.outside.stations, hole.positionMm),
  }));
}

function expectHolesInPlace(sheet: ReadSheet, document: DesignDocument) {
  const wrap = measureHoles(sheet.pages, 'wrap');
  const strip = measureHoles(sheet.pages, 'strip');
  for (const { hole, fromFootMm, roundMm } of expectedMarks(document)) {
    const onWrap = wrap.filter(
      (mark) =>
        Math.abs(mark.fromReferenceMm - fromFootMm) < 0.001 && Math.abs(mark.aboveMiddleMm - roundMm) < 0.001,
    );
    expect(onWrap.length, `hole ${hole.id} on the wrap-around`).toBeGreaterThan(0);
    expect(onWrap.some((mark) => mark.isWhole)).toBe(true);
    for (const mark of onWrap) {
      const outside = diameterAt(document.outside.stations, hole.positionMm);
      expect(mark.alongMm).toBeCloseTo(hole.diameterMm, 3);
      expect(mark.acrossMm).toBeCloseTo(outside * Math.asin(hole.diameterMm / outside), 3);
    }
    const onStrip = strip.filter((mark) => Math.abs(mark.fromReferenceMm - fromFootMm) < 0.001);
    expect(onStrip.length > 0, `hole ${hole.id} on the strip`).toBe(hole.angleDeg === 0);
    for (const mark of onStrip) {
      expect(Math.abs(mark.aboveMiddleMm)).toBeLessThan(0.001);
      expect(mark.alongMm).toBeCloseTo(hole.diameterMm, 3);
      expect(mark.acrossMm).toBeCloseTo(hole.diameterMm, 3);
    }
  }
}

describe('the templates', () => {
  it.each(['A4', 'Letter'] as const)('have every hole in its place on %s', async (paper) => {
    const document = buildWhistle();
    expectHolesInPlace(await drawnSheet({ document, paper }), document);
  });

  it('have the thumb hole on both seam edges and other holes at their angle', async () => {
    const holes = [
      buildHole({ id: 'thumb', positionMm: 100, angleDeg: 180, cover: 'thumb' }),
      buildHole({ id: 'left', positionMm: 130, angleDeg: 35 }),
      buildHole({ id: 'right', positionMm: 240, angleDeg: -20 }),
    ];
    const document = tube(420, 24, holes);
    const sheet = await drawnSheet({ document });
    expectHolesInPlace(sheet, document);
    const thumb = measureHoles(sheet.pages, 'wrap').filter(
      (mark) => Math.abs(mark.fromReferenceMm - 320) < 0.001,
    );
    expect(new Set(thumb.map((mark) => Math.sign(mark.aboveMiddleMm)))).toEqual(new Set([1, -1]));
  });

  it('have holes of a tapered body on its centre line at their distance', async () => {
    const document = {
      ...buildWhistle(),
      outside: {
        stations: [
          { positionMm: -31, diameterMm: 27 },
          { positionMm: 265, diameterMm: 21 },
        ],
      },
    };
    const sheet = await drawnSheet({ document });
    const wrap = measureHoles(sheet.pages, 'wrap');
    for (const { fromFootMm } of expectedMarks(document)) {
      const mark = wrap.find((found) => Math.abs(found.fromReferenceMm - fromFootMm) < 0.001);
      expect(mark?.aboveMiddleMm).toBeCloseTo(0, 3);
    }
    const heights = readTemplates(templatePages(sheet)[0]!)[0]!.outline;
    expect(heights.bottom - heights.top).toBeCloseTo(Math.PI * diameterAt(document.outside.stations, 105), 2);
  });

  it('measure from the mouth end where the workshop does', async () => {
    const document = buildWhistle();
    const workshop = { name: 'Yard', unit: 'mm', referenceEnd: 'mouth', bandCents: [5] } as const;
    const sheet = await drawnSheet({ document, workshop });
    const [first] = templatePages(sheet);
    const [wrap] = readTemplates(first!);
    for (const hole of document.holes.filter(({ positionMm }) => positionMm < 115)) {
      const distances = wrap!.holes.map(({ centre }) => centre.x - wrap!.barXs[0]!);
      expect(distances.some((distance) => Math.abs(distance - hole.positionMm) < 0.001)).toBe(true);
    }
    expect(wordsOf(sheet.pages[0]!)).toMatch(/122\.6/);
  });

  it.each(['A4', 'Letter'] as const)('have two rulers of exactly 100 mm on every %s page', async (paper) => {
    for (const outsideMm of [17.5, 44, 58]) {
      const sheet = await drawnSheet({ document: tube(300, outsideMm, []), paper });
      for (const page of templatePages(sheet)) {
        const rulers = page.paths.filter(({ lineWidthMm, points }) => {
          return Math.abs(lineWidthMm - 0.3) < 0.005 && points.length === 6;
        });
        const sizes = rulers.map(({ box }) => [box.right - box.left, box.bottom - box.top]);
        expect(sizes).toEqual([
          [expect.closeTo(100, 3), expect.closeTo(6, 3)],
          [expect.closeTo(6, 3), expect.closeTo(100, 3)],
        ]);
        expect(wordsOf(page)).toMatch(/If it is not 100\.0 within 0\.2, do not use this page/);
      }
    }
  });

  it('show a body too thick for one page in parts that hold every hole', async () => {
    const holes = [buildHole({ id: 'a', positionMm: 150, diameterMm: 20, angleDeg: 0 })];
    const sheet = await drawnSheet({ document: tube(300, 90, holes) });
    const curves = templatePages(sheet).flatMap((page) =>
      readTemplates(page).flatMap((found) => found.holes),
    );
    expect(curves.some((hole) => Math.abs(hole.acrossMm - 90 * Math.asin(20 / 90)) < 0.001)).toBe(true);
  });

  it('keep every hole in its place on instruments of all sizes', { timeout: 120_000 }, async () => {
    const instrument = fc.record({
      outsideMm: fc.double({ min: 14, max: 40, noNaN: true }),
      firstMm: fc.double({ min: 20, max: 300, noNaN: true }),
      tailMm: fc.double({ min: 12, max: 300, noNaN: true }),
      steps: fc.array(
        fc.record({
          stepMm: fc.double({ min: 18, max: 70, noNaN: true }),
          share: fc.double({ min: 0.1, max: 0.65, noNaN: true }),
          angleDeg: fc.constantFrom(0, 0, 0, 15, -40, 180),
        }),
        { maxLength: 24 },
      ),
    });
    await fc.assert(
      fc.asyncProperty(instrument, async ({ outsideMm, firstMm, tailMm, steps }) => {
        let positionMm = firstMm;
        const holes = steps.map(({ stepMm, share, angleDeg }, index) => {
          positionMm += stepMm;
          const diameterMm = Math.min(share * outsideMm, 15);
          return buildHole({ id: `h${index}`, positionMm, diameterMm, angleDeg });
        });
        const document = tube(positionMm + tailMm, outsideMm, holes);
        const sheet = await drawnSheet({ document });
        expectHolesInPlace(sheet, document);
        const gaps = templatePages(sheet)
          .flatMap((page) => readTemplates(page))
          .flatMap(({ holes: marks, joinXs }) =>
            marks.flatMap(({ centre }) => joinXs.map((joinX) => Math.abs(centre.x - joinX))),
          );
        for (const gap of gaps) expect(gap).toBeGreaterThan(8 - 0.001);
      }),
      { numRuns: 12 },
    );
  });
});
