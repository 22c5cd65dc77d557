import { describe, expect, it } from 'vitest';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import { ladderPlaces } from './ladder-places.ts';

const rung = (mode: number, frequencyHz: number, centsFromMultiple: number, strength: number) => ({
  mode,
  frequencyHz,
  centsFromMultiple,
  strength,
  weak: false,
});

const prediction: FingeringPrediction = {
  id: 'f-g5',
  note: 'G5',
  register: 1,
  targetHz: 784,
  frequencyHz: 780,
  centsFromScale: -8.9,
  beatsHz: 4,
  mode: 1,
  ladder: [rung(1, 780, 0, 0), rung(2, 1560, 0, -15), rung(3, 2479.3, 100, -30)],
  ventHole: 'h4',
  cutoffHz: 1950,
  accuracyCents: 10,
  notices: [],
};

const size = { top: 0, bottom: 276, most: 5 };

describe('ladderPlaces', () => {
  it('spaces the exact multiples evenly, the first at the bottom', () => {
    const { rungs } = ladderPlaces(prediction, size);
    expect(rungs.map(({ multipleY }) => multipleY)).toEqual([238, 138, 38]);
  });

  it('moves a resonance up by 0.42 of the spacing for 100 cents', () => {
    const { rungs } = ladderPlaces(prediction, size);
    expect(rungs[0]?.y).toBe(238);
    expect(rungs[2]?.y).toBeCloseTo(38 - 42, 6);
  });

  it('is full length at 0 dB, half at −15 dB, a stub at −30 dB', () => {
    expect(ladderPlaces(prediction, size).rungs.map(({ share }) => share)).toEqual([1, 0.5, 0.02]);
  });

  it('puts the leak between the multiples it lies between', () => {
    expect(ladderPlaces(prediction, size).cutoffY).toBeCloseTo(88, 0);
  });

  it('leaves the leak out with no open holes', () => {
    expect(ladderPlaces({ ...prediction, cutoffHz: null }, size).cutoffY).toBeNull();
  });
});
