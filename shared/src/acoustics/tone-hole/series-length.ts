import { clampedChimneyRatio, holeToBoreRatio } from './tone-hole-range.ts';

/**
 * Length by which an open tone hole shortens the bore: negative, in units of the hole's characteristic impedance.
 *
 * The whole series impedance of the T is j·k·length; half of it lies on each side. Within 1 % of the finite elements.
 *
 * @param boreRadius - at the hole's axis, m, > 0
 * @param holeRadius - m, > 0, at most 0.95 of the bore; `seriesRadius` of the shape where the hole is undercut
 * @param chimney - height on the hole's axis, m, > 0
 * @returns m, ≤ 0
 * @throws EngineInputError if a length is not positive or the hole is too wide
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/tonehole.json
 */
export function openSeriesLength(boreRadius: number, holeRadius: number, chimney: number): number {
  const d = holeToBoreRatio(boreRadius, holeRadius);
  const height = clampedChimneyRatio(chimney, holeRadius);
  const tall = 0.3048 + (-0.0121 - 0.0061 * d) * d;
  const low = (0.0885 - 0.0056 * d) * (1 - Math.tanh(2.6342 * height));
  return -holeRadius * d ** 4 * (tall + low);
}

/**
 * Length by which a closed tone hole shortens the bore: negative, in units of the hole's characteristic impedance.
 *
 * The whole series impedance of the T is j·k·length; half of it lies on each side. Within 0.6 % of the finite elements
 * for a lid that follows the outside.
 *
 * @param boreRadius - at the hole's axis, m, > 0
 * @param holeRadius - m, > 0, at most 0.95 of the bore; `seriesRadius` of the shape where the hole is undercut
 * @param chimney - height on the hole's axis, m, > 0
 * @returns m, ≤ 0
 * @throws EngineInputError if a length is not positive or the hole is too wide
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/tonehole.json
 */
export function closedSeriesLength(boreRadius: number, holeRadius: number, chimney: number): number {
  const d = holeToBoreRatio(boreRadius, holeRadius);
  const height = clampedChimneyRatio(chimney, holeRadius);
  const tall = 3.2886 + (0.1422 + 0.0542 * d) * d;
  const low = (1.8604 + (0.2 - 0.5093 * d) * d) * (1 / Math.tanh(1.84 * height) - 1);
  return (-holeRadius * d ** 4) / (tall + low);
}
