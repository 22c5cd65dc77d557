import { ICE_POINT, ROOM_CARBON_DIOXIDE, type HumidAir } from './humid-air.ts';

/** J/(mol·K), the value that goes with CIPM-2007. */
export const GAS_CONSTANT = 8.314472;

/** kg/mol. CIPM-2007. */
export const WATER_MOLAR_MASS = 18.01528e-3;

/**
 * Molar mass of dry air whose CO2 beyond 0.04 % has taken the place of oxygen, as in breath.
 *
 * @param carbonDioxideFraction - mole fraction of CO2
 * @returns kg/mol
 * @source A. Picard et al., Metrologia 45 (2008) 149 (CIPM-2007)
 */
export function dryAirMolarMass(carbonDioxideFraction: number): number {
  return (28.96546 + 12.011 * (carbonDioxideFraction - ROOM_CARBON_DIOXIDE)) * 1e-3;
}

/**
 * Density of moist air with CO2.
 *
 * @param air - moist air, see `humidAir`
 * @returns kg/m³
 * @source A. Picard et al., Metrologia 45 (2008) 149 (CIPM-2007)
 */
export function airDensity(air: HumidAir): number {
  const { temperature, pressure, waterFraction, carbonDioxideFraction } = air;
  const molarMass = dryAirMolarMass(carbonDioxideFraction);
  const dryDensity = (pressure * molarMass) / (compressibility(air) * GAS_CONSTANT * temperature);
  return dryDensity * (1 - waterFraction * (1 - WATER_MOLAR_MASS / molarMass));
}

// Compressibility factor of moist air; CIPM-2007.
function compressibility(air: HumidAir): number {
  const t = air.temperature - ICE_POINT;
  const xv = air.waterFraction;
  const ratio = air.pressure / air.temperature;
  const linear =
    1.58123e-6 -
    2.9331e-8 * t +
    1.1043e-10 * t * t +
    (5.707e-6 - 2.051e-8 * t) * xv +
    (1.9898e-4 - 2.376e-6 * t) * xv * xv;
  return 1 - ratio * linear + ratio * ratio * (1.83e-11 - 0.765e-8 * xv * xv);
}
