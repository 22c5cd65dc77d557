import { describe, expect, it } from 'vitest';
import { buildWhistle } from '../../../tests/sheets/build-sheet-input.ts';
import { boreRows } from './bore-rows.ts';

const profile = (...stations: [positionMm: number, diameterMm: number][]) => ({
  stations: stations.map(([positionMm, diameterMm]) => ({ positionMm, diameterMm })),
});

describe('the bore table', () => {
  it('lists the bore from the foot upward, then the outside, then the window', () => {
    const rows = boreRows(buildWhistle());
    expect(rows.map((row) => [row.step, row.footwardMm, row.mouthwardMm])).toEqual([
      ['B1', 265, -4.6],
      ['B2', 265, -31],
      ['B3', 0, -4.6],
    ]);
  });

  it('lays stations on one line together and keeps each change of taper', () => {
    const bore = profile([-4.6, 19], [50, 19], [100, 19], [150, 18], [200, 17], [265, 16.9]);
    const spans = boreRows(buildWhistle({ bore, outside: profile([-31, 30], [265, 30]) })).slice(0, 3);
    expect(spans.map((row) => [row.footwardMm, row.mouthwardMm])).toEqual([
      [265, 200],
      [200, 100],
      [100, -4.6],
    ]);
    expect(spans[1]?.diametersMm).toEqual({ footward: 17, mouthward: 19 });
  });

  it('makes no row of a step', () => {
    const bore = profile([-4.6, 14], [100, 14], [100, 12], [265, 12]);
    const spans = boreRows(buildWhistle({ bore })).filter((row) => row.what.startsWith('Bore'));
    expect(spans).toHaveLength(2);
  });
});
