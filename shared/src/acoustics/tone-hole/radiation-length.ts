import { EngineInputError } from '../engine-input-error.ts';

/**
 * Outer end length of an open tone hole in a round body, at low frequency.
 *
 * The part that depends on frequency is `selfRadiation` of the body times holeRadius²/(4·outerRadius).
 *
 * @param holeRadius - at the outer surface, m, > 0
 * @param outerRadius - of the body at the hole, m, at least the hole's radius
 * @returns m
 * @throws EngineInputError if the hole is not positive or wider than the body
 * @source J.-P. Dalmont, C. J. Nederveen and N. Joly, J. Sound Vib. 244 (2001) 505
 */
export function radiationLength(holeRadius: number, outerRadius: number): number {
  if (!(holeRadius > 0 && holeRadius <= outerRadius)) {
    throw new EngineInputError(
      'holeRadius',
      holeRadius,
      'A tone hole is narrower than the body it is drilled in.',
    );
  }
  return holeRadius * (0.822 - 0.47 * (holeRadius / outerRadius) ** 0.8);
}
