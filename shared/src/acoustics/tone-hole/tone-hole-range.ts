import { EngineInputError } from '../engine-input-error.ts';

/** Where the tone-hole lengths were fitted; beyond `clampedTo` they are held at its value. */
export const TONE_HOLE_RANGE = {
  /** Hole radius over bore radius (inner radius where undercut). */
  radiusRatio: { from: 0.2, to: 0.9, refusedAbove: 0.95 },
  /** Chimney height over hole radius. */
  chimneyRatio: { from: 0.13, to: 5, clampedTo: { from: 0.1, to: 10 } },
  /** Wavenumber times bore radius: fitted to the first, no use beyond the second. */
  boreWavenumber: { to: 0.4, unreliableAbove: 0.6 },
} as const;

const CLAMP = TONE_HOLE_RANGE.chimneyRatio.clampedTo;

/**
 * Hole radius over bore radius, refused where the formulas end.
 *
 * @param boreRadius - m, > 0
 * @param holeRadius - m, > 0
 * @returns the ratio, above 0 and at most 0.95
 * @throws EngineInputError if a radius is not positive or the hole is wider than 95 % of the bore
 */
export function holeToBoreRatio(boreRadius: number, holeRadius: number): number {
  if (!(boreRadius > 0)) {
    throw new EngineInputError('boreRadius', boreRadius, 'The bore has a diameter above 0 at every hole.');
  }
  if (!(holeRadius > 0)) {
    throw new EngineInputError('holeRadius', holeRadius, 'A tone hole has a diameter above 0.');
  }
  const ratio = holeRadius / boreRadius;
  if (ratio > TONE_HOLE_RANGE.radiusRatio.refusedAbove + 1e-9) {
    throw new EngineInputError(
      'holeRadius',
      holeRadius,
      'A tone hole is at most 0.95 of the bore wide. Choose a smaller drill.',
    );
  }
  return ratio;
}

/**
 * Chimney height over hole radius, held inside the range where the formulas stay sound.
 *
 * @param chimney - m, > 0
 * @param holeRadius - m, > 0
 * @returns the ratio, from 0.1 to 10
 * @throws EngineInputError if the chimney is not positive
 */
export function clampedChimneyRatio(chimney: number, holeRadius: number): number {
  if (!(chimney > 0)) {
    throw new EngineInputError(
      'chimney',
      chimney,
      'A tone hole has a chimney above 0. Check the outside there.',
    );
  }
  return Math.min(Math.max(chimney / holeRadius, CLAMP.from), CLAMP.to);
}
