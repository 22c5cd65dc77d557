import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { beatsBetween, centsBetween, formatCents, frequencyAbove } from './cents.ts';

describe('cents', () => {
  it.each([
    // Ratio and cents of the pure intervals: A. J. Ellis in Helmholtz, On the Sensations of Tone (1885), appendix XX.
    [2, 1200],
    [3 / 2, 701.955],
    [5 / 4, 386.314],
    [81 / 80, 21.506],
  ])('of the ratio %f are %f', (ratio, cents) => {
    expect(centsBetween(440 * ratio, 440)).toBeCloseTo(cents, 3);
  });

  it('lead back to the frequency they came from', () => {
    const frequency = fc.double({ min: 20, max: 20_000, noNaN: true });
    fc.assert(
      fc.property(frequency, frequency, (f, reference) => {
        expect(frequencyAbove(reference, centsBetween(f, reference)) / f).toBeCloseTo(1, 12);
      }),
    );
  });

  it('beat at the difference of the two frequencies', () => {
    expect(beatsBetween(440, 443)).toBe(3);
    expect(beatsBetween(443, 440)).toBe(3);
  });

  it.each([
    [3.84, '+3.8'],
    [-6.1, '\u22126.1'],
    [0.04, '0.0'],
    [-0.04, '0.0'],
    [-0.05, '\u22120.1'],
    [120, '+120.0'],
  ])('%f stands on paper as %s', (cents, text) => {
    expect(formatCents(cents)).toBe(text);
  });
});
