import { endLengthRatio, reflectionLoss, writeEndImpedance, type ReflectionFit } from './reflection-fit.ts';

/** Within 0.04 % in |R| and 0.13 % in length for ka ≤ 1.5 (0.15 and 0.3 % to 3.5), tests/reference/tables/radiation.json. */
export const UNFLANGED_FIT: ReflectionFit = {
  beta: 0.5,
  eta: 0.612701,
  a1: 2.52007,
  a2: 1.1102,
  a3: 0.0606686,
  a4: 0.0931058,
  a5: 0.00611558,
  b1: 0.948903,
  b2: 1.19053,
  b3: 0.00306403,
  b4: -0.00499232,
  b5: -0.0660944,
};

/** Low-frequency end length over the radius; no unit. Integral of Levine and Schwinger (1948), evaluated anew. */
export const UNFLANGED_LENGTH_RATIO = UNFLANGED_FIT.eta;

/**
 * Impedance of a thin-walled open end of a cylinder, over the bore's characteristic impedance.
 *
 * @param ka - wavenumber times inner radius, ≥ 0; fitted to 3.5, magnitude and length held beyond
 * @param out - where the result goes: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source H. Levine and J. Schwinger, Phys. Rev. 73 (1948) 383, exact integrals; rational fit in
 *   tests/reference/tables/radiation.json
 */
export function unflangedEndImpedance(ka: number, out: Float64Array, at: number): void {
  writeEndImpedance(reflectionLoss(UNFLANGED_FIT, ka), ka * endLengthRatio(UNFLANGED_FIT, ka), out, at);
}
