import { boreEnds } from '#shared/document/profile.ts';
import { bodyEnds, numberedHoles, referenceName } from './bench-position.ts';
import type { FlowSection } from './flow.ts';
import { MARGIN_MM } from './paper.ts';
import { HAIRLINE_MM, type Pen, type Point } from './pen.ts';
import { contentWidthMm, type SheetContext } from './sheet-context.ts';
import { diameterInWords, lengthInWords } from './sheet-lengths.ts';
import { tagged } from './tagging.ts';
import { benchReading } from './template-frame.ts';
import { outsideRadiusMm, seamEdge, turnedAngle } from './template-geometry.ts';

const HEIGHT_MM = 33;

/** Room for one figure in a row of them. */
const FIGURE_MM = 9.4;

const MIDDLE_MM = 12.5;
const NUMBERS_MM = 4;
const POSITIONS_MM = 22.6;
const BODY_LINE = { widthMm: 0.27 };
const LEADER = { widthMm: HAIRLINE_MM };
const SMALL = { size: 8 } as const;

/** Thickest half of the body as it is drawn; the length decides unless the body is stout. */
const MOST_HALF_MM = 6;

interface OutlineScale {
  x: (alongMm: number) => number;
  /** mm on paper for one of the body, across it. */
  across: number;
}

/** The instrument on one line, not to scale: holes numbered from the mouth end, positions under them. */
export function outlineSection(context: SheetContext): FlowSection {
  const alt = outlineWords(context);
  return {
    gapMm: 0,
    head: {
      heightMm: HEIGHT_MM,
      draw: (topMm) =>
        tagged(context.pen, context.root, { type: 'Figure', tag: { alt } }, () =>
          drawOutline(context, topMm),
        ),
    },
    blocks: [],
  };
}

function outlineWords({ input }: SheetContext): string {
  const count = input.document.holes.length;
  return `Outline of the instrument, not to scale, with ${count === 1 ? '1 hole' : `${count} holes`}.`;
}

function outlineScale(context: SheetContext): OutlineScale {
  const { document } = context.input;
  const { fromMm, toMm } = bodyEnds(document);
  const widthMm = contentWidthMm(context) - 14;
  const along = widthMm / (toMm - fromMm);
  const thickest = Math.max(...document.outside.stations.map((station) => station.diameterMm / 2));
  return {
    x: (alongMm) => MARGIN_MM + 4 + (alongMm - fromMm) * along,
    across: Math.min(along, MOST_HALF_MM / thickest),
  };
}

function drawOutline(context: SheetContext, topMm: number): void {
  const scale = outlineScale(context);
  const middleY = topMm + MIDDLE_MM;
  drawBody(context, scale, middleY);
  drawMouth(context, scale, middleY);
  drawHoles(context, scale, topMm);
  drawEnds(context, scale, topMm);
}

function drawBody(context: SheetContext, scale: OutlineScale, middleY: number): void {
  const { pen, input } = context;
  const { fromMm, toMm } = bodyEnds(input.document);
  const edge = seamEdge(input.document, { fromMm, toMm }).map(({ alongMm, halfMm }): [number, number] => [
    scale.x(alongMm),
    (halfMm / Math.PI) * scale.across,
  ]);
  const upper = edge.map(([x, half]): [number, number] => [x, middleY - half]);
  const lower = edge.map(([x, half]): [number, number] => [x, middleY + half]).reverse();
  pen.pdf
    .save()
    .polygon(...upper, ...lower)
    .fill('#ffffff')
    .restore();
  pen.polygon([...upper, ...lower], BODY_LINE);
  pen.centreLine([scale.x(fromMm) - 2, middleY], [scale.x(toMm) + 3, middleY]);
  writeBore(context, scale, middleY);
}

/** The bore's diameter, in the longest stretch without a hole. */
function writeBore({ pen, input, writing }: SheetContext, scale: OutlineScale, middleY: number): void {
  const { document } = input;
  const { fromMm, toMm } = bodyEnds(document);
  const places = [fromMm, 0, ...numberedHoles(document).map(({ hole }) => hole.positionMm), toMm].sort(
    (a, b) => a - b,
  );
  const gaps = places.slice(1).map((to, index) => ({ from: places[index] ?? to, to }));
  const widest = gaps.reduce((best, gap) => (gap.to - gap.from > best.to - best.from ? gap : best));
  const diameters = document.bore.stations.map((station) => station.diameterMm);
  const [first = 0, last = 0] = [diameters[0], diameters.at(-1)];
  const isStraight = Math.max(...diameters) - Math.min(...diameters) < 0.005;
  const words = isStraight
    ? `bore ${diameterInWords(first, writing)}`
    : `bore ${diameterInWords(first, writing)} to ${diameterInWords(last, writing)}`;
  const x = scale.x((widest.from + widest.to) / 2);
  const widthMm = pen.textWidthMm(words, SMALL);
  pen.fillRect([x - widthMm / 2 - 1, middleY - 1.6], widthMm + 2, 3.2, '#ffffff');
  pen.text(words, [x, middleY + 1], { ...SMALL, align: 'centre' });
}

function drawMouth({ pen, input }: SheetContext, scale: OutlineScale, middleY: number): void {
  const { mouthEnd } = input.document;
  if (mouthEnd.kind === 'window') {
    const halfMm = (mouthEnd.widthMm / 2) * scale.across;
    const left = scale.x(-mouthEnd.lengthMm);
    pen.fillRect([left, middleY - halfMm], scale.x(0) - left, 2 * halfMm);
  }
  if (mouthEnd.kind === 'embouchure') {
    const rx = scale.x(mouthEnd.lengthMm / 2) - scale.x(0);
    pen.pdf
      .save()
      .ellipse(scale.x(0), middleY, rx, (mouthEnd.widthMm / 2) * scale.across)
      .fill('#000000')
      .restore();
  }
}

function drawHoles(context: SheetContext, scale: OutlineScale, topMm: number): void {
  const { pen, input, writing } = context;
  const { document } = input;
  const reading = benchReading(context);
  const holes = numberedHoles(document).map((entry) => ({ ...entry, x: scale.x(entry.hole.positionMm) }));
  const xs = holes.map(({ x }) => x);
  const ends = { fromMm: MARGIN_MM, toMm: pen.paper.widthMm - MARGIN_MM };
  const numberXs = spreadOut(xs, { ...ends, roomMm: 5.4 });
  const figures = positionPlaces(xs, ends);
  const middleY = topMm + MIDDLE_MM;
  holes.forEach(({ hole, label, x }, index) => {
    const angle = (turnedAngle(hole.angleDeg) * Math.PI) / 180;
    const y = middleY - (outsideRadiusMm(document, hole.positionMm) * scale.across * Math.sin(angle)) / 1.2;
    const radiusMm = (hole.diameterMm / 2) * scale.across;
    const isBehind = Math.abs(angle) > Math.PI / 2;
    if (isBehind) pen.circle([x, y], radiusMm, { widthMm: 0.2, dashMm: [0.6, 0.5] });
    else pen.fillCircle([x, y], radiusMm);
    const numberX = numberXs[index] ?? x;
    pen.text(label, [numberX, topMm + NUMBERS_MM], { size: 10, weight: 700, align: 'centre' });
    const figure = figures[index] ?? { x, lowerMm: 0 };
    const figureY = topMm + POSITIONS_MM + figure.lowerMm;
    const from: Point = [x, Math.max(y + radiusMm, middleY) + 1.4];
    pen.stroke(LEADER, (path) =>
      path
        .moveTo(...from)
        .lineTo(x, topMm + POSITIONS_MM - 5.4)
        .lineTo(figure.x, figureY - 2.6),
    );
    const position = lengthInWords(reading(hole.positionMm), { ...writing, besides: 'nothing' });
    pen.text(position, [figure.x, figureY], { size: 8.8, align: 'centre' });
  });
}

/** The mouth's edge and the foot, one of which is what everything is measured from. */
function drawEnds(context: SheetContext, scale: OutlineScale, topMm: number): void {
  const { pen, input, writing } = context;
  const { document, workshop } = input;
  const reading = benchReading(context);
  const isFoot = workshop.referenceEnd === 'foot';
  const { footMm } = boreEnds(document);
  const ends = [
    { alongMm: 0, name: MOUTH_WORDS[document.mouthEnd.kind] },
    { alongMm: footMm, name: 'foot' },
  ];
  // Ends stand on a line of their own: the positions of crowded holes may reach under them.
  const y = topMm + POSITIONS_MM + 7;
  for (const { alongMm, name } of ends) {
    const x = scale.x(alongMm);
    pen.line([x, topMm + MIDDLE_MM + 1.4], [x, y - 3], LEADER);
    const length = lengthInWords(Math.abs(reading(alongMm)), { ...writing, besides: 'nothing' });
    const isReference = (name === 'foot') === isFoot;
    const words = isReference
      ? `0, ${referenceName(document, workshop.referenceEnd)}, reference end`
      : `${length} ${name}`;
    const { align, at } = besideEdge(pen, words, x);
    pen.text(words, [at, y], { size: 8.8, align });
  }
}

const MOUTH_WORDS = {
  window: 'lip',
  embouchure: 'embouchure',
  rim: 'rim',
  reed: 'reed seat',
  'ideal-open': 'mouth end',
  'ideal-closed': 'mouth end',
} as const;

/** Words stand in the middle of their line unless they would run over the margin. */
function besideEdge(pen: Pen, words: string, x: number): { align: 'left' | 'centre' | 'right'; at: number } {
  const half = pen.textWidthMm(words, { size: 8.8 }) / 2;
  const right = pen.paper.widthMm - MARGIN_MM;
  if (x + half > right) return { align: 'right', at: right };
  if (x - half < MARGIN_MM) return { align: 'left', at: MARGIN_MM };
  return { align: 'centre', at: x };
}

/** Moves places in a row apart until each has its room, as little as can be, and keeps them between two ends. */
export function spreadOut(
  places: readonly number[],
  { roomMm, fromMm, toMm }: { roomMm: number; fromMm: number; toMm: number },
): number[] {
  const groups: { sum: number; count: number }[] = [];
  const start = ({ sum, count }: { sum: number; count: number }) => {
    const spanMm = (count - 1) * roomMm;
    const free = sum / count - spanMm / 2;
    return Math.max(fromMm + roomMm / 2, Math.min(free, toMm - roomMm / 2 - spanMm));
  };
  for (const place of places) {
    let group = { sum: place, count: 1 };
    let before = groups.at(-1);
    // Neighbours that would touch stand in one row about the middle of their places.
    while (before !== undefined && start(before) + before.count * roomMm > start(group)) {
      group = { sum: before.sum + group.sum, count: before.count + group.count };
      groups.pop();
      before = groups.at(-1);
    }
    groups.push(group);
  }
  return groups.flatMap((group) =>
    Array.from({ length: group.count }, (_, index) => start(group) + index * roomMm),
  );
}

/** Figures under a crowd of holes stand in two rows, every other one lower. */
function positionPlaces(xs: readonly number[], ends: { fromMm: number; toMm: number }) {
  const rows = xs.length * FIGURE_MM > ends.toMm - ends.fromMm - 20 ? 2 : 1;
  const spread = [0, 1].map((row) =>
    spreadOut(
      xs.filter((_, index) => index % rows === row),
      { ...ends, roomMm: FIGURE_MM },
    ),
  );
  return xs.map((x, index) => ({
    x: spread[index % rows]?.[Math.floor(index / rows)] ?? x,
    lowerMm: (index % rows) * 3.3,
  }));
}
