import { describe, expect, it } from 'vitest';
import { selfRadiation } from '#shared/acoustics/radiation/cylinder-radiation.ts';
import {
  bafflingFactor,
  mutualRadiation,
  openingPair,
} from '#shared/acoustics/radiation/mutual-radiation.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows } from './table-rows.ts';
import table from './tables/interaction.json' with { type: 'json' };

const g = new Float64Array(2);

describe('openings on one side of a round body against the exact Green function', () => {
  const statics = tableRows(table.columns, table.rows);
  const self = tableRows(table.self.columns, table.self.rows);
  const mutual = tableRows(table.mutual.columns, table.mutual.rows);

  it('gives the baffling factor as fitted, and the exact one within 0.5 %', () => {
    const factor = (z: number) => bafflingFactor(z, 0);
    const fitted = statics.map((row) => relative(factor(row.number('z_over_R')), row.number('fit')));
    const exact = statics.map((row) => relative(factor(row.number('z_over_R')), row.number('D')));
    expect(spreadOf(fitted).max).toBeLessThan(1e-4);
    expect(spreadOf(exact).max).toBeLessThan(0.005);
  });

  it('gives the self-radiation at the nodes', () => {
    const errors = self.flatMap((row) => {
      selfRadiation(row.number('kR'), g, 0);
      return [g[0]! - row.number('Re_g'), g[1]! - row.number('Im_g')];
    });
    // The table prints five figures, the nodes have six.
    expect(spreadOf(errors).max).toBeLessThan(5e-5);
  });

  it('radiates as a point in free space while the body is small', () => {
    selfRadiation(1e-3, g, 0);
    expect(g[1]! / 1e-3).toBeCloseTo(-1, 2);
  });

  it('gives the mutual radiation as fitted', () => {
    const errors = mutual.flatMap((row) => {
      mutualRadiation(row.number('kR'), openingPair(row.number('z_over_R'), 0, 1), g, 0);
      return [g[0]! - row.number('fit_Re'), g[1]! - row.number('fit_Im')];
    });
    expect(spreadOf(errors).max).toBeLessThan(1e-4);
  });

  it('gives the exact mutual radiation within 0.06 over the radius', () => {
    const errors = mutual.flatMap((row) => {
      mutualRadiation(row.number('kR'), openingPair(row.number('z_over_R'), 0, 1), g, 0);
      return [g[0]! - row.number('Re'), g[1]! - row.number('Im')];
    });
    expect(spreadOf(errors).max).toBeLessThan(0.06);
  });
});
