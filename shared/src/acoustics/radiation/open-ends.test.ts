import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { finiteWallEndImpedance } from './finite-wall-end.ts';
import { flangedEndImpedance } from './flanged-end.ts';
import { unflangedEndImpedance } from './unflanged-end.ts';

const out = new Float64Array(4);
const ends = {
  unflanged: unflangedEndImpedance,
  flanged: flangedEndImpedance,
  'finite wall': (ka: number, into: Float64Array, at: number) => finiteWallEndImpedance(ka, 0.8, into, at),
};
const wavenumber = fc.double({ min: 1e-6, max: 8, noNaN: true });

describe.each(Object.entries(ends))('%s end', (_, impedance) => {
  it('gives out no power at any frequency', () => {
    fc.assert(
      fc.property(wavenumber, (ka) => {
        impedance(ka, out, 0);
        expect(Number.isFinite(out[1])).toBe(true);
        expect(out[0]).toBeGreaterThan(0);
      }),
    );
  });

  it('has no jump, not even where its fit is held', () => {
    for (const ka of [1e-4, 0.5, 1.5, 3.4999999, 3.5, 6]) {
      impedance(ka, out, 0);
      impedance(ka * (1 + 1e-7), out, 2);
      expect(Math.abs(out[2]! - out[0]!)).toBeLessThan(1e-5);
      expect(Math.abs(out[3]! - out[1]!)).toBeLessThan(1e-5);
    }
  });

  it('shorts the bore at frequency 0', () => {
    impedance(0, out, 0);
    expect([out[0], out[1]]).toEqual([0, 0]);
  });

  it('writes where it is told and nowhere else', () => {
    out.fill(7);
    impedance(0.3, out, 2);
    expect([out[0], out[1]]).toEqual([7, 7]);
    expect(out[3]).toBeGreaterThan(0.1);
  });
});
