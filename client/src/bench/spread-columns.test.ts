import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { spreadColumns } from './spread-columns.ts';

const holes = fc
  .array(fc.double({ min: 0, max: 1400, noNaN: true }), { minLength: 1, maxLength: 25 })
  .map((xs) => xs.toSorted((a, b) => a - b));
const bounds = { spacing: 82, left: -5000, right: 5000 };

describe('spreadColumns', () => {
  it('leaves holes that are far enough apart where they are', () => {
    expect(spreadColumns([100, 200, 400], bounds)).toEqual([100, 200, 400]);
  });

  it('pushes two near holes apart by the same way each', () => {
    expect(spreadColumns([100, 120], bounds)).toEqual([69, 151]);
  });

  it('keeps the order, so leaders never cross, and the spacing where there is room', () => {
    fc.assert(
      fc.property(holes, (xs) => {
        const columns = spreadColumns(xs, bounds);
        for (let i = 1; i < columns.length; i += 1) {
          expect(columns[i]! - columns[i - 1]!).toBeGreaterThanOrEqual(bounds.spacing - 1e-6);
        }
      }),
    );
  });

  it('stays within its bounds and in order even when there is no room for the spacing', () => {
    fc.assert(
      fc.property(holes, fc.double({ min: 0, max: 900, noNaN: true }), (xs, room) => {
        const columns = spreadColumns(xs, { spacing: 82, left: 500, right: 500 + room });
        columns.forEach((x, i) => {
          expect(x).toBeGreaterThanOrEqual(500 - 1e-6);
          expect(x).toBeLessThanOrEqual(500 + room + 1e-6);
          if (i > 0) expect(x).toBeGreaterThanOrEqual(columns[i - 1]! - 1e-6);
        });
      }),
    );
  });

  it('is the nearest such row: moving any run of touching columns together only adds to the shifts', () => {
    const cost = (xs: number[], columns: number[]) =>
      xs.reduce((sum, x, i) => sum + (x - columns[i]!) ** 2, 0);
    fc.assert(
      fc.property(holes, fc.double({ min: -3, max: 3, noNaN: true }), fc.nat(24), (xs, shift, from) => {
        const best = spreadColumns(xs, bounds);
        const moved = best.map((x, i) => (i >= from ? x + Math.abs(shift) : x));
        expect(cost(xs, moved)).toBeGreaterThanOrEqual(cost(xs, best) - 1e-6);
      }),
    );
  });

  it('mirrors with its holes', () => {
    fc.assert(
      fc.property(holes, (xs) => {
        const mirrored = spreadColumns(xs.map((x) => -x).toReversed(), bounds);
        const straight = spreadColumns(xs, bounds);
        mirrored.toReversed().forEach((x, i) => {
          expect(-x).toBeCloseTo(straight[i]!, 6);
        });
      }),
    );
  });
});
