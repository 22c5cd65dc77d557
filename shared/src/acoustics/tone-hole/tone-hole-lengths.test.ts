import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { EngineInputError } from '../engine-input-error.ts';
import { curvedLidHeight, fingertipHeight } from './closed-lid.ts';
import { innerLength } from './inner-length.ts';
import { matchingLength } from './matching-length.ts';
import { radiationLength } from './radiation-length.ts';
import { closedSeriesLength, openSeriesLength } from './series-length.ts';

const MM = 1e-3;
const ratio = fc.double({ min: 1e-3, max: 0.949, noNaN: true });
const chimney = fc.double({ min: 0.05 * MM, max: 200 * MM, noNaN: true });

/** Low enough for the lid to be felt at the bore. */
const lowChimney = fc.double({ min: 0.05 * MM, max: 4 * MM, noNaN: true });

describe('lengths of a tone hole', () => {
  it('stay in their bounds for every hole that is not refused', () => {
    fc.assert(
      fc.property(ratio, chimney, (d, t) => {
        const a = 7 * MM;
        const b = d * a;
        expect(innerLength(a, b, t) / b).toBeGreaterThan(0.1);
        expect(innerLength(a, b, t) / b).toBeLessThan(0.8219);
        expect(openSeriesLength(a, b, t) / (b * d ** 4)).toBeGreaterThan(-0.4);
        expect(openSeriesLength(a, b, t)).toBeLessThan(0);
        expect(closedSeriesLength(a, b, t) / (b * d ** 4)).toBeGreaterThan(-0.31);
        expect(closedSeriesLength(a, b, t)).toBeLessThan(0);
        expect(matchingLength(a, b)).toBeGreaterThan(0);
      }),
    );
  });

  it('shorten the bore more when open than under a lid near by', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 0.9, noNaN: true }), lowChimney, (d, t) => {
        const a = 7 * MM;
        expect(openSeriesLength(a, d * a, t)).toBeLessThanOrEqual(closedSeriesLength(a, d * a, t));
      }),
    );
  });

  it.each([0.1, 10])('have no jump where the chimney is held, at %s hole radii', (height) => {
    const [a, b] = [7 * MM, 3 * MM];
    for (const length of [innerLength, openSeriesLength, closedSeriesLength]) {
      expect(length(a, b, height * b * (1 - 1e-9))).toBeCloseTo(length(a, b, height * b * (1 + 1e-9)), 10);
    }
  });

  it('vanish with the hole', () => {
    const [a, t, b] = [7 * MM, 4 * MM, 1e-9];
    expect(innerLength(a, b, t) / b).toBeCloseTo(0.8218, 4);
    expect(openSeriesLength(a, b, t) / b).toBeCloseTo(0, 12);
    expect(matchingLength(a, b) / b).toBeCloseTo(0, 6);
    expect(radiationLength(b, 10 * MM) / b).toBeCloseTo(0.822, 3);
  });

  it.each([
    ['holeRadius', 7, 6.7, 4],
    ['holeRadius', 7, 0, 4],
    ['boreRadius', 0, 3, 4],
    ['chimney', 7, 3, 0],
    ['chimney', 7, 3, Number.NaN],
  ])('refuse a wrong %s', (field, a, b, t) => {
    for (const length of [innerLength, openSeriesLength, closedSeriesLength]) {
      expect(() => length(a * MM, b * MM, t * MM)).toThrow(expect.objectContaining({ field }));
    }
  });

  it('refuse a hole wider than the body', () => {
    expect(() => radiationLength(9 * MM, 8 * MM)).toThrow(EngineInputError);
  });
});

describe('closed holes', () => {
  it('have the volume of a lid that follows the body', () => {
    // Mean drop of a cylinder of radius R under a circle of radius b, integrated numerically: 1 mm holes of 4 in 10.
    const [b, outer, steps] = [4, 10, 2000];
    let drop = 0;
    for (let i = 0; i < steps; i += 1) {
      const y = -b + ((i + 0.5) * 2 * b) / steps;
      drop += (outer - Math.sqrt(outer * outer - y * y)) * 2 * Math.sqrt(b * b - y * y) * ((2 * b) / steps);
    }
    const mean = drop / (Math.PI * b * b);
    expect((5 - curvedLidHeight(5, b, outer)) / mean).toBeCloseTo(1, 2);
  });

  it('lose between 0.3 and 1 mm to a fingertip, as is common practice for holes of 6 to 9 mm', () => {
    expect(fingertipHeight(3 * MM)).toBeGreaterThan(0.3 * MM);
    expect(fingertipHeight(4.5 * MM)).toBeLessThan(1 * MM);
  });
});
