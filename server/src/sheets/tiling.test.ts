import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { ALONG_PAGE, planTiles, type Tile, type TileMark } from './tiling.ts';

const joins = (tiles: readonly Tile[]) =>
  tiles.flatMap((tile) => (tile.joinAfter === null ? [] : [tile.joinAfter.atMm]));

const isWhole = (mark: TileMark, tile: Tile) =>
  mark.centreMm - mark.radiusMm >= tile.fromMm && mark.centreMm + mark.radiusMm <= tile.toMm;

/** Holes along a template, at least `gapMm` from centre to centre. */
const spacedMarks = (gapMm: number) =>
  fc
    .array(
      fc.record({
        stepMm: fc.double({ min: gapMm, max: gapMm + 60, noNaN: true }),
        share: fc.double({ min: 0.02, max: 0.9, noNaN: true }),
      }),
      { maxLength: 24 },
    )
    .map((steps) => {
      let centreMm = 0;
      return steps.map(({ stepMm, share }) => {
        centreMm += stepMm;
        return { centreMm, radiusMm: (share * gapMm) / 2 };
      });
    });

describe('tiles of a template', () => {
  it('draws 160 mm to a page and lays 10 mm over each other', () => {
    const tiles = planTiles(296, [], ALONG_PAGE);
    expect(tiles.map(({ fromMm, toMm }) => [fromMm, toMm])).toEqual([
      [0, 160],
      [150, 296],
    ]);
    expect(joins(tiles)).toEqual([155]);
  });

  it('takes one page for what fits on it', () => {
    expect(planTiles(160, [], ALONG_PAGE)).toHaveLength(1);
  });

  it('moves a join from 155 when a hole stands at 150', () => {
    expect(joins(planTiles(296, [{ centreMm: 150, radiusMm: 3 }], ALONG_PAGE))).toEqual([142]);
  });

  it('keeps every centre 8 mm from every join wherever holes leave room for one', () => {
    const instrument = fc.record({
      marks: spacedMarks(20),
      tailMm: fc.double({ min: 15, max: 400, noNaN: true }),
    });
    fc.assert(
      fc.property(instrument, ({ marks, tailMm }) => {
        const lengthMm = (marks.at(-1)?.centreMm ?? 0) + tailMm;
        for (const join of joins(planTiles(lengthMm, marks, ALONG_PAGE))) {
          for (const mark of marks) expect(Math.abs(mark.centreMm - join)).toBeGreaterThanOrEqual(8 - 1e-6);
        }
      }),
    );
  });

  it('draws every hole whole on one page at least, even where no place is clear', () => {
    const instrument = fc.record({
      marks: spacedMarks(9),
      tailMm: fc.double({ min: 15, max: 900, noNaN: true }),
    });
    fc.assert(
      fc.property(instrument, ({ marks, tailMm }) => {
        const lengthMm = (marks.at(-1)?.centreMm ?? 0) + tailMm;
        const tiles = planTiles(lengthMm, marks, ALONG_PAGE);
        for (const mark of marks) expect(tiles.some((tile) => isWhole(mark, tile))).toBe(true);
      }),
    );
  });

  it('covers the whole length, page by page, none longer than the paper takes', () => {
    fc.assert(
      fc.property(spacedMarks(9), fc.double({ min: 15, max: 1500, noNaN: true }), (marks, tailMm) => {
        const lengthMm = (marks.at(-1)?.centreMm ?? 0) + tailMm;
        const tiles = planTiles(lengthMm, marks, ALONG_PAGE);
        expect(tiles[0]?.fromMm).toBe(0);
        expect(tiles.at(-1)?.toMm).toBe(lengthMm);
        tiles.forEach((tile, index) => {
          expect(tile.toMm - tile.fromMm).toBeLessThanOrEqual(160 + 1e-6);
          const next = tiles[index + 1];
          if (next === undefined) return;
          expect(next.fromMm).toBeGreaterThan(tile.fromMm);
          expect(tile.toMm - next.fromMm).toBeGreaterThanOrEqual(10 - 1e-6);
          expect(next.joinBefore).toEqual(tile.joinAfter);
        });
      }),
    );
  });

  it('says how near the nearest hole is where a join has to stand close', () => {
    const marks = Array.from({ length: 24 }, (_, index) => ({ centreMm: 10 + index * 12, radiusMm: 3 }));
    const first = planTiles(320, marks, ALONG_PAGE)[0]?.joinAfter;
    expect(first?.clearMm).toBeCloseTo(6, 9);
  });
});
