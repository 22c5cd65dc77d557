/** One sheet's share of a template, mm from where the template begins. */
export interface Tile {
  fromMm: number;
  toMm: number;
  /** The line that lies on the same line of the tile before; null for the first. */
  joinBefore: Join | null;
  joinAfter: Join | null;
}

export interface Join {
  atMm: number;
  /** From the join to the nearest centre of a hole, mm. */
  clearMm: number;
}

/** Something that a join has to keep clear of. */
export interface TileMark {
  centreMm: number;
  radiusMm: number;
}

export interface TileRoom {
  /** Most that one sheet draws. */
  drawnMm: number;
  /** Drawn on both sheets, half of it on either side of the join. */
  overlapMm: number;
  /** No centre is nearer to a join than this, as long as there is such a place. */
  clearMm: number;
}

export const ALONG_PAGE: TileRoom = { drawnMm: 160, overlapMm: 10, clearMm: 8 };

/** White between a join and the rim of a hole, mm. */
const RIM_CLEAR_MM = 1;

/**
 * Cuts a template into tiles whose joins keep clear of every hole.
 *
 * A join lies as far along as it can. Where holes stand so close that no place is clear it takes the middle of the
 * widest gap, and the tiles on both sides grow until every hole is whole on one of them.
 */
export function planTiles(lengthMm: number, marks: readonly TileMark[], room: TileRoom): Tile[] {
  const tiles: Tile[] = [];
  let fromMm = 0;
  let joinBefore: Join | null = null;
  while (lengthMm - fromMm > room.drawnMm) {
    const atMm = joinPlace(fromMm, marks, room);
    const joinAfter = { atMm, clearMm: clearOf(atMm, marks) };
    const [upTo, nextFrom] = overlapEnds(atMm, marks, room);
    tiles.push({ fromMm, toMm: upTo, joinBefore, joinAfter });
    fromMm = nextFrom;
    joinBefore = joinAfter;
  }
  return [...tiles, { fromMm, toMm: lengthMm, joinBefore, joinAfter: null }];
}

function clearOf(atMm: number, marks: readonly TileMark[]): number {
  return Math.min(Infinity, ...marks.map((mark) => Math.abs(mark.centreMm - atMm)));
}

function joinPlace(fromMm: number, marks: readonly TileMark[], room: TileRoom): number {
  const last = fromMm + room.drawnMm - room.overlapMm / 2;
  const first = fromMm + 2 * room.overlapMm;
  const isBlocked = (atMm: number) =>
    marks.find((mark) => Math.abs(mark.centreMm - atMm) < clearanceMm(mark, room) - 1e-9);
  let atMm = last;
  for (let block = isBlocked(atMm); block !== undefined && atMm >= first; block = isBlocked(atMm)) {
    // Whole millimetres read better on paper; only a place that is clear as well is taken.
    const clear = block.centreMm - clearanceMm(block, room);
    atMm = isBlocked(Math.floor(clear)) === block ? clear : Math.floor(clear);
  }
  return atMm >= first ? atMm : widestGapMiddle({ first, last }, marks);
}

function clearanceMm(mark: TileMark, room: TileRoom): number {
  return Math.max(room.clearMm, mark.radiusMm + RIM_CLEAR_MM);
}

function widestGapMiddle(span: { first: number; last: number }, marks: readonly TileMark[]): number {
  const widest = Math.max(0, ...marks.map((mark) => mark.radiusMm));
  const last = span.last - widest;
  const centres = marks.map((mark) => mark.centreMm).sort((a, b) => a - b);
  const middles = centres.slice(1).map((centre, index) => (centre + (centres[index] ?? centre)) / 2);
  const within = [last, ...middles.filter((middle) => middle >= span.first && middle <= last)];
  const widestMm = Math.max(...within.map((at) => clearOf(at, marks)));
  // Of places that are as good, within what an eye sees, the farthest: fewer pages.
  return Math.max(...within.filter((at) => clearOf(at, marks) > widestMm - 0.25));
}

function overlapEnds(atMm: number, marks: readonly TileMark[], room: TileRoom): [number, number] {
  const half = room.overlapMm / 2;
  const before = marks.filter((mark) => mark.centreMm <= atMm).map((m) => m.centreMm + m.radiusMm + 0.5);
  const after = marks.filter((mark) => mark.centreMm > atMm).map((m) => m.centreMm - m.radiusMm - 0.5);
  return [Math.max(atMm + half, ...before), Math.min(atMm - half, ...after)];
}
