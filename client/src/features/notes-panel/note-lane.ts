import { scaleLinear } from 'd3';
import type { BenchColumn, BenchGeometry } from '../../bench/bench-geometry.ts';

/** Where the parts of a row stand, px from the bench's left edge. */
export interface NotesLayout {
  noteX: number;
  /** null where there is no room for it. */
  hzRight: number | null;
  centsRight: number;
  lane: NoteLane;
  columns: readonly BenchColumn[];
  /** Left edge of the remark; null where there is no room for one beside the circles. */
  remarkX: number | null;
  /** The circles stand on a line of their own below the note. */
  isStacked: boolean;
  /** Of one line. */
  rowHeight: number;
  /** Side of the square that a tap on a circle may hit. */
  tapSize: number;
}

/** The one scale that all bobs hang on. */
export interface NoteLane {
  left: number;
  right: number;
  zeroX: number;
  x: (cents: number) => number;
  /** Bobs further out are held here. */
  heldAtCents: number;
  ticks: readonly number[];
}

/** On the drawing of the desk: 5.2 px a cent, held at 31 cents. */
const PX_PER_CENT = 5.2;
const HELD_AT_CENTS = 31;
/** A lane narrower than this says nothing. */
const NARROWEST_LANE = 80;
const REMARK_WIDTH = 150;
/** Circles nearer than this under their holes are spread into columns. */
const LEAST_CIRCLE_GAP = 26;

export function notesLayout(geometry: BenchGeometry): NotesLayout {
  const { measures, layout, viewRight, widthPx } = geometry;
  const hasHz = layout === 'wide' || layout === 'tablet';
  const noteX = Math.max(measures.leftZone.x, 16);
  const hzRight = hasHz ? noteX + 110 : null;
  const centsRight = noteX + (hasHz ? 182 : 96);
  const columns = circleColumns(geometry);
  const laneLeft = centsRight + 36;
  const beside = (columns[0]?.x ?? viewRight) - 32;
  const isStacked = beside - laneLeft < NARROWEST_LANE;
  const rowHeight = layout === 'wide' ? 24 : 44;
  return {
    noteX,
    hzRight,
    centsRight,
    lane: noteLane(laneLeft, Math.min(laneLeft + 323, isStacked ? widthPx - 32 : beside)),
    columns,
    remarkX: remarkPlace(columns, widthPx),
    isStacked,
    rowHeight,
    // Before the page is laid out columns may lie on one another.
    tapSize: Math.max(8, Math.min(leastGap(columns), rowHeight)),
  };
}

function remarkPlace(columns: readonly BenchColumn[], widthPx: number): number | null {
  const remarkX = (columns.at(-1)?.x ?? widthPx) + 40;
  return remarkX + REMARK_WIDTH <= widthPx ? remarkX : null;
}

const leastGap = (columns: readonly BenchColumn[]) =>
  columns.slice(1).reduce((least, { x }, index) => Math.min(least, x - (columns[index]?.x ?? 0)), 44);

/** Exactly under the holes while there is room for lane and circles, else in the columns that everything hangs in. */
function circleColumns({ columns, measures }: BenchGeometry): BenchColumn[] {
  const holes = columns.filter(({ key }) => key !== 'foot');
  const fits =
    (holes[0]?.holeX ?? 0) >= measures.columnsFromWithoutLadder &&
    holes.slice(1).every(({ holeX }, index) => holeX - (holes[index]?.holeX ?? 0) >= LEAST_CIRCLE_GAP);
  return fits ? holes.map((column) => ({ ...column, x: column.holeX })) : holes;
}

function noteLane(left: number, right: number): NoteLane {
  const zeroX = (left + right) / 2;
  const half = Math.max(20, (right - left) / 2 - 1);
  const heldAtCents = Math.min(HELD_AT_CENTS, half / 1.2);
  const scale = scaleLinear([-heldAtCents, heldAtCents], [zeroX - half, zeroX + half]);
  const pxPerCent = Math.min(PX_PER_CENT, half / heldAtCents);
  return {
    left,
    right,
    zeroX,
    heldAtCents,
    x: (cents) => scale(Math.max(-heldAtCents, Math.min(heldAtCents, cents))),
    ticks: pxPerCent > 3.4 ? [-20, -10, 0, 10, 20] : heldAtCents > 15 ? [-15, 0, 15] : [0],
  };
}
