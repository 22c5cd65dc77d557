import { mixGases, moleFractions, type PerGas } from './gas-mixture.ts';
import type { HumidAir } from './humid-air.ts';
import { dryAirViscosity, gasViscosities } from './viscosity.ts';

/**
 * Thermal conductivity of moist air with CO2.
 *
 * @param air - moist air, see `humidAir`
 * @returns W/(m·K)
 * @source dry air: Lemmon and Jacobsen (2004); water vapour: IAPWS R15-11; CO2: Sutherland's formula with the constants
 *   of F. M. White, Viscous Fluid Flow; mixture: Mason and Saxena (1958)
 */
export function thermalConductivity(air: HumidAir): number {
  const t = air.temperature;
  const pure: PerGas = [dryAirConductivity(t), waterConductivity(t), carbonDioxideConductivity(t)];
  return mixGases(moleFractions(air), gasViscosities(t), pure);
}

/**
 * Thermal conductivity of dilute dry air.
 *
 * @param temperature - K
 * @returns W/(m·K)
 * @source Lemmon and Jacobsen (2004), dilute-gas part
 */
export function dryAirConductivity(temperature: number): number {
  const tau = 132.6312 / temperature;
  return 1.308e-3 * dryAirViscosity(temperature) * 1e6 + 1.405e-3 * tau ** -1.1 - 1.036e-3 * tau ** -0.3;
}

/**
 * Thermal conductivity of dilute water vapour.
 *
 * @param temperature - K
 * @returns W/(m·K)
 * @source IAPWS R15-11, dilute-gas factor
 */
export function waterConductivity(temperature: number): number {
  const t = temperature / 647.096;
  const series =
    2.443221e-3 + 1.323095e-2 / t + 6.770357e-3 / t ** 2 - 3.454586e-3 / t ** 3 + 4.096266e-4 / t ** 4;
  return (1e-3 * Math.sqrt(t)) / series;
}

function carbonDioxideConductivity(temperature: number): number {
  return (0.0146 * (temperature / 273) ** 1.5 * (273 + 1800)) / (temperature + 1800);
}
