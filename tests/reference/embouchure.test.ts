import { describe, expect, it } from 'vitest';
import { embouchureRadius, lipLength } from '#shared/acoustics/mouth-end/embouchure.ts';
import { NODE_COMPLIANCE_RATIO } from '#shared/acoustics/tone-hole/node-compliance.ts';
import { openSeriesLength } from '#shared/acoustics/tone-hole/series-length.ts';
import { openHoleImpedance } from './open-hole-impedance.ts';
import { imaginary, inverse, plus, real, times } from './phasor.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/embouchure.json' with { type: 'json' };

const lips = tableRows(table.columns, table.rows);
const tees = tableRows(table.tee_columns, table.tee_rows);

/** The hole's equivalent radius is 1 in these rows. */
const length = (row: TableRow) =>
  lipLength({
    fraction: row.number('phi'),
    angle: (row.number('alpha') * Math.PI) / 180,
    holeRadius: 1,
    outerRadius: row.number('R/b'),
  });

describe('lips on an embouchure hole', () => {
  it('have the fitted length', () => {
    const errors = lips.map((row) => relative(length(row), row.number('L_fit/b')));
    expect(spreadOf(errors).max).toBeLessThan(1e-4);
  });

  it.each([
    // Rms and largest in hole radii, as stated with the table; the three rows with a free outlet are in "fit".
    ['fit', 0.0175, 0.034],
    ['val', 0.0183, 0.029],
    ['var', 0.04, 0.0784],
  ])('have the length of the finite elements, %s rows', (set, rms, max) => {
    const rows = lips.filter((row) => row.isIn('set', [set]));
    const spread = spreadOf(rows.map((row) => length(row) - row.number('L_fem/b')));
    expect(spread.rms).toBeLessThan(rms);
    expect(spread.max).toBeLessThan(max);
  });
});

describe('embouchure hole between bore and stopper', () => {
  it('has the reactance that the full T gives', () => {
    const errors = tees.map((row) => relative(teeReactance(row), row.number('full T')));
    expect(spreadOf(errors).max).toBeLessThan(3e-4);
  });

  it('has the end length of the finite elements within 0.018 bore radii', () => {
    const errors = tees.map((row) => {
      const k = row.number('ka');
      const exact = row.number('X/Z0 fem (ka=0: end length/a)');
      if (k === 0) return teeReactance(row) - exact;
      // Length of bore with that reactance, the nearer branch of the tangent.
      const turn = Math.atan(teeReactance(row)) - Math.atan(exact);
      return (turn - Math.PI * Math.round(turn / Math.PI)) / k;
    });
    const spread = spreadOf(errors);
    expect(spread.rms).toBeLessThan(0.0106);
    expect(spread.max).toBeLessThan(0.0185);
  });
});

/** Lossless reactance over Z0 that the bore sees at the hole's axis, free outlet; the end length at frequency 0. */
function teeReactance(row: TableRow): number {
  const k = Math.max(row.number('ka'), 1e-4);
  const chimney = row.number('t/a');
  const radius = embouchureRadius(2 * row.number('ba/a'), 2 * row.number('bc/a'));
  const overBore = radius ** -2;
  const series = k * openSeriesLength(1, radius, chimney) * overBore;
  const hole = times(openHoleImpedance([1, radius, chimney], k), real(overBore));
  const node = imaginary((k * NODE_COMPLIANCE_RATIO * radius) / overBore);
  const cavity = imaginary(series / 2 - 1 / Math.tan(k * row.number('ls/a')));
  const junction = inverse(plus(plus(inverse(hole), node), inverse(cavity)));
  const reactance = series / 2 + junction.im;
  return row.number('ka') === 0 ? reactance / k : reactance;
}
