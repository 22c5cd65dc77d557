import { numberedHoles } from './bench-position.ts';
import { drawNotApprovedInside } from './not-approved.ts';
import { drawReferenceBar } from './reference-bar.ts';
import { drawJoinLine, drawRegistrationMark } from './registration-marks.ts';
import type { SheetContext } from './sheet-context.ts';
import { formatAngle } from './hole-table.ts';
import { frameTicks, type TemplateFrame } from './template-frame.ts';
import { turnedAngle } from './template-geometry.ts';
import { CUT_LINE, FINAL_LINE, HAIR_LINE, SMALL_WORDS } from './template-lines.ts';
import { MARK_OUTSIDE_MM } from './wrap-around-template.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';

const STRIP_MM = 22;

/** Wide enough for the widest hole with paper on either side. */
export function stripHeightMm(document: DesignDocument): number {
  return Math.max(STRIP_MM, ...document.holes.map((hole) => hole.diameterMm + 6));
}

interface StripPlace {
  frame: TemplateFrame;
  topMm: number;
}

/**
 * A strip for a square blank or for a centre line that is scribed already.
 *
 * It carries circles of the holes on the centre line alone. Holes elsewhere round the body are named at their
 * distance, without a circle: nobody shall drill the thumb hole through the front.
 */
export function drawStrip(context: SheetContext, place: StripPlace): void {
  const { pen, input } = context;
  const { frame, topMm } = place;
  const heightMm = stripHeightMm(input.document);
  const [x1, x2] = [frame.pageX(frame.alongFromMm), frame.pageX(frame.alongToMm)];
  const middle = topMm + heightMm / 2;
  drawNotApprovedInside(pen, { at: [x1, topMm], widthMm: x2 - x1, heightMm });
  pen.strokeRect([x1, topMm], x2 - x1, heightMm, CUT_LINE);
  pen.centreLine([x1 - 3, middle], [x2 + 3, middle]);
  drawScale(context, place);
  drawStripHoles(context, place);
  drawStripJoins(context, place);
  drawReferenceBar(context, frame, { topMm, bottomMm: topMm + heightMm, isNamed: false });
}

function drawScale(context: SheetContext, { frame, topMm }: StripPlace): void {
  const bottom = topMm + stripHeightMm(context.input.document);
  context.pen.stroke(HAIR_LINE, (path) =>
    frameTicks(context, frame).forEach(({ x, length }) =>
      path.moveTo(x, bottom).lineTo(x, bottom - 2.4 * length),
    ),
  );
}

function drawStripHoles({ pen, input }: SheetContext, { frame, topMm }: StripPlace): void {
  const { document } = input;
  const heightMm = stripHeightMm(document);
  const middle = topMm + heightMm / 2;
  for (const { hole, label } of numberedHoles(document)) {
    if (hole.positionMm < frame.alongFromMm || hole.positionMm > frame.alongToMm) continue;
    const x = frame.pageX(hole.positionMm);
    const isOnLine = turnedAngle(hole.angleDeg) === 0;
    const numberStyle = { size: 10, weight: 700 } as const;
    pen.line([x, topMm], [x, topMm + heightMm], HAIR_LINE);
    pen.text(label, [x + 0.8, topMm + 3.4], numberStyle);
    if (!isOnLine) {
      const words = `at ${formatAngle(hole.angleDeg)}°`;
      pen.text(words, [x + 0.8, topMm + 6.8], SMALL_WORDS);
      continue;
    }
    pen.circle([x, middle], hole.diameterMm / 2, FINAL_LINE);
    const reach = hole.diameterMm / 2 + 2;
    pen.line([x - reach, middle], [x + reach, middle], HAIR_LINE);
  }
}

function drawStripJoins({ pen, input }: SheetContext, { frame, topMm }: StripPlace): void {
  const bottom = topMm + stripHeightMm(input.document);
  for (const { alongMm } of frame.joins) {
    const x = frame.pageX(alongMm);
    drawJoinLine(pen, [x, topMm], [x, bottom]);
    drawRegistrationMark(pen, [x, topMm - MARK_OUTSIDE_MM]);
    drawRegistrationMark(pen, [x, bottom + MARK_OUTSIDE_MM]);
  }
}
