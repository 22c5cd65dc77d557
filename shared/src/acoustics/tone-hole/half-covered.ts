import { EngineInputError } from '../engine-input-error.ts';
import { clampedChimneyRatio } from './tone-hole-range.ts';

/** Where the half-covered lengths were fitted. */
export const HALF_COVERED_RANGE = {
  fraction: { from: 0.1, to: 0.9 },
  chimneyRatio: { from: 0.2 },
  /** Hole radius over body radius. */
  outerRatio: { to: 0.6 },
} as const;

/** A hole part of which a flat, rigid lid covers; lengths in m, `fraction` of the outlet's area from 0 to below 1. */
export interface HalfCover {
  fraction: number;
  /** Where the lid comes from: across the bore, or along it from up- or downstream. */
  from: 'side' | 'end';
  holeRadius: number;
  outerRadius: number;
  chimney: number;
}

/**
 * Length that a lid over part of the outlet adds to the outer end of an open hole.
 *
 * The hole's whole shunt is then right within 1.0 % (lid from the end) or 1.7 % (from the side).
 *
 * @param cover - the lid and the hole, see `HalfCover`; the chimney matters for a lid from the end
 * @returns m, ≥ 0, 0 for a free outlet
 * @throws EngineInputError if the fraction is not from 0 to below 1, or a length is not positive
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/half_covered.json
 */
export function halfCoveredLength(cover: HalfCover): number {
  const { fraction, holeRadius, outerRadius, chimney } = cover;
  if (cover.from === 'side') return sideCoverLength(fraction, holeRadius, outerRadius);
  const height = clampedChimneyRatio(chimney, holeRadius);
  const thinWall = 1 - 0.23 * fraction * Math.exp(-2.9 * height);
  return holeRadius * longChimneyRatio(fraction) * thinWall;
}

/**
 * Length that a lid from the side, its edge parallel to the bore, adds to the outer end of an opening.
 *
 * @param fraction - of the outlet that is covered, from 0 to below 1
 * @param openingRadius - m, > 0
 * @param outerRadius - of the body, m, > 0
 * @returns m, ≥ 0
 * @throws EngineInputError if the fraction is not from 0 to below 1
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/half_covered.json
 */
export function sideCoverLength(fraction: number, openingRadius: number, outerRadius: number): number {
  const curve = 1 + 0.94 * (0.5 - fraction) * (openingRadius / outerRadius);
  return openingRadius * longChimneyRatio(fraction) * curve;
}

/**
 * How far a lid from the end moves the hole's acting axis along the bore, towards the open part.
 *
 * @param cover - the lid and the hole, see `HalfCover`
 * @returns m, ≥ 0; 0 for a lid from the side
 * @throws EngineInputError if the fraction is not from 0 to below 1, or a length is not positive
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/half_covered.json
 */
export function halfCoveredShift(cover: HalfCover): number {
  requireFraction(cover.fraction);
  if (cover.from === 'side') return 0;
  const height = clampedChimneyRatio(cover.chimney, cover.holeRadius);
  return 0.86 * cover.fraction * cover.holeRadius * Math.exp(-1.8 * height);
}

// Added length over radius for a long chimney in a flat wall.
function longChimneyRatio(fraction: number): number {
  requireFraction(fraction);
  return (1.08 * fraction ** 1.358) / (1 - fraction) ** 0.599;
}

function requireFraction(fraction: number): void {
  if (fraction >= 0 && fraction < 1) return;
  throw new EngineInputError(
    'fraction',
    fraction,
    'A half-covered hole is covered by 0 or more and less than 1.',
  );
}
