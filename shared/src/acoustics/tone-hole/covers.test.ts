import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineInputError } from '../engine-input-error.ts';
import { halfCoveredLength, halfCoveredShift, type HalfCover } from './half-covered.ts';
import { padLength, paddedOutletLength } from './pad.ts';
import { radiationLength } from './radiation-length.ts';

const cover: HalfCover = { fraction: 0.5, from: 'end', holeRadius: 3e-3, outerRadius: 9e-3, chimney: 3e-3 };
const from = fc.constantFrom('side' as const, 'end' as const);

describe('half-covered hole', () => {
  it('is a free hole at no cover, and longer the more is covered', () => {
    expect(halfCoveredLength({ ...cover, fraction: 0 })).toBe(0);
    expect(halfCoveredShift({ ...cover, fraction: 0 })).toBe(0);
    fc.assert(
      fc.property(from, fc.double({ min: 0, max: 0.94, noNaN: true }), (side, fraction) => {
        const less = halfCoveredLength({ ...cover, from: side, fraction });
        const more = halfCoveredLength({ ...cover, from: side, fraction: fraction + 0.01 });
        expect(more).toBeGreaterThan(less);
        expect(more - less).toBeLessThan(2 * cover.holeRadius);
      }),
    );
  });

  it('keeps its axis under a lid from the side', () => {
    expect(halfCoveredShift({ ...cover, from: 'side' })).toBe(0);
    expect(halfCoveredShift(cover)).toBeGreaterThan(0);
  });

  it.each([1, -0.1, Number.NaN])('refuses to cover %s of a hole', (fraction) => {
    expect(() => halfCoveredLength({ ...cover, fraction })).toThrow(EngineInputError);
    expect(() => halfCoveredShift({ ...cover, fraction })).toThrow(EngineInputError);
  });
});

describe('pad', () => {
  const pad = { holeRadius: 6e-3, padRadius: 8e-3, height: 3e-3, rimWidth: null, outerRadius: 14e-3 };

  it('lengthens the hole the more, the lower it stands, and not at all far away', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.3e-3, max: 20e-3, noNaN: true }), (height) => {
        expect(padLength({ ...pad, height })).toBeGreaterThan(padLength({ ...pad, height: height * 1.05 }));
      }),
    );
    expect(padLength({ ...pad, height: 1 })).toBeLessThan(1e-8);
    expect(paddedOutletLength({ ...pad, height: 1 })).toBeCloseTo(radiationLength(6e-3, 14e-3), 7);
  });

  it('has no jump where the rim reaches the edge of the disc', () => {
    const at = (rimWidth: number) => padLength({ ...pad, rimWidth });
    expect(at(2e-3 - 1e-10)).toBeCloseTo(at(2e-3 + 1e-10), 9);
  });

  it.each([
    ['height', { height: 0 }],
    ['padRadius', { padRadius: 5e-3 }],
    ['rimWidth', { rimWidth: -1e-3 }],
  ])('refuses a wrong %s', (field, wrong) => {
    expect(() => padLength({ ...pad, ...wrong })).toThrow(expect.objectContaining({ field }));
  });
});
