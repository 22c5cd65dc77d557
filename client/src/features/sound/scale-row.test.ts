import { describe, expect, it } from 'vitest';
import type { FingeringPrediction } from '#shared/analysis/prediction.ts';
import { scaleUpAndDown } from './scale-row.ts';

const note = (name: string, targetHz: number, frequencyHz: number | null): FingeringPrediction => ({
  id: `${name}${targetHz}`,
  note: name,
  register: 1,
  targetHz,
  frequencyHz,
  centsFromScale: 0,
  beatsHz: 0,
  mode: 1,
  ladder: [],
  ventHole: null,
  cutoffHz: null,
  accuracyCents: 5,
  notices: [],
});

describe('the scale', () => {
  it('goes up and down by what is wanted, at what is predicted, leaving out silent and doubled notes', () => {
    const row = scaleUpAndDown([
      note('E5', 659, 661),
      note('D5', 587, 586),
      note('F5', 698, null),
      note('G5', 784, 780),
      note('G5', 784, 790),
    ]);
    expect(row.map(({ frequencyHz }) => frequencyHz)).toEqual([586, 661, 780, 661, 586]);
    expect(row.map(({ atS, lengthS }) => atS + lengthS).slice(0, -1)).toEqual(
      row.slice(1).map(({ atS }) => atS),
    );
  });

  it('of no notes is silent', () => {
    expect(scaleUpAndDown([])).toEqual([]);
  });
});
