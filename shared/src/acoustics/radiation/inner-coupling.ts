/** Angle between neighbouring columns of `SMOOTH_PART`, rad. */
const ANGLE_STEP = Math.PI / 6;

/** Axial distance between its rows, over the bore radius. */
const DISTANCE_STEP = 0.25;

/** From this distance on the first six modes of the bore give the coupling. */
const MODES_FROM = 3 * DISTANCE_STEP;

/**
 * Coupling at 0, 30, … 180° less its pole 1/(2·chord), at axial distances 0, 0.25 and 0.5 bore radii; no unit.
 *
 * Sum over the evanescent modes of a rigid duct, tests/reference/tables/coupling_angle.json (`inner_rows`) and
 * inner_coupling_30_60.json. The first figure stands for holes that would run into each other; no pair comes near it.
 */
const SMOOTH_PART = [
  [-0.4, -0.4722, -0.56212, -0.61088, -0.63983, -0.65555, -0.66057],
  [-0.3947, -0.39771, -0.45869, -0.50068, -0.52712, -0.5418, -0.54652],
  [-0.39348, -0.37229, -0.39114, -0.41784, -0.4379, -0.44977, -0.45369],
] as const;

/** Order round the bore, strength and decay of the six slowest evanescent modes; zeros of J'n, see inner_coupling_30_60.json. */
const MODES = [
  [1, 0.7703, 1.8412],
  [2, 0.573, 3.0542],
  [0, 0.1305, 3.8317],
  [3, 0.4857, 4.2012],
  [4, 0.4326, 5.3176],
  [1, 0.1942, 5.3314],
] as const;

/** Mean hole over bore up to which holes couple as points do, and what is lost per ratio beyond; coupling_angle.json. */
const POINT_LIKE_RATIO = 0.5;
const WIDE_HOLE_LOSS = 0.36;
const WIDEST_RATIO = 0.75;

/**
 * Coupling of two open holes by the evanescent field inside the bore: the mutual impedance is j·k·ρc/(π·boreRadius)·m.
 *
 * Matters for holes closer along the bore than about its diameter. Within 0.004 for holes back to back, 0.01 otherwise.
 * The same at every frequency below the bore's own cross modes.
 *
 * @param distance - along the axis, over the bore radius, ≥ 0
 * @param angle - between the holes round the bore, rad, any
 * @param holeRatio - mean radius of the two holes over that of the bore; wide holes couple up to 9 % less than points
 * @returns m, no unit; negative for holes on opposite sides
 * @source sum over the modes of a rigid duct, confirmed by finite elements of pairs, see
 *   tests/reference/tables/coupling_angle.json
 */
export function innerCoupling(distance: number, angle: number, holeRatio = POINT_LIKE_RATIO): number {
  const ze = Math.abs(distance);
  const between = Math.acos(Math.cos(angle));
  const opposite = -(0.7703 * Math.exp(-1.8412 * ze)) / (1 + 0.892 * Math.exp(-1.31 * ze));
  const nearOpposite = Math.max(0, between / ANGLE_STEP - 5);
  const mended = nearOpposite * (opposite - pointCoupling(ze, Math.PI));
  const wide = Math.min(Math.max(holeRatio, POINT_LIKE_RATIO), WIDEST_RATIO) - POINT_LIKE_RATIO;
  return (pointCoupling(ze, between) + mended) * (1 - WIDE_HOLE_LOSS * wide * Math.exp(-2 * ze));
}

function pointCoupling(ze: number, angle: number): number {
  if (ze >= MODES_FROM) return modeSum(ze, angle);
  const row = Math.floor(ze / DISTANCE_STEP);
  const share = ze / DISTANCE_STEP - row;
  const smooth = (1 - share) * smoothPart(row, angle) + share * smoothPart(row + 1, angle);
  return smooth + pole(ze, angle);
}

function smoothPart(row: number, angle: number): number {
  const values = SMOOTH_PART[row];
  if (values === undefined) return modeSum(MODES_FROM, angle) - pole(MODES_FROM, angle);
  const column = Math.min(Math.floor(angle / ANGLE_STEP), 5);
  const share = angle / ANGLE_STEP - column;
  return (1 - share) * (values[column] ?? NaN) + share * (values[column + 1] ?? NaN);
}

// What two points on a plane wall do to each other, over the straight distance between them.
function pole(ze: number, angle: number): number {
  return 0.5 / Math.hypot(ze, 2 * Math.sin(angle / 2));
}

function modeSum(ze: number, angle: number): number {
  let sum = 0;
  for (const [order, strength, decay] of MODES)
    sum += strength * Math.cos(order * angle) * Math.exp(-decay * ze);
  return sum;
}
