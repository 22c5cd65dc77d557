import { scaleLinear } from 'd3';

/** Where on a shelf the widest and the narrowest width are drawn, px from its top. */
export interface WidthRoom {
  wideY: number;
  narrowY: number;
  /** A bore that hardly changes is not blown up beyond this, px per mm of diameter. */
  mostPxPerMm: number;
}

export interface WidthScale {
  y: (diameterMm: number) => number;
  diameterMm: (y: number) => number;
  ticks: readonly number[];
  pxPerMm: number;
}

/** How widths are blown up so that they fill their room: wood above, air below. */
export function widthScale(
  widthsMm: readonly number[],
  { wideY, narrowY, mostPxPerMm }: WidthRoom,
): WidthScale {
  const widest = Math.max(...widthsMm);
  const narrowest = Math.min(...widthsMm);
  const room = narrowY - wideY;
  const pxPerMm = Math.min(mostPxPerMm, room / Math.max(widest - narrowest, 1e-6));
  const scale = scaleLinear([widest, widest - room / pxPerMm], [wideY, narrowY]);
  const axis = scaleLinear([widest - room / pxPerMm, widest], [0, 1]);
  // As many figures as stand clear of each other.
  const ticks = [3, 2, 1].map((count) => axis.ticks(count)).find(({ length }) => length <= 4) ?? [];
  return { y: (mm) => scale(mm), diameterMm: (y) => scale.invert(y), ticks, pxPerMm };
}

/** `50 times wider than it is long`: how much the widths are blown up against the lengths. */
export function timesWider(scale: WidthScale, pxPerMmAlong: number): string {
  const times = scale.pxPerMm / pxPerMmAlong;
  return times < 10 ? times.toFixed(1) : String(Math.round(times));
}
