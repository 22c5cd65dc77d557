import { endLengthRatio, reflectionLoss, writeEndImpedance, type ReflectionFit } from './reflection-fit.ts';

/** Within 0.02 % in |R| and 0.1 % in length for ka ≤ 1.5 (0.06 and 0.3 % to 3.5), tests/reference/tables/radiation.json. */
export const FLANGED_FIT: ReflectionFit = {
  beta: 1,
  eta: 0.82167,
  a1: 0.97952,
  a2: 0.669864,
  a3: 0.0245125,
  a4: 0.0472326,
  a5: 0.00340669,
  b1: 0.530739,
  b2: 1.03672,
  b3: -0.00542335,
  b4: -0.00409792,
  b5: -0.0394518,
};

/** Low-frequency end length over the radius; no unit. A. N. Norris and I. C. Sheng, J. Sound Vib. 135 (1989) 85. */
export const FLANGED_LENGTH_RATIO = FLANGED_FIT.eta;

/**
 * Impedance of the open end of a cylinder in an endless wall, over the bore's characteristic impedance.
 *
 * @param ka - wavenumber times inner radius, ≥ 0; fitted to 3.5, magnitude and length held beyond
 * @param out - where the result goes: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source W. E. Zorumski, J. Acoust. Soc. Am. 54 (1973) 1667, by mode matching; rational fit in
 *   tests/reference/tables/radiation.json
 */
export function flangedEndImpedance(ka: number, out: Float64Array, at: number): void {
  writeEndImpedance(reflectionLoss(FLANGED_FIT, ka), ka * endLengthRatio(FLANGED_FIT, ka), out, at);
}
