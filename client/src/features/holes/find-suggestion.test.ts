import { describe, expect, it, vi } from 'vitest';
import type { DesignPrediction, FingeringPrediction } from '#shared/analysis/prediction.ts';
import type { DesignDocument } from '#shared/document/design-document.ts';
import { whistleDocument } from '../../../../tests/support/whistle-document.ts';
import { effectsOf, findSuggestions } from './find-suggestion.ts';

const document = whistleDocument();
const hole = document.holes[3]!;

const note = (id: string, name: string, cents: number): FingeringPrediction => ({
  id,
  note: name,
  register: 1,
  targetHz: 784,
  frequencyHz: 784,
  centsFromScale: cents,
  beatsHz: 0,
  mode: 1,
  ladder: [],
  ventHole: 'h4',
  cutoffHz: null,
  accuracyCents: 10,
  notices: [],
});

/** A pipe on which hole 4 alone moves G5, by 10 cents a millimetre wider and 6 cents a millimetre toward the mouth. */
const straight = (changed: DesignDocument): DesignPrediction => {
  const four = changed.holes.find(({ id }) => id === 'h4')!;
  const cents = -6 + (four.diameterMm - 6.5) * 10 - (four.positionMm - hole.positionMm) * 6;
  return { engine: 'test', notices: [], fingerings: [note('f-g5', 'G5', cents), note('f-a5', 'A5', 1)] };
};

const request = {
  document,
  prediction: straight(document),
  hole,
  fingering: 'f-g5',
  unit: 'mm',
  bandCents: [5, 8, 15],
  predict: (changed: DesignDocument) => Promise.resolve(straight(changed)),
} as const;

describe('findSuggestions', () => {
  it('finds the drill and the move that bring the note to true, and their exact effect', async () => {
    const found = await findSuggestions(request);
    const drill = found.find(({ kind }) => kind === 'drill');
    const move = found.find(({ kind }) => kind === 'move');
    expect(drill?.mm).toBeCloseTo(7.1, 6);
    expect(drill?.effects[0]?.after).toBeCloseTo(0, 6);
    expect(move?.mm).toBe(-1);
    expect(drill?.change(document).holes[3]?.diameterMm).toBeCloseTo(7.1, 6);
  });

  it('offers nothing that takes another note out of its band, and less where that is near', async () => {
    const beside = (changed: DesignDocument): DesignPrediction => {
      const now = straight(changed);
      const moved = (now.fingerings[0]?.centsFromScale ?? 0) + 6;
      return { ...now, fingerings: [now.fingerings[0]!, note('f-a5', 'A5', 2 + moved)] };
    };
    const predict = (changed: DesignDocument) => Promise.resolve(beside(changed));
    const found = await findSuggestions({ ...request, prediction: beside(document), predict });
    // A5 stands at 2 of the 5 cents allowed and moves along: 3 of the 6 cents can be had.
    const drill = found.find(({ kind }) => kind === 'drill');
    expect(drill?.effects.find(({ note: name }) => name === 'A5')?.after).toBeLessThanOrEqual(5);
    expect(drill?.mm).toBeCloseTo(6.8, 6);
  });

  it('moves by whole hundredths of an inch for whoever measures so', async () => {
    const found = await findSuggestions({ ...request, unit: 'inch' });
    const move = found.find(({ kind }) => kind === 'move');
    expect((move?.mm ?? NaN) / 25.4).toBeCloseTo(-0.03, 9);
  });

  it('offers nothing for a note that is true', async () => {
    const prediction = { ...request.prediction, fingerings: [note('f-g5', 'G5', 0)] };
    const predict = vi.fn((changed: DesignDocument) => {
      const now = straight(changed);
      return Promise.resolve({
        ...now,
        fingerings: [note('f-g5', 'G5', (now.fingerings[0]?.centsFromScale ?? 0) + 6)],
      });
    });
    expect(await findSuggestions({ ...request, prediction, predict })).toEqual([]);
    expect(predict).toHaveBeenCalled();
  });

  it('passes over sizes that cannot be worked out', async () => {
    const found = await findSuggestions({ ...request, predict: () => Promise.resolve(null) });
    expect(found).toEqual([]);
  });
});

describe('effectsOf', () => {
  it('names the chosen note first, then what moves most, and sums up the rest', () => {
    const before = {
      engine: '',
      notices: [],
      fingerings: [note('a', 'A5', 0), note('b', 'B5', 0), note('g', 'G5', -6)],
    };
    const after = {
      engine: '',
      notices: [],
      fingerings: [note('a', 'A5', 0.3), note('b', 'B5', 4), note('g', 'G5', -1)],
    };
    const { effects, othersMoveCents } = effectsOf(before, after, 'g');
    expect(effects.map((effect) => effect.note)).toEqual(['G5', 'B5']);
    expect(othersMoveCents).toBeCloseTo(0.3, 6);
  });
});
