import type { Station } from '#shared/document/design-document.ts';
import { widthScale, type WidthScale } from '../../bench/width-scale.ts';

/** Heights on the shelf, px from its top; widths of the bore are drawn between `wideY` and `narrowY`. */
export const SHELF = {
  height: 232,
  woodY: 22,
  wideY: 52,
  narrowY: 98,
  mostPxPerMm: 228,
  taperY: 136,
  curveY: 188,
  curveReach: 26,
} as const;

export function shelfScale(stations: readonly Station[]): WidthScale {
  return widthScale(
    stations.map(({ diameterMm }) => diameterMm),
    SHELF,
  );
}
