/** What the engine needs to know of the air in and around an instrument; SI units. */
export interface Air {
  /** m/s */
  speedOfSound: number;
  /** kg/m³ */
  density: number;
  /** Dynamic viscosity, Pa·s */
  viscosity: number;
  /** Heat capacity at constant pressure over that at constant volume */
  heatCapacityRatio: number;
  /** Prandtl number */
  prandtl: number;
}
