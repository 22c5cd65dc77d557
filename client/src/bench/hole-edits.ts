import type { DesignDocument, Fingering, ToneHole } from '#shared/document/design-document.ts';
import { WIDEST_HOLE_SHARE } from '#shared/document/hole-faults.ts';
import { boreEnds, chimneyMm, diameterAt } from '#shared/document/profile.ts';

/** Widest hole that the bore there allows, mm, on a tenth. */
export function widestHoleMm(document: DesignDocument, positionMm: number): number {
  return Math.floor(diameterAt(document.bore.stations, positionMm) * WIDEST_HOLE_SHARE * 10 + 1e-9) / 10;
}

export function changeHole(document: DesignDocument, id: string, change: Partial<ToneHole>): DesignDocument {
  return {
    ...document,
    holes: document.holes.map((hole) => (hole.id === id ? { ...hole, ...change } : hole)),
  };
}

/** A position on a tenth of a millimetre from the foot, kept inside the bore. */
export function snapPosition(document: DesignDocument, positionMm: number): number {
  const { mouthMm, footMm } = boreEnds(document);
  const least = Math.max(mouthMm, 0) + 1;
  const inside = Math.min(footMm - 1, Math.max(least, positionMm));
  // Rounding what is measured from the foot, because that is what the rule shows.
  return tidy(footMm - Math.round((footMm - inside) * 10) / 10);
}

const tidy = (mm: number) => Math.round(mm * 1e6) / 1e6;

/**
 * A new finger hole. Fingerings cover it as they cover the next hole toward the foot, and at the foot where they
 * cover everything else: so a scale fingered from the bottom stays one.
 */
export function addHole(document: DesignDocument, positionMm: number, diameterMm: number): DesignDocument {
  const id = unusedId(document);
  const place = snapPosition(document, positionMm);
  const before = document.holes.filter((hole) => hole.positionMm <= place);
  const after = document.holes.filter((hole) => hole.positionMm > place);
  const next = nearestFootward(after);
  const hole: ToneHole = {
    id,
    name: '',
    positionMm: place,
    diameterMm: Math.min(diameterMm, widestHoleMm(document, place)),
    angleDeg: 0,
    chimneyMm: null,
    undercut: null,
    cover: 'finger',
    hand: (next ?? before.at(-1))?.hand ?? 'left',
  };
  const covers = (fingering: Fingering) =>
    next === undefined
      ? before.every((other) => other.cover === 'vent' || fingering.covered.includes(other.id))
      : fingering.covered.includes(next.id);
  return {
    ...document,
    holes: [...document.holes, hole].sort((a, b) => a.positionMm - b.positionMm),
    fingerings: document.fingerings.map((fingering) =>
      covers(fingering) ? { ...fingering, covered: [...fingering.covered, id] } : fingering,
    ),
  };
}

function nearestFootward(holes: readonly ToneHole[]): ToneHole | undefined {
  return holes.reduce<ToneHole | undefined>(
    (nearest, hole) => (nearest === undefined || hole.positionMm < nearest.positionMm ? hole : nearest),
    undefined,
  );
}

function unusedId(document: DesignDocument): string {
  const taken = new Set(document.holes.map((hole) => hole.id));
  let number = document.holes.length + 1;
  while (taken.has(`h${number}`)) number += 1;
  return `h${number}`;
}

/** Takes a hole away, and out of every fingering. */
export function removeHole(document: DesignDocument, id: string): DesignDocument {
  return {
    ...document,
    holes: document.holes.filter((hole) => hole.id !== id),
    fingerings: document.fingerings.map((fingering) => ({
      ...fingering,
      covered: fingering.covered.filter((hole) => hole !== id),
      half: fingering.half.filter((half) => half.hole !== id),
    })),
  };
}

/** Middle of the longest stretch without a hole in the lower two thirds of the bore: where a new hole is offered. */
export function roomiestPosition(document: DesignDocument): number {
  const { footMm } = boreEnds(document);
  const places = [
    footMm / 3,
    ...document.holes.map((hole) => hole.positionMm).filter((mm) => mm > footMm / 3),
    footMm,
  ].sort((a, b) => a - b);
  const gaps = places.slice(1).map((end, index) => ({ start: places[index] ?? 0, end }));
  const longest = gaps.reduce((best, gap) => (gap.end - gap.start > best.end - best.start ? gap : best));
  return snapPosition(document, (longest.start + longest.end) / 2);
}

/** Undercut to a diameter at the bore; back to the hole's own diameter takes it away. */
export function withUndercut(document: DesignDocument, id: string, innerDiameterMm: number): DesignDocument {
  const hole = document.holes.find((other) => other.id === id);
  if (hole === undefined) return document;
  if (innerDiameterMm <= hole.diameterMm + 1e-6) return changeHole(document, id, { undercut: null });
  const depthMm = hole.undercut?.depthMm ?? Math.round(chimneyMm(document, hole) * 5) / 10;
  return changeHole(document, id, { undercut: { innerDiameterMm, depthMm } });
}
