import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineInputError } from '../engine-input-error.ts';
import { airProperties } from './air-properties.ts';
import type { AirConditions } from './humid-air.ts';

const room: AirConditions = {
  temperature: 293.15,
  pressure: 101_325,
  relativeHumidity: 0.5,
  carbonDioxideFraction: 4e-4,
};

const conditions = fc.record({
  temperature: fc.double({ min: 273.15, max: 312.15, noNaN: true }),
  pressure: fc.double({ min: 60_000, max: 109_000, noNaN: true }),
  relativeHumidity: fc.double({ min: 0, max: 0.99, noNaN: true }),
  carbonDioxideFraction: fc.double({ min: 0, max: 0.059, noNaN: true }),
});

describe('air properties', () => {
  it('are those of air, everywhere in range', () => {
    fc.assert(
      fc.property(conditions, (given) => {
        const air = airProperties(given);
        expect(air.speedOfSound).toBeGreaterThan(320);
        expect(air.speedOfSound).toBeLessThan(370);
        expect(air.density).toBeGreaterThan(0.6);
        expect(air.density).toBeLessThan(1.5);
        expect(air.viscosity).toBeGreaterThan(1.6e-5);
        expect(air.viscosity).toBeLessThan(2e-5);
        expect(air.heatCapacityRatio).toBeGreaterThan(1.38);
        expect(air.heatCapacityRatio).toBeLessThan(1.41);
        expect(air.prandtl).toBeGreaterThan(0.68);
        expect(air.prandtl).toBeLessThan(0.76);
      }),
    );
  });

  it('change little with a little change of any condition', () => {
    fc.assert(
      fc.property(
        conditions,
        fc.constantFrom(...(Object.keys(room) as (keyof AirConditions)[])),
        (given, key) => {
          const step = {
            temperature: 0.01,
            pressure: 10,
            relativeHumidity: 1e-3,
            carbonDioxideFraction: 1e-5,
          }[key];
          const before = airProperties(given);
          const after = airProperties({ ...given, [key]: given[key] + step });
          for (const quantity of Object.keys(before) as (keyof typeof before)[]) {
            expect(Math.abs(after[quantity] / before[quantity] - 1)).toBeLessThan(2e-4);
          }
        },
      ),
    );
  });

  it('sound faster in warm and in moist air, slower in breath', () => {
    fc.assert(
      fc.property(conditions, (given) => {
        const { speedOfSound } = airProperties(given);
        expect(airProperties({ ...given, temperature: given.temperature + 1 }).speedOfSound).toBeGreaterThan(
          speedOfSound,
        );
        expect(
          airProperties({ ...given, relativeHumidity: given.relativeHumidity + 0.01 }).speedOfSound,
        ).toBeGreaterThan(speedOfSound);
        expect(
          airProperties({ ...given, carbonDioxideFraction: given.carbonDioxideFraction + 1e-3 }).speedOfSound,
        ).toBeLessThan(speedOfSound);
      }),
    );
  });

  it.each([
    ['temperature', 273],
    ['temperature', 313.3],
    ['temperature', Number.NaN],
    ['pressure', 59_000],
    ['pressure', 111_000],
    ['relativeHumidity', -0.01],
    ['relativeHumidity', 1.01],
    ['carbonDioxideFraction', -1e-6],
    ['carbonDioxideFraction', 0.07],
  ] as const)('refuses a %s of %s and names it', (field, value) => {
    expect(() => airProperties({ ...room, [field]: value })).toThrow(EngineInputError);
    expect(() => airProperties({ ...room, [field]: value })).toThrow(
      expect.objectContaining({ field, value }),
    );
  });

  it('holds at the very edges', () => {
    for (const temperature of [273.15, 313.15, 0 + 273.15, 40 + 273.15]) {
      expect(airProperties({ ...room, temperature }).speedOfSound).toBeGreaterThan(330);
    }
  });
});
