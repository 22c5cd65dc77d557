import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { innerCoupling } from './inner-coupling.ts';

const angle = fc.double({ min: 0.35, max: Math.PI, noNaN: true });

describe('coupling inside the bore', () => {
  it('has no jump in distance or angle', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 4, noNaN: true }), angle, (z, theta) => {
        const here = innerCoupling(z, theta);
        expect(Math.abs(innerCoupling(z + 1e-7, theta) - here)).toBeLessThan(1e-5);
        expect(Math.abs(innerCoupling(z, theta + 1e-7) - here)).toBeLessThan(1e-5);
      }),
    );
    expect(innerCoupling(0.75 - 1e-9, 2)).toBeCloseTo(innerCoupling(0.75, 2), 7);
  });

  it('does not care which hole comes first nor which way round the angle is read', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 3, noNaN: true }), angle, (z, theta) => {
        const m = innerCoupling(z, theta);
        expect(innerCoupling(-z, -theta)).toBeCloseTo(m, 12);
        expect(innerCoupling(z, 2 * Math.PI - theta)).toBeCloseTo(m, 12);
      }),
    );
  });

  it('dies out along the bore', () => {
    for (const theta of [0, 1, 2, Math.PI]) expect(Math.abs(innerCoupling(5, theta))).toBeLessThan(1e-3);
  });

  it('brings holes on one side nearer and opposite holes further apart', () => {
    expect(innerCoupling(0.5, 0)).toBeGreaterThan(0);
    expect(innerCoupling(0.5, Math.PI)).toBeLessThan(0);
  });
});
