import { cramerPolynomial, type CramerCoefficients } from './cramer-polynomial.ts';
import type { HumidAir } from './humid-air.ts';

/** m/s. Cramer (1993), sound speed row. */
const SPEED_COEFFICIENTS: CramerCoefficients = [
  331.5024, 0.603055, -0.000528, 51.471935, 0.1495874, -0.000782, -1.82e-7, 3.73e-8, -2.93e-10, -85.20931,
  -0.228525, 5.91e-5, -2.835149, -2.15e-13, 29.179762, 0.000486,
];

/**
 * Speed of sound at low frequency in moist air with CO2.
 *
 * Fitted for 0–30 °C and up to 1 % CO2; up to 40 °C and 4 % CO2 it agrees with the ideal-gas value from molecular
 * constants within 0.5 cent.
 *
 * @param air - moist air, see `humidAir`
 * @returns m/s
 * @source O. Cramer, J. Acoust. Soc. Am. 93 (1993) 2510
 */
export function speedOfSound(air: HumidAir): number {
  return cramerPolynomial(SPEED_COEFFICIENTS, air);
}
