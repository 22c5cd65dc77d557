import { holeToBoreRatio } from './tone-hole-range.ts';

/**
 * Chimney length with the volume between the hole's flat end and the curved bore wall.
 *
 * @param boreRadius - at the hole's axis, m, > 0
 * @param holeRadius - m, > 0, at most 0.95 of the bore; the radius at the bore where the hole is undercut
 * @returns m, added to the chimney of open and closed holes
 * @throws EngineInputError if a radius is not positive or the hole is too wide
 * @source C. J. Nederveen, J. K. M. Jansen and R. R. van Hassel, Acustica united with Acta Acustica 84 (1998) 957
 */
export function matchingLength(boreRadius: number, holeRadius: number): number {
  const d = holeToBoreRatio(boreRadius, holeRadius);
  return ((holeRadius * d) / 8) * (1 + 0.207 * d * d * d);
}
