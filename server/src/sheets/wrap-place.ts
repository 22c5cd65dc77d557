import type { RoundBand, TemplateFrame } from './template-frame.ts';
import { curvePieces, type WrapCurve, type WrapPoint } from './template-geometry.ts';

/** Where a part of the wrap-around stands on a page. */
export interface WrapPlace {
  frame: TemplateFrame;
  band: RoundBand;
  /** The centre line, mm down the page, also when the band is a part that does not hold it. */
  centreY: number;
}

/** Puts points of the wrapped paper on the page: positive angles lie above the centre line. */
export function onPage({ frame, centreY }: WrapPlace) {
  return ({ alongMm, roundMm }: WrapPoint): [number, number] => [frame.pageX(alongMm), centreY - roundMm];
}

export function bandBox({ frame, band, centreY }: WrapPlace) {
  return {
    at: [frame.pageX(frame.alongFromMm), centreY - band.highMm] as const,
    widthMm: frame.alongToMm - frame.alongFromMm,
    heightMm: band.highMm - band.lowMm,
  };
}

export function traceCurve(path: PDFKit.PDFDocument, curve: WrapCurve, place: WrapPlace): void {
  const page = onPage(place);
  const pieces = curvePieces(curve);
  const [first] = pieces;
  if (first === undefined) return;
  path.moveTo(...page(first.start));
  for (const { controls, end } of pieces) {
    path.bezierCurveTo(...page(controls[0]), ...page(controls[1]), ...page(end));
  }
  path.closePath();
}
