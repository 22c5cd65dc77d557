import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { chainImpedance } from '../acoustics/response/chain.ts';
import type { Column, ColumnHole, ColumnMouth, HoleState } from '../acoustics/response/column.ts';
import { coupledImpedance } from '../acoustics/response/input-impedance.ts';
import { prepareColumn, tuneColumn, type PreparedColumn } from '../acoustics/response/prepared-column.ts';
import { findResonances } from '../acoustics/response/resonances.ts';

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });

interface Body {
  radii: [number, number];
  length: number;
  wall: number;
  holes: { share: number; ratio: number; open: boolean; angle: number }[];
  lossless: boolean;
  mouth: 'ideal-open' | 'ideal-closed' | 'window' | 'embouchure' | 'rim' | 'reed';
}

const bodies: fc.Arbitrary<Body> = fc.record({
  radii: fc.tuple(real(5e-3, 1e-2), real(5e-3, 1e-2)),
  length: real(0.2, 0.6),
  wall: real(2e-3, 5e-3),
  holes: fc.array(
    fc.record({
      share: real(0, 1),
      ratio: real(0.25, 0.7),
      open: fc.boolean(),
      angle: fc.constantFrom(0, Math.PI),
    }),
    { maxLength: 6 },
  ),
  lossless: fc.boolean(),
  mouth: fc.constantFrom('ideal-open', 'ideal-closed', 'window', 'embouchure', 'rim', 'reed'),
});

function mouthOf(kind: Body['mouth'], radius: number, wall: number): ColumnMouth {
  const body = { boreRadius: radius, outerRadius: radius + wall, scale: 1 };
  switch (kind) {
    case 'window':
      return { kind, width: 1.2 * radius, length: 0.6 * radius, wall: 0.3 * radius, ramp: 0.35, ...body };
    case 'rim':
      return { kind, cover: 0.5, ...body };
    case 'reed':
      return { kind, volume: 20 * radius ** 3, scale: 1 };
    case 'embouchure': {
      const hole = { along: radius, across: radius, chimney: wall, flare: null };
      return { kind, ...hole, lipCover: 0.4, lipAngle: 1.5, stopper: 2 * radius, ...body };
    }
    case 'ideal-open':
    case 'ideal-closed':
      return { kind };
  }
}

function columnOf(body: Body, scale = 1): { column: Column; states: HoleState[] } {
  const [first, last] = [body.radii[0] * scale, body.radii[1] * scale];
  const length = body.length * scale;
  const wall = body.wall * scale;
  const count = body.holes.length;
  const holes = body.holes.map((hole, i): ColumnHole => {
    const position = length * (0.35 + (0.6 * (i + 0.6 * hole.share)) / Math.max(count, 1));
    const boreRadius = first + (last - first) * (position / length);
    return {
      position,
      radius: hole.ratio * boreRadius,
      boreRadius,
      outerRadius: boreRadius + wall,
      chimney: wall,
      angle: hole.angle,
      flare: null,
      lid: 'curved',
      pad: null,
    };
  });
  const column: Column = {
    bore: [
      { position: 0, radius: first },
      { position: length, radius: last },
    ],
    input: 0,
    mouth: mouthOf(body.mouth, first, wall),
    foot: { kind: 'open', outerRadius: last + wall },
    holes,
    outside: {
      speedOfSound: 345,
      density: 1.18,
      viscosity: 1.85e-5,
      heatCapacityRatio: 1.4,
      prandtl: 0.71,
      lossless: body.lossless,
    },
    warmth: null,
  };
  return { column, states: body.holes.map(({ open }) => ({ kind: open ? 'open' : 'closed' })) };
}

function impedance(column: Column, states: HoleState[], frequency: number): [number, number] {
  const { prepared, fingerings } = prepareColumn(column, [states]);
  tuneColumn(prepared, frequency, true);
  const at = coupledImpedance(prepared, fingerings[0]!);
  return [prepared.cells[at]! / prepared.inputImpedance, prepared.cells[at + 1]! / prepared.inputImpedance];
}

function notes(column: Column, states: HoleState[], count = 3): number[] {
  const { prepared, fingerings } = prepareColumn(column, [states]);
  const maxima = prepared.playsMaxima;
  return findResonances(prepared, fingerings, { count, coupling: true, maxima })[0]!.map((r) => r.frequency);
}

const determinant = (cells: Float64Array, at: number): [number, number] => {
  const [ar, ai, br, bi, cr, ci, dr, di] = cells.subarray(at, at + 8) as unknown as number[] as [
    ...[number, number, number, number],
    ...[number, number, number, number],
  ];
  return [ar * dr - ai * di - br * cr + bi * ci, ar * di + ai * dr - br * ci - bi * cr];
};

function uncouple(prepared: PreparedColumn): void {
  const { cells, coupling } = prepared;
  cells.fill(0, coupling.outer, coupling.outer + 2 * coupling.openings ** 2);
  cells.fill(0, coupling.inner, coupling.inner + coupling.openings ** 2);
}

describe('laws of the engine over random bodies', () => {
  it('gives every two-port the determinant 1', () => {
    fc.assert(
      fc.property(bodies, real(50, 3000), (body, frequency) => {
        const { column, states } = columnOf(body);
        const { prepared } = prepareColumn(column, [states]);
        tuneColumn(prepared, frequency, true);
        const places = [
          prepared.mouth.twoPort,
          ...prepared.segments.map(({ twoPort }) => twoPort),
          ...prepared.branches.map(({ inside }) => inside),
        ];
        for (const at of places) {
          const [re, im] = determinant(prepared.cells, at);
          expect(Math.hypot(re - 1, im)).toBeLessThan(1e-10);
        }
      }),
      { numRuns: 60 },
    );
  });

  it('gives no power back: the real part of the input impedance is never below 0', () => {
    fc.assert(
      fc.property(bodies, real(50, 2500), (body, frequency) => {
        const { column, states } = columnOf(body);
        const [re, im] = impedance(column, states, frequency);
        expect(re).toBeGreaterThan(-1e-9 * Math.hypot(re, im));
      }),
      { numRuns: 200 },
    );
  });

  it('is the plain chain when no opening hears another', () => {
    fc.assert(
      fc.property(bodies, real(50, 2500), (body, frequency) => {
        const { column, states } = columnOf(body);
        const { prepared, fingerings } = prepareColumn(column, [states]);
        tuneColumn(prepared, frequency, true);
        uncouple(prepared);
        const coupled = coupledImpedance(prepared, fingerings[0]!);
        const [re, im] = [prepared.cells[coupled]!, prepared.cells[coupled + 1]!];
        const chain = chainImpedance(prepared, fingerings[0]!);
        const error = Math.hypot(prepared.cells[chain]! - re, prepared.cells[chain + 1]! - im);
        expect(error / Math.hypot(re, im)).toBeLessThan(1e-10);
      }),
      { numRuns: 100 },
    );
  });

  it('sounds an octave higher at half the size, without losses', () => {
    fc.assert(
      fc.property(bodies, (body) => {
        const whole = columnOf({ ...body, lossless: true });
        const half = columnOf({ ...body, lossless: true }, 0.5);
        const low = notes(whole.column, whole.states);
        const high = notes(half.column, half.states);
        expect(high.length).toBe(low.length);
        low.forEach((frequency, i) => expect(high[i]! / frequency / 2).toBeCloseTo(1, 7));
      }),
      { numRuns: 25 },
    );
  });

  it('does not notice a split of the bore', () => {
    fc.assert(
      fc.property(bodies, real(0.05, 0.3), real(50, 2500), (body, share, frequency) => {
        const { column, states } = columnOf({ ...body, lossless: true });
        const [first, last] = column.bore as [(typeof column.bore)[number], (typeof column.bore)[number]];
        const position = share * last.position;
        const radius = first.radius + share * (last.radius - first.radius);
        const split = { ...column, bore: [first, { position, radius }, last] };
        const [re, im] = impedance(column, states, frequency);
        const [splitRe, splitIm] = impedance(split, states, frequency);
        expect(Math.hypot(re - splitRe, im - splitIm) / Math.hypot(re, im)).toBeLessThan(1e-8);
      }),
      { numRuns: 60 },
    );
  });

  it('does not notice a hole of vanishing size', () => {
    fc.assert(
      fc.property(bodies, (body) => {
        const { column, states } = columnOf({ ...body, holes: [] });
        const tiny = columnOf({ ...body, holes: [{ share: 0.5, ratio: 2.5e-4, open: true, angle: 0 }] });
        const plain = notes(column, states);
        notes(tiny.column, tiny.states).forEach((frequency, i) =>
          expect(Math.abs(1200 * Math.log2(frequency / plain[i]!))).toBeLessThan(0.01),
        );
      }),
      { numRuns: 25 },
    );
  });

  it('moves every clear note smoothly with small changes', () => {
    fc.assert(
      fc.property(bodies, (body) => {
        const here = columnOf(body);
        const there = columnOf({ ...body, length: body.length * 1.0005 });
        const before = notes(here.column, here.states, 2);
        const after = notes(there.column, there.states, 2);
        const moved = Math.abs(1200 * Math.log2(after[0]! / before[0]!));
        expect(moved).toBeLessThan(2);
      }),
      { numRuns: 40 },
    );
  });
});
