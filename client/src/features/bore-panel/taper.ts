import type { Station } from '#shared/document/design-document.ts';
import { printLength } from '#shared/lengths/print-length.ts';
import type { LengthUnit } from '#shared/lengths/read-length.ts';

/** Slower tapers than this are straight to any reamer, 1 in n. */
const STRAIGHT_FROM = 5000;

/** A span as a reamer sees it: `straight, 90.0`, `1 in 210, 42.0`, `step to 12.5`. */
export function taperWords(from: Station, to: Station, unit: LengthUnit): string {
  const lengthMm = to.positionMm - from.positionMm;
  if (lengthMm <= 0) return `step to ${printLength(to.diameterMm, unit)}`;
  return `${taperRate(from, to)}, ${printLength(lengthMm, unit)}`;
}

/** `straight` or `1 in 210`: length to the change of the diameter over it; `opening` where it widens footward. */
export function taperRate(from: Station, to: Station): string {
  const change = to.diameterMm - from.diameterMm;
  const oneIn = Math.abs((to.positionMm - from.positionMm) / change);
  if (!(oneIn < STRAIGHT_FROM)) return 'straight';
  const figure = oneIn < 20 ? oneIn.toFixed(1) : oneIn.toFixed(0);
  return `1 in ${figure}${change > 0 ? ' opening' : ''}`;
}
