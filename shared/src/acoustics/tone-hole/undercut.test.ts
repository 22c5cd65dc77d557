import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { undercutShape, type Undercut } from './undercut.ts';

const hole: Undercut = {
  boreRadius: 9e-3,
  holeRadius: 4e-3,
  chimney: 4e-3,
  outerRadius: 13e-3,
  flare: 0.6e-3,
  depth: 3e-3,
};

describe('undercut', () => {
  it('is the hole itself where it is not flared', () => {
    expect(undercutShape({ ...hole, flare: 0 })).toEqual({
      status: 'shaped',
      innerRadius: 4e-3,
      rimRadius: 4e-3,
      seriesRadius: 4e-3,
      closedRadius: 4e-3,
      openExtraLength: 0,
      slope: 0,
    });
  });

  it('gives radii between the hole and the bore for every shape that it does not refuse', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 0.9, noNaN: true }),
        fc.double({ min: 0, max: 0.6, noNaN: true }),
        fc.double({ min: 0.1, max: 1, noNaN: true }),
        fc.double({ min: 0.2, max: 3, noNaN: true }),
        (ratio, flare, depth, height) => {
          const b = 9e-3 * ratio;
          const t = height * b;
          const shape = undercutShape({
            boreRadius: 9e-3,
            holeRadius: b,
            chimney: t,
            outerRadius: 9e-3 + t,
            flare: flare * b,
            depth: depth * t,
          });
          if (shape.status === 'refused') return;
          expect(shape.seriesRadius).toBeGreaterThanOrEqual(b);
          expect(shape.seriesRadius).toBeLessThanOrEqual(shape.innerRadius);
          expect(shape.rimRadius).toBeGreaterThanOrEqual(b);
          expect(shape.closedRadius).toBeGreaterThanOrEqual(shape.innerRadius * (1 - 1e-12));
          expect(shape.closedRadius).toBeLessThan(9e-3);
          expect(shape.openExtraLength).toBeGreaterThanOrEqual(0);
        },
      ),
    );
  });

  it('says why it refuses', () => {
    expect(undercutShape({ ...hole, flare: 3e-3, depth: 0.5e-3 })).toEqual({
      status: 'refused',
      reason: 'cone-breaks-out',
    });
    // A deep, gentle cone that ends as wide as the bore.
    const deep = {
      ...hole,
      holeRadius: 8.3e-3,
      chimney: 60e-3,
      outerRadius: 69e-3,
      depth: 60e-3,
      flare: 0.3e-3,
    };
    expect(undercutShape(deep)).toEqual({ status: 'refused', reason: 'inner-end-too-wide' });
  });

  it.each([
    ['flare', { flare: -1e-4 }],
    ['depth', { depth: 5e-3 }],
    ['depth', { depth: 0 }],
    ['chimney', { chimney: Number.NaN }],
  ])('refuses a wrong %s', (field, wrong) => {
    expect(() => undercutShape({ ...hole, ...wrong })).toThrow(expect.objectContaining({ field }));
  });
});
