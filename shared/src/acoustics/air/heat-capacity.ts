import { dryAirMolarMass, GAS_CONSTANT, WATER_MOLAR_MASS } from './density.ts';
import { ROOM_CARBON_DIOXIDE, type HumidAir } from './humid-air.ts';

/** Heat capacities over the gas constant of a linear and of a bent rigid molecule. */
const LINEAR = 3.5;
const BENT = 4;
const SINGLE_ATOM = 2.5;

/** Mole fractions in dry air with 0.04 % CO2. */
const NITROGEN = 0.78084;
const OXYGEN = 0.20946;
const ARGON = 0.00934;

/**
 * Heat capacity of moist air with CO2 at constant pressure, from rigid rotators with harmonic vibrations.
 *
 * @param air - moist air, see `humidAir`
 * @returns J/(kg·K)
 * @source statistical mechanics of ideal gases; vibration temperatures of N2, O2, H2O and CO2 from memory of handbooks
 */
export function heatCapacity(air: HumidAir): number {
  const { temperature: t, waterFraction: xw, carbonDioxideFraction: xc } = air;
  const vibration = (characteristic: number) => vibrationHeat(characteristic / t);
  const water = BENT + vibration(2295) + vibration(5262) + vibration(5404);
  const carbonDioxide = LINEAR + 2 * vibration(960) + vibration(1918) + vibration(3380);
  const dry =
    NITROGEN * (LINEAR + vibration(3393)) +
    (OXYGEN - (xc - ROOM_CARBON_DIOXIDE)) * (LINEAR + vibration(2273)) +
    ARGON * SINGLE_ATOM +
    xc * carbonDioxide;
  const molarMass = dryAirMolarMass(xc) * (1 - xw) + WATER_MOLAR_MASS * xw;
  return ((xw * water + (1 - xw) * dry) * GAS_CONSTANT) / molarMass;
}

// Heat capacity of one harmonic vibration over the gas constant (Einstein).
function vibrationHeat(x: number): number {
  const e = Math.exp(-x);
  return (x * x * e) / ((1 - e) * (1 - e));
}
