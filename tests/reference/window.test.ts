import { describe, expect, it } from 'vitest';
import { windowEnd, windowImpedance, type WindowEnd } from '#shared/acoustics/mouth-end/window.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/window.json' with { type: 'json' };

const statics = tableRows(table.columns, table.rows);
const dynamics = tableRows(table.freq_columns, table.freq_rows);
const z = new Float64Array(2);

/** The bore's radius is 1; the rows with a frequency all have a ramp of 20°. */
function endOf(row: TableRow, rampDegrees = 20): WindowEnd {
  return windowEnd({
    boreRadius: 1,
    width: row.number('W/a'),
    length: row.number('H/a'),
    wall: row.number('t/a'),
    ramp: (rampDegrees * Math.PI) / 180,
  });
}

const staticLength = (row: TableRow) => endOf(row, row.number('ramp_deg')).staticLength;

function growth(row: TableRow): number {
  const end = endOf(row);
  windowImpedance(end, row.number('ka'), z, 0);
  return z[1]! / row.number('ka') - end.staticLength;
}

describe('windows', () => {
  it('have the fitted length', () => {
    const errors = statics.map((row) => relative(staticLength(row), row.number('L_fit/a')));
    expect(spreadOf(errors).max).toBeLessThan(1e-4);
  });

  it.each([
    // Rms and largest, as stated with the table.
    ['shapes that were fitted', ['fit'], 0.0127, 0.0256],
    ['shapes computed afterwards', ['val', 'freqval'], 0.0093, 0.0189],
    ['other ramps and solid backs', ['var'], 0.0092, 0.0219],
  ])('have the length of the finite elements: %s', (_, sets, rms, max) => {
    const rows = statics.filter((row) => row.isIn('set', sets));
    const spread = spreadOf(rows.map((row) => relative(staticLength(row), row.number('L_fem/a'))));
    expect(spread.rms).toBeLessThan(rms);
    expect(spread.max).toBeLessThan(max);
  });

  it('grow with frequency as fitted, and as the finite elements within 0.015 bore radii', () => {
    const fitted = dynamics.map((row) => growth(row) - row.number('dL_fit/a'));
    const exact = dynamics.map((row) => growth(row) - row.number('dL_fem/a'));
    // Five printed figures of a length near 5.
    expect(spreadOf(fitted).max).toBeLessThan(3e-5);
    expect(spreadOf(exact).max).toBeLessThan(0.015);
  });

  it('have the resistance of an opening in a long body, within 7 % of the finite elements to 0.3', () => {
    const resistance = (row: TableRow) => {
      windowImpedance(endOf(row), row.number('ka'), z, 0);
      return z[0]!;
    };
    const fitted = dynamics.map((row) => relative(resistance(row), row.number('r_from_g')));
    const low = dynamics.filter((row) => row.number('ka') <= 0.3);
    const exact = low.map((row) => relative(resistance(row), row.number('r_fem')));
    expect(spreadOf(fitted).max).toBeLessThan(1e-4);
    expect(spreadOf(exact).max).toBeLessThan(0.07);
  });
});
