import { ROOM_CARBON_DIOXIDE, type HumidAir } from './humid-air.ts';

/** The three gases that the transport properties are mixed from: ordinary dry air, water vapour, CO2 beyond 0.04 %. */
export type PerGas = readonly [dryAir: number, water: number, carbonDioxide: number];

/** g/mol, as in CIPM-2007 and the standard atomic weights. */
const MOLAR_MASSES: PerGas = [28.96546, 18.01528, 44.0095];

const GASES = [0, 1, 2] as const;

/**
 * Mole fractions of dry air, water vapour and excess CO2.
 *
 * @param air - moist air, see `humidAir`
 * @returns the three mole fractions; they sum to 1
 */
export function moleFractions(air: HumidAir): PerGas {
  const dry = 1 - air.waterFraction;
  const excess = Math.max(air.carbonDioxideFraction - ROOM_CARBON_DIOXIDE, 0) * dry;
  return [dry - excess, air.waterFraction, excess];
}

/**
 * A transport property of the mixture from that of each gas, with Wilke's weights.
 *
 * @param fractions - mole fractions
 * @param viscosities - of each gas, Pa·s; they set the weights
 * @param property - of each gas, any unit
 * @returns the property of the mixture, same unit
 * @source C. R. Wilke, J. Chem. Phys. 18 (1950) 517; for conductivity E. A. Mason and S. C. Saxena, Phys. Fluids 1
 *   (1958) 361, with the factor 1
 */
export function mixGases(fractions: PerGas, viscosities: PerGas, property: PerGas): number {
  let mixed = 0;
  for (const i of GASES) {
    let weight = 0;
    for (const j of GASES) {
      const massRatio = MOLAR_MASSES[j] / MOLAR_MASSES[i];
      const root = 1 + Math.sqrt(viscosities[i] / viscosities[j]) * massRatio ** 0.25;
      weight += (fractions[j] * root * root) / Math.sqrt(8 * (1 + 1 / massRatio));
    }
    mixed += (fractions[i] * property[i]) / weight;
  }
  return mixed;
}
