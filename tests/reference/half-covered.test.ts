import { describe, expect, it } from 'vitest';
import {
  halfCoveredLength,
  halfCoveredShift,
  type HalfCover,
} from '#shared/acoustics/tone-hole/half-covered.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/half_covered.json' with { type: 'json' };

const long = tableRows(table.columns, table.rows);
const full = tableRows(table.full_columns, table.full_rows);

/** The hole's radius is 1; a chimney of 8 counts as long. */
const longCover = (row: TableRow): HalfCover => ({
  fraction: row.number('phi'),
  from: row.cell('side_lid') === true ? 'side' : 'end',
  holeRadius: 1,
  outerRadius: 1 / row.number('b/R'),
  chimney: 8,
});

const fullCover = (row: TableRow): HalfCover => ({
  fraction: row.number('phi'),
  from: row.isIn('set', ['val_side']) ? 'side' : 'end',
  holeRadius: 1,
  outerRadius: 1 / row.number('b/a') + row.number('t/b'),
  chimney: row.number('t/b'),
});

describe('half-covered holes', () => {
  it('has the fitted length of a long chimney', () => {
    const errors = long.map((row) => relative(halfCoveredLength(longCover(row)), row.number('D_fit/b')));
    expect(spreadOf(errors).max).toBeLessThan(1e-4);
  });

  it('has the fitted length and shift of a hole in a bore', () => {
    const lengths = full.map((row) => relative(halfCoveredLength(fullCover(row)), row.number('D_fit/b')));
    const shifts = full.map((row) => halfCoveredShift(fullCover(row)) - row.number('shift_fit/b'));
    expect(spreadOf(lengths).max).toBeLessThan(1e-4);
    expect(spreadOf(shifts).max).toBeLessThan(1e-5);
  });

  it.each([
    ['fit', 0.046],
    ['val', 0.111],
  ])('has the length of the finite elements, long chimney, %s rows', (set, tolerance) => {
    const rows = long.filter((row) => row.isIn('set', [set]));
    const errors = rows.map((row) => halfCoveredLength(longCover(row)) - row.number('D_fem/b'));
    expect(spreadOf(errors).max).toBeLessThan(tolerance);
  });

  it.each([
    // Share of the whole shunt, rms and largest, as stated with the table.
    ['fit_axial', 0.0042, 0.0099],
    ['val_axial', 0.0042, 0.0066],
    ['val_side', 0.0105, 0.0174],
  ])('has the whole shunt of the finite elements, %s rows', (set, rms, max) => {
    const rows = full.filter((row) => row.isIn('set', [set]));
    const errors = rows.map((row) => {
      const error = halfCoveredLength(fullCover(row)) - row.number('D_fem/b');
      return error / (row.number('Zs0') + row.number('D_fem/b'));
    });
    expect(spreadOf(errors).rms).toBeLessThan(rms);
    expect(spreadOf(errors).max).toBeLessThan(max);
  });

  it('moves the axis as the finite elements do, within 0.04 hole radii', () => {
    const axial = full.filter((row) => !row.isIn('set', ['val_side']));
    const errors = axial.map((row) => halfCoveredShift(fullCover(row)) - row.number('shift_fem/b'));
    expect(spreadOf(errors).max).toBeLessThan(0.04);
  });
});
