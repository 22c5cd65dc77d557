import { drawMouthOpening } from './mouth-opening-drawing.ts';
import { drawNotApprovedInside } from './not-approved.ts';
import type { Point } from './pen.ts';
import { drawReferenceBar } from './reference-bar.ts';
import { drawJoinLine, drawRegistrationMark } from './registration-marks.ts';
import type { SheetContext } from './sheet-context.ts';
import { spanInWords } from './sheet-lengths.ts';
import { benchReading, frameTicks, halfHeights } from './template-frame.ts';
import { halfRoundMm, seamEdge } from './template-geometry.ts';
import { CUT_LINE, FOLD_LINE, HAIR_LINE, SMALL_WORDS } from './template-lines.ts';
import { drawWrapHoles } from './wrap-holes.ts';
import { bandBox, type WrapPlace } from './wrap-place.ts';

/** Registration marks stand this far outside the seam edges. */
export const MARK_OUTSIDE_MM = 5;

/** The outside unrolled at full scale: seam edges above and below, the centre line between, holes as they fall. */
export function drawWrapAround(context: SheetContext, place: WrapPlace): void {
  const { pen } = context;
  const box = bandBox(place);
  drawNotApprovedInside(pen, wordsBox(context, place));
  pen.clipped([box.at[0] - 4, box.at[1] - 1], box.widthMm + 8, box.heightMm + 2, () => {
    drawOutline(context, place);
    drawFolds(context, place);
    drawMouthOpening(context, place);
  });
  drawSeamScales(context, place);
  drawWrapHoles(context, place);
  drawJoins(context, place);
  const { at, heightMm } = box;
  drawReferenceBar(context, place.frame, { topMm: at[1], bottomMm: at[1] + heightMm });
}

/** What surely lies inside the outline, also where the body is thinnest. */
function wordsBox({ input }: SheetContext, { frame, band, centreY }: WrapPlace) {
  const { leastMm } = halfHeights(input.document, frame);
  const [high, low] = [Math.min(band.highMm, leastMm), Math.max(band.lowMm, -leastMm)];
  return {
    at: [frame.pageX(frame.alongFromMm), centreY - high] as const,
    widthMm: frame.alongToMm - frame.alongFromMm,
    heightMm: high - low,
  };
}

function drawOutline({ pen, input }: SheetContext, { frame, band, centreY }: WrapPlace): void {
  const edge = seamEdge(input.document, { fromMm: frame.alongFromMm, toMm: frame.alongToMm });
  const upper = edge.map(({ alongMm, halfMm }): Point => {
    return [frame.pageX(alongMm), centreY - Math.min(halfMm, band.highMm)];
  });
  const lower = edge.map(({ alongMm, halfMm }): Point => {
    return [frame.pageX(alongMm), centreY + Math.min(halfMm, -band.lowMm)];
  });
  pen.polygon([...upper, ...lower.reverse()], CUT_LINE);
  if (band.lowMm <= 0 && band.highMm >= 0) {
    const [x1, x2] = [frame.pageX(frame.alongFromMm) - 3, frame.pageX(frame.alongToMm) + 3];
    pen.centreLine([x1, centreY], [x2, centreY]);
  }
}

/** Where the taper changes the paper bends. */
function drawFolds({ pen, input }: SheetContext, { frame, centreY }: WrapPlace): void {
  const { stations } = input.document.outside;
  const inside = stations
    .slice(1, -1)
    .filter(({ positionMm }) => positionMm > frame.alongFromMm && positionMm < frame.alongToMm);
  for (const { positionMm } of inside) {
    const half = halfRoundMm(input.document, positionMm);
    const x = frame.pageX(positionMm);
    pen.line([x, centreY - half], [x, centreY + half], FOLD_LINE);
  }
}

/** The same ticks on both seams, so that they can be matched underneath. */
function drawSeamScales(context: SheetContext, { frame, band, centreY }: WrapPlace): void {
  const { pen, input } = context;
  const ticks = frameTicks(context, frame).map((tick) => ({
    ...tick,
    halfMm: halfRoundMm(input.document, tick.alongMm),
  }));
  const isInBand = (mm: number) => mm <= band.highMm + 1e-6 && mm >= band.lowMm - 1e-6;
  for (const side of [1, -1]) {
    const shown = ticks.filter(({ halfMm }) => isInBand(side * halfMm));
    if (shown.length === 0) continue;
    pen.stroke(HAIR_LINE, (path) => {
      for (const { x, halfMm, length } of shown) {
        const y = centreY - side * halfMm;
        path.moveTo(x, y).lineTo(x, y + side * 2.6 * length);
      }
    });
  }
  const [left, right] = [frame.pageX(frame.alongFromMm) + 3, frame.pageX(frame.alongToMm) - 3];
  for (const { x, alongMm, halfMm, figure } of ticks) {
    const isAtStep = Math.abs(halfRoundMm(input.document, alongMm - 3) - halfMm) > 1;
    if (figure === '' || x < left || x > right || !isInBand(halfMm) || isAtStep) continue;
    pen.text(figure, [x, centreY - halfMm + 5.6], { ...SMALL_WORDS, align: 'centre' });
  }
}

/** Join lines end at the seams; their ring marks stand as far outside the seams on either page. */
function drawJoins(context: SheetContext, { frame, band, centreY }: WrapPlace): void {
  const { pen, input, writing } = context;
  const reading = benchReading(context);
  for (const { alongMm } of frame.joins) {
    const half = halfRoundMm(input.document, alongMm);
    const x = frame.pageX(alongMm);
    const top = centreY - Math.min(half, band.highMm);
    const bottom = centreY + Math.min(half, -band.lowMm);
    drawJoinLine(pen, [x, top], [x, bottom]);
    drawRegistrationMark(pen, [x, top - MARK_OUTSIDE_MM]);
    drawRegistrationMark(pen, [x, bottom + MARK_OUTSIDE_MM]);
    const isLeft = x < frame.pageX((frame.alongFromMm + frame.alongToMm) / 2);
    const words = `join ${spanInWords(reading(alongMm), writing)}`;
    const at = isLeft ? x + 1.2 : x - 1.2;
    pen.text(words, [at, bottom - 4], { ...SMALL_WORDS, align: isLeft ? 'left' : 'right' });
  }
  for (const roundMm of band.joinsMm) {
    const y = centreY - roundMm;
    const [x1, x2] = [frame.pageX(frame.alongFromMm), frame.pageX(frame.alongToMm)];
    drawJoinLine(pen, [x1, y], [x2, y]);
    drawRegistrationMark(pen, [x1 - MARK_OUTSIDE_MM, y]);
    drawRegistrationMark(pen, [x2 + MARK_OUTSIDE_MM, y]);
  }
}
