/**
 * Angle of a vector, for counting turns: `Math.atan2` costs ten times as much.
 *
 * @param y - second component
 * @param x - first component
 * @returns rad, in [−π, π], within 0.005
 */
export function roughAngle(y: number, x: number): number {
  const ax = Math.abs(x);
  const ay = Math.abs(y);
  const small = ax > ay ? ay / ax : ax / ay;
  const octant = small * (Math.PI / 4 + 0.273 * (1 - small));
  const quadrant = ax > ay ? octant : Math.PI / 2 - octant;
  const half = x < 0 ? Math.PI - quadrant : quadrant;
  return y < 0 ? -half : half;
}
