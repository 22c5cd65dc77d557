import type { DesignDocument } from '#shared/document/design-document.ts';
import { boreEnds } from '#shared/document/profile.ts';

/** The parts of a document that make the body; holes are drawn upon it. */
export type BodyShape = Pick<DesignDocument, 'bore' | 'outside' | 'mouthEnd' | 'foot'>;

/** How far the drawing reaches, mm from the mouth end's reference point. */
export interface DrawnBody {
  headMm: number;
  footMm: number;
  /** Widest outside, mm. */
  widestMm: number;
}

/** Head drawn beyond the bore where the document says nothing of it, in outside diameters. */
const HEAD_IN_DIAMETERS: Record<DesignDocument['mouthEnd']['kind'], number> = {
  window: 1.5,
  embouchure: 1.1,
  rim: 0,
  reed: 1.6,
  'ideal-open': 0,
  'ideal-closed': 0,
};

/** What of an instrument is drawn: outside and bore, and the head (beak, cap, reed) that the bore leaves out. */
export function drawnBody(document: Omit<BodyShape, 'foot'>): DrawnBody {
  const { mouthMm, footMm } = boreEnds(document);
  const outside = document.outside.stations;
  const outsideFrom = outside[0]?.positionMm ?? mouthMm;
  const widestMm = outside.reduce((widest, station) => Math.max(widest, station.diameterMm), 0);
  const bareHead = mouthMm - HEAD_IN_DIAMETERS[document.mouthEnd.kind] * (outside[0]?.diameterMm ?? 0);
  return {
    headMm: Math.min(outsideFrom, bareHead),
    footMm: Math.max(footMm, outside.at(-1)?.positionMm ?? footMm),
    widestMm,
  };
}
