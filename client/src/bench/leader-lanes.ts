import type { BenchColumn } from './bench-geometry.ts';

/** Lanes lie this far apart, px; the lowest this far below the strip. */
const LANE_STEP = 2.5;
const LOWEST_LANE = 12;

/**
 * How far below the strip a leader turns toward its column, or null where it may slant to it by itself.
 *
 * A hole left of the columns (a zoomed view, a thumb hole high up) would draw its leader through what stands at the
 * left. It runs along the strip instead, in a lane of its own: further left is lower, so that lanes never cross. A hole
 * that a lane passes under takes one as well.
 */
export function leaderLanes(columns: readonly BenchColumn[], hangLeft: number): (number | null)[] {
  let reach = hangLeft;
  const inLane = columns.map(({ holeX, x }) => {
    const isLane = holeX < reach;
    if (isLane) reach = Math.max(reach, x + 1);
    return isLane;
  });
  const step = Math.min(LANE_STEP, LOWEST_LANE / Math.max(1, inLane.filter(Boolean).length));
  let lane = 0;
  return inLane.map((isLane) => {
    if (!isLane) return null;
    lane += 1;
    return LOWEST_LANE - (lane - 1) * step;
  });
}
