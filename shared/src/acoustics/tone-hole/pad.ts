import { EngineInputError } from '../engine-input-error.ts';
import { finiteWallLength } from '../radiation/finite-wall-end.ts';
import { radiationLength } from './radiation-length.ts';

/** Where the pad's length was fitted, all over the hole's radius. */
export const PAD_RANGE = {
  height: { from: 0.2, to: 2.5 },
  padRadius: { from: 1.1, to: 3 },
  rimWidth: { from: 0.1, to: 2 },
} as const;

/** A flat disc held above an open hole; lengths in m. */
export interface Pad {
  holeRadius: number;
  padRadius: number;
  /** Above the rim, or above the outside of the body on the hole's axis where there is no raised rim. */
  height: number;
  /** Width of a raised flat rim around the hole; null: the hole opens in the body itself. */
  rimWidth: number | null;
  outerRadius: number;
}

/**
 * Length that a pad above an open hole adds to its outer end.
 *
 * Within 0.11 hole radii for heights from 0.2 hole radii (rms 0.03); up to 0.19 for a wide, low pad over a hole without a rim.
 *
 * @param pad - the pad and the hole, see `Pad`
 * @returns m, > 0
 * @throws EngineInputError if a length is not positive or the pad is narrower than the hole
 * @source fitted to finite elements, see tests/reference/tables/pad.json
 */
export function padLength(pad: Pad): number {
  requirePad(pad);
  const { holeRadius, rimWidth } = pad;
  const disc = pad.padRadius / holeRadius;
  const curve = rimWidth === null ? holeRadius / (4 * pad.outerRadius) : 0;
  const height = pad.height / holeRadius + curve;
  const gapEdge = Math.min(disc, 1 + (rimWidth === null ? disc - 1 : rimWidth / holeRadius));
  const gap = 0.883 * Math.log(gapEdge) + 0.14 + 0.091 * (disc - gapEdge);
  return holeRadius / ((2 * height) / gap + (10.7 * height ** 3.06) / disc ** 1.61);
}

/**
 * Outer end length of an open hole under a pad: that of its rim or of the body, and what the pad adds.
 *
 * @param pad - the pad and the hole, see `Pad`
 * @returns m, > 0
 * @throws EngineInputError if a length is not positive, or the pad is narrower than the hole
 * @source rim: J.-P. Dalmont, C. J. Nederveen and N. Joly, J. Sound Vib. 244 (2001) 505; pad: as `padLength`
 */
export function paddedOutletLength(pad: Pad): number {
  const { holeRadius, rimWidth } = pad;
  const outlet =
    rimWidth === null
      ? radiationLength(holeRadius, pad.outerRadius)
      : holeRadius * finiteWallLength(holeRadius / (holeRadius + rimWidth));
  return outlet + padLength(pad);
}

function requirePad(pad: Pad): void {
  if (!(pad.height > 0)) {
    throw new EngineInputError('height', pad.height, 'A pad stands more than 0 above its open hole.');
  }
  if (!(pad.holeRadius > 0 && pad.padRadius >= pad.holeRadius)) {
    throw new EngineInputError('padRadius', pad.padRadius, 'A pad is at least as wide as its hole.');
  }
  if (pad.rimWidth !== null && !(pad.rimWidth >= 0)) {
    throw new EngineInputError('rimWidth', pad.rimWidth, 'A rim is 0 or more wide.');
  }
}
