import { EngineInputError } from '../engine-input-error.ts';

/**
 * Admittance of a reed and what holds it, as a spring of air: imaginary, times the bore's characteristic impedance.
 *
 * @param wavenumber - 1/m, ≥ 0
 * @param volume - equivalent volume of reed and mouthpiece or staple, with its calibration, m³, ≥ 0
 * @param boreRadius - at the reed seat, m, > 0
 * @returns the imaginary part, no unit; the real part is 0
 * @source lumped compliance; C. J. Nederveen, Acoustical Aspects of Woodwind Instruments (1969), the equivalent volume
 */
export function reedSusceptance(wavenumber: number, volume: number, boreRadius: number): number {
  return (wavenumber * volume) / (Math.PI * boreRadius * boreRadius);
}

/**
 * Volume of the tip that a truncated cone lacks: about what its reed and staple have to stand for.
 *
 * @param mouthRadius - radius at the mouth end, m, > 0
 * @param taper - growth of the radius per length, no unit, > 0
 * @returns m³
 * @throws EngineInputError if the radius or the taper is not positive
 * @source geometry of the cone; A. H. Benade, Fundamentals of Musical Acoustics (1976), the rule
 */
export function missingConeVolume(mouthRadius: number, taper: number): number {
  if (!(mouthRadius > 0)) {
    throw new EngineInputError('mouthRadius', mouthRadius, 'The bore has a diameter above 0 at the reed.');
  }
  if (!(taper > 0)) {
    throw new EngineInputError('taper', taper, 'Only a bore that widens towards the foot lacks a tip.');
  }
  return (Math.PI * mouthRadius ** 3) / (3 * taper);
}
