import { describe, expect, it } from 'vitest';
import { curveInDecibels, decibelsAt, multipleOf, resonanceWidthHz } from './resonance-curve.ts';

/** Impedance of a plain resonator, Z = 1 + i·(f − f0)/(w/2): at half power w wide, by definition of the quality factor. */
function resonator(frequencyHz: number, widthHz: number, stepHz = 2) {
  const points = Array.from({ length: 500 }, (_, index) => {
    const at = 500 + index * stepHz;
    return { frequencyHz: at, re: 1, im: (at - frequencyHz) / (widthHz / 2) };
  });
  return { fingering: 'f', points };
}

describe('the impedance curve', () => {
  it.each([
    [783, 33],
    [1000, 51],
    [1204.7, 84],
  ])('of a resonator at %d Hz is as wide as the resonator, %d Hz', (frequencyHz, widthHz) => {
    const points = curveInDecibels(resonator(frequencyHz, widthHz));
    expect(Math.abs(resonanceWidthHz(points, frequencyHz, false)! - widthHz)).toBeLessThan(1);
  });

  it('is read the other way up where maxima play', () => {
    const { points } = resonator(800, 40);
    const peak = points.map(({ frequencyHz, re, im }) => ({
      frequencyHz,
      re: re / (re * re + im * im),
      im: -im / (re * re + im * im),
    }));
    const width = resonanceWidthHz(curveInDecibels({ fingering: 'f', points: peak }), 800, true)!;
    expect(Math.abs(width - 40)).toBeLessThan(1);
  });

  it('has no width for a resonance at its edge', () => {
    expect(resonanceWidthHz(curveInDecibels(resonator(505, 80)), 505, false)).toBeNull();
  });

  it('is read between its points, and not beyond', () => {
    const points = [
      { frequencyHz: 100, decibels: 0 },
      { frequencyHz: 200, decibels: 10 },
    ];
    expect(decibelsAt(points, 150)).toBe(5);
    expect(decibelsAt(points, 250)).toBeNull();
  });
});

describe('exact multiples', () => {
  it('are odd for a pipe closed at the mouth end', () => {
    expect([1, 2, 3, 4].map((mode) => multipleOf(mode, true))).toEqual([1, 3, 5, 7]);
    expect([1, 2, 3, 4].map((mode) => multipleOf(mode, false))).toEqual([1, 2, 3, 4]);
  });
});
