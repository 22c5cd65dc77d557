import { EngineInputError } from '../engine-input-error.ts';

/** Where the undercut's rules were fitted. */
export const UNDERCUT_RANGE = {
  /** Hole radius (outside) over bore radius. */
  radiusRatio: { from: 0.3, to: 0.75 },
  /** Chimney height over hole radius. */
  chimneyRatio: { from: 0.4, to: 2 },
  /** Flare over hole radius. */
  flareRatio: { to: 0.4 },
  /** Depth over chimney height. */
  depthRatio: { from: 0.3, to: 1 },
} as const;

/** Expected error of a note above an undercut of a shape the rules were not fitted to, cents. */
export const UNUSUAL_UNDERCUT_CENTS = 5;

/** Nearest that the cone may come to running out sideways, and its end to the bore's width. */
const WIDEST_SHARE = 0.95;

/** A hole opened towards the bore by a cone about its own axis; lengths in m. */
export interface Undercut {
  boreRadius: number;
  /** At the outside, where the finger lies. */
  holeRadius: number;
  chimney: number;
  outerRadius: number;
  /** How much wider the radius is at the bore than outside. */
  flare: number;
  /** Height of the cone above the bore, at most the chimney. */
  depth: number;
}

/** Radii and lengths that stand for an undercut hole in the T circuit. */
export interface ShapedUndercut {
  status: 'shaped';
  /** At the bore: inner length, open matching length, node compliance, open cone. */
  innerRadius: number;
  /** At the outside: radiation of the open hole and the top of its cone; the hole's own unless the cone reaches the rim. */
  rimRadius: number;
  /** For the series length, open and closed. */
  seriesRadius: number;
  /** At the bore for the closed chimney's matching length and cone. */
  closedRadius: number;
  /** Series length of the open hole, in units of the impedance of the hole's outside radius, m. */
  openExtraLength: number;
  /** Flare over depth. */
  slope: number;
}

export interface RefusedUndercut {
  status: 'refused';
  reason: 'cone-breaks-out' | 'inner-end-too-wide';
}

/**
 * Radii and lengths by which an undercut hole enters the formulas of a straight one.
 *
 * Open chimney: cylinder(innerRadius, matching), cone(innerRadius → rimRadius, depth), cylinder(holeRadius, chimney −
 * depth). Closed: cone from closedRadius to holeRadius and no extra length. Open and closed shunts within 1 % and 0.8 % of
 * blind finite-element shapes, series length 5 and 7 %.
 *
 * @param undercut - see `Undercut`; flare from 0, depth above 0 and up to the chimney
 * @returns the shape, or why there is none: the cone would run out of the bore's side, or is as wide as the bore
 * @throws EngineInputError if a length is not positive or the cone is deeper than the chimney
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/undercut.json
 */
export function undercutShape(undercut: Undercut): ShapedUndercut | RefusedUndercut {
  requireUndercut(undercut);
  const { boreRadius: a, holeRadius: b, flare, depth } = undercut;
  const slope = flare / depth;
  const innerRadius = b + flare;
  if (innerRadius > WIDEST_SHARE * a) return { status: 'refused', reason: 'inner-end-too-wide' };
  // Radius of the cone carried on to the bore's axis; the cone meets the bore wall only while this stays small.
  const atAxis = b + slope * (a + depth);
  if (atAxis > WIDEST_SHARE * a * Math.hypot(1, slope))
    return { status: 'refused', reason: 'cone-breaks-out' };
  const atSides = radiusAtBoreSides(a, slope, atAxis);
  return {
    status: 'shaped',
    innerRadius,
    rimRadius: b + 0.66 * (outerRimRadius(undercut, slope) - b),
    seriesRadius: b + flare / (1 + 0.27 * slope),
    closedRadius: innerRadius + 0.12 * (atSides - innerRadius),
    openExtraLength: (0.4 * slope * slope * depth * b) / innerRadius,
    slope,
  };
}

// Radius of the cone where it meets the bore wall beside the hole.
function radiusAtBoreSides(boreRadius: number, slope: number, atAxis: number): number {
  const spread = 1 + slope * slope;
  const c = atAxis * slope;
  const height = (c + Math.sqrt(c * c - spread * (atAxis * atAxis - boreRadius * boreRadius))) / spread;
  return atAxis - slope * height;
}

// Radius of the outer rim beside the hole: wider than the drill where the cone reaches the curved outside.
function outerRimRadius(undercut: Undercut, slope: number): number {
  const { holeRadius, chimney, outerRadius, depth } = undercut;
  const straight = chimney - depth;
  let rim = holeRadius;
  for (let pass = 0; pass < 6; pass += 1) {
    const inside = Math.min(rim, outerRadius);
    const drop = outerRadius - Math.sqrt(outerRadius * outerRadius - inside * inside);
    rim = holeRadius + Math.max(0, slope * (drop - straight));
  }
  return rim;
}

function requireUndercut(undercut: Undercut): void {
  for (const field of ['boreRadius', 'holeRadius', 'chimney', 'outerRadius', 'depth'] as const) {
    if (!(undercut[field] > 0)) {
      throw new EngineInputError(field, undercut[field], 'The lengths of an undercut hole are above 0.');
    }
  }
  if (!(undercut.flare >= 0)) {
    throw new EngineInputError(
      'flare',
      undercut.flare,
      'An undercut is at least as wide inside as its hole.',
    );
  }
  if (undercut.depth > undercut.chimney * (1 + 1e-9)) {
    throw new EngineInputError('depth', undercut.depth, 'An undercut is no deeper than its chimney.');
  }
}
