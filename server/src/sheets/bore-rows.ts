import type { DesignDocument, Station } from '#shared/document/design-document.ts';
import { bodyEnds } from './bench-position.ts';

/** One step of making the bore and the outside. */
export interface BoreRow {
  step: string;
  what: string;
  /** Span along the body, mm from the mouth end's reference point, the foot end first. */
  footwardMm: number;
  mouthwardMm: number;
  /** Diameters at both ends of the span; equal for a straight one, null for an opening. */
  diametersMm: { footward: number; mouthward: number } | null;
  toleranceMm: number | null;
  checkWith: string;
}

/** Tolerances of common practice, ± mm: a reamed bore, and a body turned to callipers. */
const BORE_TOLERANCE_MM = 0.03;
const OUTSIDE_TOLERANCE_MM = 0.1;

/** Stations closer to the straight line between their neighbours than this add nothing to a row, mm. */
const STRAIGHT_MM = 0.005;

/** The steps in working order: the bore from the foot upward, the outside, then the opening at the mouth end. */
export function boreRows(document: DesignDocument): BoreRow[] {
  const bore = stretches(document.bore.stations).map((stretch) => boreRow(stretch));
  const { fromMm, toMm } = bodyEnds(document);
  const outside = stretches(document.outside.stations)
    .filter(({ from, to }) => to.positionMm > fromMm && from.positionMm < toMm)
    .map((stretch) => outsideRow(stretch));
  const rows = [...bore, ...outside, ...mouthRows(document)];
  return rows.map((row, index) => ({ ...row, step: `B${index + 1}` }));
}

interface Stretch {
  from: Station;
  to: Station;
}

/** Straight stretches of a profile, foot first; stations on one line are laid together, steps are left out. */
function stretches(stations: readonly Station[]): Stretch[] {
  const kept: Station[] = [];
  for (const station of stations) {
    const [before, last] = [kept.at(-2), kept.at(-1)];
    if (before !== undefined && last !== undefined && isOnLine(last, before, station)) kept.pop();
    kept.push(station);
  }
  return kept
    .slice(1)
    .map((to, index) => ({ from: kept[index] ?? to, to }))
    .filter(({ from, to }) => to.positionMm > from.positionMm)
    .reverse();
}

function isOnLine(middle: Station, from: Station, to: Station): boolean {
  if (to.positionMm <= middle.positionMm || middle.positionMm <= from.positionMm) return false;
  const share = (middle.positionMm - from.positionMm) / (to.positionMm - from.positionMm);
  const straight = from.diameterMm + share * (to.diameterMm - from.diameterMm);
  return Math.abs(straight - middle.diameterMm) < STRAIGHT_MM;
}

function isStraight({ from, to }: Stretch): boolean {
  return Math.abs(from.diameterMm - to.diameterMm) < STRAIGHT_MM;
}

function spanOf({ from, to }: Stretch) {
  return {
    step: '',
    footwardMm: to.positionMm,
    mouthwardMm: from.positionMm,
    diametersMm: { footward: to.diameterMm, mouthward: from.diameterMm },
  };
}

function boreRow(stretch: Stretch): BoreRow {
  const straight = isStraight(stretch);
  return {
    ...spanOf(stretch),
    what: straight ? 'Bore, drilled and reamed straight' : 'Bore, taper reamer',
    toleranceMm: BORE_TOLERANCE_MM,
    checkWith: straight ? 'plug gauge' : 'gauges at both ends',
  };
}

function outsideRow(stretch: Stretch): BoreRow {
  return {
    ...spanOf(stretch),
    what: isStraight(stretch) ? 'Outside, turned straight' : 'Outside, turned to a taper',
    toleranceMm: OUTSIDE_TOLERANCE_MM,
    checkWith: 'callipers, three places',
  };
}

function mouthRows(document: DesignDocument): BoreRow[] {
  const { mouthEnd } = document;
  const opening = { step: '', diametersMm: null, toleranceMm: null };
  if (mouthEnd.kind === 'window') {
    const span = { footwardMm: 0, mouthwardMm: -mouthEnd.lengthMm };
    return [{ ...opening, ...span, what: 'Window', checkWith: 'slip gauges' }];
  }
  if (mouthEnd.kind === 'embouchure') {
    const span = { footwardMm: mouthEnd.lengthMm / 2, mouthwardMm: -mouthEnd.lengthMm / 2 };
    const stopper = { footwardMm: -mouthEnd.stopperMm, mouthwardMm: -mouthEnd.stopperMm };
    return [
      { ...opening, ...span, what: 'Embouchure hole', checkWith: 'callipers' },
      { ...opening, ...stopper, what: 'Stopper face', checkWith: 'marked rod' },
    ];
  }
  return [];
}

/** Widest dowel that slides into the bore at the lowest hole, or null where the bore tapers. */
export function dowelMm(document: DesignDocument): number | null {
  const diameters = document.bore.stations.map((station) => station.diameterMm);
  const least = Math.min(...diameters);
  return Math.max(...diameters) - least < STRAIGHT_MM ? least - 0.1 : null;
}
