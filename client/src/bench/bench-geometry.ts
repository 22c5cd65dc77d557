import { scaleLinear } from 'd3';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';
import { LAYOUTS, layoutOf, type BenchLayout, type BenchMeasures } from './bench-layout.ts';
import { drawnBody, type DrawnBody } from './drawn-body.ts';
import { spreadColumns } from './spread-columns.ts';

export interface BenchColumn {
  /** Hole id, or `foot`. */
  key: string;
  /** Where the hole is on the instrument, px. */
  holeX: number;
  /** Where its column hangs, px. */
  x: number;
}

/** What of the instrument is in view: everything, the finger holes, or a zoomed stretch. */
export type BenchView =
  { kind: 'whole' } | { kind: 'holes' } | { kind: 'stretch'; zoom: number; middleMm: number };

/** The one mapping that plan, section, rule, columns and tables share; px count from the bench's left edge. */
export interface BenchGeometry {
  layout: BenchLayout;
  measures: BenchMeasures;
  widthPx: number;
  body: DrawnBody;
  pxPerMm: number;
  /** The same as `pxPerMm` where the drawing is true to scale; less where a long zoom would outgrow the strip. */
  acrossPxPerMm: number;
  /** Where the instrument would stand at no zoom, px. */
  fitPxPerMm: number;
  x: (positionMm: number) => number;
  mm: (x: number) => number;
  /** Edges of what can be seen of the instrument, px. */
  viewLeft: number;
  viewRight: number;
  headHidden: boolean;
  columns: readonly BenchColumn[];
  /** Distance of the two nearest columns, px: tells whether labels stand in one line or two. */
  columnSpacing: number;
  /** Right edge of the row labels, px. */
  labelRight: number;
  hangLeft: number;
  hangRight: number;
  /** True when the columns leave room for the ladder beside the inspector. */
  ladderFits: boolean;
}

/** More columns than this need the room of the ladder. */
const COLUMNS_BESIDE_LADDER = 10;

interface Mapping {
  pxPerMm: number;
  fitPxPerMm: number;
  x: BenchGeometry['x'];
  mm: BenchGeometry['mm'];
}

export function benchGeometry(document: DesignDocument, widthPx: number, view: BenchView): BenchGeometry {
  const layout = layoutOf(widthPx);
  const measures = LAYOUTS[layout];
  const body = drawnBody(document);
  const viewLeft = measures.marginLeft;
  const viewRight = widthPx - measures.marginRight;
  const mapping = mapLength({ document, body, view, measures, viewLeft, viewRight });
  const ladderFits = measures.ladder && document.holes.length + 1 <= COLUMNS_BESIDE_LADDER;
  const hangRight = widthPx - measures.hangInset;
  const hung = columnsOf(document, mapping.x, {
    left: ladderFits ? measures.columnsFrom : measures.columnsFromWithoutLadder,
    right: hangRight - measures.columnReach,
    spacing: measures.spacing,
    viewLeft,
    viewRight,
  });
  const firstX = hung[0]?.x ?? measures.columnsFrom;
  return {
    layout,
    measures,
    widthPx,
    body,
    ...mapping,
    acrossPxPerMm: Math.min(mapping.pxPerMm, measures.tubePx / body.widestMm),
    viewLeft,
    viewRight,
    headHidden: mapping.x(body.headMm) < viewLeft - 1,
    columns: hung,
    columnSpacing: leastGap(hung, measures.spacing),
    labelRight: firstX - measures.labelGap,
    hangLeft: firstX - measures.columnReach,
    hangRight,
    ladderFits,
  };
}

interface LengthRequest {
  document: DesignDocument;
  body: DrawnBody;
  view: BenchView;
  measures: BenchMeasures;
  viewLeft: number;
  viewRight: number;
}

function mapLength({ document, body, view, measures, viewLeft, viewRight }: LengthRequest): Mapping {
  const room = Math.max(1, viewRight - viewLeft);
  const fitPxPerMm = Math.min(
    measures.mostPxPerMm,
    room / (body.footMm - body.headMm),
    measures.tubePx / body.widestMm,
  );
  const seen = seenLength({ document, body, view, roomMm: room / fitPxPerMm });
  const pxPerMm = seen === null ? fitPxPerMm : room / (seen.toMm - seen.fromMm);
  // Whole instruments that do not fill the bench stand at its right: the foot is where the columns end.
  const scale =
    seen === null
      ? scaleLinear([body.footMm - room / fitPxPerMm, body.footMm], [viewRight - room, viewRight])
      : scaleLinear([seen.fromMm, seen.toMm], [viewLeft, viewRight]);
  return { pxPerMm, fitPxPerMm, x: (mm) => scale(mm), mm: (x) => scale.invert(x) };
}

interface SeenRequest {
  document: DesignDocument;
  body: DrawnBody;
  view: BenchView;
  roomMm: number;
}

function seenLength({ document, body, view, roomMm }: SeenRequest): { fromMm: number; toMm: number } | null {
  if (view.kind === 'whole') return null;
  if (view.kind === 'holes') {
    const first = document.holes.reduce((least, hole) => Math.min(least, hole.positionMm), Infinity);
    if (!Number.isFinite(first)) return null;
    const fromMm = Math.max(body.headMm, first - 0.06 * (body.footMm - first) - body.widestMm / 2);
    return { fromMm, toMm: body.footMm };
  }
  if (view.zoom <= 1) return null;
  const lengthMm = roomMm / view.zoom;
  const least = Math.min(body.headMm, body.footMm - lengthMm);
  const fromMm = Math.max(least, Math.min(body.footMm - lengthMm, view.middleMm - lengthMm / 2));
  return { fromMm, toMm: fromMm + lengthMm };
}

interface ColumnRoom {
  left: number;
  right: number;
  spacing: number;
  viewLeft: number;
  viewRight: number;
}

function columnsOf(document: DesignDocument, x: (mm: number) => number, room: ColumnRoom): BenchColumn[] {
  const places = document.holes
    .map((hole) => ({ key: hole.id, holeX: x(hole.positionMm) }))
    .concat({ key: 'foot', holeX: x(boreEnds(document).footMm) })
    .filter(({ holeX }) => holeX >= room.viewLeft - 0.5 && holeX <= room.viewRight + 0.5)
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
