import { describe, expect, it } from 'vitest';
import type { Resonance } from '../acoustics/response/resonances.ts';
import { ladderOf } from './ladder.ts';

const rung = (order: number, frequency: number, magnitude: number): Resonance => ({
  order,
  frequency,
  magnitude,
  weak: false,
});

describe('ladderOf', () => {
  it('reckons strength in dB against the strongest rung', () => {
    const impedances = [rung(1, 100, 40), rung(2, 300, 4)];
    expect(ladderOf(impedances, true, 'odd').map(({ strength }) => strength)).toEqual([0, -20]);
    const dips = [rung(1, 100, 0.1), rung(2, 200, 0.01)];
    expect(ladderOf(dips, false, 'all').map(({ strength }) => strength)).toEqual([-20, 0]);
  });

  it('reckons cents against whole and against odd multiples of its first rung', () => {
    const rungs = [rung(1, 100, 0.1), rung(2, 300 * 2 ** (10 / 1200), 0.1)];
    expect(ladderOf(rungs, false, 'odd')[1]?.centsFromMultiple).toBeCloseTo(10, 9);
    // 3/2 is 701.955 cents: the pure fifth, any table of intervals.
    expect(ladderOf(rungs, false, 'all')[1]?.centsFromMultiple).toBeCloseTo(711.955, 3);
  });

  it.each([
    ['dips to nothing', [0, -0], false],
    ['rises without end', [Infinity, -Infinity], true],
  ])('has a strength for every rung where nothing takes power and the impedance %s', (_, ends, maxima) => {
    const [first = NaN, second = NaN] = ends;
    const rungs = [rung(1, 100, first), rung(2, 200, second), rung(3, 300, 1)];
    const strengths = ladderOf(rungs, maxima, 'all').map(({ strength }) => strength);
    expect(strengths.slice(0, 2)).toEqual([0, 0]);
    expect(strengths[2]).toBeLessThan(-200);
    expect(Number.isFinite(strengths[2])).toBe(true);
  });
});
