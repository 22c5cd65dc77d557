import { EngineInputError } from '../engine-input-error.ts';

/** What a maker can say about the air: temperature in K, pressure in Pa, humidity from 0 to 1, CO2 as a mole fraction. */
export interface AirConditions {
  temperature: number;
  pressure: number;
  relativeHumidity: number;
  carbonDioxideFraction: number;
}

/** Conditions with the share of water vapour worked out. */
export interface HumidAir extends AirConditions {
  /** Mole fraction of water vapour. */
  waterFraction: number;
}

/** Beyond these limits the air properties refuse; the sound speed is checked to 0.5 cent inside them. */
export const AIR_RANGE = {
  temperature: { from: 273.15, to: 313.15 },
  pressure: { from: 60_000, to: 110_000 },
  relativeHumidity: { from: 0, to: 1 },
  carbonDioxideFraction: { from: 0, to: 0.06 },
} as const;

/** Above this share of CO2 the sound speed has not been held against an independent computation. */
export const CARBON_DIOXIDE_CHECKED_TO = 0.04;

/** 0 °C in K. */
export const ICE_POINT = 273.15;

/** CO2 in ordinary dry air, mole fraction; breath carries more, and less oxygen. */
export const ROOM_CARBON_DIOXIDE = 4e-4;

const SLACK = 1e-9;

const REFUSALS: Record<keyof AirConditions, string> = {
  temperature: 'The air properties hold from 0 to 40 °C. Give a temperature between them.',
  pressure: 'The air properties hold from 60 to 110 kPa. Give a pressure between them.',
  relativeHumidity: 'Relative humidity lies between 0 and 1.',
  carbonDioxideFraction: 'The air properties hold up to 6 % carbon dioxide. Give a share from 0 to 0.06.',
};

/**
 * Works out the water vapour in air of stated conditions, and refuses conditions outside the formulas' range.
 *
 * @param conditions - temperature 273.15–313.15 K, pressure 60–110 kPa, relative humidity 0–1, CO2 0–0.06
 * @returns the conditions with the mole fraction of water vapour
 * @throws EngineInputError if a condition is outside its range or not a number
 * @source Saturation pressure and enhancement factor: CIPM-81 (P. Giacomo, Metrologia 18 (1982) 33), as used by
 *   O. Cramer, J. Acoust. Soc. Am. 93 (1993) 2510
 */
export function humidAir(conditions: AirConditions): HumidAir {
  for (const field of Object.keys(REFUSALS) as (keyof AirConditions)[]) {
    const { from, to } = AIR_RANGE[field];
    const slack = SLACK * to;
    if (!(conditions[field] >= from - slack && conditions[field] <= to + slack)) {
      throw new EngineInputError(field, conditions[field], REFUSALS[field]);
    }
  }
  const { temperature, pressure, relativeHumidity } = conditions;
  const celsius = temperature - ICE_POINT;
  const enhancement = 1.00062 + 3.14e-8 * pressure + 5.6e-7 * celsius * celsius;
  const saturation = saturationPressure(temperature);
  return { ...conditions, waterFraction: (relativeHumidity * enhancement * saturation) / pressure };
}

// Saturation vapour pressure of water, Pa; CIPM-81.
function saturationPressure(temperature: number): number {
  return Math.exp(
    1.2811805e-5 * temperature * temperature -
      1.9509874e-2 * temperature +
      34.04926034 -
      6353.6311 / temperature,
  );
}
