import type { SheetContext } from './sheet-context.ts';
import { lengthInWords } from './sheet-lengths.ts';
import { benchReading } from './template-frame.ts';
import { embouchureCurve, windowCorners } from './template-geometry.ts';
import { OPENING_LINE, SMALL_WORDS, WORDS } from './template-lines.ts';
import { onPage, traceCurve, type WrapPlace } from './wrap-place.ts';

/** The opening at the mouth end, drawn thin: it is cut before the holes are. */
export function drawMouthOpening(context: SheetContext, place: WrapPlace): void {
  const { pen, input, writing } = context;
  const { document } = input;
  const { mouthEnd } = document;
  const { frame, centreY } = place;
  if (0 < frame.alongFromMm || 0 > frame.alongToMm) return;
  const reading = benchReading(context);
  const label = (what: string, halfMm: number) => {
    pen.text(what, [frame.pageX(0), centreY - halfMm - 2], { ...WORDS, align: 'centre' });
    const lip = mouthEnd.kind === 'window' ? 'lip' : 'centre';
    const words = `${lip} ${lengthInWords(reading(0), writing)}`;
    pen.text(words, [frame.pageX(0), centreY + halfMm + 4.4], { ...SMALL_WORDS, align: 'centre' });
  };
  if (mouthEnd.kind === 'window') {
    const corners = windowCorners(document, mouthEnd);
    pen.polygon(corners.map(onPage(place)), OPENING_LINE);
    label('window', Math.abs(corners[0]?.roundMm ?? 0));
  }
  if (mouthEnd.kind === 'embouchure') {
    const curve = embouchureCurve(document, mouthEnd);
    pen.stroke(OPENING_LINE, (path) => traceCurve(path, curve, place));
    label('embouchure', curve.at(0.25).roundMm);
  }
}
