import type { Air } from './air.ts';
import { airDensity } from './density.ts';
import { heatCapacity } from './heat-capacity.ts';
import { heatCapacityRatio } from './heat-capacity-ratio.ts';
import { humidAir, type AirConditions } from './humid-air.ts';
import { speedOfSound } from './speed-of-sound.ts';
import { thermalConductivity } from './thermal-conductivity.ts';
import { airViscosity } from './viscosity.ts';

/**
 * All that the engine needs to know of moist air with CO2.
 *
 * @param conditions - temperature 273.15–313.15 K, pressure 60–110 kPa, relative humidity 0–1, CO2 mole fraction 0–0.06
 *   (0.0004 in a room, 0.02–0.04 in a blown instrument)
 * @returns sound speed (m/s), density (kg/m³), viscosity (Pa·s), heat capacity ratio and Prandtl number
 * @throws EngineInputError if a condition is outside its range or not a number
 * @source Cramer (1993), CIPM-2007, and for the transport properties the sources in their own files
 */
export function airProperties(conditions: AirConditions): Air {
  const air = humidAir(conditions);
  const viscosity = airViscosity(air);
  return {
    speedOfSound: speedOfSound(air),
    density: airDensity(air),
    viscosity,
    heatCapacityRatio: heatCapacityRatio(air),
    prandtl: (viscosity * heatCapacity(air)) / thermalConductivity(air),
  };
}
