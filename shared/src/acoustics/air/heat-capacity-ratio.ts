import { cramerPolynomial, type CramerCoefficients } from './cramer-polynomial.ts';
import type { HumidAir } from './humid-air.ts';

/** No unit. Cramer (1993), row of the specific heat ratio. */
const RATIO_COEFFICIENTS: CramerCoefficients = [
  1.400822, -1.75e-5, -1.73e-7, -0.0873629, -0.0001665, -3.26e-6, 2.047e-8, -1.26e-10, 5.939e-14, -0.1199717,
  -0.0008693, 1.979e-6, -0.01104, -3.478e-16, 0.0450616, 1.82e-6,
];

/**
 * Heat capacity at constant pressure over that at constant volume, of moist air with CO2.
 *
 * Enters the wall losses alone; an error of 1 % there moves a note by less than 0.1 cent.
 *
 * @param air - moist air, see `humidAir`
 * @returns the ratio, no unit, about 1.4
 * @source O. Cramer, J. Acoust. Soc. Am. 93 (1993) 2510
 */
export function heatCapacityRatio(air: HumidAir): number {
  return cramerPolynomial(RATIO_COEFFICIENTS, air);
}
