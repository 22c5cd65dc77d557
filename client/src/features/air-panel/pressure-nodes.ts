import type { Ribbon } from '../../engine/engine-answers.ts';

/** A waist thinner than this is as good as no pressure. */
const WAIST = 0.2;
/** The pressure must rise by so much on both sides: the dip at an open hole is no waist. */
const RISE = 0.06;

/** Where along the bore the pressure has its waists, mm from the mouth end's reference; the ends do not count. */
export function pressureNodes(points: Ribbon['points']): number[] {
  return points
    .filter(
      ({ pressure }, index) =>
        pressure < WAIST &&
        pressure < (points[index + 1]?.pressure ?? -1) &&
        riseBeside(points, index, 1) >= RISE &&
        riseBeside(points, index, -1) >= RISE,
    )
    .map(({ positionMm }) => positionMm);
}

/** How far the pressure rises on one side before it falls below what it is here. */
function riseBeside(points: Ribbon['points'], index: number, by: 1 | -1): number {
  const here = points[index]?.pressure ?? 0;
  let highest = here;
  for (let at = index + by; (points[at]?.pressure ?? -1) >= here; at += by) {
    highest = Math.max(highest, points[at]?.pressure ?? 0);
  }
  return highest - here;
}

/** Pressure at a place, as a share of the most in the bore; straight between the points. */
export function pressureAt(points: Ribbon['points'], positionMm: number): number | null {
  const after = points.findIndex((point) => point.positionMm >= positionMm);
  const [a, b] = [points[after - 1], points[after]];
  if (b === undefined) return points.at(-1)?.pressure ?? null;
  if (a === undefined) return b.pressure;
  const length = b.positionMm - a.positionMm;
  const share = length === 0 ? 0 : (positionMm - a.positionMm) / length;
  return a.pressure + share * (b.pressure - a.pressure);
}
