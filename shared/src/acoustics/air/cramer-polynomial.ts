import { ICE_POINT, type HumidAir } from './humid-air.ts';

/** The sixteen coefficients a0…a15 of one quantity. */
export type CramerCoefficients = readonly [
  ...[number, number, number, number, number, number, number, number],
  ...[number, number, number, number, number, number, number, number],
];

/**
 * The polynomial in temperature, pressure, water vapour and CO2 that Cramer fitted to properties of moist air.
 *
 * @param a - the coefficients of the quantity
 * @param air - moist air
 * @returns the quantity, in the unit of its coefficients
 * @source O. Cramer, J. Acoust. Soc. Am. 93 (1993) 2510, the form of the fit
 */
export function cramerPolynomial(a: CramerCoefficients, air: HumidAir): number {
  const t = air.temperature - ICE_POINT;
  const p = air.pressure;
  const xw = air.waterFraction;
  const xc = air.carbonDioxideFraction;
  return (
    a[0] +
    (a[1] + a[2] * t) * t +
    (a[3] + (a[4] + a[5] * t) * t) * xw +
    (a[6] + (a[7] + a[8] * t) * t) * p +
    (a[9] + (a[10] + a[11] * t) * t) * xc +
    a[12] * xw * xw +
    a[13] * p * p +
    a[14] * xc * xc +
    a[15] * xw * p * xc
  );
}
