import { describe, expect, it } from 'vitest';
import { padLength, paddedOutletLength } from '#shared/acoustics/tone-hole/pad.ts';
import { relative, spreadOf } from './spread.ts';
import { tableRows, type TableRow } from './table-rows.ts';
import table from './tables/pad.json' with { type: 'json' };

const rows = tableRows(table.columns, table.rows);
const onBody = tableRows(table.check3d_columns, table.check3d_rows);

/** The hole's radius is 1; the body plays no part beside a raised rim. */
const rimPad = (row: TableRow) => ({
  holeRadius: 1,
  padRadius: row.number('rd/b'),
  height: row.number('h/b'),
  rimWidth: row.number('w/b'),
  outerRadius: 3,
});

const bodyPad = (row: TableRow) => {
  const rim = row.cell('w/b');
  return {
    holeRadius: 1,
    padRadius: row.number('rd/b'),
    height: row.number('h/b'),
    rimWidth: typeof rim === 'number' ? rim : null,
    outerRadius: row.number('R/b'),
  };
};

describe('pads above open holes', () => {
  it('have the fitted length', () => {
    const flat = rows.map((row) => relative(padLength(rimPad(row)), row.number('D_fit/b')));
    const body = onBody.map((row) => relative(padLength(bodyPad(row)), row.number('D_fit/b')));
    expect(spreadOf([...flat, ...body]).max).toBeLessThan(1e-4);
  });

  it('have the length of the finite elements where they stand off and overlap the hole', () => {
    const usual = rows.filter((row) => row.number('h/b') >= 0.2 && row.number('rd/b') >= 1.1);
    const spread = spreadOf(usual.map((row) => padLength(rimPad(row)) - row.number('D_fem/b')));
    expect(spread.count).toBe(98);
    expect(spread.rms).toBeLessThan(0.03);
    expect(spread.max).toBeLessThan(0.11);
  });

  it('have the length of the finite elements on a round body', () => {
    const errors = (some: readonly TableRow[]) =>
      spreadOf(some.map((row) => padLength(bodyPad(row)) - row.number('D_fem/b')));
    expect(errors(onBody.filter((row) => row.cell('w/b') !== null)).max).toBeLessThan(0.05);
    const noRim = onBody.filter((row) => row.cell('w/b') === null);
    expect(errors(noRim.filter((row) => row.number('rd/b') === 1.3)).max).toBeLessThan(0.033);
    expect(errors(noRim).max).toBeLessThan(0.193);
  });

  it.each(Object.entries(table.base_without_pad))('stand on a rim %s wide of known length', (width, base) => {
    const pad = { holeRadius: 1, padRadius: 3, height: 50, rimWidth: Number(width), outerRadius: 3 };
    // Dalmont, Nederveen and Joly's interpolation against the finite elements of the bare rim: 0.6 %.
    expect(Math.abs(relative(paddedOutletLength(pad) - padLength(pad), base))).toBeLessThan(0.006);
  });
});
