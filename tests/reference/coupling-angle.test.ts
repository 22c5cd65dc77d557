import { describe, expect, it } from 'vitest';
import { innerCoupling } from '#shared/acoustics/radiation/inner-coupling.ts';
import {
  bafflingFactor,
  mutualRadiation,
  openingPair,
} from '#shared/acoustics/radiation/mutual-radiation.ts';
import { spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/coupling_angle.json' with { type: 'json' };
import between from './tables/inner_coupling_30_60.json' with { type: 'json' };

const radians = (degrees: number) => (degrees * Math.PI) / 180;
const g = new Float64Array(2);

describe('openings at an angle round the body against the exact Green function', () => {
  const statics = tableRows(table.columns, table.rows);
  const dynamics = tableRows(table.dyn_columns, table.dyn_rows);
  const factor = (row: TableRow) =>
    bafflingFactor(row.number('z/R'), Math.sin(radians(row.number('theta_deg')) / 2) ** 2);
  const couple = (row: TableRow) => {
    mutualRadiation(
      row.number('kR'),
      openingPair(row.number('z/R'), radians(row.number('theta_deg')), 1),
      g,
      0,
    );
  };

  it('gives the baffling factor as fitted and the exact one within 0.0085', () => {
    const fitted = statics.map((row) => factor(row) - row.number('D_fit'));
    const exact = statics.map((row) => factor(row) - row.number('D'));
    expect(spreadOf(fitted).max).toBeLessThan(1e-4);
    // 0.0072 at angles; 0.0084 for two holes almost in one place on one side.
    expect(spreadOf(exact).max).toBeLessThan(0.0085);
  });

  it('gives the coupling as fitted', () => {
    const errors = dynamics.flatMap((row) => {
      couple(row);
      const size = Math.max(1, Math.hypot(row.number('fit_Re'), row.number('fit_Im')));
      return [(g[0]! - row.number('fit_Re')) / size, (g[1]! - row.number('fit_Im')) / size];
    });
    expect(spreadOf(errors).max).toBeLessThan(1e-4);
  });

  it.each([
    [0.2, 0.012],
    [0.4, 0.03],
    [0.6, 0.081],
  ])('gives the exact coupling from 60° on at wavenumber·radius %s within %s', (kR, tolerance) => {
    const rows = dynamics.filter((row) => row.number('kR') === kR && row.number('theta_deg') >= 59);
    const errors = rows.map((row) => {
      couple(row);
      return Math.hypot(g[0]! - row.number('Re G R'), g[1]! - row.number('Im G R'));
    });
    expect(spreadOf(errors).max).toBeLessThan(tolerance);
  });

  it.each([
    // Imaginary part from the exact Green function (Hankel functions to order 14, 80-point quadrature), R = 1, z = 0.
    [0.8, 90, -0.511],
    [0.8, 180, -0.016],
    [1, 60, -0.958],
    [1, 180, 0.128],
    [1.5, 120, 0.095],
    [1.5, 180, 0.116],
  ])('stays near the exact resistance beyond the fit, at %s and %s°', (kR, degrees, exact) => {
    mutualRadiation(kR, openingPair(0, radians(degrees), 1), g, 0);
    expect(Math.abs(g[1]! - exact)).toBeLessThan(kR > 1 ? 0.62 : 0.15);
  });
});

describe('open holes that couple inside the bore', () => {
  const rows = tableRows(table.inner_columns, table.inner_rows);

  it('gives the fitted coupling of opposite holes', () => {
    const errors = rows.map((row) => innerCoupling(row.number('z/a'), Math.PI) - row.number('Mi_180_fit'));
    expect(spreadOf(errors).max).toBeLessThan(1e-5);
  });

  it('gives the exact coupling of opposite holes within 0.004', () => {
    const errors = rows.map((row) => innerCoupling(row.number('z/a'), Math.PI) - row.number('Mi_180'));
    expect(spreadOf(errors).max).toBeLessThan(0.004);
  });

  it.each([90, 120, 150])('gives the exact coupling at %s°', (degrees) => {
    const near = rows.filter((row) => row.number('z/a') < 0.75);
    const far = rows.filter((row) => row.number('z/a') >= 0.75);
    const errorsOf = (some: readonly TableRow[]) =>
      some.map((row) => innerCoupling(row.number('z/a'), radians(degrees)) - row.number(`Mi_${degrees}`));
    expect(spreadOf(errorsOf(near)).max).toBeLessThan(2e-5);
    expect(spreadOf(errorsOf(far)).max).toBeLessThan(0.003);
  });

  it('gives the exact coupling of holes on one side', () => {
    const apart = rows.filter((row) => row.number('z/a') > 0);
    const errors = apart.map((row) => innerCoupling(row.number('z/a'), 0) - row.number('Mi_0'));
    expect(spreadOf(errors).max).toBeLessThan(0.009);
  });

  it.each([30, 60])('gives the exact coupling at %s°', (degrees) => {
    const errors = tableRows(between.columns, between.rows).map(
      (row) => innerCoupling(row.number('z/a'), radians(degrees)) - row.number(`m_${degrees}`),
    );
    expect(spreadOf(errors).max).toBeLessThan(0.004);
  });

  it('couples wide holes back to back as the finite elements do', () => {
    const pairs = tableRows(table.opposite_same_z_columns, table.opposite_same_z_rows);
    const errors = pairs.map((row) => {
      const ratio = (row.number('b1/a') + row.number('b2/a')) / 2;
      return innerCoupling(0, Math.PI, ratio) - row.number('Mi_from_fem');
    });
    expect(spreadOf(errors).max).toBeLessThan(0.008);
  });
});
