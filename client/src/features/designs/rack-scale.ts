import type { DesignSummary } from '#shared/contract/designs.ts';

type Outline = DesignSummary['outline'];

/** Scale of the rack where everything fits at it, as on the wall of a shop: one for all, so that lengths can be compared. */
const USUAL_PX_PER_MM = 0.8;

/** Head drawn beyond the bore where the document says nothing of it, in outside diameters at the mouth end. */
const HEAD_IN_DIAMETERS: Record<Outline['mouthEndKind'], number> = {
  window: 1.5,
  embouchure: 1.1,
  rim: 0,
  reed: 1.1,
  'ideal-open': 0,
  'ideal-closed': 0,
};

export function headMm(outline: Outline): number {
  const first = outline.outside[0];
  const bareHead = outline.mouthMm - HEAD_IN_DIAMETERS[outline.mouthEndKind] * (first?.diameterMm ?? 0);
  return Math.min(bareHead, first?.positionMm ?? bareHead);
}

export interface RackScale {
  widthPx: number;
  pxPerMm: number;
}

/** One scale for a whole list: the longest still fits in. */
export function rackScale(outlines: readonly Outline[], widthPx: number): RackScale {
  const longest = outlines.reduce((most, outline) => Math.max(most, outline.footMm - headMm(outline)), 0);
  const room = widthPx - 8;
  return { widthPx, pxPerMm: longest === 0 ? USUAL_PX_PER_MM : Math.min(USUAL_PX_PER_MM, room / longest) };
}
