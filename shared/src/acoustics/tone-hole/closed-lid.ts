/**
 * Radius of curvature of a fingertip pressed on a hole, m. Common practice: the tip then fills 0.3–1 mm of holes 6–9 mm
 * wide; measure where it matters.
 */
export const FINGERTIP_CURVATURE_RADIUS = 6e-3;

/**
 * Mean chimney height under a rigid lid that follows the outside of a round body.
 *
 * Under a flat lid it is the chimney itself. The series length of a closed hole was fitted with such a lid.
 *
 * @param chimney - height on the hole's axis, m, > 0
 * @param holeRadius - at the outer surface, m, > 0
 * @param outerRadius - of the body at the hole, m, > 0
 * @returns m; below 0 where a wide hole in a thin wall has less room than the curve takes
 * @source geometry: mean drop of a cylinder under a circle, to fourth order; held against
 *   tests/reference/tables/undercut.json
 */
export function curvedLidHeight(chimney: number, holeRadius: number, outerRadius: number): number {
  const ratio = (holeRadius * holeRadius) / (8 * outerRadius * outerRadius);
  return chimney - ratio * outerRadius * (1 + ratio);
}

/**
 * Mean height of the fingertip's bulge into a closed hole: what it takes off the chimney under the finger.
 *
 * @param holeRadius - at the outer surface, m, > 0
 * @param curvatureRadius - of the fingertip, m, > 0
 * @returns m, of a cap of that curvature spread over the hole; 0.4 mm for a 6 mm hole, 0.8 mm for a 9 mm one
 * @source common practice (geometry of a cap); not measured
 */
export function fingertipHeight(holeRadius: number, curvatureRadius = FINGERTIP_CURVATURE_RADIUS): number {
  return (holeRadius * holeRadius) / (4 * curvatureRadius);
}
