import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cubicSpline, type SplinePiece } from './cubic-spline.ts';

const value = ({ from, c0, c1, c2, c3 }: SplinePiece, x: number) =>
  c0 + (x - from) * (c1 + (x - from) * (c2 + (x - from) * c3));
const curvature = ({ from, c2, c3 }: SplinePiece, x: number) => 2 * c2 + 6 * (x - from) * c3;

const knots = fc
  .array(fc.double({ min: 0.1, max: 2, noNaN: true }), { minLength: 4, maxLength: 12 })
  .map((steps) => steps.reduce<number[]>((xs, step) => [...xs, (xs.at(-1) ?? 0) + step], []));
const coefficient = fc.double({ min: -3, max: 3, noNaN: true });

describe('cubic spline', () => {
  it('is exact for every cubic', () => {
    fc.assert(
      fc.property(knots, fc.tuple(coefficient, coefficient, coefficient, coefficient), (xs, [a, b, c, d]) => {
        const cubic = (x: number) => a + x * (b + x * (c + x * d));
        for (const piece of cubicSpline(xs.map((x) => [x, cubic(x)] as const))) {
          const middle = (piece.from + piece.to) / 2;
          const size =
            1 + Math.abs(a) + Math.abs(b * middle) + Math.abs(c * middle ** 2) + Math.abs(d * middle ** 3);
          expect(Math.abs(value(piece, middle) - cubic(middle)) / size).toBeLessThan(1e-9);
        }
      }),
    );
  });

  it('passes through its points and bends without a break', () => {
    const points = [0, 1, 1.5, 3, 4].map((x) => [x, Math.sin(3 * x)] as const);
    const pieces = cubicSpline(points);
    pieces.forEach((piece, i) => {
      expect(value(piece, piece.from)).toBeCloseTo(points[i]![1], 12);
      expect(value(piece, piece.to)).toBeCloseTo(points[i + 1]![1], 12);
      const next = pieces[i + 1];
      if (next !== undefined) expect(curvature(piece, piece.to)).toBeCloseTo(curvature(next, next.from), 9);
    });
  });

  it('refuses points that it cannot join', () => {
    expect(() =>
      cubicSpline([
        [0, 0],
        [1, 1],
        [2, 0],
      ]),
    ).toThrow(RangeError);
    expect(() =>
      cubicSpline([
        [0, 0],
        [1, 1],
        [1, 2],
        [2, 0],
      ]),
    ).toThrow(RangeError);
  });
});
