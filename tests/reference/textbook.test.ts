import { describe, expect, it } from 'vitest';
import { openHoleCutoffHz } from '#shared/analysis/open-hole-cutoff.ts';
import { prepareColumn } from '#shared/acoustics/response/prepared-column.ts';
import { findResonances } from '#shared/acoustics/response/resonances.ts';
import type { Column, ColumnHole } from '#shared/acoustics/response/column.ts';
import table from './tables/textbook.json' with { type: 'json' };

const value = (start: string): number => {
  const item = table.items.find(({ name }) => name.startsWith(start));
  if (typeof item?.value !== 'number') throw new Error(`no item ${start}`);
  return item.value;
};

const air = { density: 1.2, viscosity: 1.8e-5, heatCapacityRatio: 1.4, prandtl: 0.71, lossless: true };

function tube(change: Partial<Column>, length: number, speedOfSound: number): Column {
  return {
    bore: [
      { position: 0, radius: 1e-4 },
      { position: length, radius: 1e-4 },
    ],
    input: 0,
    mouth: { kind: 'ideal-open' },
    foot: { kind: 'open', outerRadius: 1.001e-4 },
    holes: [],
    outside: { ...air, speedOfSound },
    warmth: null,
    ...change,
  };
}

function modes(column: Column, count = 4): number[] {
  const { prepared, fingerings } = prepareColumn(column, [[]]);
  const maxima = prepared.playsMaxima;
  return findResonances(prepared, fingerings, { count, coupling: true, maxima })[0]!.map(
    ({ frequency }) => frequency,
  );
}

describe('textbook examples', () => {
  it('sounds 128 Hz on a stopped tube of the length in OpenStax College Physics', () => {
    const [first] = modes(tube({ foot: { kind: 'stopped' } }, value('closed tube length for 128 Hz'), 344));
    expect(first).toBeCloseTo(128, 3);
  });

  it('sounds 1:2:3:4 open–open and 1:3:5:7 open–closed, an octave lower for the same length', () => {
    const open = modes(tube({}, 1, 340));
    const closed = modes(tube({ mouth: { kind: 'ideal-closed' } }, 1, 340));
    open.forEach((frequency, i) => expect(frequency / open[0]!).toBeCloseTo(i + 1, 3));
    closed.forEach((frequency, i) => expect(frequency / closed[0]!).toBeCloseTo(2 * i + 1, 3));
    expect(open[0]! / closed[0]!).toBeCloseTo(value('open-closed vs open-open'), 3);
  });

  it('gives the hand-calculated open–closed pipe with its end correction', () => {
    const column = tube(
      {
        bore: [
          { position: 0, radius: 7.5e-3 },
          { position: 0.6, radius: 7.5e-3 },
        ],
        foot: { kind: 'open', outerRadius: 7.5e-3 },
        mouth: { kind: 'ideal-closed' },
      },
      0.6,
      343,
    );
    expect(modes(column)[0]).toBeCloseTo(value('open-closed pipe 0.60 m'), 2);
  });

  it('sounds all multiples on a complete cone, the same as an open pipe of its length', () => {
    const cone = tube(
      {
        bore: [
          { position: 0, radius: 1e-6 },
          { position: 1, radius: 1e-3 },
        ],
        foot: { kind: 'open', outerRadius: 1.001e-3 },
        mouth: { kind: 'ideal-closed' },
      },
      1,
      340,
    );
    const found = modes(cone);
    found.forEach((frequency, i) => expect(frequency / found[0]!).toBeCloseTo(i + 1, 2));
    expect(found[0]! / 170).toBeCloseTo(1, 2);
  });

  it("gives Benade's cutoff of a row of open holes", () => {
    const hole = (position: number): ColumnHole => ({
      position,
      radius: 4e-3,
      boreRadius: 9.5e-3,
      outerRadius: 13.5e-3,
      chimney: 4e-3,
      angle: 0,
      flare: null,
      lid: 'curved',
      pad: null,
    });
    const column = tube({ holes: [hole(0.2), hole(0.23), hole(0.26)] }, 0.4, 345);
    const cutoff = openHoleCutoffHz(column, [{ kind: 'open' }, { kind: 'open' }, { kind: 'open' }]);
    expect(cutoff).toBeCloseTo(value("Benade's tone-hole lattice"), 0);
  });
});
