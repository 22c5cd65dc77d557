import { EngineInputError } from '../engine-input-error.ts';
import { radiationLength } from '../tone-hole/radiation-length.ts';
import { sideCoverLength } from '../tone-hole/half-covered.ts';

/** Where the lips' length was fitted; the angle in rad, radii over the hole's equivalent radius. */
export const LIP_RANGE = {
  fraction: { from: 0.2, to: 0.6 },
  angle: { from: Math.PI / 3, to: (2 * Math.PI) / 3 },
  outerRadius: { from: 2.3, to: 3.1 },
  axisRatio: { from: 1, to: 1.2 },
} as const;

/**
 * Radius of the round hole that stands for an elliptic embouchure hole.
 *
 * @param along - diameter along the tube, m, > 0
 * @param across - diameter across the tube, m, > 0
 * @returns m, that of the circle of equal area
 * @throws EngineInputError if a diameter is not positive
 * @source equal area; the hole's shunt is 0.3–0.5 % too large for an axis ratio of 1.2 (finite elements)
 */
export function embouchureRadius(along: number, across: number): number {
  if (!(along > 0)) {
    throw new EngineInputError('along', along, 'An embouchure hole has a length above 0.');
  }
  if (!(across > 0)) {
    throw new EngineInputError('across', across, 'An embouchure hole has a width above 0.');
  }
  return Math.sqrt(along * across) / 2;
}

/** Lips over an embouchure hole; lengths in m, the angle in rad. */
export interface Lips {
  /** Of the outlet's area that they cover, from 0 to below 1. */
  fraction: number;
  /** Between plate and lip at the edge of the lip: π/2 upright, less where it leans over the hole. */
  angle: number;
  /** At the outer surface. */
  holeRadius: number;
  /** Of the body at the hole. */
  outerRadius: number;
}

/**
 * Outer end length of an embouchure hole with the lips upon it, chimney not counted.
 *
 * Within 0.03 hole radii of rigid lips in finite elements inside `LIP_RANGE`. Real lips are soft and their cover is not
 * known: calibrate. Below a cover of 0.2 the lip's own wall fades in smoothly from the free outlet.
 *
 * @param lips - see `Lips`
 * @returns m, > 0
 * @throws EngineInputError if the fraction is not from 0 to below 1, or the angle or a radius not positive
 * @source fitted to three-dimensional finite elements, see tests/reference/tables/embouchure.json
 */
export function lipLength(lips: Lips): number {
  const { fraction, angle, holeRadius, outerRadius } = lips;
  if (!(angle > 0 && angle <= Math.PI)) {
    throw new EngineInputError('angle', angle, 'The lips stand at an angle above 0 and up to 180°.');
  }
  const covered = sideCoverLength(fraction, holeRadius, outerRadius);
  const wall = 0.04 + (0.177 + 0.182 * fraction) * (Math.PI / angle - 1);
  const presence = Math.min(fraction / LIP_RANGE.fraction.from, 1);
  const fade = presence * presence * (3 - 2 * presence);
  return radiationLength(holeRadius, outerRadius) + covered + holeRadius * fade * wall;
}
