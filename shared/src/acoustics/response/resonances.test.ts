import { describe, expect, it } from 'vitest';
import type { Column, ColumnMouth } from './column.ts';
import { prepareColumn } from './prepared-column.ts';
import { findResonances } from './resonances.ts';

const LENGTH = 0.6;
const SPEED = 343;

function stoppedTube(mouth: ColumnMouth): Column {
  return {
    bore: [
      { position: 0, radius: 5e-4 },
      { position: LENGTH, radius: 5e-4 },
    ],
    input: 0,
    mouth,
    foot: { kind: 'stopped' },
    holes: [],
    outside: {
      speedOfSound: SPEED,
      density: 1.2,
      viscosity: 1.8e-5,
      heatCapacityRatio: 1.4,
      prandtl: 0.71,
      lossless: true,
    },
    warmth: null,
  };
}

describe('findResonances', () => {
  // Every resonance of such a tube lies on a sample of the scan, where rounding alone decides on which side.
  it.each([
    ['odd', 'ideal-open', (order: number) => 2 * order - 1],
    ['even', 'ideal-closed', (order: number) => 2 * order],
  ] as const)('finds the %s multiples of c/4L of a stopped %s tube, each once', (_, kind, multiple) => {
    const { prepared, fingerings } = prepareColumn(stoppedTube({ kind }), [[]]);
    const search = { count: 24, coupling: true, maxima: prepared.playsMaxima };
    const found = findResonances(prepared, fingerings, search)[0] ?? [];
    expect(found.map(({ order }) => order)).toEqual(Array.from({ length: 24 }, (__, i) => i + 1));
    for (const { order, frequency } of found) {
      expect(Math.abs(frequency - (multiple(order) * SPEED) / (4 * LENGTH))).toBeLessThan(1e-5);
    }
  });
});
