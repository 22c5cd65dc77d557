import { endLengthRatio, reflectionLoss, writeEndImpedance } from './reflection-fit.ts';
import { UNFLANGED_FIT } from './unflanged-end.ts';

/** The unflanged length that Dalmont, Nederveen and Joly's interpolation starts from; no unit. */
const THIN_WALL_RATIO = 0.6127;
const ENDLESS_WALL_RATIO = 0.8216;

/**
 * Low-frequency length of an open end with a wall of finite thickness, over the inner radius.
 *
 * @param radiusRatio - inner over outer radius, above 0 (an endless flange) to 1 (no wall)
 * @returns the ratio, 0.613–0.822; no unit
 * @source J.-P. Dalmont, C. J. Nederveen and N. Joly, J. Sound Vib. 244 (2001) 505
 */
export function finiteWallLength(radiusRatio: number): number {
  const q = radiusRatio;
  return ENDLESS_WALL_RATIO + q * (THIN_WALL_RATIO - ENDLESS_WALL_RATIO) + 0.057 * q * (1 - q ** 5);
}

/**
 * Impedance of the open end of a cylinder with a wall, over the bore's characteristic impedance.
 *
 * @param ka - wavenumber times inner radius, ≥ 0; fitted to 3.5, magnitude and length held beyond
 * @param radiusRatio - inner over outer radius at the end, above 0 to 1
 * @param out - where the result goes: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source length: Dalmont, Nederveen and Joly (2001) at low frequency, with the frequency dependence and the magnitude of
 *   the unflanged end
 */
export function finiteWallEndImpedance(ka: number, radiusRatio: number, out: Float64Array, at: number): void {
  const scale = finiteWallLength(radiusRatio) / THIN_WALL_RATIO;
  const phase = ka * endLengthRatio(UNFLANGED_FIT, ka) * scale;
  writeEndImpedance(reflectionLoss(UNFLANGED_FIT, ka), phase, out, at);
}
