import { EngineInputError } from '../engine-input-error.ts';
import { finiteWallLength } from '../radiation/finite-wall-end.ts';
import { reflectionLoss } from '../radiation/reflection-fit.ts';
import { UNFLANGED_FIT } from '../radiation/unflanged-end.ts';
import { sideCoverLength } from '../tone-hole/half-covered.ts';

/** Cover for which the half-covered hole's rule, used here by analogy, was fitted. */
export const RIM_RANGE = { fraction: { from: 0.2, to: 0.85 } } as const;

/** The open mouth of an end-blown bore under chin and lips; lengths in m. */
export interface Rim {
  boreRadius: number;
  outerRadius: number;
  /** Of the open end's area that chin and lips cover, from 0 to below 1. */
  fraction: number;
}

/** A rim with its length worked out; made by `rimEnd`. */
export interface RimEnd {
  boreRadius: number;
  /** Length that the covered end adds to the bore, before `scale`, m. */
  length: number;
  /** Calibration of the player's own: multiplies the length. */
  scale: number;
}

/**
 * Prepares the impedance of a blown rim.
 *
 * Chin and lips are taken for a rigid lid by analogy with the half-covered hole; no measurement stands behind it, so
 * calibrate.
 *
 * @param rim - see `Rim`
 * @param scale - calibration factor on the length, > 0
 * @returns the end for `rimImpedance`
 * @throws EngineInputError if the bore is not positive, not inside the outside, or the cover not from 0 to below 1
 * @source open end: Dalmont, Nederveen and Joly (2001); cover: see tests/reference/tables/half_covered.json
 */
export function rimEnd(rim: Rim, scale = 1): RimEnd {
  const { boreRadius, outerRadius, fraction } = rim;
  if (!(boreRadius > 0 && boreRadius <= outerRadius)) {
    throw new EngineInputError(
      'boreRadius',
      boreRadius,
      'The bore at the rim is above 0 and inside the outside.',
    );
  }
  const free = boreRadius * finiteWallLength(boreRadius / outerRadius);
  return { boreRadius, length: free + sideCoverLength(fraction, boreRadius, outerRadius), scale };
}

/**
 * Impedance of a blown rim, over the characteristic impedance of the bore there.
 *
 * @param end - made by `rimEnd`
 * @param wavenumber - 1/m, ≥ 0
 * @param out - where the result goes: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source length as `rimEnd`; resistance from the reflection of an unflanged end, H. Levine and J. Schwinger, Phys. Rev. 73
 *   (1948) 383
 */
export function rimImpedance(end: RimEnd, wavenumber: number, out: Float64Array, at: number): void {
  const loss = reflectionLoss(UNFLANGED_FIT, wavenumber * end.boreRadius);
  out[at] = loss / (2 - loss);
  out[at + 1] = wavenumber * end.length * end.scale;
}
