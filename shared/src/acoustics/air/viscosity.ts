import { mixGases, moleFractions, type PerGas } from './gas-mixture.ts';
import type { HumidAir } from './humid-air.ts';

/**
 * Dynamic viscosity of moist air with CO2.
 *
 * @param air - moist air, see `humidAir`
 * @returns Pa·s
 * @source dry air: E. W. Lemmon and R. T. Jacobsen, Int. J. Thermophys. 25 (2004) 21; water vapour: IAPWS R12-08;
 *   CO2: Sutherland's formula with the constants of F. M. White, Viscous Fluid Flow; mixture: Wilke (1950)
 */
export function airViscosity(air: HumidAir): number {
  const pure = gasViscosities(air.temperature);
  return mixGases(moleFractions(air), pure, pure);
}

/**
 * Viscosities of dry air, water vapour and CO2 as dilute gases.
 *
 * @param temperature - K
 * @returns Pa·s for each gas
 * @source as `airViscosity`
 */
export function gasViscosities(temperature: number): PerGas {
  return [dryAirViscosity(temperature), waterViscosity(temperature), carbonDioxideViscosity(temperature)];
}

/**
 * Viscosity of dilute dry air.
 *
 * @param temperature - K
 * @returns Pa·s
 * @source Lemmon and Jacobsen (2004), dilute-gas part
 */
export function dryAirViscosity(temperature: number): number {
  const l = Math.log(temperature / 103.3);
  const collision = Math.exp(0.431 + (-0.4623 + (0.08406 + (0.005341 - 0.00331 * l) * l) * l) * l);
  return (2.66958e-8 * Math.sqrt(28.9586 * temperature)) / (0.36 * 0.36 * collision);
}

function waterViscosity(temperature: number): number {
  const t = temperature / 647.096;
  const series = 1.67752 + (2.20462 + (0.6366564 - 0.241605 / t) / t) / t;
  return (1e-4 * Math.sqrt(t)) / series;
}

function carbonDioxideViscosity(temperature: number): number {
  return (1.37e-5 * (temperature / 273) ** 1.5 * (273 + 222)) / (temperature + 222);
}
