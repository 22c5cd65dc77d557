/** Coefficients of a rational fit to the reflection at the open end of a cylinder. */
export interface ReflectionFit {
  /** Resistance over (ka)²/2 at low frequency. */
  beta: number;
  /** End length over radius at low frequency. */
  eta: number;
  a1: number;
  a2: number;
  a3: number;
  a4: number;
  a5: number;
  b1: number;
  b2: number;
  b3: number;
  b4: number;
  b5: number;
}

/** Beyond this the magnitude and the length are held. */
export const LARGEST_END_WAVENUMBER = 3.5;

/**
 * What the reflection's magnitude lacks of 1 at the end of a cylinder.
 *
 * @param fit - of the kind of end
 * @param ka - wavenumber times radius, ≥ 0
 * @returns 1 − |R|, from 0 to below 1; given so because |R| itself loses its digits at low frequency
 * @source rational form after F. Silva et al., J. Sound Vib. 322 (2009) 255, with two more terms
 */
export function reflectionLoss(fit: ReflectionFit, ka: number): number {
  const held = Math.min(ka, LARGEST_END_WAVENUMBER);
  const x = held * held;
  const below = 1 + x * (fit.beta + fit.a1 + x * (fit.a2 + x * (fit.a3 + x * fit.a5)));
  return (x * (fit.beta + x * (fit.a2 - fit.a4 + x * (fit.a3 + x * fit.a5)))) / below;
}

/**
 * Length of the open end over the radius.
 *
 * @param fit - of the kind of end
 * @param ka - wavenumber times radius, ≥ 0
 * @returns l/a, > 0
 * @source as `reflectionLoss`
 */
export function endLengthRatio(fit: ReflectionFit, ka: number): number {
  const held = Math.min(ka, LARGEST_END_WAVENUMBER);
  const x = held * held;
  const below = 1 + x * (fit.b2 + x * (fit.b3 + x * fit.b4));
  return (fit.eta * (1 + x * (fit.b1 + x * fit.b5))) / below;
}

/**
 * Impedance of an end from its reflection −|R|·exp(−2j·phase), over the characteristic impedance of the bore there.
 *
 * @param loss - 1 − |R|, from 0 to 1
 * @param phase - wavenumber times end length
 * @param out - where the result goes: real part at `at`, imaginary part at `at + 1`
 * @param at - index into `out`
 * @source Z/Z0 = (1 + r)/(1 − r) of a reflection r; any textbook of acoustics
 */
export function writeEndImpedance(loss: number, phase: number, out: Float64Array, at: number): void {
  const magnitude = 1 - loss;
  const sine = Math.sin(phase);
  // |1 + |R|e^{−2jφ}|² = loss² + 4|R|cos²φ, with the cosine squared written from the sine.
  const norm = (1 + magnitude) * (1 + magnitude) - 4 * magnitude * sine * sine;
  out[at] = (loss * (1 + magnitude)) / norm;
  out[at + 1] = (2 * magnitude * Math.sin(2 * phase)) / norm;
}
