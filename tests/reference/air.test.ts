import { describe, expect, it } from 'vitest';
import { airProperties } from '#shared/acoustics/air/air-properties.ts';
import { airDensity } from '#shared/acoustics/air/density.ts';
import { humidAir } from '#shared/acoustics/air/humid-air.ts';
import {
  dryAirConductivity,
  thermalConductivity,
  waterConductivity,
} from '#shared/acoustics/air/thermal-conductivity.ts';
import { dryAirViscosity } from '#shared/acoustics/air/viscosity.ts';
import { heatCapacity } from '#shared/acoustics/air/heat-capacity.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/air.json' with { type: 'json' };

const rows = tableRows(table.columns, table.rows);
const conditions = (row: TableRow) => ({
  temperature: row.number('t_C') + 273.15,
  pressure: 101_325,
  relativeHumidity: row.number('rh'),
  carbonDioxideFraction: row.number('xc'),
});

/** The same published formulas, printed with eight figures. */
const SAME_FORMULAS = 1e-6;

describe('air against the published formulas', () => {
  it.each([
    ['c', (row: TableRow) => airProperties(conditions(row)).speedOfSound],
    ['rho', (row: TableRow) => airProperties(conditions(row)).density],
    ['eta', (row: TableRow) => airProperties(conditions(row)).viscosity],
    ['kappa', (row: TableRow) => thermalConductivity(humidAir(conditions(row)))],
    ['cp', (row: TableRow) => heatCapacity(humidAir(conditions(row)))],
    ['gamma', (row: TableRow) => airProperties(conditions(row)).heatCapacityRatio],
    ['Pr', (row: TableRow) => airProperties(conditions(row)).prandtl],
  ] as const)('gives %s at every temperature, humidity and CO2', (column, quantity) => {
    const spread = spreadOf(rows.map((row) => relative(quantity(row), row.number(column))));
    expect(spread.count).toBe(108);
    expect(spread.max).toBeLessThan(SAME_FORMULAS);
  });

  it('gives the share of water vapour', () => {
    const errors = rows.map((row) => humidAir(conditions(row)).waterFraction - row.number('xw'));
    expect(spreadOf(errors).max).toBeLessThan(1e-9);
  });

  it('keeps the sound speed within half a cent of the ideal gas', () => {
    const cents = rows.map(
      (row) => 1200 * Math.log2(airProperties(conditions(row)).speedOfSound / row.number('c_ideal_gas')),
    );
    expect(spreadOf(cents).max).toBeLessThan(0.5);
  });
});

describe('air at other pressures', () => {
  const { columns, rows: cells } = table.pressure_check;
  const state = (row: TableRow) => ({
    temperature: row.number('t_C') + 273.15,
    pressure: row.number('p'),
    relativeHumidity: 0.5,
    carbonDioxideFraction: 4e-4,
  });

  it('gives the sound speed', () => {
    const errors = tableRows(columns, cells).map((row) =>
      relative(airProperties(state(row)).speedOfSound, row.number('c')),
    );
    expect(spreadOf(errors).max).toBeLessThan(SAME_FORMULAS);
  });

  it('gives the density, with the saturation pressure of 2007 that these rows were made with', () => {
    const errors = tableRows(columns, cells).map((row) => {
      const { temperature: t, pressure } = state(row);
      // Picard et al., Metrologia 45 (2008) 149, equation of the saturation pressure.
      const saturation = Math.exp(1.2378847e-5 * t * t - 1.9121316e-2 * t + 33.93711047 - 6343.1645 / t);
      const enhancement = 1.00062 + 3.14e-8 * pressure + 5.6e-7 * (t - 273.15) ** 2;
      const waterFraction = (0.5 * enhancement * saturation) / pressure;
      return relative(airDensity({ ...humidAir(state(row)), waterFraction }), row.number('rho'));
    });
    expect(spreadOf(errors).max).toBeLessThan(SAME_FORMULAS);
  });
});

describe('air against handbooks', () => {
  it('is within a cent of ISO 9613-1 when dry', () => {
    const { columns, rows: cells } = table.iso9613;
    const cents = tableRows(columns, cells).map((row) => {
      const air = airProperties({
        temperature: row.number('t_C') + 273.15,
        pressure: 101_325,
        relativeHumidity: 0,
        carbonDioxideFraction: 4e-4,
      });
      return 1200 * Math.log2(air.speedOfSound / row.number('c_iso'));
    });
    expect(spreadOf(cents).max).toBeLessThan(1);
  });

  it('stays near the constants of Keefe (1984) around 300 K', () => {
    const near = tableRows(table.keefe1984.columns, table.keefe1984.rows).filter(
      (row) => row.number('t_C') >= 15,
    );
    for (const row of near) {
      const air = airProperties({
        temperature: row.number('t_C') + 273.15,
        pressure: 101_325,
        relativeHumidity: 0,
        carbonDioxideFraction: 4e-4,
      });
      expect(Math.abs(relative(air.speedOfSound, row.number('c')))).toBeLessThan(1.5e-3);
      expect(Math.abs(relative(air.density, row.number('rho')))).toBeLessThan(3e-3);
      expect(Math.abs(relative(air.viscosity, row.number('eta')))).toBeLessThan(1e-2);
      expect(Math.abs(relative(Math.sqrt(air.prandtl), row.number('sqrtPr')))).toBeLessThan(5e-3);
    }
  });

  it.each([
    // Lemmon and Jacobsen, Int. J. Thermophys. 25 (2004) 21, check values of the dilute gas.
    ['viscosity of dry air at 300 K', dryAirViscosity(300), 18.523e-6, 1e-7],
    ['conductivity of dry air at 300 K', dryAirConductivity(300), 26.3529e-3, 5e-5],
    // IAPWS R15-11, check value of the dilute vapour.
    ['conductivity of water vapour at 298.15 K', waterConductivity(298.15), 18.4341883e-3, 1e-8],
  ])('gives the printed %s', (_, value, printed, tolerance) => {
    expect(Math.abs(relative(value, printed))).toBeLessThan(tolerance);
  });
});
