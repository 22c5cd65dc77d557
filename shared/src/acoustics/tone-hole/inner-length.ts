import { clampedChimneyRatio, holeToBoreRatio } from './tone-hole-range.ts';

/**
 * Length that the air just inside the bore adds to a tone hole, open or closed.
 *
 * A series mass k·length in units of the hole's own characteristic impedance. Within 0.002 hole radii of the finite
 * elements for 0.2 ≤ hole/bore ≤ 0.9 and 0.13 ≤ chimney/hole radius ≤ 5.
 *
 * @param boreRadius - at the hole's axis, m, > 0
 * @param holeRadius - m, > 0, at most 0.95 of the bore; the radius at the bore where the hole is undercut
 * @param chimney - height on the hole's axis, m, > 0
 * @returns m, 0.2–0.82 hole radii
 * @throws EngineInputError if a length is not positive or the hole is too wide
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/tonehole.json
 */
export function innerLength(boreRadius: number, holeRadius: number, chimney: number): number {
  const d = holeToBoreRatio(boreRadius, holeRadius);
  const height = clampedChimneyRatio(chimney, holeRadius);
  const tall = 0.8218 + (-0.1684 + (-0.9651 + (0.7626 - 0.2815 * d) * d) * d) * d;
  const low = 0.0583 + (-0.1078 + 0.0984 * d) * d;
  return holeRadius * (tall - low * Math.exp(-5.0144 * height));
}
