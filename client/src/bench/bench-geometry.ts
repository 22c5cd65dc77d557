import { scaleLinear } from 'd3';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { LAYOUTS, layoutOf, type BenchLayout, type BenchMeasures } from './bench-layout.ts';
import type { BenchView } from './bench-view.ts';
import type { DrawnBody } from './drawn-body.ts';
import { spreadColumns } from './spread-columns.ts';

/** The one mapping that plan, section, rule, columns and tables share; px count from the bench's left edge. */
export interface BenchFrame {
  layout: BenchLayout;
  measures: BenchMeasures;
  widthPx: number;
  body: DrawnBody;
  pxPerMm: number;
  /** The same as `pxPerMm` where the drawing is true to scale; less where a long zoom would outgrow the strip. */
  acrossPxPerMm: number;
  /** Scale of the whole instrument at no zoom. */
  fitPxPerMm: number;
  x: (positionMm: number) => number;
  mm: (x: number) => number;
  /** Edges of what can be seen of the instrument, px. */
  viewLeft: number;
  viewRight: number;
  /** The head lies outside the view: it is drawn broken off. */
  headHidden: boolean;
}

export interface BenchColumn {
  /** Hole id, or `foot`. */
  key: string;
  /** Where the hole is on the instrument, px. */
  holeX: number;
  /** Where its column hangs, px. */
  x: number;
}

export interface BenchGeometry extends BenchFrame {
  frame: BenchFrame;
  columns: readonly BenchColumn[];
  /** Distance of the two nearest columns, px: tells whether labels stand in one line or two. */
  columnSpacing: number;
  /** Right edge of the row labels, px. */
  labelRight: number;
  hangLeft: number;
  hangRight: number;
  /** Holes left of this stand over row labels or the left zone: their leaders run along the strip. */
  lanesLeft: number;
  /** True when the columns leave room for the ladder beside the inspector. */
  ladderFits: boolean;
}

/** More columns than this need the room of the ladder. */
const COLUMNS_BESIDE_LADDER = 10;

export function benchFrame(body: DrawnBody, widthPx: number, view: BenchView): BenchFrame {
  const layout = layoutOf(widthPx);
  const measures = LAYOUTS[layout];
  const viewLeft = measures.marginLeft;
  const viewRight = Math.max(viewLeft + 1, widthPx - measures.marginRight);
  const room = viewRight - viewLeft;
  const fitPxPerMm = Math.min(
    measures.mostPxPerMm,
    room / (body.footMm - body.headMm),
    measures.tubePx / body.widestMm,
  );
  // A whole instrument that does not fill the bench stands at its right: the foot is where the columns end.
  const seen = view.kind === 'whole' ? { fromMm: body.footMm - room / fitPxPerMm, toMm: body.footMm } : view;
  const scale = scaleLinear([seen.fromMm, seen.toMm], [viewLeft, viewRight]);
  const pxPerMm = room / (seen.toMm - seen.fromMm);
  return {
    layout,
    measures,
    widthPx,
    body,
    pxPerMm,
    acrossPxPerMm: Math.min(pxPerMm, measures.tubePx / body.widestMm),
    fitPxPerMm,
    x: (mm) => scale(mm),
    mm: (x) => scale.invert(x),
    viewLeft,
    viewRight,
    headHidden: scale(body.headMm) < viewLeft - 1,
  };
}

export function benchGeometry(document: DesignDocument, frame: BenchFrame): BenchGeometry {
  const { measures, widthPx } = frame;
  const ladderFits = measures.ladder && document.holes.length + 1 <= COLUMNS_BESIDE_LADDER;
  const hangRight = widthPx - measures.hangInset;
  const columns = columnsOf(document, frame, {
    left: ladderFits ? measures.columnsFrom : measures.columnsFromWithoutLadder,
    right: hangRight - measures.columnReach,
    spacing: measures.spacing,
  });
  const firstX = columns[0]?.x ?? measures.columnsFrom;
  return {
    ...frame,
    frame,
    columns,
    columnSpacing: leastGap(columns, measures.spacing),
    labelRight: firstX - measures.labelGap,
    hangLeft: firstX - measures.columnReach,
    lanesLeft: Math.min(firstX - measures.columnReach, firstX - measures.labelGap + LABEL_CLEARANCE_PX),
    hangRight,
    ladderFits,
  };
}

/** From the row labels to the edge of a fingering circle's place, px. */
const LABEL_CLEARANCE_PX = 16;

interface ColumnRoom {
  left: number;
  right: number;
  spacing: number;
}

function columnsOf(document: DesignDocument, frame: BenchFrame, room: ColumnRoom): BenchColumn[] {
  const places = document.holes
    .map((hole) => ({ key: hole.id, holeX: frame.x(hole.positionMm) }))
    .concat({ key: 'foot', holeX: frame.x(boreEnds(document).footMm) })
    .filter(({ holeX }) => holeX >= frame.viewLeft - 0.5 && holeX <= frame.viewRight + 0.5)
    .sort((a, b) => a.holeX - b.holeX);
  const spread = spreadColumns(
    places.map((place) => place.holeX),
    room,
  );
  return places.map((place, index) => ({ ...place, x: spread[index] ?? place.holeX }));
}

function leastGap(columns: readonly BenchColumn[], whenAlone: number): number {
  return columns.slice(1).reduce((least, column, index) => {
    const before = columns[index];
    return before === undefined ? least : Math.min(least, column.x - before.x);
  }, whenAlone * 2);
}

/** The column of a hole or the foot, or undefined where it lies outside the view. */
export function columnOf(geometry: BenchGeometry, key: string | null): BenchColumn | undefined {
  return geometry.columns.find((column) => column.key === key);
}
