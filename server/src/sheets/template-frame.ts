import type { DesignDocument } from '#shared/document/design-document.ts';
import { benchPositionMm, bodyEnds, type ReferenceEnd } from './bench-position.ts';
import { MARGIN_MM } from './paper.ts';
import { scaleTicks, type ScaleTick } from './scale-ticks.ts';
import type { SheetContext } from './sheet-context.ts';
import { holeAppearances, seamEdge } from './template-geometry.ts';
import { ALONG_PAGE, planTiles, type Join, type TileRoom } from './tiling.ts';

/** White to the left of the longest tile, for a ruler or for words, mm. */
const LEFT_OF_TILE_MM = 20;

/** One tile along the body, placed across a page: which length it shows, and where. */
export interface TemplateFrame {
  /** The length shown, mm from the mouth end's reference point. */
  alongFromMm: number;
  alongToMm: number;
  part: number;
  parts: number;
  /** Joins with the parts before and after, as places along the body. */
  joins: { alongMm: number; part: number; clearMm: number }[];
  /** Distance across the page of a place along the body. */
  pageX: (alongMm: number) => number;
}

/** Tiles start at the end that everything is measured from, whose page is the one that is stuck down first. */
export function templateFrames(document: DesignDocument, referenceEnd: ReferenceEnd): TemplateFrame[] {
  const { fromMm, toMm } = bodyEnds(document);
  const tiled = (alongMm: number) => (referenceEnd === 'foot' ? toMm - alongMm : alongMm - fromMm);
  const along = (tiledMm: number) => (referenceEnd === 'foot' ? toMm - tiledMm : fromMm + tiledMm);
  const marks = document.holes.map((hole) => ({
    centreMm: tiled(hole.positionMm),
    radiusMm: hole.diameterMm / 2,
  }));
  const tiles = planTiles(toMm - fromMm, marks, ALONG_PAGE);
  return tiles.map((tile, index) => {
    const ends = [along(tile.fromMm), along(tile.toMm)].sort((a, b) => a - b);
    const [alongFromMm = 0, alongToMm = 0] = ends;
    const join = (at: Join | null, part: number) =>
      at === null ? [] : [{ alongMm: along(at.atMm), part, clearMm: at.clearMm }];
    const leftMm = MARGIN_MM + LEFT_OF_TILE_MM;
    // The foot end of the first page stays where the next pages' right edges are, so that pages look alike.
    const offset = referenceEnd === 'foot' ? leftMm + ALONG_PAGE.drawnMm - alongToMm : leftMm - alongFromMm;
    return {
      alongFromMm,
      alongToMm,
      part: index + 1,
      parts: tiles.length,
      joins: [...join(tile.joinBefore, index), ...join(tile.joinAfter, index + 2)],
      pageX: (alongMm) => offset + alongMm,
    };
  });
}

/** A share of the once-round height; a body too thick for one page is cut into several. */
export interface RoundBand {
  /** mm from the centre line, upward on the page. */
  lowMm: number;
  highMm: number;
  joinsMm: number[];
}

/** Most and least that lies above the centre line along a tile, mm. */
export function halfHeights(
  document: DesignDocument,
  frame: TemplateFrame,
): { leastMm: number; mostMm: number } {
  const halves = seamEdge(document, { fromMm: frame.alongFromMm, toMm: frame.alongToMm }).map(
    ({ halfMm }) => halfMm,
  );
  return { leastMm: Math.min(...halves), mostMm: Math.max(...halves) };
}

/** The bands of a tile: the whole height where the paper takes it. */
export function roundBands(document: DesignDocument, frame: TemplateFrame, room: TileRoom): RoundBand[] {
  const { mostMm } = halfHeights(document, frame);
  const marks = document.holes.flatMap((hole) =>
    holeAppearances(document, hole).map(({ centre, curve }) => ({
      centreMm: centre.roundMm + mostMm,
      radiusMm: curve.at(0.25).roundMm - centre.roundMm,
    })),
  );
  return planTiles(2 * mostMm, marks, room).map((tile) => ({
    lowMm: tile.fromMm - mostMm,
    highMm: tile.toMm - mostMm,
    joinsMm: [tile.joinBefore, tile.joinAfter].flatMap((join) => (join === null ? [] : [join.atMm - mostMm])),
  }));
}

/** What the bench reads off its rule at a place along the body, mm. */
export function benchReading({ input }: SheetContext) {
  return (alongMm: number) => benchPositionMm(input.document, alongMm, input.workshop.referenceEnd);
}

export interface FrameTick extends ScaleTick {
  alongMm: number;
  x: number;
}

/** Ticks of the bench rule along a tile, in the unit of the sheet. */
export function frameTicks(context: SheetContext, frame: TemplateFrame): FrameTick[] {
  const reading = benchReading(context);
  const [from = 0, to = 0] = [frame.alongFromMm, frame.alongToMm].map(reading).sort((a, b) => a - b);
  // Readings and places along the body mirror each other, so that reading twice leads back.
  const along = reading;
  return scaleTicks(from, to, context.writing.unit).map((tick) => ({
    ...tick,
    alongMm: along(tick.atMm),
    x: frame.pageX(along(tick.atMm)),
  }));
}
