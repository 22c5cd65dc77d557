import { scaleLinear } from 'd3';
import type { Station } from '#shared/document/design-document.ts';

/** Heights on the shelf, px from its top; widths of the bore are drawn between `wideY` and `narrowY`. */
export const SHELF = {
  height: 232,
  woodY: 22,
  wideY: 52,
  narrowY: 98,
  taperY: 136,
  curveY: 188,
  curveReach: 26,
} as const;

/** A bore that hardly changes is not blown up beyond this, px per mm of diameter. */
const MOST_PX_PER_MM = 228;

export interface ShelfScale {
  y: (diameterMm: number) => number;
  diameterMm: (y: number) => number;
  ticks: readonly number[];
  pxPerMm: number;
}

/** How the bore's widths are blown up so that they fill the shelf: wood above, air below. */
export function shelfScale(stations: readonly Station[]): ShelfScale {
  const widths = stations.map(({ diameterMm }) => diameterMm);
  const widest = Math.max(...widths);
  const narrowest = Math.min(...widths);
  const room = SHELF.narrowY - SHELF.wideY;
  const pxPerMm = Math.min(MOST_PX_PER_MM, room / Math.max(widest - narrowest, 1e-6));
  const scale = scaleLinear([widest, widest - room / pxPerMm], [SHELF.wideY, SHELF.narrowY]);
  const axis = scaleLinear([widest - room / pxPerMm, widest], [0, 1]);
  // As many figures as stand clear of each other.
  const ticks = [3, 2, 1].map((count) => axis.ticks(count)).find(({ length }) => length <= 4) ?? [];
  return { y: (mm) => scale(mm), diameterMm: (y) => scale.invert(y), ticks, pxPerMm };
}

/** `50 times wider than it is long`: how much the widths are blown up against the lengths. */
export function timesWider(scale: ShelfScale, pxPerMmAlong: number): string {
  const times = scale.pxPerMm / pxPerMmAlong;
  return times < 10 ? times.toFixed(1) : String(Math.round(times));
}
